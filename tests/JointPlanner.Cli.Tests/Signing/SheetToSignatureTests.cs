using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Cli.Tests.Signing;

/// <summary>A plan becomes a sheet, the sheet is signed at home, the signed sheet is verified; in an empty folder, without database or network.</summary>
public sealed class SheetToSignatureTests : IDisposable
{
    private const string Password = "correct horse";
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-cli-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public void A_sheet_is_made_signed_and_verified()
    {
        var sheet = Sheet("sheet.pdf");
        var (key, certificate) = Key(DateTimeOffset.UtcNow.AddDays(30));
        var signed = At("signed.pdf");
        var ran = Sign(sheet, key, Password, signed);
        Assert.True(ran.ExitCode == ExitCodes.Done, ran.Error);
        Assert.True(File.ReadAllBytes(signed).AsSpan().StartsWith(File.ReadAllBytes(sheet)));

        var verified = Ran.Of("verify", signed, "--root", certificate);
        Assert.Equal(ExitCodes.Done, verified.ExitCode);
        Assert.Contains("unchanged? Unchanged", verified.Output, StringComparison.Ordinal);
        Assert.Contains("who?", verified.Output, StringComparison.Ordinal);
        Assert.Contains("claimed by the signer, not proven", verified.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void The_same_plan_and_date_give_the_same_sheet_byte_for_byte() =>
        Assert.Equal(File.ReadAllBytes(Sheet("one.pdf")), File.ReadAllBytes(Sheet("two.pdf")));

    [Fact]
    public void A_changed_byte_is_told()
    {
        var (key, _) = Key(DateTimeOffset.UtcNow.AddDays(30));
        var signed = At("signed.pdf");
        Sign(Sheet("sheet.pdf"), key, Password, signed);
        var bytes = File.ReadAllBytes(signed);
        bytes[1000] ^= 1;
        File.WriteAllBytes(signed, bytes);
        var verified = Ran.Of("verify", signed);
        Assert.Equal(ExitCodes.CannotBeIssued, verified.ExitCode);
        Assert.Contains("Field designer\n  unchanged? Broken: ", verified.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_wrong_password_is_refused_and_nothing_is_written()
    {
        var (key, _) = Key(DateTimeOffset.UtcNow.AddDays(30));
        var ran = Sign(Sheet("sheet.pdf"), key, "wrong", At("signed.pdf"));
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Equal($"--key {key}: The password does not open the key file. Type it again; upper and lower case differ.\n", ran.Error);
        Assert.False(File.Exists(At("signed.pdf")));
    }

    [Fact]
    public void An_expired_certificate_is_refused()
    {
        var (key, _) = Key(DateTimeOffset.UtcNow.AddDays(-1));
        var ran = Sign(Sheet("sheet.pdf"), key, Password, At("signed.pdf"));
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Matches(@"^Not signed: The certificate of .*Dana Designer.* expired on \d{4}-\d\d-\d\d .* UTC; the signing time is .* UTC\. Sign with a renewed certificate\.\n$", ran.Error);
        Assert.False(File.Exists(At("signed.pdf")));
    }

    [Fact]
    public void A_file_that_is_not_ours_is_told_apart_and_an_unsigned_sheet_is_no_success()
    {
        File.WriteAllText(At("note.pdf"), "%PDF-1.7 hello");
        Assert.Equal(ExitCodes.FaultyInput, Ran.Of("verify", At("note.pdf")).ExitCode);
        File.WriteAllBytes(At("foreign.pdf"), ForeignPdf());
        var foreign = Ran.Of("verify", At("foreign.pdf"));
        Assert.Equal(ExitCodes.FaultyInput, foreign.ExitCode);
        Assert.StartsWith("The file was not made by this program: it lacks ", foreign.Output, StringComparison.Ordinal);
        var unsigned = Ran.Of("verify", Sheet("sheet.pdf"));
        Assert.Equal(ExitCodes.CannotBeIssued, unsigned.ExitCode);
        Assert.Contains("no signature", unsigned.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_exists_is_never_replaced()
    {
        var sheet = Sheet("sheet.pdf");
        var ran = Ran.Of("sheet", Plan, "--date", "2026-05-31", "--out", sheet);
        Assert.Equal(ExitCodes.WrongUsage, ran.ExitCode);
        Assert.Contains("--out", ran.Error, StringComparison.Ordinal);
    }

    /// <summary>A whole PDF of one empty page, made by nobody's program.</summary>
    private static byte[] ForeignPdf()
    {
        string[] objects = ["<</Type/Catalog/Pages 2 0 R>>", "<</Type/Pages/Kids[3 0 R]/Count 1>>", "<</Type/Page/Parent 2 0 R/MediaBox[0 0 99 99]/Resources<<>>>>"];
        var (text, offsets) = (new System.Text.StringBuilder("%PDF-1.4\n"), new List<int>());
        for (var i = 0; i < objects.Length; i++)
        {
            offsets.Add(text.Length);
            text.Append(System.Globalization.CultureInfo.InvariantCulture, $"{i + 1} 0 obj\n{objects[i]}\nendobj\n");
        }
        var table = text.Length;
        text.Append("xref\n0 4\n0000000000 65535 f \n");
        foreach (var offset in offsets) text.Append(System.Globalization.CultureInfo.InvariantCulture, $"{offset:D10} 00000 n \n");
        text.Append(System.Globalization.CultureInfo.InvariantCulture, $"trailer\n<</Size 4/Root 1 0 R>>\nstartxref\n{table}\n%%EOF\n");
        return System.Text.Encoding.ASCII.GetBytes(text.ToString());
    }

    private static string Plan => SeedData.Structure("plover-flats-bridge");

    private string At(string name) => Path.Combine(folder, name);

    private string Sheet(string name)
    {
        var ran = Ran.Of("sheet", Plan, "--date", "2026-05-31", "--out", At(name));
        Assert.True(ran.ExitCode == ExitCodes.Done, ran.Error);
        return At(name);
    }

    private Ran Sign(string sheet, string key, string password, string output)
    {
        File.WriteAllText(At("password"), password + "\n");
        return Ran.Of("sign", sheet, "--field", "designer", "--key", key, "--password-file", At("password"), "--name", "Dana Designer", "--out", output);
    }

    private (string Key, string Certificate) Key(DateTimeOffset until)
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var request = new CertificateRequest("CN=Dana Designer", key, HashAlgorithmName.SHA256);
        request.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.DigitalSignature, critical: true));
        using var certificate = request.CreateSelfSigned(until.AddDays(-90), until);
        File.WriteAllBytes(At("me.pfx"), certificate.Export(X509ContentType.Pfx, Password));
        File.WriteAllText(At("me.pem"), certificate.ExportCertificatePem());
        return (At("me.pfx"), At("me.pem"));
    }
}
