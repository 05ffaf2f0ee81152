using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using System.Text;

namespace JointPlanner.Issuing.Tests;

public class HandedInCertificateTests
{
    private static readonly DateTimeOffset Now = new(2031, 5, 4, 9, 0, 0, TimeSpan.Zero);

    private static X509Certificate2 Made(AsymmetricAlgorithm key, X509KeyUsageFlags? usage = X509KeyUsageFlags.NonRepudiation, int validDays = 30)
    {
        var by = HashAlgorithmName.SHA256;
        var request = key is RSA rsa ? new CertificateRequest("CN=Ines Brandt", rsa, by, RSASignaturePadding.Pkcs1) : new CertificateRequest("CN=Ines Brandt", (ECDsa)key, by);
        if (usage is { } flags) request.CertificateExtensions.Add(new X509KeyUsageExtension(flags, critical: true));
        return request.CreateSelfSigned(Now.AddDays(-60), Now.AddDays(validDays));
    }

    private static HandedInCertificate Read(X509Certificate2 certificate) => HandedInCertificate.Read(certificate.RawData, Now);

    [Fact]
    public void A_sound_certificate_says_who_which_key_and_how_long()
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        using var certificate = Made(key);
        foreach (var file in (byte[][])[certificate.RawData, Encoding.ASCII.GetBytes(certificate.ExportCertificatePem())])
        {
            var read = HandedInCertificate.Read(file, Now);
            Assert.Null(read.Refusal);
            Assert.Equal(("CN=Ines Brandt", "CN=Ines Brandt", "elliptic curve, 256 bits"), (read.Subject, read.Issuer, read.Key));
            Assert.Equal((Now.AddDays(-60), Now.AddDays(30)), (read.From, read.Until));
            Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(certificate.RawData)), read.Fingerprint.Replace(" ", "", StringComparison.Ordinal));
            Assert.Equal(certificate.RawData, read.Encoded.ToArray());
        }
    }

    [Theory]
    [InlineData(X509KeyUsageFlags.DigitalSignature, null)]
    [InlineData(X509KeyUsageFlags.NonRepudiation, null)]
    [InlineData(X509KeyUsageFlags.KeyEncipherment | X509KeyUsageFlags.KeyCertSign, "neither digitalSignature nor nonRepudiation")]
    public void The_key_usage_must_allow_signing(X509KeyUsageFlags usage, string? says)
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP384);
        using var certificate = Made(key, usage);
        Told(says, Read(certificate));
    }

    [Theory]
    [InlineData(1024, "RSA key has 1024 bits")]
    [InlineData(2048, null)]
    public void A_short_rsa_key_is_refused(int bits, string? says)
    {
        using var key = RSA.Create(bits);
        using var certificate = Made(key);
        Told(says, Read(certificate));
        Assert.Equal(FormattableString.Invariant($"RSA, {bits} bits"), Read(certificate).Key);
    }

    [Fact]
    public void A_certificate_issued_with_sha_1_is_refused()
    {
        using var key = RSA.Create(2048);
        var name = new X500DistinguishedName("CN=Ines Brandt");
        var request = new CertificateRequest(name, key, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1);
        using var certificate = request.Create(name, new OldSignature(key), Now.AddDays(-60), Now.AddDays(30), new byte[] { 1 });
        Told("SHA-1", Read(certificate));
    }

    [Fact]
    public void An_expired_and_a_future_certificate_are_refused()
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        using var certificate = Made(key, validDays: -1);
        Told("expired on 2031-05-03", Read(certificate));
        Told("valid only from", HandedInCertificate.Read(certificate.RawData, Now.AddYears(-1)));
    }

    [Fact]
    public void A_file_with_a_private_key_is_refused_whatever_its_form()
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        using var certificate = Made(key);
        byte[][] files =
        [
            certificate.Export(X509ContentType.Pfx, "word"), certificate.Export(X509ContentType.Pkcs12),
            Encoding.ASCII.GetBytes(certificate.ExportCertificatePem() + "\n" + key.ExportPkcs8PrivateKeyPem()),
            Encoding.ASCII.GetBytes(key.ExportECPrivateKeyPem()),
        ];
        foreach (var file in files)
        {
            var read = HandedInCertificate.Read(file, Now);
            Told("holds a private key", read);
            Assert.True(read.Encoded.IsEmpty);
        }
    }

    [Fact]
    public void Something_else_and_something_too_large_are_refused()
    {
        Told("no certificate", HandedInCertificate.Read([1, 2, 3], Now));
        Told("no certificate", HandedInCertificate.Read([], Now));
        Told("larger than 64 KiB", HandedInCertificate.Read(new byte[70_000], Now));
    }

    // The platform no longer issues with SHA-1 by itself.
    private sealed class OldSignature(RSA key) : X509SignatureGenerator
    {
        public override byte[] GetSignatureAlgorithmIdentifier(HashAlgorithmName hashAlgorithm) => Convert.FromHexString("300D06092A864886F70D0101050500"); // sha1WithRSAEncryption

#pragma warning disable CA5350 // the weak signature is what is tested
        public override byte[] SignData(byte[] data, HashAlgorithmName hashAlgorithm) => key.SignData(data, HashAlgorithmName.SHA1, RSASignaturePadding.Pkcs1);
#pragma warning restore CA5350

        protected override PublicKey BuildPublicKey() => new(key);
    }

    private static void Told(string? says, HandedInCertificate read)
    {
        if (says is null) Assert.Null(read.Refusal);
        else Assert.Contains(says, read.Refusal, StringComparison.Ordinal);
    }
}
