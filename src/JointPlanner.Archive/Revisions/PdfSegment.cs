using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Revisions;

/// <summary>A field prepared in the sheet for one signature.</summary>
public enum SignatureField
{
    Designer,
    Checker,
}

/// <summary>
/// A piece of the sheet's PDF: first the sheet as frozen, then what each signature appended. The document after segment n is the bytes of segments 1 to n in a row.
/// </summary>
public sealed class PdfSegment : ChainedRow
{
    public required Guid RevisionId { get; init; }
    public Revision? Revision { get; init; }
    public required int Ordinal { get; init; }
    public required Guid BlobId { get; init; }
    public Blob? Blob { get; init; }
    public required long Length { get; init; }

    /// <summary>Length of the document up to and with this segment.</summary>
    public required long PrefixLength { get; init; }

    /// <summary>SHA-256 of the document up to and with this segment.</summary>
    public required string PrefixHash { get; init; }

    public SignatureField? Field { get; init; }
    public Guid? SignerId { get; init; }
    public string? CertificateFingerprint { get; init; }
    public string? PublicKeyHash { get; init; }

    protected override void Write(ChainText text) => text
        .Add("revision", RevisionId).Add("ordinal", Ordinal).Add("blob", BlobId).Add("length", Length)
        .Add("prefixLength", PrefixLength).Add("prefix", PrefixHash).Add("field", Field?.ToString())
        .Add("signer", SignerId).Add("certificate", CertificateFingerprint).Add("key", PublicKeyHash);
}

/// <summary>Bytes, in a table of their own so that no list ever loads them.</summary>
public sealed class Blob
{
    public Guid Id { get; init; } = Guid.CreateVersion7();
    public required byte[] Bytes { get; init; }
    public required string Hash { get; init; }

    public static Blob Of(byte[] bytes) => new() { Bytes = bytes, Hash = Fingerprint.Of(bytes) };
}
