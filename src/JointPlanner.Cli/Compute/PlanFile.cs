using JointPlanner.Codes;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Cli.Compute;

/// <summary>A plan and the owner's rules that it names, read from files.</summary>
/// <param name="Path">The plan's file.</param>
/// <param name="Reading">What the plan says.</param>
/// <param name="RulesPath">File of the owner's rules; empty where the plan names none.</param>
/// <param name="Rules">The rules; null for none or where they are at fault.</param>
/// <param name="Faults">Faults and warnings by the file they stand in.</param>
internal sealed record PlanFile(
    string Path, PlanReading? Reading, string RulesPath, OwnerRuleSet? Rules, IReadOnlyList<(string File, Fault Fault)> Faults)
{
    /// <summary>True where nothing can be computed.</summary>
    public bool IsFaulty => Faults.Any(f => !f.Fault.IsWarning);

    /// <summary>Reads a plan and its rules.</summary>
    /// <param name="path">The plan.</param>
    /// <param name="rules">File of the owner's rules; null to look for the set that the plan names.</param>
    public static PlanFile Read(string path, string? rules)
    {
        if (!File.Exists(path)) return new(path, null, "", null, [(path, Missing("plan-file-missing", "", path, "A plan file."))]);
        using var stream = File.OpenRead(path);
        var reading = new PlanReader(new KnownWords { Bases = Catalogue.All }).Read(stream);
        var faults = reading.Faults.Select(f => (path, f)).ToList();
        if (reading.Plan is not { } plan) return new(path, reading, "", null, faults);

        var named = plan.Basis.OwnerRules;
        if (rules is null && named.Length == 0) return new(path, reading, "", null, faults);
        var places = rules is null ? PlacesOf(path, named) : [rules];
        if (places.FirstOrDefault(File.Exists) is not { } found)
        {
            faults.Add((path, Missing("owner-rules-missing", "basis/owner-rules", rules ?? named, $"A rule set in one of: {string.Join(", ", places)}.")));
            return new(path, reading, "", null, faults);
        }
        using var ruleStream = File.OpenRead(found);
        var read = OwnerRulesReader.Read(ruleStream);
        faults.AddRange(read.Faults.Select(f => (found, f)));
        if (read.Rules is { } set && named.Length > 0 && set.Id != named)
            faults.Add((path, new("owner-rules-other", "basis/owner-rules", named, $"The file {found} holds the rule set {set.Id}.", $"The rule set {named}.",
                "Name the set in the plan that you want, or give the file that holds it.")));
        return new(path, reading, found, read.Rules, faults);
    }

    private static string[] PlacesOf(string plan, string id)
    {
        var beside = System.IO.Path.GetDirectoryName(System.IO.Path.GetFullPath(plan)) ?? ".";
        return
        [
            .. new[] { System.IO.Path.Combine(beside, "owner-rules"), System.IO.Path.Combine(beside, "..", "owner-rules"), System.IO.Path.Combine("seed-data", "owner-rules") }
                .Select(folder => System.IO.Path.GetFullPath(System.IO.Path.Combine(folder, System.IO.Path.GetFileName(id) + ".json"))),
        ];
    }

    private static Fault Missing(string id, string field, string value, string allowed) =>
        new(id, field, value, "There is no such file.", allowed, "Check the name; give the owner's rules by --rules where they lie elsewhere.");
}
