using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Revisions;

/// <summary>One step in the life of a revision.</summary>
public sealed class StateEntry : ChainedRow
{
    public required Guid RevisionId { get; init; }
    public Revision? Revision { get; init; }

    /// <summary>1, 2, 3 … within the revision.</summary>
    public required int Ordinal { get; init; }

    public required RevisionState State { get; init; }
    public required Act Act { get; init; }
    public required Guid PersonId { get; init; }
    public string? Reason { get; init; }

    /// <summary>Hash of what the act was about: of the frozen package, or of the document as it was issued.</summary>
    public string? SubjectHash { get; init; }

    protected override void Write(ChainText text) => text
        .Add("revision", RevisionId).Add("ordinal", Ordinal).Add("state", State.ToString()).Add("act", Act.ToString())
        .Add("person", PersonId).Add("reason", Reason).Add("subject", SubjectHash);
}
