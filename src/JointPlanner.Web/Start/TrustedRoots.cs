using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Web.Start;

/// <summary>Certificates of the authorities that the operator trusts: the files in the folder roots of the installation.</summary>
/// <param name="Certificates">The certificates.</param>
public sealed record TrustedRoots(X509Certificate2Collection Certificates)
{
    /// <summary>Reads the folder; none where there is no folder.</summary>
    internal static TrustedRoots Open(string ownFolder)
    {
        var roots = new X509Certificate2Collection();
        var folder = Path.Combine(ownFolder, "roots");
        if (Directory.Exists(folder))
            foreach (var file in Directory.EnumerateFiles(folder).Where(f => Path.GetExtension(f) is ".pem" or ".cer" or ".crt").Order(StringComparer.Ordinal))
                roots.Add(X509CertificateLoader.LoadCertificateFromFile(file));
        return new TrustedRoots(roots);
    }
}
