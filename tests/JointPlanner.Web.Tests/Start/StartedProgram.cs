using System.Diagnostics;

namespace JointPlanner.Web.Tests.Start;

/// <summary>The program as it is started for real work: a process of its own, in Production.</summary>
internal static class StartedProgram
{
    /// <summary>What it said, and with what it ended; null while it still runs because it has started (it is then stopped).</summary>
    public static async Task<(int? ExitCode, string Says)> Run(string folder, params (string Name, string Value)[] settings)
    {
        var start = new ProcessStartInfo("dotnet", ["JointPlanner.Web.dll", "--contentRoot", folder])
        {
            WorkingDirectory = AppContext.BaseDirectory,
            RedirectStandardError = true,
            RedirectStandardOutput = true,
        };
        (string, string)[] sound =
        [
            ("ASPNETCORE_ENVIRONMENT", "Production"), ("DOTNET_ENVIRONMENT", "Production"), ("Archive__Folder", folder), ("PublicAddress", "https://joints.example"),
            ("Keys__ProtectedByDatabase", "true"), ("ASPNETCORE_URLS", "http://127.0.0.1:0"), ("Proxies__Trusted__0", "127.0.0.1"),
        ];
        foreach (var (name, value) in sound.Concat(settings)) start.Environment[name] = value;
        using var program = Process.Start(start)!;
        var errors = program.StandardError.ReadToEndAsync();
        while (await program.StandardOutput.ReadLineAsync() is { } line)
        {
            if (!line.Contains("Application started", StringComparison.Ordinal)) continue;
            program.Kill();
            await program.WaitForExitAsync();
            return (null, await errors);
        }

        await program.WaitForExitAsync();
        return (program.ExitCode, await errors);
    }
}
