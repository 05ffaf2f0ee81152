using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Setting;

/// <summary>
/// What was set at a joint: the head of that joint's chain, which the readings follow. Kept also when it fails at an end of the temperature range.
/// </summary>
public sealed class SettingRecord : ChainedRow
{
    public required Guid StructureId { get; init; }

    /// <summary>The place: the joint's id in the plan.</summary>
    public required string Joint { get; init; }

    /// <summary>What is installed in that place, as the person names it.</summary>
    public required string Device { get; init; }

    public required Guid RevisionId { get; init; }

    /// <summary>Null when recorded through a field link: then it is unconfirmed until a designer member accepts it.</summary>
    public Guid? PersonId { get; init; }

    public Guid? FieldLinkId { get; init; }
    public required string PersonName { get; init; }

    /// <summary>When it was measured; the row's own instant is when it was recorded.</summary>
    public required DateTimeOffset MeasuredAt { get; init; }

    public required string Zone { get; init; }

    /// <summary>Stage or hold point by name ("before concreting").</summary>
    public required string HoldPoint { get; init; }

    /// <summary>Age of the deck then, seconds; null where it plays no part.</summary>
    public double? DeckAge { get; init; }

    /// <summary>What was read at each measuring point, in words, from which the points' mean temperature comes; null where it was found otherwise.</summary>
    public string? TemperaturesRead { get; init; }

    public required bool HoldsAtMinimum { get; init; }
    public required string VerdictAtMinimum { get; init; }
    public required bool HoldsAtMaximum { get; init; }
    public required string VerdictAtMaximum { get; init; }
    public string? Reason { get; init; }
    public ICollection<SettingPoint> Points { get; init; } = [];

    public bool Holds => HoldsAtMinimum && HoldsAtMaximum;

    protected override void Write(ChainText text)
    {
        text.Add("structure", StructureId).Add("joint", Joint).Add("device", Device).Add("revision", RevisionId)
            .Add("person", PersonId).Add("link", FieldLinkId).Add("name", PersonName).Add("measured", MeasuredAt).Add("zone", Zone)
            .Add("holdPoint", HoldPoint).Add("deckAge", DeckAge).Add("temperaturesRead", TemperaturesRead).Add("holdsAtMinimum", HoldsAtMinimum).Add("verdictAtMinimum", VerdictAtMinimum)
            .Add("holdsAtMaximum", HoldsAtMaximum).Add("verdictAtMaximum", VerdictAtMaximum).Add("reason", Reason);
        foreach (var point in Points.OrderBy(point => point.Ordinal)) point.Write(text);
    }
}
