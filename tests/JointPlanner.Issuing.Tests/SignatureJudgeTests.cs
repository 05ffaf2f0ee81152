using JointPlanner.Archive.Revisions;
using JointPlanner.Issuing.Tests.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Issuing.Tests;

public sealed class SignatureJudgeTests
{
    private static readonly System.Security.Cryptography.X509Certificates.X509Certificate2 Mine = TestSigner.Named("Dana Designer"), Other = TestSigner.Named("Chris Checker");
    private static readonly DateTimeOffset Received = new(2031, 5, 4, 10, 0, 0, TimeSpan.Zero);

    [Fact]
    public async Task The_registered_persons_signature_in_the_own_field_meets_no_objection()
    {
        var facts = Facts(await WrongUploads.Sign(WrongUploads.Archived, "designer", Mine));
        Assert.Empty(facts.Objections);
        Assert.Equal(SignatureJudge.PublicKeyHash(Mine), facts.PublicKeyHash);
    }

    [Theory]
    [MemberData(nameof(WrongUploads.Kinds), MemberType = typeof(WrongUploads))]
    public async Task Each_wrong_upload_meets_an_objection_that_names_what_is_wrong(string kind, string says) =>
        Assert.Contains(says, Assert.Single(Facts(await WrongUploads.Make(kind, Mine, Other)).Objections), StringComparison.Ordinal);

    [Fact]
    public async Task A_page_added_under_a_signature_that_fits_is_no_broken_signature_and_still_refused()
    {
        // The forgery is a good one: read by itself, the file says "unchanged".
        var forged = await WrongUploads.Make("an added page", Mine, Other);
        Assert.Equal(UnchangedVerdict.Unchanged, Assert.Single(new Verifier([]).Verify(forged).Signatures).Unchanged.Verdict);
        Assert.NotEmpty(Facts(forged).Objections);
    }

    private static Archive.Acts.SignatureFacts Facts(byte[] uploaded) => SignatureJudge.Facts(WrongUploads.Archived, uploaded, SignatureField.Designer, Mine, Received);
}
