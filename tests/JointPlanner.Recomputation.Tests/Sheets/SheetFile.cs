using System.Diagnostics;
using System.Text;
using System.Text.Json.Nodes;

namespace JointPlanner.Recomputation.Tests.Sheets;

/// <summary>The sheet of a plan, made by the program run as its users run it.</summary>
internal static class SheetFile
{
    /// <summary>The PDF of a plan whose display is set to a profile.</summary>
    public static byte[] Of(string plan, string profile)
    {
        var folder = Directory.CreateTempSubdirectory("joint-planner-recomputed-").FullName;
        try
        {
            var text = JsonNode.Parse(File.ReadAllText(PlanFiles.PathOf(plan)))!;
            text["display"] = profile;
            var (copy, sheet) = (Path.Combine(folder, "plan.json"), Path.Combine(folder, "sheet.pdf"));
            File.WriteAllText(copy, text.ToJsonString());
            List<string> words = [PlanFiles.Program, "sheet", copy, "--out", sheet, "--date", "2026-05-31"];
            if ((string?)text["basis"]?["owner-rules"] is { } rules) words.AddRange(["--rules", Path.Combine(PlanFiles.Root, "seed-data", "owner-rules", rules + ".json")]);
            Run(plan, words);
            return File.ReadAllBytes(sheet);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    private static void Run(string plan, List<string> words)
    {
        var start = new ProcessStartInfo("dotnet", words) { RedirectStandardOutput = true, RedirectStandardError = true, StandardErrorEncoding = Encoding.UTF8 };
        using var process = Process.Start(start)!;
        var errors = process.StandardError.ReadToEndAsync();
        process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        // 0: may be issued, 3: made, but something stops issue.
        if (process.ExitCode is not (0 or 3)) throw new InvalidOperationException($"{plan}: exit code {process.ExitCode}. {errors.Result}");
    }
}
