using JointPlanner.Archive.Tests.Databases;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>PostgreSQL is stopped under the running program: while a person edits, saves for all, freezes, opens a page.</summary>
public sealed class SilentArchiveTests(Chromium chromium)
{
    private const string Station = "[data-path='supports/p2/station']";

    [Fact]
    public async Task A_stopped_database_is_told_where_it_is_met_loses_nothing_and_is_found_again()
    {
        await using var server = await PostgresCluster.Make();
        await using var site = new SiteProcess(chromium) { Settings = new Dictionary<string, string> { ["Archive__Kind"] = "postgresql", ["Archive__ConnectionString"] = server.ConnectionString } };
        await site.Start();
        var writer = await site.Visit("designer");
        await writer.Open("Kestrel Lane Overbridge");
        await writer.Page.WaitForSelectorAsync("[data-draft]");
        var freezer = await site.Visit("designer");
        await freezer.Open("Plover Flats Bridge");
        await freezer.Page.ClickAsync("a.revision");
        await freezer.Page.WaitForSelectorAsync("text=Freeze for checking");

        await server.Stop();
        await writer.Page.FillAsync(Station, "111 ft");
        await Assertions.Expect(writer.Page.Locator("[data-draft=open]")).ToContainTextAsync("the archive does not answer");
        await writer.Page.ClickAsync("button:has-text('Save for all')");
        Assert.Equal("111 ft", await writer.Page.InputValueAsync(Station));
        await freezer.Page.ClickAsync("text=Freeze for checking");
        await Assertions.Expect(freezer.Page.Locator("main [role=alert]").First).ToContainTextAsync("The archive does not answer");
        await Assertions.Expect(freezer.Page.Locator("h1 .state")).ToHaveTextAsync("a draft");
        await freezer.Page.ClickAsync("nav >> text=Structures");
        await Assertions.Expect(freezer.Page.Locator("h1")).ToHaveTextAsync("The archive does not answer");

        await server.Start();
        await Assertions.Expect(writer.Page.Locator("[data-draft=saved]")).ToHaveTextAsync("draft saved");
        await writer.Page.ClickAsync("button:has-text('Save for all')");
        await Assertions.Expect(writer.Page.Locator(".share-done")).ToHaveTextAsync("Saved for all.");
        await freezer.Page.ClickAsync("text=Show the page again");
        await freezer.Page.ClickAsync("text=Plover Flats Bridge");
        await freezer.Page.ClickAsync("a.revision");
        await freezer.Page.ClickAsync("text=Freeze for checking");
        await Assertions.Expect(freezer.Page.Locator("h1 .state")).ToHaveTextAsync("in check");
        await writer.Page.ReloadAsync();
        await writer.Page.WaitForSelectorAsync("[data-draft]");
        Assert.Equal("111 ft", await writer.Page.InputValueAsync(Station));
    }
}
