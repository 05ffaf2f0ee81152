using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Issuing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>The signatures of a stored sheet that verify now, each with the certificate that the archive took it with.</summary>
internal static class StoredSignatures
{
    internal static IReadOnlyList<VerifiedSignature> Verified(StoredDocument stored)
    {
        var reports = new Verifier([]).Verify(stored.Bytes).Signatures.Where(s => s.Unchanged.Verdict == UnchangedVerdict.Unchanged).ToList();
        return [.. stored.Segments
            .Where(segment => segment.Field is { } field && reports.Any(r => r.Field == SignatureJudge.NameOf(field)
                && r.Who.Fingerprint.Equals(segment.CertificateFingerprint, StringComparison.OrdinalIgnoreCase)))
            .Select(segment => new VerifiedSignature(segment.Field!.Value, segment.PublicKeyHash ?? ""))];
    }
}
