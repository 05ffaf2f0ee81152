using System.CommandLine;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Comparing;

namespace JointPlanner.Cli.Comparing;

/// <summary><c>run-again FILE</c>: a stored package is computed again and compared with the results stored with it; nothing is written.</summary>
internal static class RunAgainCommand
{
    private static readonly JsonSerializerOptions Readable = new() { WriteIndented = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>The command with its options.</summary>
    public static Command Make()
    {
        var file = new Argument<string>("file") { Description = "A sheet (PDF), or its attachment calculation.json." };
        var results = new Option<string?>("--results") { Description = "The results beside a package; without it results.json in the same folder is taken. A sheet carries its own." };
        var profile = new Option<string?>("--profile") { Description = "Units shown: metric or us; without it those of the package." };
        profile.AcceptOnlyFromAmong([.. DisplayProfile.All.Select(p => p.Id)]);
        var json = new Option<bool>("--json") { Description = "Write for machines: SI." };
        var command = new Command("run-again",
            "Computes the package of a sheet again and says whether today's results are the stored ones. Exit code 0 where they are the same, or the same within rounding; 3 where not. " + ExitCodes.InWords)
        { file, results, profile, json };
        command.SetAction(parsed =>
        {
            var (output, error) = (parsed.InvocationConfiguration.Output, parsed.InvocationConfiguration.Error);
            try
            {
                var (package, stored) = StoredFiles.Read(parsed.GetRequiredValue(file), parsed.GetValue(results));
                var again = RunAgain.Of(package, stored);
                var shown = DisplayProfile.Of(parsed.GetValue(profile) ?? again.Stored.Package.Units);
                if (parsed.GetValue(json)) output.WriteLine(Json(again).ToJsonString(Readable));
                else
                    foreach (var line in DifferenceLines.Of(again, shown)) output.WriteLine(line);
                return again.IsSame ? ExitCodes.Done : ExitCodes.CannotBeIssued;
            }
            catch (InvalidDataException fault)
            {
                error.WriteLine(fault.Message);
                return ExitCodes.FaultyInput;
            }
        });
        return command;
    }

    private static JsonObject Json(RunAgain again) => new()
    {
        ["package"] = again.Stored.PackageHash,
        ["results"] = again.Stored.ResultsHash,
        ["same"] = again.IsSame,
        ["summary"] = again.Summary,
        ["compared"] = again.Differences?.Compared,
        ["within-rounding"] = again.Differences?.WithinRounding,
        ["differences"] = new JsonArray([
            .. (again.Differences?.Results ?? []).Select(d => new JsonObject { ["key"] = d.Key, ["quantity"] = d.Quantity.Id, ["stored"] = d.Before, ["today"] = d.After }),
        ]),
        ["notes"] = new JsonArray([.. again.Notes.Concat(again.Obstacles).Select(n => JsonValue.Create(n))]),
    };
}
