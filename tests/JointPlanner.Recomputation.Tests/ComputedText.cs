using System.Diagnostics;
using System.Text;

namespace JointPlanner.Recomputation.Tests;

/// <summary>What the program prints, run as its users run it.</summary>
internal static class ComputedText
{
    /// <summary>Output of <c>compute PLAN --steps</c>.</summary>
    public static string Of(string plan, string profile)
    {
        var start = new ProcessStartInfo("dotnet", [PlanFiles.Program, "compute", PlanFiles.PathOf(plan), "--profile", profile, "--steps"])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardOutputEncoding = Encoding.UTF8,
            StandardErrorEncoding = Encoding.UTF8,
        };
        using var process = Process.Start(start)!;
        var errors = process.StandardError.ReadToEndAsync();
        var text = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        // 0: may be issued, 3: computed, but something stops issue.
        return process.ExitCode is 0 or 3 ? text : throw new InvalidOperationException($"{plan}: exit code {process.ExitCode}. {errors.Result}");
    }
}
