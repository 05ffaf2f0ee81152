using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Pdf.Tests.Signing;

/// <summary>An invented certification authority with a root, an intermediate and the persons it vouches for; made anew for each test run.</summary>
internal sealed class TestAuthority
{
    public static readonly DateTimeOffset SigningTime = new(2025, 6, 2, 9, 30, 0, TimeSpan.Zero);

    private static readonly DateTimeOffset From = new(2020, 1, 1, 0, 0, 0, TimeSpan.Zero);
    private static readonly DateTimeOffset To = new(2045, 1, 1, 0, 0, 0, TimeSpan.Zero);

    private byte _serial;

    public TestAuthority(string name)
    {
        var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var root = Authority($"CN={name} Root, O=Invented Bridges", key);
        Root = root.CreateSelfSigned(From, To);
        var between = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        Intermediate = Authority($"CN={name} Persons, O=Invented Bridges", between).Create(Root, From, To, [1]).CopyWithPrivateKey(between);
    }

    public static TestAuthority Known { get; } = new("Known");

    public static TestAuthority Foreign { get; } = new("Foreign");

    /// <summary>A designer with RSA-3072.</summary>
    public static X509Certificate2 Designer { get; } = Known.Rsa("CN=Dana Designer", 3072);

    /// <summary>A checker with ECDSA P-256.</summary>
    public static X509Certificate2 Checker { get; } = Known.Ecdsa("CN=Chris Checker");

    public X509Certificate2 Root { get; }

    public X509Certificate2 Intermediate { get; }

    public X509Certificate2Collection Roots => [X509CertificateLoader.LoadCertificate(Root.RawData)];

    public X509Certificate2Collection Chain =>
        [X509CertificateLoader.LoadCertificate(Intermediate.RawData), X509CertificateLoader.LoadCertificate(Root.RawData)];

    public X509Certificate2 Rsa(string subject, int bits)
    {
        var key = RSA.Create(bits);
        return Issue(new CertificateRequest(subject, key, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1), null, From, To).CopyWithPrivateKey(key);
    }

    public X509Certificate2 Ecdsa(string subject, DateTimeOffset? from = null, DateTimeOffset? to = null, X509KeyUsageFlags usage = X509KeyUsageFlags.DigitalSignature | X509KeyUsageFlags.NonRepudiation, params X509Extension[] more)
    {
        var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        return Issue(new CertificateRequest(subject, key, HashAlgorithmName.SHA256), usage, from ?? From, to ?? To, more).CopyWithPrivateKey(key);
    }

    /// <summary>Another certificate for the same key.</summary>
    public X509Certificate2 Again(X509Certificate2 certificate, string subject)
    {
        using var key = certificate.GetECDsaPrivateKey()!;
        return Issue(new CertificateRequest(subject, key, HashAlgorithmName.SHA256), null, From, To).CopyWithPrivateKey(key);
    }

    private static CertificateRequest Authority(string subject, ECDsa key)
    {
        var request = new CertificateRequest(subject, key, HashAlgorithmName.SHA256);
        request.CertificateExtensions.Add(new X509BasicConstraintsExtension(true, false, 0, true));
        request.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.KeyCertSign | X509KeyUsageFlags.CrlSign, true));
        request.CertificateExtensions.Add(new X509SubjectKeyIdentifierExtension(request.PublicKey, false));
        return request;
    }

    private X509Certificate2 Issue(CertificateRequest request, X509KeyUsageFlags? usage, DateTimeOffset from, DateTimeOffset to, params X509Extension[] more)
    {
        request.CertificateExtensions.Add(new X509BasicConstraintsExtension(false, false, 0, true));
        request.CertificateExtensions.Add(new X509KeyUsageExtension(usage ?? X509KeyUsageFlags.DigitalSignature | X509KeyUsageFlags.NonRepudiation, true));
        foreach (var extension in more) request.CertificateExtensions.Add(extension);
        using var key = Intermediate.GetECDsaPrivateKey()!;
        return request.Create(Intermediate.SubjectName, X509SignatureGenerator.CreateForECDsa(key), from, to, [2, ++_serial]);
    }
}
