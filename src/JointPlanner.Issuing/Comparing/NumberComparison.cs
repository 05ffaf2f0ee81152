using System.Collections.Immutable;
using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Comparing;

/// <summary>Compares the numbers of two stored results and counts them.</summary>
/// <param name="computed">What the later package computes to; null where it cannot be computed here.</param>
internal sealed class NumberComparison(Result? computed)
{
    private readonly Tolerances tolerances = Tolerances.Of(computed);
    private readonly IReadOnlyDictionary<string, Step> steps = computed?.ByKey() ?? new Dictionary<string, Step>();

    public int Compared { get; private set; }

    public int WithinRounding { get; private set; }

    public ImmutableArray<ResultDifference> Results(StoredResults before, StoredResults after)
    {
        var (then, now) = (before.Values.ToDictionary(v => v.Key), after.Values.ToDictionary(v => v.Key));
        return
        [
            .. now.Keys.Union(then.Keys).Select(key => (Before: then.GetValueOrDefault(key), After: now.GetValueOrDefault(key)))
                .Where(p => p.Before is null || p.After is null || Differ(tolerances.Compare(p.After.Key, p.Before.Value, p.After.Value)))
                .Select(p => Difference(p.Before, p.After)),
            .. OfJoints(before, after),
        ];
    }

    public ImmutableArray<TableDifference> Tables(StoredResults before, StoredResults after)
    {
        var (then, now) = (ByMethod(before), ByMethod(after));
        return [.. now.Keys.Union(then.Keys).Select(k => Table(k.Joint, k.Method, then.GetValueOrDefault(k), now.GetValueOrDefault(k))).Where(d => d.Differing > 0)];
    }

    public static ImmutableArray<FindingDifference> Findings(StoredResults before, StoredResults after)
    {
        var gone = before.Findings.ToList();
        var differences = new List<FindingDifference>();
        foreach (var finding in after.Findings)
        {
            var was = gone.Find(f => SameSentence(f, finding) && SameNumbers(f, finding)) ?? gone.Find(f => SameSentence(f, finding)) ?? gone.Find(f => f.Id == finding.Id && f.Path == finding.Path);
            if (was is not null) gone.Remove(was);
            if (was is null || !SameSentence(was, finding) || !SameNumbers(was, finding)) differences.Add(new(was, finding));
        }

        return [.. differences, .. gone.Select(f => new FindingDifference(f, null))];
    }

    private bool Differ(Sameness sameness)
    {
        Compared++;
        if (sameness == Sameness.WithinRounding) WithinRounding++;
        return sameness == Sameness.Changed;
    }

    private ResultDifference Difference(StoredValue? before, StoredValue? after)
    {
        var value = after ?? before!;
        var quantity = Quantity.All.FirstOrDefault(q => q.Id == value.Quantity) ?? Quantity.Ratio;
        return new(value.Key, steps.GetValueOrDefault(value.Key)?.Meaning ?? value.Key, quantity, before?.Value, after?.Value);
    }

    private IEnumerable<ResultDifference> OfJoints(StoredResults before, StoredResults after)
    {
        var (then, now) = (JointNumbers.Of(before), JointNumbers.Of(after));
        return now.Keys.Union(then.Keys).Select(key => (Key: key, Before: then.GetValueOrDefault(key), After: now.GetValueOrDefault(key)))
            .Where(p => p.Before is null || p.After is null
                || Differ(Tolerances.Compare(p.Before.Value, p.After.Value, Math.Max(Math.Abs(p.Before.Value), Math.Abs(p.After.Value)))))
            .Select(p => new ResultDifference(p.Key, (p.After ?? p.Before)!.Meaning, (p.After ?? p.Before)!.Quantity, p.Before?.Value, p.After?.Value));
    }

    private TableDifference Table(string joint, string method, StoredTable? before, StoredTable? after)
    {
        var (then, now) = (Rows(before), Rows(after));
        var pairs = now.Keys.Union(then.Keys).Select(k => (Before: then.GetValueOrDefault(k), After: now.GetValueOrDefault(k))).ToList();
        var differing = pairs.Where(p => p.Before is null || p.After is null || DifferInAny(p.Before, p.After)).ToList();
        var largest = differing.Where(p => p.Before?.Set is not null && p.After?.Set is not null)
            .OrderByDescending(p => Math.Abs(p.After!.Set!.Value - p.Before!.Set!.Value)).FirstOrDefault();
        return new(joint, method, pairs.Count, differing.Count, largest.After is { } row && largest.Before is { } was
            ? new SetDifference(row.Temperature, row.DeckAge, was.Set!.Value, row.Set!.Value)
            : null);
    }

    private bool DifferInAny(StoredRow before, StoredRow after)
    {
        (double?, double?)[] numbers =
        [
            (before.Least, after.Least), (before.Set, after.Set), (before.Greatest, after.Greatest), (before.Minus, after.Minus), (before.Plus, after.Plus), (before.Reserve, after.Reserve),
            (before.Along?.Set, after.Along?.Set), (before.Along?.Minus, after.Along?.Minus), (before.Along?.Plus, after.Along?.Plus),
        ];
        var largest = numbers.SelectMany(n => new[] { n.Item1, n.Item2 }).Max(n => Math.Abs(n ?? 0));
        var differs = false;
        foreach (var (a, b) in numbers) differs |= Differ(Tolerances.Compare(a, b, largest));
        return differs || before.LeastBy != after.LeastBy || before.GreatestBy != after.GreatestBy || before.Refusal?.Id != after.Refusal?.Id;
    }

    private static bool SameSentence(StoredFinding a, StoredFinding b) => a.Id == b.Id && a.Path == b.Path && a.Severity == b.Severity && a.Sentence == b.Sentence;

    private static bool SameNumbers(StoredFinding a, StoredFinding b) => a.Numbers.Length == b.Numbers.Length
        && a.Numbers.Zip(b.Numbers).All(n => n.First.Quantity == n.Second.Quantity
            && Tolerances.Compare(n.First.Value, n.Second.Value, Math.Max(Math.Abs(n.First.Value), Math.Abs(n.Second.Value))) != Sameness.Changed);

    private static Dictionary<(string Joint, string Method), StoredTable> ByMethod(StoredResults results) =>
        results.Joints.SelectMany(j => j.Tables.Select(t => (j.Joint, Table: t))).ToDictionary(t => (t.Joint, t.Table.Method), t => t.Table);

    private static Dictionary<(double, double?), StoredRow> Rows(StoredTable? table) => (table?.Rows ?? []).ToDictionary(r => (r.Temperature, r.DeckAge));
}
