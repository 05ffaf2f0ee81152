using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Pdf.Signing;

/// <summary>Gets a time stamp for a request from the operator's server; it may throw when there is none.</summary>
/// <param name="request">What is to be stamped.</param>
/// <param name="cancellation">Stops the waiting.</param>
public delegate Task<Rfc3161TimestampToken> TimeStampSource(Rfc3161TimestampRequest request, CancellationToken cancellation);

/// <summary>Who signs what, where and when.</summary>
public sealed record SignRequest
{
    /// <summary>Name of the prepared field, such as "designer".</summary>
    public required string Field { get; init; }

    /// <summary>The signer's certificate, with its private key.</summary>
    public required X509Certificate2 Certificate { get; init; }

    /// <summary>Certificates between the signer's and the root. A root among them is left out: a reader must have it from elsewhere.</summary>
    public X509Certificate2Collection Chain { get; init; } = [];

    /// <summary>When it is signed, by the signer's own word.</summary>
    public required DateTimeOffset Instant { get; init; }

    /// <summary>The signer's name as it shall be shown.</summary>
    public required string SignerName { get; init; }

    /// <summary>Why it is signed, such as "Designed by"; may be empty.</summary>
    public string Reason { get; init; } = "";

    /// <summary>Where it is signed; may be empty.</summary>
    public string Place { get; init; } = "";

    /// <summary>SHA-256 of the file that the signer was shown, hexadecimal; other bytes are not signed.</summary>
    public required string ExpectedSha256 { get; init; }

    /// <summary>With the first signature only: also certify the file, so that readers tell of any change but further signatures (DocMDP, P = 2).</summary>
    public bool Certify { get; init; }

    /// <summary>Bytes to keep free for the signature's value; null for enough.</summary>
    public int? ReservedBytes { get; init; }

    /// <summary>Where a time stamp comes from; null for none. Where one is asked for and does not come, nothing is signed.</summary>
    public TimeStampSource? TimeStamp { get; init; }
}

/// <summary>A signed file: the file before, byte for byte, and one update after it.</summary>
/// <param name="Bytes">The whole file.</param>
/// <param name="PrefixLength">Length of the file before.</param>
/// <param name="Sha256">SHA-256 of the whole file, upper-case hexadecimal.</param>
public sealed record SignedFile(byte[] Bytes, int PrefixLength, string Sha256)
{
    /// <summary>The update alone: what is stored beside the file before.</summary>
    public ReadOnlyMemory<byte> Appended => Bytes.AsMemory(PrefixLength);
}
