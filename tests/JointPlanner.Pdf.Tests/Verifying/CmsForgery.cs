using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;
using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Signing;

namespace JointPlanner.Pdf.Tests.Verifying;

/// <summary>Makes signatures that our signer would refuse to make, by signing anew a file that it made and a test then altered.</summary>
internal static class CmsForgery
{
    public static async Task<byte[]> SignWithClaimedTime(byte[] sheet, X509Certificate2 certificate, DateTimeOffset claimed)
    {
        byte[] signed = await Signed.By(sheet, "designer", certificate);
        return Again(signed, certificate, Hex(Date(TestAuthority.SigningTime)), Hex(Date(claimed)));

        static string Date(DateTimeOffset instant) => instant.UtcDateTime.ToString("'D:'yyyyMMddHHmmss", CultureInfo.InvariantCulture);
    }

    public static async Task<byte[]> SignWithName(byte[] sheet, X509Certificate2 certificate, string name)
    {
        string stand = new('Ω', name.Length); // of the same length in UTF-16
        var request = Signed.Request(sheet, "designer", certificate) with { SignerName = stand };
        byte[] signed = (await Signer.SignAsync(sheet, request)).Bytes;
        return Again(signed, certificate, Hex16(stand), Hex16(name));
    }

    /// <summary>Replaces a text of the signed bytes by one of the same length and signs them anew.</summary>
    public static byte[] Again(byte[] signed, X509Certificate2 certificate, string from, string to, int field = 0)
    {
        byte[] file = [.. signed];
        var revisions = PdfRevisions.Open(file);
        var hole = JointPlanner.Pdf.Verifying.SignatureHole.Find(revisions, revisions.Last, JointPlanner.Pdf.Verifying.FormFields.In(revisions.Last)[field].Dictionary["V"]).Hole!;
        int at = file.AsSpan().IndexOf(Encoding.ASCII.GetBytes(from));
        Assert.True(at > 0 && from.Length == to.Length);
        Encoding.ASCII.GetBytes(to).CopyTo(file, at);
        var signer = new CmsSigner(SubjectIdentifierType.IssuerAndSerialNumber, certificate) { DigestAlgorithm = new Oid("2.16.840.1.101.3.4.2.1"), IncludeOption = X509IncludeOption.EndCertOnly };
        signer.Certificates.AddRange(TestAuthority.Known.Chain);
        var writer = new System.Formats.Asn1.AsnWriter(System.Formats.Asn1.AsnEncodingRules.DER);
        using (writer.PushSequence()) using (writer.PushSequence()) using (writer.PushSequence()) writer.WriteOctetString(SHA256.HashData(certificate.RawData));
        signer.SignedAttributes.Add(new AsnEncodedData(new Oid("1.2.840.113549.1.9.16.2.47"), writer.Encode()));
        var cms = new SignedCms(new ContentInfo([.. file.AsSpan(0, hole.Start), .. file.AsSpan(hole.End)]), detached: true);
        cms.ComputeSignature(signer);
        string value = Convert.ToHexString(cms.Encode()).PadRight(hole.End - hole.Start - 2, '0');
        Encoding.ASCII.GetBytes(value).CopyTo(file, hole.Start + 1);
        return file;
    }

    private static string Hex(string text) => Convert.ToHexString(Encoding.ASCII.GetBytes(text));

    private static string Hex16(string text) => Convert.ToHexString(Encoding.BigEndianUnicode.GetBytes(text));
}
