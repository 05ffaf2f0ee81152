using System.Diagnostics;
using System.Globalization;
using System.Net;
using System.Net.Sockets;
using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.EndToEnd.Tests.Sites;

/// <summary>The site as a process of its own, which can be killed and started again on the same port and archive.</summary>
public sealed class SiteProcess(Chromium chromium) : IAsyncDisposable
{
    private readonly SiteFolder folder = new();
    private readonly string port = FreePort().ToString(CultureInfo.InvariantCulture);
    private readonly List<string> said = [];
    private Process? process;

    public string Address => $"http://127.0.0.1:{port}";

    /// <summary>Further settings, as environment variables.</summary>
    public IReadOnlyDictionary<string, string> Settings { get; init; } = new Dictionary<string, string>();

    /// <summary>Starts the program and waits until it answers.</summary>
    public async Task Start()
    {
        var start = new ProcessStartInfo("dotnet") { WorkingDirectory = AppContext.BaseDirectory, RedirectStandardOutput = true, RedirectStandardError = true };
        foreach (var argument in (string[])["exec", Path.Combine(AppContext.BaseDirectory, "JointPlanner.Web.dll")]) start.ArgumentList.Add(argument);
        foreach (var (name, value) in new Dictionary<string, string>(Settings)
        {
            ["ASPNETCORE_ENVIRONMENT"] = "Development",
            ["ASPNETCORE_URLS"] = Address,
            ["Demo__Enabled"] = "true",
            ["Archive__Folder"] = folder.Path,
        }) start.Environment[name] = value;
        process = Process.Start(start)!;
        process.OutputDataReceived += Note;
        process.ErrorDataReceived += Note;
        process.BeginOutputReadLine();
        process.BeginErrorReadLine();
        await Answering();
    }

    /// <summary>Ends it as a power cut would: nothing is asked, nothing is written.</summary>
    public async Task Kill()
    {
        process!.Kill();
        await process.WaitForExitAsync();
        process.Dispose();
        process = null;
    }

    /// <summary>Makes the demo's checker a designer too. The site is not running meanwhile: the archive on one file has one user.</summary>
    public async Task MakeCheckerDesigner()
    {
        await using var archive = new SqliteArchive(Path.Combine(folder.Path, "archive.db"));
        await using var rooms = new ServiceCollection().AddArchive(archive).BuildServiceProvider();
        var contexts = rooms.GetRequiredService<IDbContextFactory<ArchiveContext>>();
        await using var context = await contexts.CreateDbContextAsync();
        var person = await context.Users.SingleAsync(p => p.UserName == "checker");
        var administrator = await context.Users.FirstAsync(p => p.Administrator);
        await using var scope = await ArchiveScope.Enter(contexts, administrator.Id);
        var organisation = await scope.Organisations().SingleAsync();
        await rooms.GetRequiredService<OrganisationRegister>().SetRoles(ActCall.AtConsole(administrator.Id, TimeProvider.System.GetUtcNow()), organisation.Id, person.Id, [Role.Checker, Role.Designer]);
    }

    /// <summary>A fresh browser profile in which a demo person is signed in.</summary>
    public async Task<Visitor> Visit(string account)
    {
        var visitor = await chromium.Visit(Address);
        await visitor.Enter(account, folder.Password(account));
        return visitor;
    }

    public async ValueTask DisposeAsync()
    {
        if (process is not null) await Kill();
        folder.Dispose();
    }

    private async Task Answering()
    {
        using var http = new HttpClient { BaseAddress = new Uri(Address) };
        using var patience = new CancellationTokenSource(TimeSpan.FromSeconds(60));
        while (true)
        {
            if (process!.HasExited) throw new InvalidOperationException($"The site ended with {process.ExitCode}:\n{string.Join('\n', said)}");
            try
            {
                using var answer = await http.GetAsync("/health", patience.Token);
                if (answer.IsSuccessStatusCode) return;
            }
            catch (HttpRequestException)
            {
                // Not listening yet.
            }

            await Task.WhenAny(process.WaitForExitAsync(patience.Token), Task.Delay(100, patience.Token));
        }
    }

    private void Note(object sender, DataReceivedEventArgs line)
    {
        lock (said) said.Add(line.Data ?? "");
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
