using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Setting;

/// <summary>One measured point across the deck.</summary>
public sealed class SettingPoint
{
    public required Guid SettingRecordId { get; init; }
    public required int Ordinal { get; init; }

    /// <summary>"left kerb", "axis", "right kerb" or the person's own word.</summary>
    public required string Place { get; init; }

    /// <summary>The opening, metres.</summary>
    public required double Opening { get; init; }

    /// <summary>Direction in which it was measured ("normal to the joint", "along the deck").</summary>
    public required string Direction { get; init; }

    /// <summary>The structure's effective temperature, °C.</summary>
    public required double Temperature { get; init; }

    /// <summary>How the temperature was found.</summary>
    public required string Method { get; init; }

    /// <summary>Its standard uncertainty, kelvin.</summary>
    public required double Uncertainty { get; init; }

    internal void Write(ChainText text) => text
        .Add("point", Ordinal).Add("place", Place).Add("opening", Opening).Add("direction", Direction)
        .Add("temperature", Temperature).Add("method", Method).Add("uncertainty", Uncertainty);
}
