using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Sheets.Parts;

/// <summary>Which steps a sheet prints: everything that a printed result rests on, found by walking back from it. Trials of sizes that were not taken are told in the table of families.</summary>
internal static class StepsThatCount
{
    public static IReadOnlySet<int> Of(Result result)
    {
        var counted = new HashSet<int>();
        var open = new Stack<int>(Roots(result).Where(n => n.Step >= 0).Select(n => n.Step));
        while (open.TryPop(out var step))
            if (counted.Add(step))
                foreach (var operand in result.Steps[step].Origin.Operands) open.Push(operand);
        return counted;
    }

    private static IEnumerable<Number> Roots(Result result) =>
    [
        .. result.Segments.SelectMany(s => new[] { s.Temperature.Min, s.Temperature.Max, s.Temperature.DoubtAllowance, s.Temperature.Expansion }),
        .. result.Segments.Select(s => s.ZeroMovementPoint).OfType<Number>(),
        .. result.Segments.SelectMany(s => s.Section?.Numbers ?? []),
        .. result.Joints.SelectMany(Roots),
        .. result.Bearings.SelectMany(b => new[] { b.HotAtStart, b.ColdAtStart, b.HotAtEnd, b.ColdAtEnd }),
        .. result.BearingMovements.SelectMany(b => new Number?[] { b.TravelMost, b.TravelLeast, b.RotationMost, b.RotationLeast }).OfType<Number>(),
        .. (result.Model?.States ?? []).SelectMany(s => s.Numbers),
        .. result.Restraints.SelectMany(r => new[] { r.Hot, r.Cold }),
        .. result.HandChecks.SelectMany(c => c.ByHand is { } hand ? new[] { c.Solved, hand } : [c.Solved]),
    ];

    private static IEnumerable<Number> Roots(JointResult joint)
    {
        foreach (var length in joint.ExpansionLengths) yield return length.Length;
        foreach (var movement in joint.Movements)
        {
            yield return movement.OpensBy;
            yield return movement.ClosesBy;
        }
        foreach (var rule in joint.Fit?.Chosen?.Rules ?? [])
        {
            yield return rule.Value;
            yield return rule.Limit;
        }
        if (joint.Table is not { } table) yield break;
        yield return table.Rate;
        yield return table.Min;
        yield return table.Max;
        var row = table.Design;
        foreach (var number in new[] { row.Window?.Least, row.Window?.Greatest, row.ByRule, row.Set, row.Minus, row.Plus, row.Reserve }.OfType<Number>())
            yield return number;
    }
}
