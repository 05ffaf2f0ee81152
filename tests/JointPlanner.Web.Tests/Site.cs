using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;

namespace JointPlanner.Web.Tests;

/// <summary>The whole site in this process, in demo mode, with a database of its own that goes with it.</summary>
public sealed class Site : WebApplicationFactory<Program>
{
    public string Folder { get; } = Directory.CreateTempSubdirectory("joint-planner-").FullName;

    public override async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        if (Directory.Exists(Folder)) Directory.Delete(Folder, recursive: true);
        GC.SuppressFinalize(this);
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Development");
        builder.UseSetting("Demo:Enabled", "true");
        builder.UseSetting("urls", "http://127.0.0.1:0");
        builder.UseSetting("Archive:Folder", Folder);
    }
}
