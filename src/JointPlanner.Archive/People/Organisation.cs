using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.People;

/// <summary>Who issues by the owner's rule.</summary>
public enum IssuedBy
{
    Designer,
    Owner,
    DesignerOrOwner,
}

public sealed class Organisation : IVersioned
{
    public Guid Id { get; init; } = Guid.CreateVersion7();
    public required string Name { get; set; }

    /// <summary>The owner's rule for structures of this organisation: who issues.</summary>
    public IssuedBy IssuedBy { get; set; } = IssuedBy.DesignerOrOwner;

    public bool DesignerSignatureRequired { get; set; } = true;
    public bool CheckerSignatureRequired { get; set; } = true;
    public long Version { get; private set; }
    public ICollection<Membership> Memberships { get; } = [];
}

/// <summary>One role of one person in one organisation.</summary>
public sealed class Membership
{
    public required Guid PersonId { get; init; }
    public required Guid OrganisationId { get; init; }
    public required Role Role { get; init; }
}
