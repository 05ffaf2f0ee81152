using System.Diagnostics;
using System.Globalization;
using System.Net;
using System.Net.Sockets;

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>A PostgreSQL server of one's own on a free loopback port, which can be stopped and started; thrown away with everything in it.</summary>
public sealed class PostgresCluster : IAsyncDisposable
{
    private readonly string _folder;
    private readonly string _orElse;
    private readonly string _port = FreePort().ToString(CultureInfo.InvariantCulture);

    private PostgresCluster(string folder, string orElse) => (_folder, _orElse) = (folder, orElse);

    /// <summary>Connection string of a superuser.</summary>
    public string ConnectionString => $"Host=127.0.0.1;Port={_port};Username=postgres;Database=postgres";

    private string Data => Path.Combine(_folder, "data");

    private static bool IsRoot => Environment.UserName == "root";

    /// <param name="orElse">What else could be done where PostgreSQL is not installed, for the failure's sentence.</param>
    public static async Task<PostgresCluster> Make(string orElse = "")
    {
        var cluster = new PostgresCluster(Directory.CreateTempSubdirectory("joint-planner-postgres-").FullName, orElse);
        if (IsRoot) await cluster.Execute("chown", ["postgres", cluster._folder]);
        await cluster.Run("initdb", "-D", cluster.Data, "-U", "postgres", "-A", "trust", "-E", "UTF8", "--locale=C.UTF-8", "--no-sync", "--no-instructions");
        await cluster.Start();
        return cluster;
    }

    public Task Start() => Run(
        "pg_ctl", "-D", Data, "-l", Path.Combine(_folder, "log"), "-w", "-o",
        $"-c listen_addresses=127.0.0.1 -c port={_port} -c unix_socket_directories={_folder} -c fsync=off -c synchronous_commit=off -c full_page_writes=off -c max_connections=200",
        "start");

    /// <summary>Stops it as an operator would in a hurry: sessions are ended, what was committed stays.</summary>
    public Task Stop() => Run("pg_ctl", "-D", Data, "-m", "fast", "-w", "stop");

    public async ValueTask DisposeAsync()
    {
        if (File.Exists(Path.Combine(Data, "postmaster.pid"))) await Run("pg_ctl", "-D", Data, "-m", "immediate", "stop");
        Directory.Delete(_folder, recursive: true);
    }

    // initdb and postgres refuse root.
    private Task Run(string program, params string[] arguments) =>
        IsRoot ? Execute("runuser", ["-u", "postgres", "--", Binary(program), .. arguments]) : Execute(Binary(program), arguments);

    private async Task Execute(string program, string[] arguments)
    {
        // Through a shell that closes the streams: the server would inherit a pipe and keep it open.
        var start = new ProcessStartInfo("/bin/sh") { WorkingDirectory = _folder };
        foreach (var argument in (string[])["-c", "\"$@\" >/dev/null 2>&1 </dev/null", "sh", program, .. arguments]) start.ArgumentList.Add(argument);
        using var process = Process.Start(start)!;
        await process.WaitForExitAsync();
        if (process.ExitCode != 0) throw new InvalidOperationException($"{program} ended with {process.ExitCode}; PostgreSQL is needed for these tests {_orElse}.");
    }

    private string Binary(string name)
    {
        var versions = Directory.Exists("/usr/lib/postgresql") ? Directory.GetDirectories("/usr/lib/postgresql") : [];
        var found = versions.Order(StringComparer.Ordinal).Select(version => Path.Combine(version, "bin", name)).LastOrDefault(File.Exists);
        return found ?? throw new InvalidOperationException($"PostgreSQL's {name} is not installed: install the server package of Debian (postgresql) {_orElse}.");
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
