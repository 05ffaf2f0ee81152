using JointPlanner.Archive.Chains;

namespace JointPlanner.Archive.Confirming;

/// <summary>An owner's word that a value held from memory stands in the licensed text. Counts for packages frozen afterwards.</summary>
public sealed class Confirmation : ChainedRow
{
    public required Guid OrganisationId { get; init; }
    public required string ValueId { get; init; }
    public required string Document { get; init; }
    public required string Edition { get; init; }

    /// <summary>Clause, table or page.</summary>
    public required string Place { get; init; }

    public required Guid PersonId { get; init; }

    /// <summary>The person's name as it was then: it is printed.</summary>
    public required string PersonName { get; init; }

    public required DateOnly Date { get; init; }
    public bool DemonstrationOnly { get; init; }
    public ConfirmationRevocation? Revocation { get; init; }

    protected override void Write(ChainText text) => text
        .Add("organisation", OrganisationId).Add("value", ValueId).Add("document", Document).Add("edition", Edition).Add("place", Place)
        .Add("person", PersonId).Add("name", PersonName).Add("date", Date).Add("demonstration", DemonstrationOnly);
}

/// <summary>Takes a confirmation back; packages frozen before keep it.</summary>
public sealed class ConfirmationRevocation : ChainedRow
{
    public required Guid ConfirmationId { get; init; }
    public required Guid PersonId { get; init; }
    public required string Reason { get; init; }

    protected override void Write(ChainText text) => text.Add("confirmation", ConfirmationId).Add("person", PersonId).Add("reason", Reason);
}
