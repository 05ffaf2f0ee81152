using System.Diagnostics;
using System.Globalization;
using System.Net;
using System.Net.Sockets;
using JointPlanner.Archive.Tests.Databases;
using Npgsql;

[assembly: AssemblyFixture(typeof(ThrowawayPostgres))]

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>
/// One PostgreSQL server for the whole test run: the one that JOINTPLANNER_TEST_POSTGRES names (a superuser's connection string), else one started here on a
/// free loopback port and thrown away. Where neither is to be had the tests fail; they are never skipped.
/// </summary>
public sealed class ThrowawayPostgres : IAsyncLifetime
{
    private const string Variable = "JOINTPLANNER_TEST_POSTGRES";
    private string? _folder;

    /// <summary>Connection string of a superuser.</summary>
    public static string Server { get; private set; } = "";

    public async ValueTask InitializeAsync()
    {
        Server = Environment.GetEnvironmentVariable(Variable) ?? await Start();
        await using var connection = new NpgsqlConnection(Server);
        await connection.OpenAsync();
    }

    public async ValueTask DisposeAsync()
    {
        await TestDatabase.ForgetTemplates();
        NpgsqlConnection.ClearAllPools();
        if (_folder is null) return;
        await Run(Binary("pg_ctl"), "-D", Path.Combine(_folder, "data"), "-m", "immediate", "stop");
        Directory.Delete(_folder, recursive: true);
    }

    private async Task<string> Start()
    {
        _folder = Directory.CreateTempSubdirectory("joint-planner-postgres-").FullName;
        if (IsRoot) await Execute("chown", ["postgres", _folder]);
        var data = Path.Combine(_folder, "data");
        await Run(Binary("initdb"), "-D", data, "-U", "postgres", "-A", "trust", "-E", "UTF8", "--locale=C.UTF-8", "--no-sync", "--no-instructions");
        var port = FreePort().ToString(CultureInfo.InvariantCulture);
        var options = $"-c listen_addresses=127.0.0.1 -c port={port} -c unix_socket_directories={_folder} -c fsync=off -c synchronous_commit=off -c full_page_writes=off -c max_connections=200";
        await Run(Binary("pg_ctl"), "-D", data, "-l", Path.Combine(_folder, "log"), "-w", "-o", options, "start");
        return $"Host=127.0.0.1;Port={port};Username=postgres;Database=postgres";
    }

    private static bool IsRoot => Environment.UserName == "root";

    // initdb and postgres refuse root.
    private Task Run(string program, params string[] arguments) =>
        IsRoot ? Execute("runuser", ["-u", "postgres", "--", program, .. arguments]) : Execute(program, arguments);

    private async Task Execute(string program, string[] arguments)
    {
        // Through a shell that closes the streams: the server would inherit a pipe and keep it open.
        var start = new ProcessStartInfo("/bin/sh") { WorkingDirectory = _folder! };
        foreach (var argument in (string[])["-c", "\"$@\" >/dev/null 2>&1 </dev/null", "sh", program, .. arguments]) start.ArgumentList.Add(argument);
        using var process = Process.Start(start)!;
        await process.WaitForExitAsync();
        if (process.ExitCode != 0) throw new InvalidOperationException($"{program} ended with {process.ExitCode}; PostgreSQL is needed for these tests (or {Variable}).");
    }

    private static string Binary(string name)
    {
        var versions = Directory.Exists("/usr/lib/postgresql") ? Directory.GetDirectories("/usr/lib/postgresql") : [];
        var found = versions.Order(StringComparer.Ordinal).Select(version => Path.Combine(version, "bin", name)).LastOrDefault(File.Exists);
        return found ?? throw new InvalidOperationException($"PostgreSQL's {name} is not installed: install the server package of Debian (postgresql) or set {Variable}.");
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
