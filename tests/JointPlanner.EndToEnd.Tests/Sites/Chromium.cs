using Microsoft.Playwright;

[assembly: AssemblyFixture(typeof(Chromium))]

namespace JointPlanner.EndToEnd.Tests.Sites;

/// <summary>One browser for the whole run; every visitor has a profile of their own in it.</summary>
public sealed class Chromium : IAsyncLifetime
{
    private IPlaywright? playwright;
    private IBrowser? browser;

    public async ValueTask InitializeAsync()
    {
        // Generous: a busy machine is slow, not wrong.
        Assertions.SetDefaultExpectTimeout(20_000);
        playwright = await Playwright.CreateAsync();
        browser = await playwright.Chromium.LaunchAsync(new()
        {
            ExecutablePath = Environment.GetEnvironmentVariable("CHROMIUM_PATH") ?? "/usr/bin/chromium",
            Headless = true,
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
        });
    }

    /// <summary>A fresh browser profile before the site at an address.</summary>
    public async Task<Visitor> Visit(string address, int width = 1440, int height = 1000)
    {
        var context = await browser!.NewContextAsync(new() { BaseURL = address, ViewportSize = new() { Width = width, Height = height }, ReducedMotion = ReducedMotion.Reduce });
        return new Visitor(await context.NewPageAsync(), address);
    }

    public async ValueTask DisposeAsync()
    {
        if (browser is not null) await browser.DisposeAsync();
        playwright?.Dispose();
    }
}
