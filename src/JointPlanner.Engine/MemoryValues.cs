using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine;

/// <summary>Collects what a result rests on that is held from memory.</summary>
internal static class MemoryValues
{
    /// <summary>Every value from memory among the table steps and formulas used, the counted entries, the owner's rules and the limits used; each id once.</summary>
    public static ImmutableArray<Provenance> Of(
        IReadOnlyList<Step> steps, CountingTable counting, IReadOnlyList<JointResult> joints, OwnerRuleSet? rules)
    {
        var causes = joints.SelectMany(j => j.Movements).Select(m => m.Cause).ToHashSet();
        var tables = steps.Select(s => s.Origin).OfType<TableOrigin>().Select(o => o.Source);
        var formulas = steps.Select(s => s.Origin).OfType<FormulaOrigin>().Select(o => o.Formula.Source).DistinctBy(p => p.ValueId);
        var entries = counting.Entries.Where(e => causes.Contains(e.Key.Item1)).Select(e => e.Value.Source).OfType<Provenance>();
        var limits = joints.SelectMany(j => j.Fit?.Chosen?.Limits ?? []).Select(l => l.Source);
        var owners = rules is null ? [] : rules.Families.SelectMany(Sources).Append(rules.Source);
        return
        [
            .. tables.Concat(formulas).Concat(entries).Concat(limits).Concat(owners)
                .Where(p => p.Mark == Mark.Memory)
                .DistinctBy(p => (p.ValueId, p.Document, p.Place))
                .OrderBy(p => p.ValueId, StringComparer.Ordinal),
        ];
    }

    /// <summary>A family's own source and those of single figures: a size that fits rests on every figure that it was judged by.</summary>
    private static IEnumerable<Provenance> Sources(FamilyRules family) =>
        family.Notes.Values.Select(n => n.Source).OfType<Provenance>().Prepend(family.Source);
}
