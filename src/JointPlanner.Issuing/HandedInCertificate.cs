using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using System.Text;
using JointPlanner.Archive.Values;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Issuing;

/// <summary>What stands in a public certificate that a person hands in to sign with, and what speaks against it.</summary>
public sealed record HandedInCertificate
{
    /// <summary>Largest file that is read, in bytes.</summary>
    public const int LargestFile = 64 * 1024;

    /// <summary>Whom it names.</summary>
    public string Subject { get; private init; } = "";
    /// <summary>Who says so; the subject itself where it is self-signed.</summary>
    public string Issuer { get; private init; } = "";
    /// <summary>SHA-256 of the whole certificate, as it is read out: pairs with blanks.</summary>
    public string Fingerprint { get; private init; } = "";
    /// <summary>Kind and size of its key.</summary>
    public string Key { get; private init; } = "";
    /// <summary>First instant of its validity.</summary>
    public DateTimeOffset From { get; private init; }
    /// <summary>Last instant of its validity.</summary>
    public DateTimeOffset Until { get; private init; }
    /// <summary>The certificate alone, DER; empty where the file was none.</summary>
    public ReadOnlyMemory<byte> Encoded { get; private init; }
    /// <summary>Why it cannot be handed in, as a sentence; null where it can.</summary>
    public string? Refusal { get; private init; }

    /// <summary>Reads a file that comes in, no further than it may be large; the bytes are wiped, for somebody may have chosen the file with the key.</summary>
    public static async Task<HandedInCertificate> Read(Stream file, DateTimeOffset now)
    {
        // One byte too many is enough to see that it is too large.
        var bytes = new byte[LargestFile + 1];
        var length = await file.ReadAtLeastAsync(bytes, bytes.Length, throwOnEndOfStream: false);
        var held = bytes[..length];
        var read = Read(held, now);
        CryptographicOperations.ZeroMemory(bytes);
        CryptographicOperations.ZeroMemory(held);
        return read;
    }

    /// <summary>Reads a file.</summary>
    public static HandedInCertificate Read(byte[] file, DateTimeOffset now)
    {
        if (file.Length > LargestFile) return new() { Refusal = $"The file is larger than {LargestFile / 1024} KiB, which is the most that is read. Choose the certificate's own file (.cer, .crt or .pem)." };
        if (HoldsPrivateKey(file)) return new() { Refusal = "The file holds a private key. It was not kept. The key never leaves you: export the certificate without it (.cer, .crt or .pem) and hand that in." };
        try
        {
            using var certificate = X509CertificateLoader.LoadCertificate(file);
            return Of(certificate, now);
        }
        catch (Exception unreadable) when (unreadable is CryptographicException or ArgumentException)
        {
            return new() { Refusal = "The file is no certificate that can be read. Hand in one public X.509 certificate, DER or PEM (.cer, .crt or .pem)." };
        }
    }

    /// <summary>What stands in a certificate that is kept already.</summary>
    public static HandedInCertificate Of(X509Certificate2 certificate, DateTimeOffset now)
    {
        using var rsa = certificate.GetRSAPublicKey();
        using var elliptic = certificate.GetECDsaPublicKey();
        var until = new DateTimeOffset(certificate.NotAfter.ToUniversalTime());
        return new()
        {
            Subject = certificate.Subject,
            Issuer = certificate.Issuer,
            Fingerprint = Paired(Archive.Values.Fingerprint.Of(certificate.RawData)),
            Key = rsa is not null ? FormattableString.Invariant($"RSA, {rsa.KeySize} bits") : elliptic is not null ? FormattableString.Invariant($"elliptic curve, {elliptic.KeySize} bits") : $"of another kind ({certificate.PublicKey.Oid.FriendlyName})",
            From = new DateTimeOffset(certificate.NotBefore.ToUniversalTime()),
            Until = until,
            Encoded = certificate.RawData,
            Refusal = CertificateRules.Fault(certificate, now) switch
            {
                null => null,
                { Refusal: SigningRefusal.CertificateExpired } => FormattableString.Invariant($"The certificate expired on {until:yyyy-MM-dd HH:mm} UTC. Hand in the renewed one."),
                { } fault => fault.Text,
            },
        };
    }

    /// <summary>A hash as people read it out.</summary>
    public static string Paired(string hash) => string.Join(' ', hash.Chunk(4).Select(four => new string(four)));

    private static bool HoldsPrivateKey(byte[] file)
    {
        if (file.Length == 0) return false;
        if (Encoding.Latin1.GetString(file).Contains("PRIVATE KEY-----", StringComparison.Ordinal)) return true;
        try
        {
            return X509Certificate2.GetCertContentType(file) is X509ContentType.Pfx or X509ContentType.Pkcs12;
        }
        catch (CryptographicException)
        {
            return false;
        }
    }
}
