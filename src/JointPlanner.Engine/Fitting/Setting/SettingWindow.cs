using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>Least and greatest normal opening that may be set, and what governs each end.</summary>
/// <param name="Least">G_lo, m.</param>
/// <param name="Greatest">G_hi, m; less than G_lo when nothing fits.</param>
/// <param name="LeastBy">Limit that governs the lower end.</param>
/// <param name="GreatestBy">Limit that governs the upper end.</param>
public sealed record SettingWindow(Number Least, Number Greatest, Limit LeastBy, Limit GreatestBy)
{
    /// <summary>True when nothing fits at this temperature and age.</summary>
    public bool IsEmpty => Least.Value > Greatest.Value;

    /// <summary>The window at one temperature and deck age.</summary>
    /// <param name="limits">Bounds on the gap; at least one lower and one upper.</param>
    /// <param name="movements">What the joint asks from that temperature. Its occasion decides how the doubt about the temperature is treated.</param>
    /// <exception cref="ArgumentException">A lower or an upper bound is missing.</exception>
    public static SettingWindow At(IReadOnlyList<Limit> limits, CountedMovements movements)
    {
        var joint = movements.Demand.Joint.Id;
        var (least, leastBy) = End(SettingFormulas.AboveLower, SettingFormulas.LeastOpening, Keys.SetLeast(joint), Bound.Lower, limits, movements);
        var (greatest, greatestBy) = End(SettingFormulas.BelowUpper, SettingFormulas.GreatestOpening, Keys.SetGreatest(joint), Bound.Upper, limits, movements);
        return new SettingWindow(least, greatest, leastBy, greatestBy);
    }

    private static (Number End, Limit By) End(
        Formula one, Formula all, string key, Bound bound, IReadOnlyList<Limit> limits, CountedMovements movements)
    {
        var ends = new List<(Number End, Limit By)>(limits.Count);
        foreach (var limit in limits)
        {
            if (limit.Bound != bound) continue;
            var normal = movements.Normal(limit);
            ends.Add((movements.Toward(limit) is { } toward ? movements.Derivation.Use(one, "", normal, toward) : normal, limit));
        }

        if (ends.Count == 0) throw new ArgumentException($"A {bound} bound on the gap is needed.", nameof(limits));
        var end = movements.Derivation.Use(all, key, [.. ends.Select(e => e.End)]);
        return (end, ends.First(e => e.End.Value.Equals(end.Value)).By);
    }
}
