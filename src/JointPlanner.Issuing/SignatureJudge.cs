using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Issuing;

/// <summary>What the archive needs to know of a signed sheet and cannot find out itself: it reads no PDF.</summary>
public static class SignatureJudge
{
    /// <summary>Name of a field in the file.</summary>
    public static string NameOf(SignatureField field) => field == SignatureField.Designer ? "designer" : "checker";

    /// <summary>Facts about an upload that should add one signature.</summary>
    /// <param name="archived">The archived sheet.</param>
    /// <param name="uploaded">What came back.</param>
    /// <param name="field">The field that this person signs.</param>
    /// <param name="registered">The person's registered certificate.</param>
    /// <param name="received">When it came.</param>
    public static SignatureFacts Facts(byte[] archived, byte[] uploaded, SignatureField field, X509Certificate2 registered, DateTimeOffset received)
    {
        var fingerprint = Convert.ToHexStringLower(registered.GetCertHash(System.Security.Cryptography.HashAlgorithmName.SHA256));
        var answer = UpdateRule.AcceptSignedUpload(archived, uploaded, NameOf(field), fingerprint, received);
        return new SignatureFacts(fingerprint, PublicKeyHash(registered), answer.IsAccepted ? [] : [answer.Text]);
    }

    /// <summary>Signatures of a sheet that are whole and unchanged, with the key that each verified with.</summary>
    public static IReadOnlyList<VerifiedSignature> Verified(byte[] sheet, IEnumerable<X509Certificate2> registered)
    {
        var keys = registered.ToDictionary(
            c => Convert.ToHexString(c.GetCertHash(System.Security.Cryptography.HashAlgorithmName.SHA256)), PublicKeyHash);
        return
        [
            .. new Verifier([]).Verify(sheet).Signatures
                .Where(s => s.Unchanged.Verdict == UnchangedVerdict.Unchanged && keys.ContainsKey(s.Who.Fingerprint))
                .Select(s => new VerifiedSignature(s.Field == "designer" ? SignatureField.Designer : SignatureField.Checker, keys[s.Who.Fingerprint])),
        ];
    }

    /// <summary>SHA-256 of the subject public key info.</summary>
    public static string PublicKeyHash(X509Certificate2 certificate) =>
        Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(certificate.PublicKey.ExportSubjectPublicKeyInfo()));
}
