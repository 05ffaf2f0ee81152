using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.People;

/// <summary>Lets one person set a password, once and for a time. Only the hash of the token is kept.</summary>
public sealed class PasswordLink : IVersioned
{
    /// <summary>How long a link can be used.</summary>
    public static readonly TimeSpan Holds = TimeSpan.FromHours(48);

    public Guid Id { get; init; } = Guid.CreateVersion7();
    public required Guid PersonId { get; init; }
    public required string TokenHash { get; init; }

    /// <summary>Null when it was made at the console.</summary>
    public Guid? MadeById { get; init; }

    public required DateTimeOffset MadeAt { get; init; }
    public required DateTimeOffset ExpiresAt { get; init; }

    /// <summary>When it was used, or when a newer link took its place.</summary>
    public DateTimeOffset? ClosedAt { get; set; }

    public long Version { get; private set; }

    public bool IsOpen(DateTimeOffset now) => ClosedAt is null && now < ExpiresAt;
}
