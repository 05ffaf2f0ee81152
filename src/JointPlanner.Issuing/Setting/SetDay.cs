using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Setting;

namespace JointPlanner.Issuing.Setting;

/// <summary>One joint on the day of setting, as one person sees it.</summary>
public sealed record SetDay
{
    /// <summary>Id of the structure.</summary>
    public required Guid StructureId { get; init; }
    /// <summary>Its name.</summary>
    public required string Structure { get; init; }
    /// <summary>IANA zone of the place.</summary>
    public required string Zone { get; init; }
    /// <summary>Id of the joint.</summary>
    public required string JointId { get; init; }
    /// <summary>The revision asked for; null where none was ever issued.</summary>
    public Revision? Revision { get; init; }
    /// <summary>When it was issued.</summary>
    public DateTimeOffset? Issued { get; init; }
    /// <summary>Until when joints may be set by it.</summary>
    public DateTimeOffset? UseBefore { get; init; }
    /// <summary>Why nothing may be set by it, whatever the temperature; null where it may.</summary>
    public string? WhyNot { get; init; }
    /// <summary>The joint as issued; null where the revision has no table for it.</summary>
    public IssuedJoint? Joint { get; init; }
    /// <summary>True where the person may record what was set.</summary>
    public bool MayRecord { get; init; }
    /// <summary>True where the person may accept records.</summary>
    public bool MayAccept { get; init; }
    /// <summary>Records of the joint, latest first.</summary>
    public IReadOnlyList<KeptRecord> Records { get; init; } = [];
}

/// <summary>A setting record and what became of it.</summary>
/// <param name="Record">The record.</param>
/// <param name="Revision">Number of the revision by which it was set.</param>
/// <param name="Acceptance">Its acceptance; null while nobody accepted it.</param>
/// <param name="AcceptedBy">Who accepted it.</param>
public sealed record KeptRecord(SettingRecord Record, int Revision, SettingAcceptance? Acceptance, string AcceptedBy)
{
    /// <summary>Where it stands, in words.</summary>
    public string State => (Acceptance, Record.Holds) switch
    {
        ({ Reason: { } }, false) => "fails, accepted with a reason",
        ({ }, _) => "accepted",
        (null, false) => "fails, not accepted",
        _ => "waits for acceptance",
    };
}

/// <summary>A joint in the list of those that can be set.</summary>
/// <param name="Id">Id in the plan.</param>
/// <param name="Mark">What the drawing calls it.</param>
/// <param name="Device">What was chosen.</param>
/// <param name="Latest">Its latest record; null for none.</param>
public sealed record JointToSet(string Id, string Mark, string Device, KeptRecord? Latest);

/// <summary>What was set, as it was typed in.</summary>
/// <param name="RevisionId">Revision by which it was set.</param>
/// <param name="Joint">Id of the joint.</param>
/// <param name="Device">What is installed in that place.</param>
/// <param name="MeasuredAt">When it was measured.</param>
/// <param name="HoldPoint">At which hold point.</param>
/// <param name="Points">Openings across the deck.</param>
/// <param name="DeckAge">Age of the deck, s; null where it plays no part.</param>
/// <param name="TemperaturesRead">What was read at each measuring point, in words.</param>
/// <param name="Remark">A remark; null for none.</param>
public sealed record WhatWasSet(
    Guid RevisionId, string Joint, string Device, DateTimeOffset MeasuredAt, string HoldPoint, IReadOnlyList<SetPoint> Points, double? DeckAge,
    string? TemperaturesRead, string? Remark);
