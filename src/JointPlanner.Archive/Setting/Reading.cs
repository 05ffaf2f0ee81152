using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Setting;

/// <summary>A later measurement of a joint's opening; it belongs to the place and names device and point.</summary>
public sealed class Reading : ChainedRow
{
    public required Guid StructureId { get; init; }
    public required string Joint { get; init; }
    public required string Device { get; init; }
    public required string Point { get; init; }
    public required DateOnly Date { get; init; }

    /// <summary>Null when only the date is known.</summary>
    public DateTimeOffset? MeasuredAt { get; init; }

    public string? Zone { get; init; }

    /// <summary>The opening, metres.</summary>
    public required double Opening { get; init; }

    public required string Direction { get; init; }

    /// <summary>The structure's effective temperature, °C; null when none was measured.</summary>
    public double? Temperature { get; init; }

    public string? Method { get; init; }

    /// <summary>Standard uncertainty of the temperature, kelvin.</summary>
    public double? Uncertainty { get; init; }

    public required Guid PersonId { get; init; }

    /// <summary>Name and hash of the file it was imported from, or null.</summary>
    public string? Source { get; init; }

    protected override void Write(ChainText text) => text
        .Add("structure", StructureId).Add("joint", Joint).Add("device", Device).Add("point", Point).Add("date", Date)
        .Add("measured", MeasuredAt).Add("zone", Zone).Add("opening", Opening).Add("direction", Direction)
        .Add("temperature", Temperature).Add("method", Method).Add("uncertainty", Uncertainty).Add("person", PersonId).Add("source", Source);
}
