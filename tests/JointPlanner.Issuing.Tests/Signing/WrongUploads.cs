using System.Formats.Asn1;
using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;
using System.Text;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;

namespace JointPlanner.Issuing.Tests.Signing;

/// <summary>Every kind of signed sheet that must not be taken, made by hand, with a part of the sentence that refuses it.</summary>
internal static class WrongUploads
{
    /// <summary>The sheet that is archived: small, and independent of the program's own writer.</summary>
    public static readonly byte[] Archived = HandMadeSheet.WithTable();

    public static readonly TheoryData<string, string> Kinds = new()
    {
        { "another person's certificate", "registered for this person is" },
        { "a second update", "adds 2 updates" },
        { "an added page", "pages were added (1 before, 2 after)" },
        { "the wrong field", "signs the field checker; expected was designer" },
        { "a changed byte before the update", "byte" },
        { "not ours", "byte" },
        { "nothing signed", "nothing was signed" },
    };

    public static async Task<byte[]> Make(string kind, X509Certificate2 mine, X509Certificate2 other) => kind switch
    {
        "another person's certificate" => await Sign(Archived, "designer", other),
        "a second update" => await Sign(await Sign(Archived, "designer", mine), "checker", other),
        "an added page" => await SignWithPage(mine),
        "the wrong field" => await Sign(Archived, "checker", mine),
        "a changed byte before the update" => Flipped(await Sign(Archived, "designer", mine), 500),
        "not ours" => await Sign(HandMadeSheet.WithoutAttachments(), "designer", mine),
        "nothing signed" => Updated(Archived),
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "No such upload."),
    };

    public static async Task<byte[]> Sign(byte[] sheet, string field, X509Certificate2 certificate) => (await Signer.SignAsync(sheet, new SignRequest
    {
        Field = field,
        Certificate = certificate,
        Instant = new DateTimeOffset(certificate.NotBefore.ToUniversalTime()).AddMinutes(1),
        SignerName = certificate.GetNameInfo(X509NameType.SimpleName, false),
        ExpectedSha256 = Convert.ToHexString(SHA256.HashData(sheet)),
    })).Bytes;

    /// <summary>Appends a page behind everything, as another program would: an update of its own, without a signature.</summary>
    public static byte[] WithPageAfter(byte[] sheet) => Updated(sheet,
        (2, "<</Type/Pages/Count 2/Kids[3 0 R 90 0 R]>>"), (90, "<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]>>"));

    // An update behind a sheet made by hand, or behind an update of such a one.
    private static byte[] Updated(byte[] sheet, params (int Number, string Body)[] objects)
    {
        var text = Encoding.Latin1.GetString(sheet);
        var start = text[(text.LastIndexOf("startxref\n", StringComparison.Ordinal) + 10)..].Split('\n')[0];
        var (bodies, table) = (new StringBuilder(), new StringBuilder("xref\n"));
        foreach (var (number, body) in objects)
        {
            table.Append(CultureInfo.InvariantCulture, $"{number} 1\n{sheet.Length + bodies.Length:D10} 00000 n \n");
            bodies.Append(CultureInfo.InvariantCulture, $"{number} 0 obj\n{body}\nendobj\n");
        }

        table.Append(CultureInfo.InvariantCulture,
            $"trailer\n<</Size 91/Root 1 0 R/Info 7 0 R/ID[<00112233445566778899AABBCCDDEEFF><FF>]/Prev {start}>>\nstartxref\n{sheet.Length + bodies.Length}\n%%EOF\n");
        return [.. sheet, .. Encoding.Latin1.GetBytes(bodies.ToString() + table)];
    }

    /// <summary>A dishonest signer's work: the honest update, into which a page is put, and then signed anew so that the signature fits.</summary>
    private static async Task<byte[]> SignWithPage(X509Certificate2 mine)
    {
        var update = Encoding.Latin1.GetString(await Sign(Archived, "designer", mine))[Archived.Length..];
        var table = update.LastIndexOf("xref\n", update.LastIndexOf("startxref", StringComparison.Ordinal), StringComparison.Ordinal);
        var at = Archived.Length + table;
        const string pages = "2 0 obj\n<</Type/Pages/Count 2/Kids[3 0 R 90 0 R]>>\nendobj\n", page = "90 0 obj\n<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]>>\nendobj\n";
        var moved = pages.Length + page.Length;
        var tail = string.Create(CultureInfo.InvariantCulture, $"xref\n2 1\n{at:D10} 00000 n \n90 1\n{at + pages.Length:D10} 00000 n \n") + update[(table + 5)..];
        tail = tail[..tail.IndexOf("trailer", StringComparison.Ordinal)]
            + System.Text.RegularExpressions.Regex.Replace(tail[tail.IndexOf("trailer", StringComparison.Ordinal)..], @"/Size \d+", "/Size 91");
        tail = tail[..tail.LastIndexOf("startxref", StringComparison.Ordinal)]
            + string.Create(CultureInfo.InvariantCulture, $"startxref\n{at + moved}\n%%EOF\n");
        return SignedAnew(Encoding.Latin1.GetBytes(Encoding.Latin1.GetString(Archived) + update[..table] + pages + page + tail), mine);
    }

    private static byte[] SignedAnew(byte[] file, X509Certificate2 mine)
    {
        var hole = Archived.Length + file.AsSpan(Archived.Length).IndexOf("/Contents<"u8) + 9;
        var end = hole + file.AsSpan(hole).IndexOf((byte)'>') + 1;
        var range = Archived.Length + file.AsSpan(Archived.Length).IndexOf("/ByteRange["u8) + 11;
        var width = file.AsSpan(range).IndexOf((byte)']');
        Encoding.ASCII.GetBytes(string.Create(CultureInfo.InvariantCulture, $"0 {hole} {end} {file.Length - end}").PadRight(width)).CopyTo(file, range);
        var signer = new CmsSigner(SubjectIdentifierType.IssuerAndSerialNumber, mine) { DigestAlgorithm = new Oid("2.16.840.1.101.3.4.2.1"), IncludeOption = X509IncludeOption.EndCertOnly };
        var writer = new AsnWriter(AsnEncodingRules.DER);
        using (writer.PushSequence()) using (writer.PushSequence()) using (writer.PushSequence()) writer.WriteOctetString(SHA256.HashData(mine.RawData));
        signer.SignedAttributes.Add(new AsnEncodedData(new Oid("1.2.840.113549.1.9.16.2.47"), writer.Encode()));
        var cms = new SignedCms(new ContentInfo([.. file.AsSpan(0, hole), .. file.AsSpan(end)]), detached: true);
        cms.ComputeSignature(signer);
        Encoding.ASCII.GetBytes(Convert.ToHexString(cms.Encode()).PadRight(end - hole - 2, '0')).CopyTo(file, hole + 1);
        return file;
    }

    private static byte[] Flipped(byte[] file, int at)
    {
        file[at] ^= 1;
        return file;
    }
}
