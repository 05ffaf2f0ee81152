using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>
/// The rules that the gap's bounds make when a size is chosen. A setting window exists exactly when, for every lower and upper bound,
/// the closing toward the one and the opening toward the other have room between them; toward a bound at installation nothing moves,
/// because it holds on that day only. The bound that governs one end is set against every bound of the other, which decides the same.
/// </summary>
internal static class GapRules
{
    private sealed record End(Limit Limit, Number Normal, Number? Toward, bool IsByRule = false)
    {
        public bool IsAtInstallation => Toward is null && !IsByRule;

        public double Reach => Normal.Value + ((Limit.Bound == Bound.Lower ? 1 : -1) * (Toward?.Value ?? 0));
    }

    /// <summary>Every pair of bounds that can govern.</summary>
    /// <param name="limits">Bounds of the size and of the code.</param>
    /// <param name="byRule">Opening that the owner's rule sets; null where the value is free within the window.</param>
    /// <param name="movements">What the joint asks.</param>
    public static IEnumerable<RuleCheck> Of(IReadOnlyList<Limit> limits, Limit? byRule, CountedMovements movements)
    {
        var lower = Ends(limits, Bound.Lower, movements);
        var upper = Ends(limits, Bound.Upper, movements);
        var highest = lower.MaxBy(e => e.Reach)!;
        var lowest = upper.MinBy(e => e.Reach)!;
        foreach (var end in upper) yield return Pair(highest, end, movements);
        foreach (var end in lower.Where(e => e != highest)) yield return Pair(end, lowest, movements);
        if (byRule is null) yield break;
        var set = new End(byRule, byRule.Value, null, IsByRule: true);
        yield return Pair(highest, set, movements);
        yield return Pair(set, lowest, movements);
    }

    private static List<End> Ends(IReadOnlyList<Limit> limits, Bound bound, CountedMovements movements) =>
        [.. limits.Where(l => l.Bound == bound).Select(l => new End(l, movements.Normal(l), movements.Toward(l)))];

    private static RuleCheck Pair(End lower, End upper, CountedMovements movements)
    {
        var derivation = movements.Derivation;
        var asked = (lower.Toward, upper.Toward) switch
        {
            ({ } closes, { } opens) => derivation.Use(FamilyFormulas.MovementAsked, "", closes, opens),
            ({ } closes, null) => closes,
            (null, { } opens) => opens,
            _ => derivation.Table("m", "movement between two bounds of the day of setting", Quantity.Movement, 0,
                Provenance.Derived("both hold on the day of setting only"), "nil"),
        };
        var allowed = derivation.Use(FamilyFormulas.MovementAllowed, "", upper.Normal, lower.Normal);
        var source = upper.Toward is null ? upper.Limit.Source : lower.Toward is null ? lower.Limit.Source : upper.Limit.Source;
        return SizeTrial.AtMost($"movement between {lower.Limit.Name} and {upper.Limit.Name}", Quantity.Movement, asked, allowed,
            Measure.Normal, upper.Limit.JudgedBy ?? lower.Limit.JudgedBy, lower.IsAtInstallation || upper.IsAtInstallation, source);
    }
}
