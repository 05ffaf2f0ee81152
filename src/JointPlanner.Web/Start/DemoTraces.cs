using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive;

namespace JointPlanner.Web.Start;

/// <summary>What a demonstration leaves in the folder of an installation: passwords, key files, a root made from them. None of it may lie where real work is kept.</summary>
internal static class DemoTraces
{
    internal const string PeopleFile = "demo-people.json", KeyFiles = "demo-*.pfx", Mark = "(demonstration)";

    /// <exception cref="ArchiveNotReady">Something lies there; the sentence names it.</exception>
    internal static void Refuse(string folder)
    {
        if (!Directory.Exists(folder)) return;
        var found = Directory.EnumerateFiles(folder, PeopleFile).Concat(Directory.EnumerateFiles(folder, KeyFiles)).Order(StringComparer.Ordinal).FirstOrDefault();
        if (found is not null)
            throw new ArchiveNotReady($"The folder holds {Path.GetFileName(found)} of a demonstration: passwords or keys that anybody with the file can use. Give Archive:Folder of another, empty folder.");
        if (TrustedRoots.Open(folder).Certificates.FirstOrDefault(IsDemonstrations) is { } root)
            throw new ArchiveNotReady($"The folder roots trusts \"{root.Subject}\", a certificate of the demonstration. Take it out, then start again.");
    }

    private static bool IsDemonstrations(X509Certificate2 certificate) => (certificate.Subject + certificate.Issuer).Contains(Mark, StringComparison.OrdinalIgnoreCase);
}
