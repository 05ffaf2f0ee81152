using System.Formats.Asn1;
using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Pdf.Verifying;

/// <summary>A signature's value (RFC 5652), checked against the bytes it is said to sign.</summary>
/// <param name="Certificate">The signer's certificate, bound to the signature.</param>
/// <param name="Carried">Certificates carried along, the signer's included; not protected by the signature.</param>
/// <param name="Signer">The signer's part, for the time stamp.</param>
/// <param name="NotSigned">What the value holds that the signature does not protect.</param>
internal sealed record SignatureValue(X509Certificate2 Certificate, X509Certificate2Collection Carried, SignerInfo Signer, IReadOnlyList<string> NotSigned)
{
    private const int MostCertificates = 20;

    private static readonly string[] Digests = ["2.16.840.1.101.3.4.2.1", "2.16.840.1.101.3.4.2.2", "2.16.840.1.101.3.4.2.3"]; // SHA-256, -384, -512

    /// <summary>Checks the value, or says why it does not fit.</summary>
    /// <remarks>The value is a stranger's: whatever its decoding throws is an answer about the value, not a fault of ours.</remarks>
    public static (SignatureValue? Value, string Fault) Check(byte[] padded, byte[] signed, bool mustNameCertificate)
    {
        try
        {
            return CheckUnguarded(padded, signed, mustNameCertificate);
        }
        catch (Exception e) when (StrangersValue.IsAtFault(e))
        {
            return (null, "the signature does not fit the signed bytes, or cannot be read");
        }
    }

    private static (SignatureValue? Value, string Fault) CheckUnguarded(byte[] padded, byte[] signed, bool mustNameCertificate)
    {
        AsnDecoder.ReadEncodedValue(padded, AsnEncodingRules.BER, out _, out _, out int used);
        if (padded.AsSpan(used).ContainsAnyExcept((byte)0)) return (null, "bytes are hidden behind the signature's value");
        if (!SignatureEncoding.IsPlain(padded.AsMemory(0, used)))
            return (null, "the signature's value is not laid out as the standard wants it");
        var cms = new SignedCms(new ContentInfo(signed), detached: true);
        cms.Decode(padded.AsSpan(0, used));
        if (!cms.Detached) return (null, "the signature carries a content of its own instead of signing the file");
        if (cms.ContentInfo.ContentType.Value != "1.2.840.113549.1.7.1") return (null, "the signature is made for another kind of content");
        if (cms.Certificates.Count > MostCertificates) return (null, "the signature carries more certificates than any chain needs");
        if (cms.SignerInfos is not { Count: 1 } signers) return (null, "the signature's value is not by exactly one signer");
        var signer = signers[0];
        if (!Digests.Contains(signer.DigestAlgorithm.Value))
            return (null, "the signature uses a digest that is no longer safe or is not known here");
        if (signer.Certificate is not { } certificate) return (null, "the signer's certificate is missing");
        if (CertificateRules.WeakKey(certificate) is { } weak) return (null, weak);
        cms.CheckSignature(verifySignatureOnly: true);
        if (Named(signer, certificate) is var named && named == CertificateNaming.Another)
            return (null, "the signature was made with another certificate than the one it carries");
        if (named == CertificateNaming.None && mustNameCertificate) return (null, "the signature does not name its certificate");
        return (new SignatureValue(certificate, cms.Certificates, signer, Unprotected(cms, signer, named)), "");
    }

    private static List<string> Unprotected(SignedCms cms, SignerInfo signer, CertificateNaming named)
    {
        var parts = new List<string>();
        if (cms.Certificates.Count > 1) parts.Add("the further certificates carried along");
        if (named == CertificateNaming.None) parts.Add("which certificate of the same key was meant");
        foreach (var attribute in signer.UnsignedAttributes)
            parts.Add(attribute.Oid.Value == SigningIdentifiers.TimeStampToken ? "the time stamp, which is signed by the time-stamp server" : $"an unsigned attribute {attribute.Oid.Value}");
        return parts;
    }

    private enum CertificateNaming
    {
        None,
        This,
        Another,
    }

    /// <summary>The signed attribute signing-certificate-v2 (RFC 5035): does it name this certificate?</summary>
    private static CertificateNaming Named(SignerInfo signer, X509Certificate2 certificate)
    {
        foreach (var attribute in signer.SignedAttributes)
        {
            if (attribute.Oid.Value != SigningIdentifiers.SigningCertificateV2) continue;
            if (attribute.Values.Count != 1) return CertificateNaming.Another;
            var first = new AsnReader(attribute.Values[0].RawData, AsnEncodingRules.BER).ReadSequence().ReadSequence().ReadSequence();
            string digest = first.PeekTag() == Asn1Tag.Sequence ? first.ReadSequence().ReadObjectIdentifier() : Digests[0];
            byte[] named = first.ReadOctetString();
            byte[]? own = digest switch
            {
                "2.16.840.1.101.3.4.2.1" => SHA256.HashData(certificate.RawData),
                "2.16.840.1.101.3.4.2.2" => SHA384.HashData(certificate.RawData),
                "2.16.840.1.101.3.4.2.3" => SHA512.HashData(certificate.RawData),
                _ => null,
            };
            return own is not null && named.AsSpan().SequenceEqual(own) ? CertificateNaming.This : CertificateNaming.Another;
        }
        return CertificateNaming.None;
    }
}
