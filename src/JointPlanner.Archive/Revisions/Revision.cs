using JointPlanner.Archive.Structures;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Revisions;

/// <summary>
/// One numbered state of a structure's plan. The row carries the shared plan while it is a draft and is locked by the database once frozen.
/// Where it stands is not a column but the last of its <see cref="States"/>, rows that are only ever added: so the guard on issued things is
/// plain ("no change at all"), and the history of who moved it when cannot part from where it stands.
/// </summary>
public sealed class Revision : IVersioned
{
    public Guid Id { get; init; } = Guid.CreateVersion7();
    public required Guid StructureId { get; init; }
    public Structure? Structure { get; init; }
    public required int Number { get; init; }

    /// <summary>The shared plan file as text, opaque here.</summary>
    public required string PlanText { get; set; }

    public required string PlanHash { get; set; }
    public long Version { get; private set; }
    public ICollection<StateEntry> States { get; } = [];

    /// <summary>Needs <see cref="States"/> loaded.</summary>
    public RevisionState State => States.MaxBy(entry => entry.Ordinal)?.State
        ?? throw new InvalidOperationException($"The states of revision {Number} are not loaded.");
}
