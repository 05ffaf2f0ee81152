using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Revisions;

/// <summary>What the checker wrote when returning a revision.</summary>
public sealed class Remark : ChainedRow
{
    public required Guid RevisionId { get; init; }
    public Revision? Revision { get; init; }
    public required Guid PersonId { get; init; }

    /// <summary>Path in the plan or key of a result that the remark is about, if it is about one.</summary>
    public string? About { get; init; }

    public required string Text { get; init; }

    protected override void Write(ChainText text) => text
        .Add("revision", RevisionId).Add("person", PersonId).Add("about", About).Add("text", Text);
}
