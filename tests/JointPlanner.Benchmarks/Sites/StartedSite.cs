using System.Diagnostics;
using System.Net;
using System.Net.Sockets;
using System.Text.Json;

namespace JointPlanner.Benchmarks.Sites;

/// <summary>The web program as its own process on a free loopback port, in demo mode with an empty archive that is deleted at the end.</summary>
internal sealed class StartedSite : IAsyncDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-site-").FullName;
    private readonly Stopwatch sinceStart = Stopwatch.StartNew();
    private readonly HttpClient client = new();
    private readonly Process process;

    public StartedSite()
    {
        Address = $"http://127.0.0.1:{FreePort()}";
        // The site beside this program: same configuration, same build.
        var web = Path.Combine(Path.GetDirectoryName(PlanFiles.Folder)!, "src", "JointPlanner.Web");
        var built = new DirectoryInfo(AppContext.BaseDirectory);
        var program = Path.Combine(web, "bin", built.Parent!.Name, built.Name, "JointPlanner.Web.dll");
        var start = new ProcessStartInfo("dotnet", [program]) { RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = web };
        start.Environment["ASPNETCORE_ENVIRONMENT"] = "Development";
        start.Environment["ASPNETCORE_URLS"] = Address;
        start.Environment["Demo__Enabled"] = "true";
        start.Environment["Archive__Folder"] = folder;
        process = Process.Start(start) ?? throw new InvalidOperationException("The web program did not start.");
        process.BeginOutputReadLine();
        process.BeginErrorReadLine();
    }

    public string Address { get; }

    /// <summary>Working set, in millions of bytes.</summary>
    public double Megabytes
    {
        get
        {
            process.Refresh();
            return process.WorkingSet64 / 1e6;
        }
    }

    public string Password(string account) =>
        JsonSerializer.Deserialize<Dictionary<string, string>>(File.ReadAllText(Path.Combine(folder, "demo-people.json")))![account];

    /// <summary>Milliseconds from the start of the process to the first page answered.</summary>
    public async Task<double> FirstPage()
    {
        while (!process.HasExited && sinceStart.Elapsed < TimeSpan.FromMinutes(1))
        {
            try
            {
                using var answer = await client.GetAsync(Address + "/account/enter");
                if (answer.IsSuccessStatusCode) return sinceStart.Elapsed.TotalMilliseconds;
            }
            catch (HttpRequestException)
            {
                await Task.Delay(5); // not listening yet
            }
        }
        throw new InvalidOperationException("The web program answered nothing.");
    }

    /// <summary>Median milliseconds of the health page.</summary>
    public async Task<double> HealthPage()
    {
        var taken = new List<double>();
        for (var i = 0; i < 100; i++)
        {
            var watch = Stopwatch.StartNew();
            using var answer = await client.GetAsync(Address + "/health");
            answer.EnsureSuccessStatusCode();
            taken.Add(watch.Elapsed.TotalMilliseconds);
        }
        return taken.Order().ElementAt(taken.Count / 2);
    }

    public async ValueTask DisposeAsync()
    {
        client.Dispose();
        if (!process.HasExited) process.Kill(entireProcessTree: true);
        await process.WaitForExitAsync();
        process.Dispose();
        Directory.Delete(folder, recursive: true);
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
