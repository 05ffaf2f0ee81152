using System.Security.Cryptography;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Revisions;

/// <summary>A revision's sheet put together from its segments.</summary>
/// <param name="Hash">SHA-256 of the whole.</param>
public sealed record StoredDocument(byte[] Bytes, string Hash, IReadOnlyList<PdfSegment> Segments)
{
    /// <summary>Reads it and recomputes the hash of every prefix; an altered byte refuses.</summary>
    internal static async Task<StoredDocument> Read(ArchiveContext archive, Guid revisionId, CancellationToken cancel)
    {
        var segments = await archive.PdfSegments.AsNoTracking().Include(segment => segment.Blob)
            .Where(segment => segment.RevisionId == revisionId).OrderBy(segment => segment.Ordinal).ToListAsync(cancel);
        if (segments.Count == 0) throw new NotFound("sheet");
        using var bytes = new MemoryStream();
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        foreach (var segment in segments)
        {
            bytes.Write(segment.Blob!.Bytes);
            hash.AppendData(segment.Blob.Bytes);
            var prefix = Convert.ToHexStringLower(hash.GetCurrentHash());
            if (prefix != segment.PrefixHash || bytes.Length != segment.PrefixLength || segment.Length != segment.Blob.Bytes.Length)
                throw new ActRefused(
                    RefusalReason.Altered,
                    $"The stored sheet was altered: its first {segment.PrefixLength} bytes should have the hash {segment.PrefixHash} and have {prefix}. Nothing is done with it; tell the administrator to run `verify-archive`.");
        }

        return new StoredDocument(bytes.ToArray(), segments[^1].PrefixHash, segments);
    }

    /// <summary>The segment that the bytes after <paramref name="before"/> make, or the base when there is none before.</summary>
    internal static PdfSegment Next(Guid revisionId, StoredDocument? before, byte[] whole, SignerOfSegment? signer)
    {
        var start = before?.Bytes.Length ?? 0;
        var blob = Blob.Of(whole[start..]);
        return new PdfSegment
        {
            RevisionId = revisionId,
            Ordinal = (before?.Segments.Count ?? 0) + 1,
            BlobId = blob.Id,
            Blob = blob,
            Length = blob.Bytes.Length,
            PrefixLength = whole.Length,
            PrefixHash = Fingerprint.Of(whole),
            Field = signer?.Field,
            SignerId = signer?.PersonId,
            CertificateFingerprint = signer?.CertificateFingerprint,
            PublicKeyHash = signer?.PublicKeyHash,
        };
    }
}

internal sealed record SignerOfSegment(SignatureField Field, Guid PersonId, string CertificateFingerprint, string PublicKeyHash);
