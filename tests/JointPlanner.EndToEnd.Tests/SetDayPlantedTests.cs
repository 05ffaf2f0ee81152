using System.Text.Json.Nodes;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>
/// An archive whose issued results hold numbers that no engine would give: page and table show them, and show none where the issue may not be used.
/// </summary>
public sealed class SetDayPlantedTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task Page_and_table_show_what_was_issued_and_nothing_else()
    {
        var (structure, _) = await site.IssuePlanted("Plover Flats Bridge", results => Plant(results, "set", 0.1234, "minus", 0.0021, "plus", 0.0043, "least", 0.1201, "greatest", 0.1288));
        var page = await Open(structure, "j1");
        await page.FillAsync("#t-slab", "61");
        await page.FillAsync("#t-girder", "66");
        // The plan is in US units: 0.1234 m is 4.858 in.
        await Assertions.Expect(page.Locator("[data-set]")).ToHaveTextAsync("4.858 in");
        await page.ClickAsync("button:has-text('mm · °C')");
        await Assertions.Expect(page.Locator("[data-set]")).ToHaveTextAsync("123.4 mm");
        Assert.Equal("61", await page.InputValueAsync("#t-slab"));
        await Assertions.Expect(page.Locator(".big-tolerance")).ToHaveTextAsync("tighter by at most 2.1 mm wider by at most 4.3 mm", new() { UseInnerText = false });
        // 61 °F and 66 °F by equal weights are 63.5 °F, 17.5 °C.
        await Assertions.Expect(page.Locator(".big-window")).ToHaveTextAsync("at 17.5 °C · window 120.1 mm – 128.8 mm");
        await page.ClickAsync("summary:has-text('The issued table')");
        var cells = await page.Locator(".setting-table tbody td.set").AllInnerTextsAsync();
        Assert.True(cells.Count > 40, $"{cells.Count} rows");
        Assert.All(cells, c => Assert.Equal("123.4 mm", c));

        await page.FillAsync("#t-slab", "200");
        await DoNotSet(page, "values are given from");
    }

    [Fact]
    public async Task After_its_last_day_an_issue_shows_why_and_no_number()
    {
        var (structure, _) = await site.IssuePlanted("Kestrel Lane Overbridge", results => results["day"]!["use-within"] = 0.001);
        await DoNotSet(await Open(structure, "j1"), "was to be used before");
    }

    [Fact]
    public async Task Below_the_least_age_and_after_withdrawal_why_is_said_and_no_number()
    {
        var (structure, revision) = await site.IssuePlanted("Tarn Moss Viaduct", _ => { });
        var page = await Open(structure, "j2");
        foreach (var point in (string[])["top", "web", "bottom"]) await page.FillAsync($"#t-{point}", "12");
        await Assertions.Expect(page.Locator(".big-why")).ToHaveTextAsync("Enter the age of the deck.");
        await page.FillAsync("#age", "3");
        await DoNotSet(page, "Do not set at a deck age of 3 d");
        await page.FillAsync("#age", "400");
        await Assertions.Expect(page.Locator("[data-set]")).ToBeVisibleAsync();

        await using var services = site.Services.CreateAsyncScope();
        var owner = (await services.ServiceProvider.GetRequiredService<UserManager<Person>>().FindByNameAsync("owner"))!.Id;
        await services.ServiceProvider.GetRequiredService<WithdrawRevision>().Do(ActCall.AtConsole(owner, TimeProvider.System.GetUtcNow()), new WithdrawRequest(revision, "Pier 3 was found to be fixed."));
        await page.ReloadAsync();
        await DoNotSet(page, "was withdrawn");
        await Assertions.Expect(page.Locator(".big-why")).ToContainTextAsync("Pier 3 was found to be fixed.");
        await Assertions.Expect(page.Locator(".record-form")).ToHaveCountAsync(0);
    }

    [Fact]
    public async Task A_record_that_fails_is_kept_shown_and_accepted_with_a_reason_only_and_a_superseded_revision_sets_nothing()
    {
        var (structure, _) = await site.IssuePlanted("Sorrel Creek Crossing", _ => { });
        var page = await Open(structure, "j1");
        await page.FillAsync("#t-slab", "10");
        await page.FillAsync("#t-girder", "10");
        await page.FillAsync("#age", "90");
        for (var point = 0; point < 3; point++) await page.FillAsync($"#opening-{point}", point == 1 ? "25" : "60");
        await Assertions.Expect(page.Locator(".record-form .finding-stops")).ToContainTextAsync("axis: Carried to");
        await page.ClickAsync("button:has-text('Record what was set')");
        var record = page.Locator("article.record");
        await Assertions.Expect(record.Locator(".state")).ToHaveTextAsync("fails, not accepted");
        await Assertions.Expect(record.Locator(".finding-stops")).ToContainTextAsync("too narrow by");
        await site.Picture(page, "set-day-fails");

        var designer = await site.Visit("designer");
        await designer.Go($"/structures/{structure}/joints/j1/set");
        var own = designer.Page.Locator("article.record");
        await own.Locator("button").ClickAsync();
        await Assertions.Expect(own.GetByRole(AriaRole.Alert)).ToContainTextAsync("accepted only with a reason");
        await own.Locator("textarea").FillAsync("The edge is ground back by 40 mm before the seal goes in.");
        await own.Locator("button").ClickAsync();
        await Assertions.Expect(own.Locator(".state")).ToHaveTextAsync("fails, accepted with a reason");
        await Assertions.Expect(own).ToContainTextAsync("The edge is ground back");
        await site.Picture(designer.Page, "set-day-desktop");
        Assert.Empty(await designer.Barriers());
        Assert.Empty(designer.Troubles);

        await site.IssuePlanted("Sorrel Creek Crossing", _ => { });
        await page.GotoAsync($"{site.Address}/structures/{structure}/joints/j1/set?revision=1");
        await DoNotSet(page, "was superseded");
        await Assertions.Expect(page.Locator(".big-why")).ToContainTextAsync("Revision 2 holds.");
        await site.Picture(page, "set-day-superseded");
        await page.GotoAsync($"{site.Address}/structures/{structure}/joints/j1/set");
        await Assertions.Expect(page.Locator(".day-head")).ToContainTextAsync("Revision 2");
        await Assertions.Expect(page.Locator(".big-why")).ToContainTextAsync("Enter the temperature");
        await Assertions.Expect(page.Locator("article.record")).ToContainTextAsync("revision 1");
    }

    [Fact]
    public async Task A_structure_that_is_not_open_to_the_person_is_not_there()
    {
        var visitor = await site.Visit("contractor", 390, 844);
        await visitor.Go($"/structures/{Guid.CreateVersion7()}/joints/j1/set");
        await Assertions.Expect(visitor.Page.Locator("h1")).ToHaveTextAsync("Nothing here");
    }

    private static void Plant(JsonNode results, params object[] named)
    {
        foreach (var row in results["joints"]!.AsArray().SelectMany(j => j!["tables"]!.AsArray()).SelectMany(t => t!["rows"]!.AsArray()))
            if (row!["set"] is not null)
                for (var i = 0; i < named.Length; i += 2) row[(string)named[i]] = (double)named[i + 1];
    }

    private async Task<IPage> Open(Guid structure, string joint)
    {
        var visitor = await site.Visit("contractor", 390, 844);
        await visitor.Go($"/structures/{structure}/joints/{joint}/set");
        return visitor.Page;
    }

    private static async Task DoNotSet(IPage page, string why)
    {
        await Assertions.Expect(page.Locator(".big-stop")).ToHaveTextAsync("Do not set");
        await Assertions.Expect(page.Locator(".big-why")).ToContainTextAsync(why);
        await Assertions.Expect(page.Locator("[data-set]")).ToHaveCountAsync(0);
    }
}
