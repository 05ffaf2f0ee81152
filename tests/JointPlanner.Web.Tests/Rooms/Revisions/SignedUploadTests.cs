using JointPlanner.Archive.Revisions;
using JointPlanner.Issuing.Tests.Signing;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Tests.Rooms.Revisions;

/// <summary>Signed sheets that come in through the form, right and wrong, once and twice.</summary>
public sealed class SignedUploadTests(RevisionHouse house) : IClassFixture<RevisionHouse>
{
    private const string WrongOnes = "Plover Flats Bridge", Twice = "Sorrel Creek Crossing", TwiceByKey = "Tarn Moss Viaduct", Later = "Kestrel Lane Overbridge";

    [Theory]
    [MemberData(nameof(WrongUploads.Kinds), MemberType = typeof(WrongUploads))]
    public async Task Each_wrong_upload_is_refused_by_name_on_the_page_and_nothing_is_stored(string kind, string says)
    {
        var revision = await InCheck(WrongOnes, WrongUploads.Archived);
        using var mine = house.Life.Key("designer");
        using var other = house.Life.Key("checker");
        var browser = await house.Browser("designer");
        var page = await browser.GetStringAsync($"/revisions/{revision}");
        var landed = await RevisionHouse.Landed(browser, await HandIn(browser, page, revision, await WrongUploads.Make(kind, mine.Certificate, other.Certificate)));
        // What is no continuation of the archived sheet is told by the archive itself.
        Assert.Contains(kind is "a changed byte before the update" or "not ours" ? "does not begin with the archived sheet, byte for byte" : says, landed, StringComparison.Ordinal);
        Assert.Single((await house.Life.Document(revision)).Segments);
    }

    [Fact]
    public async Task The_same_form_sent_twice_at_the_same_moment_signs_once_and_is_answered_twice_alike()
    {
        var revision = await house.Life.Frozen(Twice);
        var browser = await house.Browser("designer");
        var page = await browser.GetStringAsync($"/revisions/{revision}");
        var signed = await house.Life.Signed(revision, SignatureField.Designer);
        await Twins(browser, revision, () => HandIn(browser, page, revision, signed));

        // Pressed once more later, it still gets the first answer; another form for the same field does not.
        Assert.DoesNotContain("signed already", await RevisionHouse.Landed(browser, await HandIn(browser, page, revision, signed)), StringComparison.Ordinal);
        var another = await RevisionHouse.Landed(browser, await HandIn(browser, page, revision, signed, Guid.CreateVersion7().ToString()));
        Assert.Contains("The designer's field is signed already.", another, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_key_file_sent_twice_at_the_same_moment_signs_once_though_each_makes_a_signature_of_its_own()
    {
        var revision = await house.Life.Frozen(TwiceByKey);
        var browser = await house.Browser("designer");
        var page = await browser.GetStringAsync($"/revisions/{revision}");
        var key = await File.ReadAllBytesAsync(Path.Combine(house.Folder, "demo-designer.pfx"));
        await Twins(browser, revision, () => browser.PostAsync($"/revisions/{revision}/sign", RevisionHouse.Upload(page, "key", "me.pfx", key,
            ("request", RevisionHouse.Hidden(page, "request")), ("field", "Designer"), ("expected", RevisionHouse.Hidden(page, "expected")), ("password", house.Life.Password("designer")))));
    }

    [Fact]
    public async Task A_sheet_that_another_person_signed_meanwhile_is_to_be_taken_again()
    {
        var revision = await house.Life.Frozen(Later);
        await house.Life.Accept(revision);
        var browser = await house.Browser("designer");
        var page = await browser.GetStringAsync($"/revisions/{revision}");
        var mine = await house.Life.Signed(revision, SignatureField.Designer);
        await house.Life.Sign(revision, SignatureField.Checker);
        Assert.Contains("Somebody else signed meanwhile", await RevisionHouse.Landed(browser, await HandIn(browser, page, revision, mine)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_file_beyond_the_limit_is_told_so()
    {
        var revision = await InCheck(WrongOnes, WrongUploads.Archived);
        var browser = await house.Browser("designer");
        var answer = await HandIn(browser, await browser.GetStringAsync($"/revisions/{revision}"), revision, new byte[27 << 20]);
        Assert.Equal(System.Net.HttpStatusCode.RequestEntityTooLarge, answer.StatusCode);
        Assert.Contains("Too large", RevisionHouse.Text(await answer.Content.ReadAsStringAsync()), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_link_that_somebody_made_up_puts_no_words_on_the_page()
    {
        var revision = (await house.Life.Latest(await house.Life.Structure(WrongOnes))).Id;
        var browser = await house.Browser("designer");
        Assert.DoesNotContain("Call this number", RevisionHouse.Text(await browser.GetStringAsync($"/revisions/{revision}?says=Call+this+number")), StringComparison.Ordinal);
    }

    private async Task<Guid> InCheck(string structure, byte[] sheet)
    {
        var latest = await house.Life.Latest(await house.Life.Structure(structure));
        return latest.State == RevisionState.Draft ? await house.Life.FrozenWith(structure, sheet) : latest.Id;
    }

    private async Task Twins(HttpClient browser, Guid revision, Func<Task<HttpResponseMessage>> send)
    {
        var answers = await Task.WhenAll(send(), send(), send());
        Assert.All(answers, a => Assert.Equal($"/revisions/{revision}", a.Headers.Location!.ToString()));
        Assert.Equal([null, SignatureField.Designer], (await house.Life.Document(revision)).Segments.Select(s => s.Field));
        Assert.Contains("signed by the designer", RevisionHouse.Text(await browser.GetStringAsync($"/revisions/{revision}")), StringComparison.Ordinal);
        await using var owner = await house.Life.As("owner");
        Assert.Equal(1, await owner.Audit().CountAsync(a => a.What == "Sign" && a.Subject.Contains(revision.ToString())));
    }

    private static Task<HttpResponseMessage> HandIn(HttpClient browser, string page, Guid revision, byte[] sheet, string? request = null) =>
        browser.PostAsync($"/revisions/{revision}/signed", RevisionHouse.Upload(page, "sheet", "signed.pdf", sheet,
            ("request", request ?? RevisionHouse.Hidden(page, "request")), ("field", "Designer"), ("expected", RevisionHouse.Hidden(page, "expected"))));
}
