using System.Globalization;
using System.Text.RegularExpressions;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Signing;

/// <summary>Programs of other people judge our signatures: poppler's pdfsig, OpenSSL, qpdf.</summary>
public sealed class OutsideToolsTests : IDisposable
{
    private readonly OutsideTool _tool = new();

    public static TheoryData<string, bool> Variants =>
        new() { { "stream", false }, { "stream", true }, { "table", false }, { "form in catalog", true } };

    [Theory]
    [MemberData(nameof(Variants))]
    public async Task Pdfsig_finds_both_signatures_valid_and_the_first_not_over_the_whole_file(string variant, bool checkerFirst)
    {
        _tool.Write("signed.pdf", await Signed.ByBoth(Sample(variant), checkerFirst));
        string output = Pdfsig();
        string[] parts = output.Split("Signature #");
        Assert.Equal(3, parts.Length);
        string designer = Assert.Single(parts, part => part.Contains("Common Name: Dana Designer", StringComparison.Ordinal));
        string checker = Assert.Single(parts, part => part.Contains("Common Name: Chris Checker", StringComparison.Ordinal));
        var (first, second) = checkerFirst ? (checker, designer) : (designer, checker);
        foreach (string part in new[] { first, second })
        {
            Assert.Contains("Signature is Valid.", part, StringComparison.Ordinal);
            Assert.Contains("Certificate is Trusted.", part, StringComparison.Ordinal);
            Assert.Contains("ETSI.CAdES.detached", part, StringComparison.Ordinal);
            Assert.Contains("SHA-256", part, StringComparison.Ordinal);
        }
        Assert.Contains("Not total document signed", first, StringComparison.Ordinal);
        Assert.Contains("Total document signed", second, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Pdfsig_reports_a_digest_mismatch_after_one_changed_byte()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer);
        int title = signed.AsSpan().IndexOf("(Sample)"u8);
        signed[title + 1] = (byte)'s';
        _tool.Write("signed.pdf", signed);
        Assert.Contains("Digest Mismatch", Pdfsig(), StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public async Task Qpdf_finds_nothing_wrong_with_a_signed_file(string variant, bool checkerFirst)
    {
        _tool.Write("signed.pdf", await Signed.ByBoth(Sample(variant), checkerFirst));
        var (exit, output) = _tool.Run("qpdf", "--check", "signed.pdf");
        Assert.DoesNotContain("WARNING", output, StringComparison.Ordinal);
        Assert.Equal(0, exit);
        Assert.Contains("No syntax or stream encoding errors found", output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Openssl_verifies_each_extracted_signature_as_cades()
    {
        byte[] signed = await Signed.ByBoth(HandMadeSheet.WithStream());
        _tool.Write("root.pem", Pem(TestAuthority.Known.Root));
        var file = PdfRevisions.Open(signed);
        foreach (var field in FormFields.In(file.Last))
        {
            var (hole, _) = SignatureHole.Find(file, file.Last, field.Dictionary["V"]);
            Assert.NotNull(hole);
            _tool.Write("signature.der", hole.Value);
            _tool.Write("signed.bin", hole.Signed(signed));
            var (exit, output) = _tool.Run("openssl", "cms", "-verify", "-cades", "-binary", "-inform", "DER", "-in", "signature.der", "-content", "signed.bin", "-CAfile", "root.pem", "-purpose", "any", "-out", "out.bin");
            Assert.True(exit == 0, output);
            Assert.Contains("CAdES Verification successful", output, StringComparison.OrdinalIgnoreCase);
        }
    }

    [Fact]
    public async Task The_signature_states_no_signing_time_attribute()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithStream(), "designer", TestAuthority.Designer);
        var file = PdfRevisions.Open(signed);
        _tool.Write("signature.der", SignatureHole.Find(file, file.Last, FormFields.In(file.Last)[0].Dictionary["V"]).Hole!.Value);
        var (_, output) = _tool.Run("openssl", "cms", "-cmsout", "-print", "-noout", "-inform", "DER", "-in", "signature.der");
        Assert.Contains("id-smime-aa-signingCertificateV2", output, StringComparison.Ordinal);
        Assert.DoesNotContain("signingTime", output, StringComparison.Ordinal);
        Assert.Equal(2, Regex.Count(output, "d.certificate"));
    }

    [Fact]
    public async Task A_certifying_signature_is_valid_and_the_next_one_too()
    {
        byte[] sheet = HandMadeSheet.WithTable();
        byte[] certified = (await Signer.SignAsync(sheet, Signed.Request(sheet, "designer", TestAuthority.Designer) with { Certify = true })).Bytes;
        _tool.Write("signed.pdf", await Signed.By(certified, "checker", TestAuthority.Checker));
        Assert.Equal(2, Regex.Count(Pdfsig(), "Signature is Valid"));
        Assert.Equal(0, _tool.Run("qpdf", "--check", "signed.pdf").ExitCode);
    }

    public void Dispose() => _tool.Dispose();

    private static byte[] Sample(string variant) => variant switch
    {
        "stream" => HandMadeSheet.WithStream(),
        "table" => HandMadeSheet.WithTable(),
        _ => HandMadeSheet.WithFormInCatalog(),
    };

    private string Pdfsig()
    {
        _tool.Write("root.pem", Pem(TestAuthority.Known.Root));
        Directory.CreateDirectory(Path.Combine(Path.GetDirectoryName(_tool.Write("empty", []))!, "nss"));
        Assert.Equal(0, _tool.Run("certutil", "-N", "-d", "sql:nss", "--empty-password").ExitCode);
        Assert.Equal(0, _tool.Run("certutil", "-A", "-d", "sql:nss", "-n", "root", "-t", "CT,C,C", "-i", "root.pem", "-a").ExitCode);
        return _tool.Run("pdfsig", "-nssdir", "sql:nss", "signed.pdf").Output;
    }

    private static byte[] Pem(System.Security.Cryptography.X509Certificates.X509Certificate2 certificate) =>
        System.Text.Encoding.ASCII.GetBytes(string.Create(CultureInfo.InvariantCulture, $"{certificate.ExportCertificatePem()}\n"));
}
