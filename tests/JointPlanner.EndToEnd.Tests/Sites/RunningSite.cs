using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;

namespace JointPlanner.EndToEnd.Tests.Sites;

/// <summary>The whole site on a loopback port in demo mode, in this process.</summary>
public sealed class RunningSite(Chromium chromium) : WebApplicationFactory<Program>, IAsyncLifetime
{
    private readonly SiteFolder folder = new();
    private readonly List<Visitor> visitors = [];

    /// <summary>Folder of this installation's own files.</summary>
    public string Folder => folder.Path;

    public string Address => ClientOptions.BaseAddress.ToString().TrimEnd('/');

    public ValueTask InitializeAsync()
    {
        UseKestrel(0);
        StartServer();
        return ValueTask.CompletedTask;
    }

    /// <summary>A fresh browser profile, in which a demo person is signed in where one is named.</summary>
    public async Task<Visitor> Visit(string? account, int width = 1440, int height = 1000)
    {
        var visitor = await chromium.Visit(Address, width, height);
        lock (visitors) visitors.Add(visitor);
        if (account is not null) await visitor.Enter(account, Password(account));
        return visitor;
    }

    public override async ValueTask DisposeAsync()
    {
        // Guests leave before the house goes.
        foreach (var visitor in visitors) await visitor.Page.Context.CloseAsync();
        await base.DisposeAsync();
        folder.Dispose();
        GC.SuppressFinalize(this);
    }

    /// <summary>Key file of a demo signer; its password is the person's.</summary>
    public string KeyFile(string account) => folder.KeyFile(account);

    /// <summary>Password of a demo person.</summary>
    public string Password(string account) => folder.Password(account);

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Development");
        builder.UseSetting("Demo:Enabled", "true");
        // All browsers of a class come from one address.
        builder.UseSetting("Circuits:PerAddress", "500");
        builder.UseSetting("urls", "http://127.0.0.1:0");
        builder.UseSetting("Archive:Folder", folder.Path);
    }
}
