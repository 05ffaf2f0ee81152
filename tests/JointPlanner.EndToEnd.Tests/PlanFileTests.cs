using System.Diagnostics;
using JointPlanner.Exchange.Plans;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>Files that go in and out of the ledger through a real browser, and the ledger on paper.</summary>
public sealed class PlanFileTests(RunningSite site) : IClassFixture<RunningSite>, IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-e2e-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public async Task A_plan_file_is_opened_changed_looked_at_in_other_units_and_handed_out_as_typed()
    {
        const string typed = "138 ft 6 1/4 in";
        var given = PlanDocument.Parse(await File.ReadAllBytesAsync(Demo)).Document!.With("structure/name", "Sorrel Creek, from a file");
        var visitor = await site.Visit("designer");
        await visitor.Go("/structures/new");
        await visitor.Page.SetInputFilesAsync("#plan-file", Written("mine.json", given.ToUtf8()));
        await visitor.Page.ClickAsync("text=Begin with this plan");
        await Assertions.Expect(visitor.Page.Locator("h1")).ToHaveTextAsync("Sorrel Creek, from a file");
        await visitor.Page.WaitForSelectorAsync(".ledger-picture svg", new() { State = WaitForSelectorState.Attached });
        Assert.Equal(given.ToUtf8(), await HandedOut(visitor.Page));

        var station = visitor.Page.Locator("input[data-path='supports/p2/station']");
        await station.FillAsync(typed);
        await Assertions.Expect(visitor.Page.Locator("#f-supports-p2-station-says .understood")).ToHaveTextAsync("= 42.221 m");
        var before = await HandedOut(visitor.Page);
        await visitor.Page.ClickAsync("text=ft · in · °F");
        await Assertions.Expect(visitor.Page.Locator(".cell-set .fact-number").First).ToContainTextAsync(" in");
        await visitor.Page.ClickAsync("text=m · mm · °C");
        await Assertions.Expect(visitor.Page.Locator(".cell-set .fact-number").First).ToContainTextAsync(" mm");
        Assert.Equal(typed, await station.InputValueAsync());
        Assert.Equal(before, await HandedOut(visitor.Page));
        Assert.Equal(given.With("supports/p2/station", typed).ToUtf8(), before);
        Assert.Empty(visitor.Troubles);
    }

    [Fact]
    public async Task A_file_of_50_MB_is_refused_at_its_field_and_what_was_typed_beside_it_stays()
    {
        var visitor = await site.Visit("designer");
        await visitor.Go("/structures/new");
        await visitor.Page.FillAsync("#e-name", "Half typed");
        await visitor.Page.SetInputFilesAsync("#plan-file", Written("large.json", new byte[50 * 1024 * 1024]));
        var says = visitor.Page.Locator("#plan-file-says");
        await Assertions.Expect(says).ToContainTextAsync("large.json cannot be opened");
        await Assertions.Expect(says).ToContainTextAsync("“50 MiB”: The file is larger than 2 MiB; nothing of it was read. Allowed: up to 2 MiB. Check that this is the right file");
        Assert.Equal("Half typed", await visitor.Page.InputValueAsync("#e-name"));
        Assert.Empty(await visitor.Barriers());
        Assert.Empty(visitor.Troubles);
    }

    [Fact]
    public async Task A_fault_in_the_list_leads_to_its_field()
    {
        var visitor = await site.Visit("designer");
        await visitor.Open("Kestrel Lane Overbridge");
        var span = visitor.Page.Locator("input[data-path='joints/j1/setting/temperature-uncertainty']");
        await visitor.Page.Locator("[data-column='joints/j1'] summary:has-text('standard deviations')").ClickAsync();
        await span.FillAsync("90 K");
        await visitor.Page.Locator("[data-leads='joints/j1/setting/temperature-uncertainty']").ClickAsync();
        Assert.Equal("joints/j1/setting/temperature-uncertainty", await visitor.Page.EvaluateAsync<string>("document.activeElement.dataset.path"));
        await visitor.Page.Keyboard.PressAsync("Control+z");
        await Assertions.Expect(visitor.Page.Locator("[data-leads]")).ToHaveCountAsync(0);
    }

    [Fact]
    public async Task The_ledger_on_paper_holds_its_figures_and_nothing_to_press()
    {
        var visitor = await site.Visit("designer");
        await visitor.Open("Sorrel Creek Crossing");
        var pdf = Written("ledger.pdf", await visitor.Page.PdfAsync(new() { PreferCSSPageSize = true }));
        var text = await PlainText(pdf);
        Assert.Contains("Sorrel Creek Crossing", text, StringComparison.Ordinal);
        Assert.Contains(await visitor.Page.Locator(".cell-set .fact-number").First.InnerTextAsync(), text, StringComparison.Ordinal);
        Assert.Contains("EN 1991-1-5", text, StringComparison.Ordinal);
        foreach (var press in new[] { "Undo", "take out", "Save for all", "Save as CSV", "Unfold the causes", "Add support" }) Assert.DoesNotContain(press, text, StringComparison.Ordinal);
    }

    private static string Demo => Path.Combine(AppContext.BaseDirectory, "seed-data", "structures", "sorrel-creek-crossing.json");

    private static async Task<byte[]> HandedOut(IPage page)
    {
        var download = await page.RunAndWaitForDownloadAsync(() => page.ClickAsync("button:has-text('Plan file')"));
        return await File.ReadAllBytesAsync(await download.PathAsync());
    }

    private static async Task<string> PlainText(string pdf)
    {
        using var process = Process.Start(new ProcessStartInfo("pdftotext", ["-layout", pdf, "-"]) { RedirectStandardOutput = true })!;
        var text = await process.StandardOutput.ReadToEndAsync();
        await process.WaitForExitAsync();
        return text;
    }

    private string Written(string name, byte[] bytes)
    {
        var path = Path.Combine(folder, name);
        File.WriteAllBytes(path, bytes);
        return path;
    }
}
