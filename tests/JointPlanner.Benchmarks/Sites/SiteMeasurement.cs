using System.Diagnostics;
using System.Globalization;
using Microsoft.Playwright;

namespace JointPlanner.Benchmarks.Sites;

/// <summary>The running site as a person feels it, on loopback with an empty archive: start, memory, and a key typed in the ledger.</summary>
public static class SiteMeasurement
{
    private const int Starts = 3;
    private const int Keys = 30;

    /// <summary>Measures and prints a table. Reference: the health page asked over the same loopback.</summary>
    public static async Task Print(TextWriter to)
    {
        var starts = new List<double>();
        for (var i = 1; i < Starts; i++)
        {
            await using var fresh = new StartedSite();
            starts.Add(await fresh.FirstPage());
        }
        await using var site = new StartedSite();
        starts.Add(await site.FirstPage());
        await Task.Delay(TimeSpan.FromSeconds(5));
        var idle = site.Megabytes;
        var reference = await site.HealthPage();
        var (page, keys) = await Keystrokes(site);

        Line(to, "what", "median", "ratio", "aim");
        Line(to, "reference: health page, ms", Shown(reference), "1", "");
        Line(to, "first page after start, empty archive, ms", Shown(Median(starts)), Ratio(Median(starts), reference), "3000");
        Line(to, "memory of the idle server, MB", Shown(idle), "", "300");
        Line(to, "ledger opened in the browser, ms", Shown(page), Ratio(page, reference), "");
        Line(to, "key typed to new results on screen, ms", Shown(Median(keys)), Ratio(Median(keys), reference), "100");
        Line(to, "the slowest of them, ms", Shown(keys.Max()), Ratio(keys.Max(), reference), "");
    }

    /// <summary>Types the end of the deck over and over; a key counts until the ledger shows other numbers.</summary>
    private static async Task<(double Page, List<double> Keys)> Keystrokes(StartedSite site)
    {
        using var playwright = await Playwright.CreateAsync();
        await using var browser = await playwright.Chromium.LaunchAsync(new()
        {
            ExecutablePath = Environment.GetEnvironmentVariable("CHROMIUM_PATH") ?? "/usr/bin/chromium",
            Headless = true,
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
        });
        var page = await browser.NewPageAsync(new() { ViewportSize = new() { Width = 1440, Height = 1000 } });
        await page.GotoAsync(site.Address + "/account/enter");
        await page.FillAsync("#account", "designer");
        await page.FillAsync("#password", site.Password("designer"));
        await page.ClickAsync("main button[type=submit]");
        await page.WaitForSelectorAsync("[data-interactive=true]");
        var watch = Stopwatch.StartNew();
        await page.ClickAsync("text=Sorrel Creek Crossing");
        await page.WaitForSelectorAsync(".ledger-picture svg", new() { State = WaitForSelectorState.Attached });
        var opened = watch.Elapsed.TotalMilliseconds;
        await page.WaitForSelectorAsync("[data-interactive=true]");
        await page.EvaluateAsync(await File.ReadAllTextAsync(Path.Combine(AppContext.BaseDirectory, "Sites", "keystroke.js")));
        var keys = new List<double>();
        for (var i = 0; i < Keys; i++)
            keys.Add(await page.EvaluateAsync<double>("text => window.typed(text)", i % 2 == 0 ? "138.7 m" : "138.8 m"));
        return (opened, keys);
    }

    private static void Line(TextWriter to, string what, string median, string ratio, string aim) =>
        to.WriteLine($"| {what,-44} | {median,8} | {ratio,8} | {aim,6} |");

    private static string Shown(double value) => value.ToString("0.0", CultureInfo.InvariantCulture);

    private static string Ratio(double value, double reference) => (value / reference).ToString("0.0", CultureInfo.InvariantCulture);

    private static double Median(List<double> values)
    {
        var sorted = values.Order().ToList();
        return sorted.Count % 2 == 1 ? sorted[sorted.Count / 2] : (sorted[(sorted.Count / 2) - 1] + sorted[sorted.Count / 2]) / 2;
    }
}
