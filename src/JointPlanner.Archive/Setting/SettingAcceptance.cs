using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Setting;

/// <summary>A designer took a setting record as right, or took one that fails with a reason.</summary>
public sealed class SettingAcceptance : ChainedRow
{
    public required Guid SettingRecordId { get; init; }
    public SettingRecord? Record { get; init; }
    public required Guid PersonId { get; init; }
    public string? Reason { get; init; }

    protected override void Write(ChainText text) => text.Add("record", SettingRecordId).Add("person", PersonId).Add("reason", Reason);
}
