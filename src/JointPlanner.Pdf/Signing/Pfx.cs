using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Pdf.Signing;

/// <summary>Why a key file could not be used.</summary>
public enum PfxFailure
{
    /// <summary>The file is larger than any key file of one person.</summary>
    TooLarge,

    /// <summary>The password does not open the file.</summary>
    WrongPassword,

    /// <summary>The file is no PKCS #12 file, or is damaged, or asks for absurd work to open it.</summary>
    NotAKeyFile,

    /// <summary>The file holds no certificate with a private key.</summary>
    NoPrivateKey,

    /// <summary>The file holds several private keys, and it is not clear which one is meant.</summary>
    SeveralKeys,
}

/// <summary>A key file that was opened, or the reason why not.</summary>
/// <param name="Key">The opened file; null when it could not be opened. Dispose it after use.</param>
/// <param name="Failure">The reason, for programs; null when opened.</param>
/// <param name="Text">The reason, for people; empty when opened.</param>
public sealed record PfxAnswer(Pfx? Key, PfxFailure? Failure, string Text);

/// <summary>A person's certificate with its private key and the issuers' certificates, out of a PKCS #12 file (.pfx, .p12).</summary>
/// <remarks>The private key is kept in memory only and never reaches a key store of the machine.</remarks>
public sealed class Pfx : IDisposable
{
    /// <summary>Largest file accepted, in bytes.</summary>
    public const int LargestFile = 32 * 1024;

    // What the Windows error ERROR_INVALID_PASSWORD is as a result code; the platform uses it everywhere.
    private const int InvalidPassword = unchecked((int)0x80070056);

    private Pfx(X509Certificate2 certificate, X509Certificate2Collection chain) => (Certificate, Chain) = (certificate, chain);

    /// <summary>The certificate, with its private key.</summary>
    public X509Certificate2 Certificate { get; }

    /// <summary>The other certificates of the file.</summary>
    public X509Certificate2Collection Chain { get; }

    /// <summary>Opens a key file. The caller clears the buffers that it passed.</summary>
    /// <param name="file">The file.</param>
    /// <param name="password">Its password; empty for none.</param>
    public static PfxAnswer Load(ReadOnlySpan<byte> file, ReadOnlySpan<char> password)
    {
        if (file.Length > LargestFile)
            return No(PfxFailure.TooLarge, string.Create(CultureInfo.InvariantCulture, $"The key file has {file.Length} bytes; at most {LargestFile} are read."));
        X509Certificate2Collection all;
        try
        {
            all = X509CertificateLoader.LoadPkcs12Collection(file, password, X509KeyStorageFlags.EphemeralKeySet);
        }
        catch (CryptographicException e) when (e.HResult == InvalidPassword)
        {
            return No(PfxFailure.WrongPassword, "The password does not open the key file. Type it again; upper and lower case differ.");
        }
        catch (CryptographicException)
        {
            return No(PfxFailure.NotAKeyFile, "The key file is no PKCS #12 file (.pfx or .p12), or it is damaged.");
        }
        var keys = all.Where(certificate => certificate.HasPrivateKey).ToList();
        if (keys.Count == 1) return new(new Pfx(keys[0], [.. all.Where(certificate => certificate != keys[0])]), null, "");
        foreach (var certificate in all) certificate.Dispose();
        return keys.Count == 0
            ? No(PfxFailure.NoPrivateKey, "The key file holds a certificate but no private key. Export it again with the private key.")
            : No(PfxFailure.SeveralKeys, "The key file holds several private keys. Export the one to sign with alone.");
    }

    /// <summary>Lets go of the key.</summary>
    public void Dispose()
    {
        Certificate.Dispose();
        foreach (var certificate in Chain) certificate.Dispose();
    }

    private static PfxAnswer No(PfxFailure failure, string text) => new(null, failure, text);
}
