using System.Globalization;
using System.Security.Cryptography;
using JointPlanner.Pdf;
using JointPlanner.Web.Tests.Rooms.Revisions;
using Microsoft.Playwright;
using Field = JointPlanner.Archive.Revisions.SignatureField;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>The revision's page in a browser: checked, signed once by two presses, issued, followed by the next one.</summary>
public sealed class RevisionTests(RunningSite site) : IClassFixture<RunningSite>
{
    private RevisionLife Life => new(site.Services, site.Folder);

    [Fact]
    public async Task One_byte_altered_in_the_stored_package_makes_accept_refuse_by_name()
    {
        var revision = await Life.Frozen("Kestrel Lane Overbridge");
        var checker = await site.Visit("checker");
        await checker.Go($"/revisions/{revision}");
        await StoredBytes.Alter(site.Folder, revision);
        await checker.Page.ClickAsync("button:has-text('Accept')");
        await Assertions.Expect(checker.Page.GetByRole(AriaRole.Alert).First).ToContainTextAsync("The stored calculation package was altered");
        await Assertions.Expect(checker.Page.Locator("h1 .state")).ToHaveTextAsync("in check");
        await Assertions.Expect(checker.Page.Locator("button:has-text('Accept')")).ToHaveCountAsync(0);
        Assert.Empty(checker.Troubles);
    }

    [Fact]
    public async Task A_double_click_on_sign_signs_once()
    {
        var revision = await Life.Frozen("Tarn Moss Viaduct");
        var designer = await site.Visit("designer");
        await designer.Go($"/revisions/{revision}");
        await designer.Gravely(null, designer.Page.Locator("details.more:has(#key) summary"));
        await designer.Page.ClickAsync("details.more:has(#key) summary");
        const string told = "field => field.validationMessage";
        await designer.Page.SetInputFilesAsync("#key", new FilePayload { Name = "me.pfx", MimeType = "application/x-pkcs12", Buffer = new byte[40000] });
        Assert.Equal("me.pfx is larger than 32 KiB. Choose another file.", await designer.Page.EvalOnSelectorAsync<string>("#key", told));
        await designer.Page.SetInputFilesAsync("#key", site.KeyFile("designer"));
        Assert.Equal("", await designer.Page.EvalOnSelectorAsync<string>("#key", told));
        await designer.Page.FillAsync("#word", site.Password("designer"));
        await designer.Page.DblClickAsync("details.more:has(#key) button[type=submit]");
        await Assertions.Expect(designer.Page.GetByText("signed by the designer")).ToBeVisibleAsync();
        await Assertions.Expect(designer.Page.GetByRole(AriaRole.Alert)).ToHaveCountAsync(0);
        Assert.Equal([null, Field.Designer], (await Life.Document(revision)).Segments.Select(s => s.Field));
    }

    [Fact]
    public async Task A_signed_sheet_of_more_than_a_mebibyte_is_taken()
    {
        var document = new Document
        {
            Title = "A sheet with much attached",
            Author = "Nobody",
            Program = "a test",
            Date = DateTimeOffset.UnixEpoch,
            Blocks = [new SignatureFields([new SignatureField("designer", "Designer"), new SignatureField("checker", "Checker")])],
            Attachments = [new("calculation.json", "application/json", RandomNumberGenerator.GetBytes(3 << 19), AttachmentRelation.Source, "noise, which cannot be packed")],
        };
        var revision = await Life.FrozenWith("Sorrel Creek Crossing", PdfWriter.Write(document).Bytes);
        var signed = await Life.Signed(revision, Field.Designer);
        Assert.True(signed.Length > 1 << 20, string.Create(CultureInfo.InvariantCulture, $"{signed.Length} bytes"));
        var designer = await site.Visit("designer");
        await HandIn(designer, revision, signed);
        await Assertions.Expect(designer.Page.GetByText("signed by the designer")).ToBeVisibleAsync();
    }

    [Fact]
    public async Task The_next_revision_is_begun_by_a_button_compared_run_again_and_nobody_is_shut_out()
    {
        const string structure = "Plover Flats Bridge";
        var first = await Life.Issued(structure);
        var designer = await site.Visit("designer");
        await designer.Go($"/revisions/{first}");
        await designer.Page.ClickAsync("button:has-text('Begin the next revision')");
        await designer.Page.WaitForURLAsync("**/structures/*");
        await designer.Page.WaitForSelectorAsync(".ledger-picture svg", new() { State = WaitForSelectorState.Attached });
        await designer.Page.Locator("[data-path='joints/j1/setting/temperature']").FillAsync("72 °F");
        await Assertions.Expect(designer.Page.GetByRole(AriaRole.Status).First).ToHaveTextAsync("draft saved", new() { Timeout = 4000 });
        await designer.Page.ClickAsync("button:has-text('Save for all')");
        await Assertions.Expect(designer.Page.Locator("a.revision").First).ToContainTextAsync("Revision 2");
        await designer.Page.Locator("a.revision").First.ClickAsync();
        await designer.Page.ClickAsync("text=Freeze for checking");
        // Computed, written as a sheet and stored: seconds on a busy machine.
        await Assertions.Expect(designer.Page.Locator("h1 .state")).ToHaveTextAsync("in check", new() { Timeout = 30000 });
        var second = new Uri(designer.Page.Url).AbsolutePath;

        foreach (var (width, paper) in new[] { (1440, "light"), (1440, "dark"), (390, "light") })
        {
            var checker = await site.Visit("checker", width, 900);
            if (paper == "dark") await checker.Page.Context.AddCookiesAsync([new() { Name = "paper", Value = "dark", Url = site.Address }]);
            await checker.Go(second);
            await Assertions.Expect(checker.Page.GetByText("joints/j1/setting/temperature")).ToBeVisibleAsync();
            await Assertions.Expect(checker.Page.Locator("table.differences", new() { HasText = "opens more, by" })).ToBeVisibleAsync();
            await checker.Page.Locator("button:has-text('Run again')").FocusAsync();
            await checker.Page.Keyboard.PressAsync("Enter");
            await Assertions.Expect(checker.Page.GetByText("Same: all ")).ToBeVisibleAsync();
            Assert.Empty(await checker.Barriers());
            var overflow = await checker.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
            Assert.True(overflow <= 0, string.Create(CultureInfo.InvariantCulture, $"{width}, {paper}: the page is {overflow} px wider than the screen"));
            Assert.Empty(checker.Troubles);
        }
    }

    private static async Task HandIn(Visitor designer, Guid revision, byte[] sheet)
    {
        await designer.Go($"/revisions/{revision}");
        await designer.Gravely(null, designer.Page.Locator("#signed"));
        await designer.Page.SetInputFilesAsync("#signed", new FilePayload { Name = "signed.pdf", MimeType = "application/pdf", Buffer = sheet });
        await designer.Page.ClickAsync("button:has-text('Hand in the signed sheet')");
    }
}
