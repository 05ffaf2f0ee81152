using System.Text.RegularExpressions;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Signing;

/// <summary>Signing the sheets that our own writer makes.</summary>
public sealed class WrittenSheetTests : IDisposable
{
    private static readonly byte[] Sheet = PdfWriter.Write(SampleSheet.Make()).Bytes;

    private readonly OutsideTool _tool = new();

    [Fact]
    public async Task A_written_sheet_is_signed_by_both_and_stays_clean_for_qpdf()
    {
        _tool.Write("signed.pdf", await Signed.ByBoth(Sheet));
        var (exit, output) = _tool.Run("qpdf", "--check", "signed.pdf");
        Assert.DoesNotContain("WARNING", output, StringComparison.Ordinal);
        Assert.Equal(0, exit);
    }

    [Fact]
    public async Task Both_signatures_are_found_unchanged_and_both_attachments_come_back()
    {
        byte[] signed = await Signed.ByBoth(Sheet, checkerFirst: true);
        var report = new Verifier(TestAuthority.Known.Roots).Verify(signed);
        Assert.Equal(FileOrigin.InTheFormOfASheet, report.Origin);
        Assert.Equal(["checker", "designer"], report.Signatures.Select(signature => signature.Field));
        Assert.All(report.Signatures, signature => Assert.Equal(UnchangedVerdict.Unchanged, signature.Unchanged.Verdict));
        Assert.Equal(SampleSheet.Package, Attachments.Read(signed).Single(file => file.Name == "calculation.json").Bytes);
        Assert.Equal(SampleSheet.Results, Attachments.Read(signed).Single(file => file.Name == "results.json").Bytes);
    }

    [Fact]
    public async Task An_upload_of_the_signed_sheet_is_accepted()
    {
        byte[] signed = await Signed.By(Sheet, "designer", TestAuthority.Designer);
        var answer = UpdateRule.AcceptSignedUpload(Sheet, signed, "designer", CertificateRules.Fingerprint(TestAuthority.Designer), TestAuthority.SigningTime);
        Assert.True(answer.IsAccepted, answer.Text);
    }

    [Fact]
    public async Task All_fonts_of_a_signed_sheet_are_embedded_subsets()
    {
        _tool.Write("signed.pdf", await Signed.ByBoth(Sheet));
        string[] fonts = _tool.Run("pdffonts", "signed.pdf").Output.Split('\n', StringSplitOptions.RemoveEmptyEntries)[2..];
        Assert.NotEmpty(fonts);
        Assert.All(fonts, font => Assert.Matches(@"\+\S+ .*\byes +yes +yes\b", font));
    }

    [Fact]
    public async Task What_stands_in_a_signed_field_can_be_read_and_names_signer_time_and_certificate()
    {
        var request = Signed.Request(Sheet, "designer", TestAuthority.Designer) with { SignerName = "Žofie Þórsdóttir-Müller", Reason = "Designed by" };
        _tool.Write("signed.pdf", (await Signer.SignAsync(Sheet, request)).Bytes);
        string text = _tool.Run("pdftotext", "-layout", "signed.pdf", "-").Output;
        Assert.Contains("Žofie Þórsdóttir-Müller", text, StringComparison.Ordinal);
        Assert.Contains("Designed by · Musterstadt · 2025-06-02 09:30:00 UTC", text, StringComparison.Ordinal);
        Assert.Contains(CertificateRules.Fingerprint(TestAuthority.Designer)[..16], text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Poppler_finds_the_signed_sheet_valid_and_its_structure_whole()
    {
        _tool.Write("signed.pdf", await Signed.ByBoth(Sheet));
        Assert.Equal(2, Regex.Count(_tool.Run("pdfsig", "-nocert", "signed.pdf").Output, "Signature is Valid"));
        Assert.Contains("Tagged:          yes", _tool.Run("pdfinfo", "signed.pdf").Output, StringComparison.Ordinal);
    }

    public void Dispose() => _tool.Dispose();
}
