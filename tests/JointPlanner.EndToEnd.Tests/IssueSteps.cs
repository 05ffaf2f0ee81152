using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>The people of the demonstration who brought a structure to an issued revision, each in a window of their own.</summary>
public sealed record IssuedRevision(Visitor Owner, Visitor Designer, Visitor Checker, string Revision, string Structure);

/// <summary>From a demo structure to an issued sheet through the screens, for every journey that begins there.</summary>
public static class IssueSteps
{
    /// <summary>The owner confirms, the designer freezes and signs, another person checks and signs, the owner issues.</summary>
    public static async Task<IssuedRevision> Issue(this RunningSite site, string structure)
    {
        var owner = await site.Visit("owner");
        await owner.Open(structure);
        var address = new Uri(owner.Page.Url).AbsolutePath;
        await ConfirmAll(owner);

        var designer = await site.Visit("designer");
        await designer.Open(structure);
        await designer.Page.ClickAsync("a.revision");
        await designer.Page.ClickAsync("text=Freeze for checking");
        await State(designer.Page, "in check");
        var revision = new Uri(designer.Page.Url).AbsolutePath;

        var checker = await site.Visit("checker");
        await checker.Go(revision);
        await checker.Page.ClickAsync("button:has-text('Accept')");
        await State(checker.Page, "checked");

        await designer.Go(revision);
        await site.Sign(designer, "designer");
        await checker.Go(revision);
        await site.Sign(checker, "checker");

        await owner.Go(revision);
        await owner.Gravely(() => owner.Page.ClickAsync("button:has-text('Issue')"), owner.Page.Locator("h1 .state-issued"));
        return new(owner, designer, checker, revision, address);
    }

    private static async Task ConfirmAll(Visitor owner)
    {
        var page = owner.Page;
        var open = page.Locator("li.finding-stops details.more");
        await Assertions.Expect(open.First).ToBeAttachedAsync();
        for (var left = await open.CountAsync(); left > 0; left--)
        {
            await open.First.Locator("summary").ClickAsync();
            await owner.Gravely(() => open.First.Locator("button").ClickAsync(), page.GetByText($"Values held from memory: {left - 1} of"));
            await Assertions.Expect(open).ToHaveCountAsync(left - 1);
        }
    }

    private static async Task Sign(this RunningSite site, Visitor signer, string account)
    {
        var page = signer.Page;
        await signer.Gravely(null, page.Locator("details.more:has(#key) summary"));
        await page.ClickAsync("details.more:has(#key) summary");
        await page.SetInputFilesAsync("#key", site.KeyFile(account));
        await page.FillAsync("#word", site.Password(account));
        await page.ClickAsync("details.more:has(#key) button[type=submit]");
        await Assertions.Expect(page.Locator($"text=signed by the {account}")).ToBeVisibleAsync();
    }

    private static Task State(IPage page, string state) => Assertions.Expect(page.Locator("h1 .state")).ToHaveTextAsync(state);
}
