using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;

namespace JointPlanner.Web.Tests;

/// <summary>The site as it is set up for real work: Production, nobody in it yet.</summary>
public sealed class RealSite : WebApplicationFactory<Program>
{
    public string Folder { get; } = Directory.CreateTempSubdirectory("joint-planner-real-").FullName;

    public override async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        if (Directory.Exists(Folder)) Directory.Delete(Folder, recursive: true);
        GC.SuppressFinalize(this);
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Production");
        builder.UseSetting("urls", "https://127.0.0.1:0");
        builder.UseSetting("PublicAddress", "https://joints.example");
        builder.UseSetting("Keys:ProtectedByDatabase", "true");
        builder.UseSetting("Archive:Folder", Folder);
    }
}
