using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Tests.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Verifying;

public class UpdateRuleTests
{
    private static readonly byte[] Archived = HandMadeSheet.WithTable();
    private static readonly string Registered = CertificateRules.Fingerprint(TestAuthority.Designer);

    [Fact]
    public async Task The_archived_file_with_the_right_persons_signature_is_accepted()
    {
        var signed = await Signer.SignAsync(Archived, Signed.Request(Archived, "designer", TestAuthority.Designer));
        var answer = Judge(signed.Bytes);
        Assert.True(answer.IsAccepted, answer.Text);
        Assert.Equal(signed.Appended.ToArray(), answer.Appended.ToArray());
        Assert.Equal(Registered, answer.Signature!.Who.Fingerprint);
        Assert.Equal(UnchangedVerdict.Unchanged, answer.Signature.Unchanged.Verdict);
    }

    [Fact]
    public async Task The_second_signature_is_accepted_upon_the_first()
    {
        byte[] first = await Signed.By(Archived, "designer", TestAuthority.Designer);
        byte[] second = await Signed.By(first, "checker", TestAuthority.Checker);
        Assert.True(UpdateRule.AcceptSignedUpload(first, second, "checker", CertificateRules.Fingerprint(TestAuthority.Checker).ToLowerInvariant(), TestAuthority.SigningTime).IsAccepted);
    }

    [Fact]
    public async Task Another_persons_certificate_is_refused_by_its_fingerprint()
    {
        var answer = Refused(UploadRefusal.AnotherCertificate, await Signed.By(Archived, "designer", TestAuthority.Checker));
        Assert.Contains(CertificateRules.Fingerprint(TestAuthority.Checker), answer.Text, StringComparison.Ordinal);
        Assert.Contains(Registered, answer.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_second_update_is_refused()
    {
        byte[] signed = await Signed.By(Archived, "designer", TestAuthority.Designer);
        Refused(UploadRefusal.SecondUpdate, HandMadeUpdate.Append(signed));
        Refused(UploadRefusal.SecondUpdate, await Signed.By(HandMadeUpdate.Append(Archived), "designer", TestAuthority.Designer));
        Refused(UploadRefusal.SecondUpdate, await Signed.By(signed, "checker", TestAuthority.Checker));
    }

    [Fact]
    public async Task A_page_added_in_the_same_update_is_refused()
    {
        byte[] forged = await SignedUpdate.WithAlso(Archived, (2, "<</Type/Pages/Count 2/Kids[3 0 R 90 0 R]>>"), (90, "<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]>>"));
        Assert.Equal(UnchangedVerdict.Unchanged, new Verifier([]).Verify(forged).Signatures.Single().Unchanged.Verdict);
        var answer = Refused(UploadRefusal.MoreThanASignature, forged);
        Assert.Contains("pages were added (1 before, 2 after)", answer.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_object_hidden_in_the_same_update_is_refused()
    {
        var answer = Refused(UploadRefusal.MoreThanASignature, await SignedUpdate.WithAlso(Archived, (90, "(hidden)")));
        Assert.Contains("object 90 was added", answer.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Changed_bytes_are_refused_with_their_place()
    {
        byte[] signed = await Signed.By(Archived, "designer", TestAuthority.Designer);
        signed[500] ^= 1;
        Assert.Contains("from byte 500 on", Refused(UploadRefusal.ChangedBytes, signed).Text, StringComparison.Ordinal);
        Refused(UploadRefusal.ChangedBytes, Archived[..^10]);
    }

    [Fact]
    public async Task A_file_rewritten_by_another_program_is_refused()
    {
        using var tool = new OutsideTool();
        tool.Write("signed.pdf", await Signed.By(Archived, "designer", TestAuthority.Designer));
        Assert.Equal(0, tool.Run("qpdf", "signed.pdf", "rewritten.pdf").ExitCode);
        Refused(UploadRefusal.ChangedBytes, tool.Read("rewritten.pdf"));
    }

    [Fact]
    public async Task The_wrong_field_is_refused()
    {
        byte[] signed = await Signed.By(Archived, "checker", TestAuthority.Designer);
        Assert.Contains("signs the field checker; expected was designer", Refused(UploadRefusal.WrongField, signed).Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_archived_file_itself_and_an_empty_update_add_nothing()
    {
        Refused(UploadRefusal.NothingAdded, Archived);
        Refused(UploadRefusal.NothingAdded, HandMadeUpdate.Append(Archived));
    }

    [Fact]
    public void Bytes_behind_the_archived_file_that_are_no_update_are_refused() =>
        Refused(UploadRefusal.NotReadable, [.. Archived, .. "more"u8]);

    [Fact]
    public async Task A_damaged_signature_is_refused()
    {
        byte[] signed = await Signed.By(Archived, "designer", TestAuthority.Designer);
        int name = signed.AsSpan(Archived.Length).IndexOf("/Name<"u8) + Archived.Length + 7;
        signed[name] = signed[name] == (byte)'5' ? (byte)'4' : (byte)'5';
        Refused(UploadRefusal.BrokenSignature, signed);
    }

    [Fact]
    public async Task A_certificate_that_has_expired_when_the_upload_comes_is_refused()
    {
        var brief = TestAuthority.Known.Ecdsa("CN=Brief", to: TestAuthority.SigningTime.AddDays(1));
        byte[] signed = await Signed.By(Archived, "designer", brief);
        string registered = CertificateRules.Fingerprint(brief);
        Assert.True(UpdateRule.AcceptSignedUpload(Archived, signed, "designer", registered, TestAuthority.SigningTime).IsAccepted);
        var late = UpdateRule.AcceptSignedUpload(Archived, signed, "designer", registered, TestAuthority.SigningTime.AddDays(2));
        Assert.Equal(UploadRefusal.CertificateUnsuitable, late.Refusal);
        Assert.Contains("expired", late.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_same_key_in_both_fields_is_refused_even_when_the_signer_let_it_pass()
    {
        var twin = TestAuthority.Known.Again(TestAuthority.Checker, "CN=Somebody Else");
        byte[] first = await Signed.By(Archived, "designer", TestAuthority.Checker);
        // Signed by another key, then signed anew with the twin of the first one.
        byte[] second = CmsForgery.Again(await Signed.By(first, "checker", TestAuthority.Designer), twin, "4461", "4461", field: 1);
        var answer = UpdateRule.AcceptSignedUpload(first, second, "checker", CertificateRules.Fingerprint(twin), TestAuthority.SigningTime);
        Assert.Equal(UploadRefusal.KeyUsedInOtherField, answer.Refusal);
    }

    private static UploadAnswer Judge(byte[] uploaded) =>
        UpdateRule.AcceptSignedUpload(Archived, uploaded, "designer", Registered, TestAuthority.SigningTime);

    private static UploadAnswer Refused(UploadRefusal expected, byte[] uploaded)
    {
        var answer = Judge(uploaded);
        Assert.Equal(expected, answer.Refusal);
        Assert.Null(answer.Signature);
        Assert.Equal(0, answer.Appended.Length);
        return answer;
    }
}
