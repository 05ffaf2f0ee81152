using System.CommandLine;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;
using JointPlanner.Engine;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary><c>compute PLAN</c>: a plan file becomes movements, joint choice and setting tables.</summary>
internal static class ComputeCommand
{
    private static readonly JsonSerializerOptions Readable = new() { WriteIndented = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>The command with its options.</summary>
    public static Command Make()
    {
        var plan = new Argument<string>("plan") { Description = "Plan file (joint-plan/1)." };
        var rules = new Option<string?>("--rules") { Description = "File of the owner's rules; without it the set that the plan names is looked for in owner-rules beside the plan or one folder up." };
        var profile = new Option<string?>("--profile") { Description = "Units shown: metric or us; without it those of the plan." };
        profile.AcceptOnlyFromAmong([.. DisplayProfile.All.Select(p => p.Id)]);
        var steps = new Option<bool>("--steps") { Description = "Print every step, so that it can be computed again from the text." };
        var json = new Option<bool>("--json") { Description = "Write for machines: results by key in SI, findings, faults." };
        var command = new Command("compute", "Computes a plan. " + ExitCodes.InWords) { plan, rules, profile, steps, json };
        command.SetAction(parsed =>
        {
            var output = parsed.InvocationConfiguration.Output;
            var read = PlanFile.Read(parsed.GetRequiredValue(plan), parsed.GetValue(rules));
            return parsed.GetValue(json)
                ? ForMachines(read, ProfileOf(read, parsed.GetValue(profile)), output)
                : ForPeople(read, ProfileOf(read, parsed.GetValue(profile)), parsed.GetValue(steps), output, parsed.InvocationConfiguration.Error);
        });
        return command;
    }

    private static int ForPeople(PlanFile read, DisplayProfile profile, bool withSteps, TextWriter output, TextWriter error)
    {
        foreach (var file in read.Faults.GroupBy(f => f.File))
            foreach (var line in FaultText.Lines(file.Key, file.Select(f => f.Fault))) error.WriteLine(line);
        if (read.IsFaulty || read.Calculation is not { Result: { } result } calculation) return ExitCodes.FaultyInput;
        foreach (var line in new ResultText(calculation, profile).Lines()) output.WriteLine(line);
        if (withSteps)
        {
            output.WriteLine();
            output.WriteLine("Model, as solved");
            foreach (var line in ModelText.Lines(result, profile)) output.WriteLine(line);
            output.WriteLine();
            output.WriteLine("Steps");
            foreach (var line in new StepPrinter(result.Steps, profile).All.SelectMany(StepText.Lines)) output.WriteLine(line);
        }
        return ExitOf(result);
    }

    private static int ForMachines(PlanFile read, DisplayProfile profile, TextWriter output)
    {
        var result = read.IsFaulty ? null : read.Calculation?.Result;
        var document = result is null ? [] : ResultJson.Of(read.Calculation!, profile);
        document["faults"] = FaultJson.Of(read.Faults);
        output.WriteLine(document.ToJsonString(Readable));
        return result is null ? ExitCodes.FaultyInput : ExitOf(result);
    }

    private static int ExitOf(Result result) => result.CanBeIssued ? ExitCodes.Done : ExitCodes.CannotBeIssued;

    private static DisplayProfile ProfileOf(PlanFile read, string? asked) =>
        asked is null ? read.Calculation?.Profile ?? DisplayProfile.Metric : DisplayProfile.Of(asked);
}
