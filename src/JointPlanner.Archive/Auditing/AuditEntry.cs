using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Auditing;

/// <summary>Who did what, when, from where. Never holds a secret.</summary>
public sealed class AuditEntry : ChainedRow
{
    public required string What { get; init; }

    /// <summary>Null when nobody was signed in.</summary>
    public Guid? PersonId { get; init; }

    public string? PersonName { get; init; }

    /// <summary>Address or console.</summary>
    public required string From { get; init; }

    /// <summary>Kind and id of what it was done to.</summary>
    public required string Subject { get; init; }

    public Guid? StructureId { get; init; }
    public Guid? OrganisationId { get; init; }
    public string? Detail { get; init; }

    /// <summary>The chain that the act wrote to, with its last hash before and after: binds that chain's end to this entry.</summary>
    public string? SubjectChain { get; init; }

    public string? HashBefore { get; init; }
    public string? HashAfter { get; init; }

    protected override void Write(ChainText text) => text
        .Add("what", What).Add("person", PersonId).Add("name", PersonName).Add("from", From).Add("subject", Subject)
        .Add("structure", StructureId).Add("organisation", OrganisationId).Add("detail", Detail)
        .Add("subjectChain", SubjectChain).Add("before", HashBefore).Add("after", HashAfter);
}
