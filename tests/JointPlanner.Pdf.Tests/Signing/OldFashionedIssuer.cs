using System.Formats.Asn1;
using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Pdf.Tests.Signing;

/// <summary>Issues certificates with SHA-1, which the platform no longer does by itself.</summary>
internal sealed class OldFashionedIssuer(RSA key) : X509SignatureGenerator
{
    public static X509Certificate2 Issue(string subject, RSA key)
    {
        var request = new CertificateRequest(subject, key, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1);
        return request.Create(request.SubjectName, new OldFashionedIssuer(key), new(2020, 1, 1, 0, 0, 0, TimeSpan.Zero), new(2045, 1, 1, 0, 0, 0, TimeSpan.Zero), [7]);
    }

    public override byte[] GetSignatureAlgorithmIdentifier(HashAlgorithmName hashAlgorithm)
    {
        var writer = new AsnWriter(AsnEncodingRules.DER);
        using (writer.PushSequence())
        {
            writer.WriteObjectIdentifier("1.2.840.113549.1.1.5");
            writer.WriteNull();
        }
        return writer.Encode();
    }

    public override byte[] SignData(byte[] data, HashAlgorithmName hashAlgorithm) =>
        key.SignData(data, HashAlgorithmName.SHA1, RSASignaturePadding.Pkcs1);

    protected override PublicKey BuildPublicKey() => new(key);
}
