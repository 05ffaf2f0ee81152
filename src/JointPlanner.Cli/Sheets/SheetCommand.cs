using System.CommandLine;
using System.Globalization;
using JointPlanner.Cli.Compute;
using JointPlanner.Exchange.Packages;
using JointPlanner.Issuing;

namespace JointPlanner.Cli.Sheets;

/// <summary><c>sheet PLAN --out FILE</c>: the calculation sheet as PDF, preliminary, with its package and results attached.</summary>
internal static class SheetCommand
{
    /// <summary>The command with its options.</summary>
    public static Command Make()
    {
        var plan = new Argument<string>("plan") { Description = "Plan file (joint-plan/1)." };
        var rules = new Option<string?>("--rules") { Description = "File of the owner's rules; without it the set that the plan names is looked for." };
        var output = new Option<string>("--out") { Description = "PDF file to write; one that exists is not replaced.", Required = true };
        var revision = new Option<string>("--revision") { Description = "Revision as printed.", DefaultValueFactory = _ => "draft" };
        var date = new Option<string>("--date") { Description = "Date of the sheet, as 2026-05-31. The same inputs and date give the same bytes.", Required = true };
        var letter = new Option<bool>("--letter") { Description = "Letter paper instead of A4." };
        var command = new Command("sheet", "Writes the calculation sheet of a plan, marked PRELIMINARY. " + ExitCodes.InWords) { plan, rules, output, revision, date, letter };
        command.SetAction(parsed =>
        {
            var error = parsed.InvocationConfiguration.Error;
            if (!DateOnly.TryParseExact(parsed.GetValue(date), "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var day))
            {
                error.WriteLine($"--date {parsed.GetValue(date)}: not a day. Allowed: a day as 2026-05-31.");
                return ExitCodes.WrongUsage;
            }
            var read = PlanFile.Read(parsed.GetRequiredValue(plan), parsed.GetValue(rules));
            foreach (var file in read.Faults.GroupBy(f => f.File))
                foreach (var line in FaultText.Lines(file.Key, file.Select(f => f.Fault))) error.WriteLine(line);
            if (read.IsFaulty) return ExitCodes.FaultyInput;
            var frozen = FrozenCalculation.Of(read.Calculation!, [], new SheetTitle
            {
                Revision = parsed.GetRequiredValue(revision),
                Date = new DateTimeOffset(day, TimeOnly.MinValue, TimeSpan.Zero),
                IsPreliminary = true,
                Letter = parsed.GetValue(letter),
            });
            return NewFile.Write(parsed.GetRequiredValue(output), frozen.Sheet.Bytes, error) is { } refused
                ? refused
                : Told(parsed.InvocationConfiguration.Output, frozen, parsed.GetRequiredValue(output), read.Calculation!.Result!.CanBeIssued);
        });
        return command;
    }

    private static int Told(TextWriter output, FrozenCalculation frozen, string file, bool canBeIssued)
    {
        output.WriteLine(FormattableString.Invariant($"{file}: {frozen.Sheet.PageCount} pages"));
        output.WriteLine($"sheet SHA-256   {ContentHash.Of(frozen.Sheet.Bytes)}");
        output.WriteLine($"package SHA-256 {ContentHash.Of(frozen.Package)}");
        output.WriteLine($"results SHA-256 {ContentHash.Of(frozen.Results)}");
        return canBeIssued ? ExitCodes.Done : ExitCodes.CannotBeIssued;
    }
}
