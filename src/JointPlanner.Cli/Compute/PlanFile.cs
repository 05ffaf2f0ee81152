using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;

namespace JointPlanner.Cli.Compute;

/// <summary>A plan and the owner's rules that it names, read from files and computed.</summary>
/// <param name="Calculation">The calculation; null where the file is no document.</param>
/// <param name="Faults">Faults and warnings with the file they stand in.</param>
internal sealed record PlanFile(Calculation? Calculation, IReadOnlyList<(string File, Fault Fault)> Faults)
{
    private const string RulesField = "basis/owner-rules";

    /// <summary>True where nothing was computed.</summary>
    public bool IsFaulty => Calculation?.Result is null || Faults.Any(f => !f.Fault.IsWarning);

    /// <summary>Reads a plan and its rules.</summary>
    /// <param name="path">The plan.</param>
    /// <param name="rules">File of the owner's rules; null to look for the set that the plan names.</param>
    public static PlanFile Read(string path, string? rules)
    {
        if (!File.Exists(path)) return new(null, [(path, Missing("file.plan-missing", "", path, "a plan file"))]);
        using var stream = File.OpenRead(path);
        var (document, unreadable) = PlanDocument.Parse(stream);
        if (document is null) return new(null, [.. unreadable.Select(f => (path, f))]);

        var named = document.TextAt(RulesField) ?? "";
        if (rules is null && named.Length == 0) return Of(Calculation.Of(document, OwnerRuleShelf.Empty), path, [], "");
        var places = rules is null ? PlacesOf(path, named) : [rules];
        if (places.FirstOrDefault(File.Exists) is not { } found)
            return Of(Calculation.Of(document, OwnerRuleShelf.Empty), path,
                [(path, Missing("file.owner-rules-missing", RulesField, rules ?? named, $"a rule-set file at {string.Join(" or ", places)}"))], RulesField);
        using var ruleStream = File.OpenRead(found);
        var reading = OwnerRulesReader.Read(ruleStream);
        // A set that cannot be read is told once, where it is wrong; that the plan's word for it is then unknown says nothing more.
        return Of(Calculation.Of(document, new OwnerRuleShelf([reading])), path,
            [.. reading.Faults.Select(f => (found, f))], reading.Rules is null ? RulesField : "");
    }

    private static PlanFile Of(Calculation calculation, string path, IReadOnlyList<(string, Fault)> others, string told) =>
        new(calculation, [.. calculation.Reading.Faults.Where(f => told.Length == 0 || f.Path != told).Select(f => (path, f)), .. others]);

    private static string[] PlacesOf(string plan, string id)
    {
        var beside = Path.GetDirectoryName(Path.GetFullPath(plan)) ?? ".";
        string[] folders = [Path.Combine(beside, "owner-rules"), Path.Combine(beside, "..", "owner-rules"), Path.Combine("seed-data", "owner-rules")];
        return [.. folders.Select(folder => Path.GetFullPath(Path.Combine(folder, Path.GetFileName(id) + ".json")))];
    }

    private static Fault Missing(string id, string field, string value, string allowed) =>
        new(id, field, value, "There is no such file.", $"Allowed: {allowed}.", "Check the name; give the owner's rules by --rules where they lie elsewhere.");
}
