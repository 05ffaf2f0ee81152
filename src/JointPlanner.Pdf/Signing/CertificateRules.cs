using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Pdf.Signing;

/// <summary>What a certificate must be like before a sheet may be signed with it.</summary>
public static class CertificateRules
{
    private static readonly string[] WeakSignatures =
    [
        "1.2.840.113549.1.1.2", "1.2.840.113549.1.1.4", "1.2.840.113549.1.1.5", // RSA with MD2, MD5, SHA-1
        "1.2.840.10045.4.1", "1.2.840.10040.4.3", "1.3.14.3.2.29",              // ECDSA, DSA, RSA with SHA-1
    ];

    /// <summary>SHA-256 of the certificate, upper-case hexadecimal: what a person registers and an administrator confirms.</summary>
    public static string Fingerprint(X509Certificate2 certificate)
    {
        ArgumentNullException.ThrowIfNull(certificate);
        return Convert.ToHexString(SHA256.HashData(certificate.RawDataMemory.Span));
    }

    /// <summary>Why the certificate may not sign at the instant; null when it may.</summary>
    public static (SigningRefusal Refusal, string Text)? Fault(X509Certificate2 certificate, DateTimeOffset instant)
    {
        ArgumentNullException.ThrowIfNull(certificate);
        string name = certificate.GetNameInfo(X509NameType.SimpleName, false);
        if (!MaySign(certificate))
            return (SigningRefusal.KeyUsage, $"The certificate of {name} is not made for signing documents: its key usage names neither digitalSignature nor nonRepudiation.");
        if (WeakKey(certificate) is { } weak) return (SigningRefusal.WeakCertificate, $"The certificate of {name} is refused: {weak}.");
        if (WeakSignature(certificate))
            return (SigningRefusal.WeakCertificate, $"The certificate of {name} is refused: it was issued with SHA-1 or MD5; SHA-256 or better is needed.");
        var (from, to) = (certificate.NotBefore.ToUniversalTime(), certificate.NotAfter.ToUniversalTime());
        if (instant.UtcDateTime < from)
            return (SigningRefusal.CertificateNotYetValid, Invariant($"The certificate of {name} is valid only from {from:yyyy-MM-dd HH:mm:ss} UTC; the signing time is {instant.UtcDateTime:yyyy-MM-dd HH:mm:ss} UTC."));
        if (instant.UtcDateTime > to)
            return (SigningRefusal.CertificateExpired, Invariant($"The certificate of {name} expired on {to:yyyy-MM-dd HH:mm:ss} UTC; the signing time is {instant.UtcDateTime:yyyy-MM-dd HH:mm:ss} UTC. Sign with a renewed certificate."));
        return null;
    }

    /// <summary>The key usage, where the certificate states one, names digitalSignature or nonRepudiation (RFC 5280, 4.2.1.3).</summary>
    internal static bool MaySign(X509Certificate2 certificate) =>
        certificate.Extensions.OfType<X509KeyUsageExtension>().All(usage => (usage.KeyUsages & (X509KeyUsageFlags.DigitalSignature | X509KeyUsageFlags.NonRepudiation)) != 0);

    internal static bool WeakSignature(X509Certificate2 certificate) => WeakSignatures.Contains(certificate.SignatureAlgorithm.Value);

    /// <summary>Why the key is not accepted; null when it is.</summary>
    internal static string? WeakKey(X509Certificate2 certificate)
    {
        using var rsa = certificate.GetRSAPublicKey();
        if (rsa is not null) return rsa.KeySize >= 2048 ? null : Invariant($"its RSA key has {rsa.KeySize} bits; at least 2048 are needed");
        using var ecdsa = certificate.GetECDsaPublicKey();
        if (ecdsa is null) return "its key is neither RSA nor ECDSA";
        return ecdsa.KeySize >= 256 ? null : Invariant($"its ECDSA key has {ecdsa.KeySize} bits; at least 256 are needed");
    }

    /// <summary>Two certificates are about the same key, whatever else they say.</summary>
    internal static bool SameKey(X509Certificate2 a, X509Certificate2 b) =>
        a.PublicKey.ExportSubjectPublicKeyInfo().AsSpan().SequenceEqual(b.PublicKey.ExportSubjectPublicKeyInfo());

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
