using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Drafts;

/// <summary>
/// One person's own copy of a structure's plan, saved while typing. The shared revision changes only when it is shared, by a merge against <see cref="BaseText"/>.
/// </summary>
public sealed class Draft : IVersioned
{
    public Guid Id { get; init; } = Guid.CreateVersion7();
    public required Guid StructureId { get; init; }
    public required Guid PersonId { get; init; }

    /// <summary>The revision it is based on.</summary>
    public required Guid RevisionId { get; set; }

    /// <summary>The shared plan as it stood when this draft was last level with it.</summary>
    public required string BaseText { get; set; }

    public required string Text { get; set; }
    public required DateTimeOffset SavedAt { get; set; }

    /// <summary>Deleted by its person; kept for 30 days.</summary>
    public DateTimeOffset? BinnedAt { get; set; }

    public long Version { get; private set; }
}
