using JointPlanner.Pdf.Verifying;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>From a demo structure to an issued sheet: the owner confirms, the designer freezes and signs, another person checks and signs, the owner issues.</summary>
public sealed class IssueJourneyTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Structure = "Plover Flats Bridge";

    [Fact]
    public async Task A_demo_structure_is_confirmed_frozen_checked_signed_twice_and_issued()
    {
        var owner = await site.Visit("owner");
        await owner.Open(Structure);
        await ConfirmAll(owner);

        var designer = await site.Visit("designer");
        await designer.Open(Structure);
        await designer.Page.ClickAsync("a.revision");
        await designer.Page.ClickAsync("text=Freeze for checking");
        await State(designer.Page, "in check");
        var revision = new Uri(designer.Page.Url).AbsolutePath;

        var checker = await site.Visit("checker");
        await checker.Go(revision);
        await checker.Page.ClickAsync("button:has-text('Accept')");
        await State(checker.Page, "checked");

        await designer.Go(revision);
        await Sign(designer, "designer");
        await checker.Go(revision);
        await Sign(checker, "checker");

        await owner.Go(revision);
        await owner.Gravely(() => owner.Page.ClickAsync("button:has-text('Issue')"), owner.Page.Locator("h1 .state-issued"));

        var download = await owner.Page.Context.APIRequest.GetAsync($"{site.Address}{revision}/sheet.pdf");
        var report = new Verifier([]).Verify(await download.BodyAsync());
        Assert.Equal(["designer", "checker"], report.Signatures.Select(s => s.Field));
        Assert.All(report.Signatures, s => Assert.Equal(UnchangedVerdict.Unchanged, s.Unchanged.Verdict));
        Assert.Empty(owner.Troubles.Concat(designer.Troubles).Concat(checker.Troubles));
    }

    private static async Task ConfirmAll(Visitor owner)
    {
        var page = owner.Page;
        var open = page.Locator("li.finding-stops details.more");
        await Assertions.Expect(open.First).ToBeAttachedAsync();
        for (var left = await open.CountAsync(); left > 0; left--)
        {
            await open.First.Locator("summary").ClickAsync();
            await owner.Gravely(() => open.First.Locator("button").ClickAsync(), page.GetByText($"{left - 1} of"));
            await Assertions.Expect(open).ToHaveCountAsync(left - 1);
        }
    }

    private async Task Sign(Visitor signer, string account)
    {
        var page = signer.Page;
        await signer.Gravely(null, page.Locator("details.more summary"));
        await page.ClickAsync("details.more summary");
        await page.SetInputFilesAsync("#key", site.KeyFile(account));
        await page.FillAsync("#word", site.Password(account));
        await page.ClickAsync("details.more button[type=submit]");
        await Assertions.Expect(page.Locator($"text=signed by the {account}")).ToBeVisibleAsync();
    }

    private static Task State(IPage page, string state) => Assertions.Expect(page.Locator("h1 .state")).ToHaveTextAsync(state);
}
