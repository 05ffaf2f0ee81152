using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Pdf.Tests.Signing;

/// <summary>Signs samples for the tests.</summary>
internal static class Signed
{
    public static SignRequest Request(byte[] pdf, string field, X509Certificate2 certificate, TestAuthority? authority = null) => new()
    {
        Field = field,
        Certificate = certificate,
        Chain = (authority ?? TestAuthority.Known).Chain,
        Instant = TestAuthority.SigningTime,
        SignerName = certificate.GetNameInfo(X509NameType.SimpleName, false),
        Reason = field == "designer" ? "Designed by" : "Checked by",
        Place = "Musterstadt",
        ExpectedSha256 = Convert.ToHexString(SHA256.HashData(pdf)),
    };

    public static async Task<byte[]> By(byte[] pdf, string field, X509Certificate2 certificate, TestAuthority? authority = null) =>
        (await Signer.SignAsync(pdf, Request(pdf, field, certificate, authority))).Bytes;

    public static async Task<byte[]> ByBoth(byte[] pdf, bool checkerFirst = false)
    {
        (string Field, X509Certificate2 Certificate)[] order = [("designer", TestAuthority.Designer), ("checker", TestAuthority.Checker)];
        if (checkerFirst) Array.Reverse(order);
        foreach (var (field, certificate) in order) pdf = await By(pdf, field, certificate);
        return pdf;
    }
}
