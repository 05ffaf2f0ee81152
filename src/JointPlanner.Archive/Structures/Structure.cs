using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Structures;

/// <summary>A bridge deck with its joints and bearings; it belongs to one organisation.</summary>
public sealed class Structure : IVersioned
{
    public Guid Id { get; init; } = Guid.CreateVersion7();

    /// <summary>The owner.</summary>
    public required Guid OrganisationId { get; set; }

    public required string Name { get; set; }

    /// <summary>IANA zone of the place, in which pages and sheets show instants.</summary>
    public required string Zone { get; set; }

    public required DateTimeOffset CreatedAt { get; init; }

    /// <summary>A closed structure takes no new work; what was issued stays readable.</summary>
    public DateTimeOffset? ClosedAt { get; set; }

    public long Version { get; private set; }
    public ICollection<StructureAccess> Access { get; } = [];
    public ICollection<Revision> Revisions { get; } = [];
}

/// <summary>Opens a structure to another organisation, to those of its people who hold the role there.</summary>
public sealed class StructureAccess
{
    public required Guid StructureId { get; init; }
    public required Guid OrganisationId { get; init; }
    public required Role Role { get; init; }
}
