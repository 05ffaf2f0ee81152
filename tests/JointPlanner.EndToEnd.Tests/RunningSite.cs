using System.Text.Json;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>The whole site on a loopback port in demo mode, with a browser beside it.</summary>
public sealed class RunningSite : WebApplicationFactory<Program>, IAsyncLifetime
{
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-e2e-").FullName;
    private IPlaywright? playwright;
    private IBrowser? browser;

    /// <summary>Folder of this installation's own files.</summary>
    public string Folder => folder;

    public string Address => ClientOptions.BaseAddress.ToString().TrimEnd('/');

    public async ValueTask InitializeAsync()
    {
        UseKestrel(0);
        StartServer();
        playwright = await Playwright.CreateAsync();
        browser = await playwright.Chromium.LaunchAsync(new()
        {
            ExecutablePath = Environment.GetEnvironmentVariable("CHROMIUM_PATH") ?? "/usr/bin/chromium",
            Headless = true,
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
        });
    }

    /// <summary>A fresh browser profile in which a demo person is signed in.</summary>
    public async Task<Visitor> Visit(string? account, int width = 1440, int height = 1000)
    {
        var context = await browser!.NewContextAsync(new() { BaseURL = Address, ViewportSize = new() { Width = width, Height = height }, ReducedMotion = ReducedMotion.Reduce });
        var visitor = new Visitor(await context.NewPageAsync(), Address);
        if (account is not null) await visitor.Enter(account, Password(account));
        return visitor;
    }

    public override async ValueTask DisposeAsync()
    {
        if (browser is not null) await browser.DisposeAsync();
        playwright?.Dispose();
        await base.DisposeAsync();
        if (Directory.Exists(folder)) Directory.Delete(folder, recursive: true);
        GC.SuppressFinalize(this);
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Development");
        builder.UseSetting("Demo:Enabled", "true");
        builder.UseSetting("urls", "http://127.0.0.1:0");
        builder.UseSetting("Archive:Folder", folder);
    }

    /// <summary>Key file of a demo signer; its password is the person's.</summary>
    public string KeyFile(string account) => Path.Combine(folder, $"demo-{account}.pfx");

    /// <summary>Password of a demo person.</summary>
    public string Password(string account) =>
        JsonSerializer.Deserialize<Dictionary<string, string>>(File.ReadAllText(Path.Combine(folder, "demo-people.json")))![account];
}
