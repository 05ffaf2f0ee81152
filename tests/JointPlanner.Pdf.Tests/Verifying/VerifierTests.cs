using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Tests.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Verifying;

public class VerifierTests
{
    private static readonly Verifier Verifier = new(TestAuthority.Known.Roots);

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task Two_signatures_give_three_statements_each(bool checkerFirst)
    {
        byte[] signed = await Signed.ByBoth(HandMadeSheet.WithStream(), checkerFirst);
        var report = Verifier.Verify(signed);
        Assert.Equal(FileOrigin.InTheFormOfASheet, report.Origin);
        Assert.Equal("2 signatures", report.SignatureCountText);
        Assert.Empty(report.EmptyFields);
        Assert.Equal(checkerFirst ? ["checker", "designer"] : ["designer", "checker"], report.Signatures.Select(signature => signature.Field));
        foreach (var signature in report.Signatures)
        {
            Assert.Equal(UnchangedVerdict.Unchanged, signature.Unchanged.Verdict);
            Assert.Equal(WhoVerdict.KnownIssuer, signature.Who.Verdict);
            Assert.Equal("CN=Known Root, O=Invented Bridges", signature.Who.Root);
            Assert.Equal(WhenVerdict.ClaimedBySigner, signature.When.Verdict);
            Assert.Equal("2025-06-02 09:30:00 UTC: claimed by the signer, not proven.", signature.When.Text);
            Assert.Equal("Musterstadt", signature.Place);
        }
        Assert.Contains("covers the first", report.Signatures[0].Unchanged.Text, StringComparison.Ordinal);
        Assert.Contains($"the field {report.Signatures[1].Field} was signed", report.Signatures[0].Unchanged.Text, StringComparison.Ordinal);
        Assert.Contains("covers the whole file", report.Signatures[1].Unchanged.Text, StringComparison.Ordinal);
        var checker = report.Signatures.Single(signature => signature.Field == "checker");
        Assert.Equal(("CN=Chris Checker", CertificateRules.Fingerprint(TestAuthority.Checker)), (checker.Who.Subject, checker.Who.Fingerprint));
    }

    [Fact]
    public void An_unsigned_sheet_has_no_signature()
    {
        var report = Verifier.Verify(HandMadeSheet.WithTable());
        Assert.Equal("no signature", report.SignatureCountText);
        Assert.Equal(["designer", "checker"], report.EmptyFields);
        Assert.Equal(FileOrigin.InTheFormOfASheet, report.Origin);
    }

    [Fact]
    public void A_pdf_without_our_fields_or_attachments_was_not_made_by_this_program()
    {
        var noFields = Verifier.Verify(HandMadeSheet.WithoutFields());
        Assert.Equal(FileOrigin.NotMadeByThisProgram, noFields.Origin);
        Assert.Contains("lacks a prepared signature field", noFields.OriginText, StringComparison.Ordinal);
        var noFiles = Verifier.Verify(HandMadeSheet.WithoutAttachments());
        Assert.Equal(FileOrigin.NotMadeByThisProgram, noFiles.Origin);
        Assert.Contains("calculation.json and results.json", noFiles.OriginText, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_signature_under_another_root_is_by_an_unknown_issuer()
    {
        var stranger = TestAuthority.Foreign.Ecdsa("CN=Dana Designer");
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", stranger, TestAuthority.Foreign);
        var signature = Verifier.Verify(signed).Signatures.Single();
        Assert.Equal(UnchangedVerdict.Unchanged, signature.Unchanged.Verdict);
        Assert.Equal(WhoVerdict.UnknownIssuer, signature.Who.Verdict);
        Assert.Equal("", signature.Who.Root);
        Assert.Equal(WhoVerdict.KnownIssuer, new Verifier(TestAuthority.Foreign.Roots).Verify(signed).Signatures.Single().Who.Verdict);
    }

    [Fact]
    public async Task A_claimed_time_outside_the_certificates_dates_is_told()
    {
        var later = TestAuthority.Known.Ecdsa("CN=Later", from: new(2025, 1, 1, 0, 0, 0, TimeSpan.Zero));
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", later);
        Assert.Equal(WhoVerdict.KnownIssuer, Verifier.Verify(signed).Signatures.Single().Who.Verdict);
        // The root was made for 2020 to 2045; the same chain judged with a root of other dates would need another root, so the person's own dates are the ones tried.
        var brief = TestAuthority.Known.Ecdsa("CN=Brief", to: TestAuthority.SigningTime.AddDays(1));
        byte[] sheet = HandMadeSheet.WithTable();
        var request = Signed.Request(sheet, "designer", brief);
        byte[] good = (await Signer.SignAsync(sheet, request)).Bytes;
        Assert.Equal(WhoVerdict.KnownIssuer, Verifier.Verify(good).Signatures.Single().Who.Verdict);
        byte[] aged = await CmsForgery.SignWithClaimedTime(sheet, brief, TestAuthority.SigningTime.AddDays(2));
        var who = Verifier.Verify(aged).Signatures.Single().Who;
        Assert.Equal(WhoVerdict.CertificateUnsuitable, who.Verdict);
        Assert.Contains("not within its dates", who.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_signed_file_that_qpdf_rewrote_is_broken()
    {
        using var tool = new OutsideTool();
        tool.Write("signed.pdf", await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer));
        Assert.Equal(0, tool.Run("qpdf", "--object-streams=preserve", "signed.pdf", "rewritten.pdf").ExitCode);
        var signature = Verifier.Verify(tool.Read("rewritten.pdf")).Signatures.Single();
        Assert.Equal(UnchangedVerdict.Broken, signature.Unchanged.Verdict);
        Assert.Equal(WhoVerdict.NotEstablished, signature.Who.Verdict);
        Assert.Equal("", signature.Who.Subject);
    }

    [Theory]
    [InlineData(8, "the content of page 1 was changed")]
    [InlineData(3, "page 1 was changed")]
    [InlineData(7, "the document information (title, author, dates) was changed")]
    [InlineData(13, "the attachment calculation.json was changed")]
    [InlineData(10, "object 10 (a XObject) was changed")]
    public async Task An_update_after_the_signature_is_named(int number, string expected)
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer);
        string body = number is 3 or 7 ? "<</Type/Page/Parent 2 0 R/MediaBox[0 0 10 10]>>" : "<</Type/XObject/Length 1>>\nstream\nX\nendstream";
        var changed = Changed(HandMadeUpdate.Append(signed, (number, body)));
        Assert.Contains(expected, changed, StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_added_page_is_named_first()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer);
        byte[] longer = HandMadeUpdate.Append(signed, (2, "<</Type/Pages/Count 2/Kids[3 0 R 90 0 R]>>"), (90, "<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]>>"));
        Assert.StartsWith("Changed after signing: pages were added (1 before, 2 after)", Changed(longer), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Moving_a_signed_field_or_changing_its_look_is_named()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer);
        string field = HandMadeUpdate.BodyOf(signed, 5);
        string moved = System.Text.RegularExpressions.Regex.Replace(field, @"/Rect ?\[[^\]]*\]", "/Rect[0 0 595 842]");
        Assert.NotEqual(field, moved);
        Assert.Contains("/Rect of the field designer was changed", Changed(HandMadeUpdate.Append(signed, (5, moved))), StringComparison.Ordinal);
        string repainted = System.Text.RegularExpressions.Regex.Replace(field, @"/N ?\d+ 0 R", "/N 90 0 R");
        Assert.NotEqual(field, repainted);
        Assert.Contains("the appearance of the field designer was changed",
            Changed(HandMadeUpdate.Append(signed, (5, repainted), (90, "<</Type/XObject/Subtype/Form/BBox[0 0 9 9]/Length 1>>\nstream\n \nendstream"))), StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_added_field_a_changed_catalog_and_a_stray_object_are_named()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer);
        byte[] field = HandMadeUpdate.Append(signed, (4, "<</Fields[5 0 R 6 0 R 90 0 R]/SigFlags 3>>"), (90, "<</FT/Sig/T(owner)>>"));
        Assert.Contains("signature fields were added: owner", Changed(field), StringComparison.Ordinal);
        string catalog = HandMadeUpdate.BodyOf(signed, 1);
        Assert.Contains("the catalog's /OpenAction was added", Changed(HandMadeUpdate.Append(signed, (1, catalog[..^2] + "/OpenAction[3 0 R/Fit]>>"))), StringComparison.Ordinal);
        Assert.Contains("object 90 was added that is no part of a signature", Changed(HandMadeUpdate.Append(signed, (90, "(x)"))), StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_object_slipped_in_where_the_signed_file_refers_to_nothing_is_named()
    {
        byte[] trap = HandMadeUpdate.Append(HandMadeSheet.WithTable(), (3, "<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]/Contents 90 0 R/Annots[5 0 R 6 0 R]>>"));
        byte[] signed = await Signed.By(trap, "designer", TestAuthority.Designer);
        Assert.Equal(UnchangedVerdict.Unchanged, Verifier.Verify(signed).Signatures.Single().Unchanged.Verdict);
        Assert.Contains("object 90 was slipped in", Changed(HandMadeUpdate.Append(signed, (90, "<</Length 1>>\nstream\n \nendstream"))), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Bytes_appended_where_the_signed_table_of_contents_already_points_are_told()
    {
        // The signed state says that page 1's content stands behind its own end; an update that names nothing puts it there.
        byte[] trap = HandMadeUpdate.Append(HandMadeSheet.WithTable(),
            (3, "<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]/Contents 90 0 R/Annots[5 0 R 6 0 R]>>"), (90, "<</Length 1>>\nstream\n \nendstream"));
        byte[] signed = await Signed.By(trap, "designer", TestAuthority.Checker);
        string information = HandMadeUpdate.BodyOf(signed, 7);
        int truth = trap.AsSpan().IndexOf("90 0 obj"u8), lie = signed.Length + $"7 0 obj\n{information}\nendobj\n".Length;
        signed = CmsForgery.Again(signed, TestAuthority.Checker, Entry(truth), Entry(lie));
        byte[] sprung = HandMadeUpdate.Append(signed, (7, information + "\nendobj\n90 0 obj\n<</Length 1>>\nstream\nX\nendstream"));
        Assert.Equal("90 0 obj", Encoding.ASCII.GetString(sprung, lie, 8));
        var report = Verifier.Verify(sprung);
        Assert.Equal(FileOrigin.NotReadable, report.Origin);
        Assert.Contains("reaches behind the end of its revision", report.OriginText, StringComparison.Ordinal);

        static string Entry(int place) => string.Create(CultureInfo.InvariantCulture, $"{place:D10} 00000 n");
    }

    [Fact]
    public async Task A_certification_that_forbids_the_next_signature_is_named()
    {
        byte[] sheet = HandMadeSheet.WithTable();
        byte[] certified = (await Signer.SignAsync(sheet, Signed.Request(sheet, "designer", TestAuthority.Designer) with { Certify = true })).Bytes;
        byte[] strict = CmsForgery.Again(certified, TestAuthority.Designer, "/P 2/V", "/P 1/V");
        string registered = CertificateRules.Fingerprint(TestAuthority.Designer);
        Assert.True(UpdateRule.AcceptSignedUpload(sheet, certified, "designer", registered, TestAuthority.SigningTime).IsAccepted);
        var answer = UpdateRule.AcceptSignedUpload(sheet, strict, "designer", registered, TestAuthority.SigningTime);
        Assert.Equal(UploadRefusal.MoreThanASignature, answer.Refusal);
        Assert.Contains("/Perms was added", answer.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_store_of_certificates_may_follow_but_may_not_own_a_page()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer);
        string catalog = HandMadeUpdate.BodyOf(signed, 1);
        byte[] stored = HandMadeUpdate.Append(signed, (1, catalog[..^2] + "/DSS 90 0 R>>"), (90, "<</Certs[91 0 R]/X 8 0 R>>"), (91, "<</Length 1>>\nstream\n \nendstream"));
        var unchanged = Verifier.Verify(stored).Signatures.Single().Unchanged;
        Assert.Equal(UnchangedVerdict.Unchanged, unchanged.Verdict);
        Assert.Contains("revocation data were stored", unchanged.Text, StringComparison.Ordinal);
        byte[] misused = HandMadeUpdate.Append(stored, (8, "<</Length 1>>\nstream\n \nendstream"));
        Assert.Contains("the content of page 1 was changed", Changed(misused), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_removed_or_replaced_signature_is_named_by_the_one_that_stays()
    {
        byte[] signed = await Signed.ByBoth(HandMadeSheet.WithTable());
        byte[] removed = HandMadeUpdate.Append(signed, (5, HandMadeUpdate.BodyOf(HandMadeSheet.WithTable(), 5)));
        var report = Verifier.Verify(removed);
        Assert.Equal(["checker"], report.Signatures.Select(signature => signature.Field));
        Assert.Contains("the signature in the field designer was removed", report.Signatures.Single().Unchanged.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_hole_wider_than_the_value_is_broken()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Designer);
        int at = signed.AsSpan().IndexOf("/ByteRange[0 "u8) + 13;
        string numbers = Encoding.ASCII.GetString(signed, at, 32);
        int[] parts = [.. numbers.Split(' ', StringSplitOptions.RemoveEmptyEntries).Select(part => int.Parse(part, CultureInfo.InvariantCulture))];
        Encoding.ASCII.GetBytes(string.Create(CultureInfo.InvariantCulture, $"{parts[0] - 1} {parts[1]} {parts[2]}").PadRight(32)).CopyTo(signed, at);
        var unchanged = Verifier.Verify(signed).Signatures.Single().Unchanged;
        Assert.Equal(UnchangedVerdict.Broken, unchanged.Verdict);
        Assert.Contains("leaves out more or less", unchanged.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_archive_tells_the_latest_the_earlier_and_any_other_bytes()
    {
        byte[] sheet = HandMadeSheet.WithStream();
        byte[] first = await Signed.By(sheet, "designer", TestAuthority.Designer), second = await Signed.By(first, "checker", TestAuthority.Checker);
        ArchivedState[] states = [.. new[] { sheet, first, second }.Select(bytes => new ArchivedState(bytes.Length, Convert.ToHexStringLower(SHA256.HashData(bytes))))];
        Assert.Equal(ArchiveVerdict.Latest, Verifier.Verify(second, states).Archive!.Verdict);
        Assert.Equal(ArchiveVerdict.Earlier, Verifier.Verify(first, states).Archive!.Verdict);
        Assert.Equal(ArchiveVerdict.GoesOnDifferently, Verifier.Verify(second, states[..2]).Archive!.Verdict);
        for (int bit = 0; bit < 8; bit++)
        {
            byte[] flipped = [.. sheet];
            flipped[sheet.Length / 2] ^= (byte)(1 << bit);
            Assert.Equal(ArchiveVerdict.Different, Verifier.Verify(flipped, states).Archive!.Verdict);
        }
    }

    [Fact]
    public async Task A_certified_file_may_be_signed_further()
    {
        byte[] sheet = HandMadeSheet.WithTable();
        byte[] certified = (await Signer.SignAsync(sheet, Signed.Request(sheet, "designer", TestAuthority.Designer) with { Certify = true })).Bytes;
        var report = Verifier.Verify(await Signed.By(certified, "checker", TestAuthority.Checker));
        Assert.All(report.Signatures, signature => Assert.Equal(UnchangedVerdict.Unchanged, signature.Unchanged.Verdict));
    }

    [Fact]
    public async Task Text_of_the_signer_is_shown_without_tricks()
    {
        byte[] sheet = HandMadeSheet.WithTable();
        byte[] forged = await CmsForgery.SignWithName(sheet, TestAuthority.Checker, "Eve\u202Egpj.\u0007");
        Assert.Equal("Eve[U+202E]gpj.[U+0007]", Verifier.Verify(forged).Signatures.Single().StatedName);
    }

    private static string Changed(byte[] file)
    {
        var signature = Verifier.Verify(file).Signatures.Single();
        Assert.Equal(UnchangedVerdict.ChangedAfterSigning, signature.Unchanged.Verdict);
        Assert.Equal(WhoVerdict.KnownIssuer, signature.Who.Verdict);
        return signature.Unchanged.Text;
    }
}
