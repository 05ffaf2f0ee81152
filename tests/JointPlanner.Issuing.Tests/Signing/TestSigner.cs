using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Issuing.Tests.Signing;

/// <summary>Certificates with keys, made for a test run.</summary>
internal static class TestSigner
{
    public static X509Certificate2 Named(string name)
    {
        var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var request = new CertificateRequest($"CN={name}", key, HashAlgorithmName.SHA256);
        request.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.DigitalSignature | X509KeyUsageFlags.NonRepudiation, critical: true));
        return request.CreateSelfSigned(new DateTimeOffset(2020, 1, 1, 0, 0, 0, TimeSpan.Zero), new DateTimeOffset(2045, 1, 1, 0, 0, 0, TimeSpan.Zero));
    }
}
