using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.People;

/// <summary>
/// A public certificate that a person handed in. It counts for signing once an administrator has compared its fingerprint with the person.
/// </summary>
public sealed class Certificate : IVersioned
{
    public Guid Id { get; init; } = Guid.CreateVersion7();
    public required Guid PersonId { get; init; }
    public required string Subject { get; init; }

    /// <summary>SHA-256 of the whole certificate.</summary>
    public required string Fingerprint { get; init; }

    /// <summary>SHA-256 of the subject public key info: two certificates with one key are one signer.</summary>
    public required string PublicKeyHash { get; init; }

    public required byte[] Encoded { get; init; }
    public required DateTimeOffset ValidUntil { get; init; }
    public required DateTimeOffset RegisteredAt { get; init; }
    public Guid? ConfirmedById { get; set; }
    public DateTimeOffset? ConfirmedAt { get; set; }
    public DateTimeOffset? RevokedAt { get; set; }
    public long Version { get; private set; }

    public bool Counts => ConfirmedAt is not null && RevokedAt is null;
}
