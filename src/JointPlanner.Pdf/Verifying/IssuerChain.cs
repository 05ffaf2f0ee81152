using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Where a certificate leads.</summary>
/// <param name="Root">The trusted root; null when it leads to none.</param>
/// <param name="WithinDates">Every certificate on the way was within its dates at the instant asked for.</param>
internal sealed record IssuerChain(X509Certificate2? Root, bool WithinDates)
{
    /// <summary>Rules for building a chain from a stranger's certificate: given roots only, and nothing is ever fetched.</summary>
    /// <remarks>The defaults fetch the addresses (AIA, CRL, OCSP) that are written in the certificate, which a hostile one chooses.</remarks>
    public static X509ChainPolicy Policy(X509Certificate2Collection roots, X509Certificate2Collection carried, DateTime utc)
    {
        var policy = new X509ChainPolicy
        {
            TrustMode = X509ChainTrustMode.CustomRootTrust,
            RevocationMode = X509RevocationMode.NoCheck,
            DisableCertificateDownloads = true,
            VerificationTime = utc,
            VerificationTimeIgnored = false,
            UrlRetrievalTimeout = TimeSpan.FromMilliseconds(1),
        };
        policy.CustomTrustStore.AddRange(roots);
        policy.ExtraStore.AddRange(carried);
        return policy;
    }

    public static IssuerChain Of(X509Certificate2 certificate, X509Certificate2Collection carried, X509Certificate2Collection roots, DateTimeOffset instant)
    {
        using var chain = new X509Chain { ChainPolicy = Policy(roots, carried, instant.UtcDateTime) };
        try
        {
            bool whole = chain.Build(certificate);
            var faults = chain.ChainStatus.Aggregate(X509ChainStatusFlags.NoError, (all, status) => all | status.Status);
            bool onlyDates = (faults & ~X509ChainStatusFlags.NotTimeValid) == 0;
            if (!whole && !onlyDates) return new(null, false);
            var last = chain.ChainElements[^1].Certificate;
            return new(roots.FirstOrDefault(root => root.RawDataMemory.Span.SequenceEqual(last.RawDataMemory.Span)), whole);
        }
        catch (CryptographicException)
        {
            return new(null, false);
        }
        finally
        {
            foreach (var element in chain.ChainElements) element.Certificate.Dispose();
        }
    }
}
