using System.Globalization;
using JointPlanner.Archive;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>Install day on a phone: from the issued revision to one number, three points recorded, accepted by a designer, at the head of the joint's chain.</summary>
public sealed class SetDayJourneyTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Structure = "Sorrel Creek Crossing";
    private const int Width = 390, Height = 844;

    [Fact]
    public async Task A_contractor_sets_by_the_issued_table_records_three_points_and_a_designer_accepts()
    {
        var issued = await site.Issue(Structure);
        await issued.Owner.Page.SetViewportSizeAsync(1440, 1300);
        await issued.Owner.Go(issued.Structure);
        await issued.Owner.Page.WaitForSelectorAsync(".ledger-picture svg", new() { State = WaitForSelectorState.Attached });
        await site.Picture(issued.Owner.Page, "ledger", isForReadme: true);

        var contractor = await site.Visit("contractor", Width, Height);
        await contractor.Go(issued.Revision);
        await contractor.Page.ClickAsync("a:has-text('Set joint') >> nth=0");
        await Assertions.Expect(contractor.Page.Locator(".big-why")).ToContainTextAsync("Enter the temperature of each point");
        await contractor.Page.WaitForSelectorAsync(".field-page[data-interactive=true]");
        await EnterTheDay(contractor.Page);
        var set = contractor.Page.Locator("[data-set]");
        await Assertions.Expect(set).ToContainTextAsync("mm");
        await Assertions.Expect(contractor.Page.Locator(".big-measured")).ToHaveTextAsync("measured normal to the joint");
        await Assertions.Expect(contractor.Page.Locator(".big-tolerance")).ToContainTextAsync("tighter by at most");
        await Assertions.Expect(contractor.Page.Locator(".big-window")).ToContainTextAsync("window");
        await InOneThumbsReach(contractor.Page);
        await site.Picture(contractor.Page, "set-day", isForReadme: true);

        var value = double.Parse((await set.InnerTextAsync()).Replace(" mm", "", StringComparison.Ordinal), CultureInfo.InvariantCulture);
        await contractor.Page.FillAsync("#now", (value + 4).ToString(CultureInfo.InvariantCulture));
        await Assertions.Expect(contractor.Page.Locator(".do-now")).ToContainTextAsync("Close by 4 mm");
        foreach (var (point, more) in ((int, double)[])[(0, 0), (1, 0.5), (2, -0.5)])
            await contractor.Page.FillAsync($"#opening-{point}", (value + more).ToString(CultureInfo.InvariantCulture));
        await Assertions.Expect(contractor.Page.Locator(".record-form .finding")).ToHaveCountAsync(2);
        await NobodyIsShutOut(contractor);
        await contractor.Page.ClickAsync("button:has-text('Record what was set')");
        var record = contractor.Page.Locator("article.record");
        await Assertions.Expect(record.Locator(".record-head")).ToContainTextAsync("waits for acceptance");
        Assert.Equal(["left kerb", "axis", "right kerb"], await record.Locator("tbody th").AllInnerTextsAsync());
        await Assertions.Expect(record.Locator("button")).ToHaveCountAsync(0);
        var address = new Uri(contractor.Page.Url).AbsolutePath;

        await issued.Designer.Go(address);
        await issued.Designer.Page.ClickAsync("article.record button:has-text('Accept this record')");
        await Assertions.Expect(issued.Designer.Page.Locator(".record-head")).ToContainTextAsync("accepted");
        await AtTheHeadOfItsChain(address);
        await issued.Designer.Go(issued.Revision);
        await Assertions.Expect(issued.Designer.Page.Locator(".joints-to-set li").First).ToContainTextAsync("accepted");
        Assert.Empty(contractor.Troubles.Concat(issued.Designer.Troubles).Concat(issued.Owner.Troubles));
    }

    private static async Task EnterTheDay(IPage page)
    {
        await page.FillAsync("#t-slab", "13");
        await page.FillAsync("#t-girder", "11.5");
        await page.SelectOptionAsync("#method", "surface");
        await page.FillAsync("#age", "90");
    }

    /// <summary>The number is on the screen without scrolling, and everything to press is large enough for a thumb in a glove.</summary>
    private static async Task InOneThumbsReach(IPage page)
    {
        await page.EvaluateAsync("() => scrollTo(0, 0)");
        var lowest = await page.Locator(".big-window").EvaluateAsync<double>("e => e.getBoundingClientRect().bottom");
        Assert.True(lowest < Height, string.Create(CultureInfo.InvariantCulture, $"the number ends at {lowest} px"));
        var small = await page.EvaluateAsync<string[]>("""
            () => [...document.querySelectorAll('main button, main input:not([type=radio]), main select, main textarea, main summary, main a.button, main .direction label')]
              .filter(e => e.offsetParent && (e.getBoundingClientRect().height < 47.9 || e.getBoundingClientRect().width < 47.9)).map(e => e.outerHTML.slice(0, 120))
            """);
        Assert.Empty(small);
    }

    private async Task NobodyIsShutOut(Visitor visitor)
    {
        Assert.Empty(await visitor.Barriers());
        await visitor.Page.ClickAsync("button:has-text('Dark')");
        await Assertions.Expect(visitor.Page.Locator("html")).ToHaveAttributeAsync("data-theme", "dark");
        Assert.Empty(await visitor.Barriers());
        await site.Picture(visitor.Page, "set-day-dark");
        await visitor.Page.ClickAsync("button:has-text('Dark')");
        var overflow = await visitor.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
        Assert.True(overflow <= 0, string.Create(CultureInfo.InvariantCulture, $"the page is {overflow} px wider than the screen"));
    }

    private async Task AtTheHeadOfItsChain(string address)
    {
        var parts = address.Split('/');
        var (structure, joint) = (Guid.Parse(parts[2]), parts[4]);
        await using var services = site.Services.CreateAsyncScope();
        var owner = (await services.ServiceProvider.GetRequiredService<UserManager<Person>>().FindByNameAsync("owner"))!.Id;
        await using var archive = await ArchiveScope.Enter(services.ServiceProvider.GetRequiredService<IDbContextFactory<ArchiveContext>>(), owner);
        var record = await archive.SettingRecords().SingleAsync(r => r.StructureId == structure && r.Joint == joint);
        var acceptance = await archive.SettingAcceptances().SingleAsync(a => a.SettingRecordId == record.Id);
        Assert.Equal((1L, record.ComputeHash(), true), (record.Position, record.Hash, record.Holds));
        Assert.Equal((2L, record.Hash, null), (acceptance.Position, acceptance.PreviousHash, acceptance.Reason));
        Assert.Equal(90 * 86400.0, record.DeckAge);
        Assert.Equal("deck slab 13.0 °C × 0.550; girder webs, shaded side 11.5 °C × 0.450", record.TemperaturesRead);
        // 0.55 · 13 + 0.45 · 11.5 = 12.325
        Assert.All(record.Points, p => Assert.Equal(("normal to the joint", 12.325, "contact thermometer, shaded faces", 1.5), (p.Direction, Math.Round(p.Temperature, 9), p.Method, p.Uncertainty)));
        Assert.Equal(["left kerb", "axis", "right kerb"], record.Points.OrderBy(p => p.Ordinal).Select(p => p.Place));
    }
}
