using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Setting;

/// <summary>Opens one joint of one revision to whoever holds the link, for a time. Only the hash of the token is kept.</summary>
public sealed class FieldLink : IVersioned
{
    public Guid Id { get; init; } = Guid.CreateVersion7();
    public required string TokenHash { get; init; }
    public required Guid StructureId { get; init; }
    public required Guid RevisionId { get; init; }
    public required string Joint { get; init; }
    public required Guid MadeById { get; init; }
    public required DateTimeOffset MadeAt { get; init; }
    public required DateTimeOffset ExpiresAt { get; init; }
    public DateTimeOffset? RevokedAt { get; set; }
    public long Version { get; private set; }
}
