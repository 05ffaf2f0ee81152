using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Revisions;

/// <summary>Somebody changed the inputs of the shared plan: who did since the last issue counts as designer and cannot check.</summary>
public sealed class RevisionEdit : ChainedRow
{
    public required Guid RevisionId { get; init; }
    public Revision? Revision { get; init; }
    public required Guid PersonId { get; init; }
    public required string PlanHashBefore { get; init; }
    public required string PlanHashAfter { get; init; }

    protected override void Write(ChainText text) => text
        .Add("revision", RevisionId).Add("person", PersonId).Add("before", PlanHashBefore).Add("after", PlanHashAfter);
}
