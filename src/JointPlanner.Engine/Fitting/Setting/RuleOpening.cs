using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>The opening that an owner's rule gives at a temperature, before rounding.</summary>
internal static class RuleOpening
{
    /// <summary>The rule that holds for a size: one that goes by a reference which neither rule nor size gives falls back to mid-window.</summary>
    public static SettingRule For(SettingRule rule, Number? referenceOpening) =>
        rule is FixedReference { Opening: null } && referenceOpening is null ? new MidWindow() : rule;

    /// <summary>Normal opening by the rule; null for mid-window, which needs a window, and where the rule has no value.</summary>
    /// <param name="rule">The rule, as it holds for the size.</param>
    /// <param name="limits">Bounds of the size.</param>
    /// <param name="referenceOpening">Opening at the reference temperature by the size.</param>
    /// <param name="movements">What the joint asks at the temperature.</param>
    public static Number? At(SettingRule rule, IReadOnlyList<Limit> limits, Number? referenceOpening, CountedMovements movements) => rule switch
    {
        FixedReference f => FromReference(f, referenceOpening, movements),
        MidRange => FromMidRange(limits, movements),
        RangeShare => FromRangeShare(limits, movements),
        _ => null,
    };

    /// <summary>k, by the code's coefficients.</summary>
    public static Number Rate(JointDemand demand, Occasion occasion, Derivation derivation) =>
        Slope(SettingFormulas.Slope, Keys.Rate(demand.Joint.Id, occasion), demand, p => p.Rate, derivation);

    /// <summary>Slope of the window, by the larger coefficients.</summary>
    public static Number WindowRate(JointDemand demand, Derivation derivation) =>
        Slope(SettingFormulas.WindowSlope, "", demand, p => p.WindowRate, derivation);

    /// <summary>Lowest and highest temperature that every segment at the joint can have; null where no segment moves it.</summary>
    public static (Number Min, Number Max)? Temperatures(JointDemand demand, Derivation derivation) => demand.Thermal.Length switch
    {
        0 => null,
        1 => (demand.Thermal[0].Min, demand.Thermal[0].Max),
        _ => (derivation.Use(RuleFormulas.Lowest, "", [.. demand.Thermal.Select(p => p.Min)]),
              derivation.Use(RuleFormulas.Highest, "", [.. demand.Thermal.Select(p => p.Max)])),
    };

    private static Number Slope(Formula formula, string key, JointDemand demand, Func<ThermalPart, Number> rate, Derivation derivation) =>
        demand.Thermal.IsEmpty
            ? derivation.Table(formula.Symbol, formula.Meaning, formula.Quantity, 0, Provenance.Derived("no segment's temperature moves this joint"), "nil")
            : derivation.Use(formula, key, [demand.CosSkew, .. demand.Thermal.Select(rate)]);

    private static Number? FromReference(FixedReference rule, Number? referenceOpening, CountedMovements movements)
    {
        var derivation = movements.Derivation;
        var opening = rule.Opening is { } given
            ? derivation.Given("owner-rules/setting/opening", "G_ref", "opening at the reference temperature, normal to the joint", Quantity.Opening, given)
            : referenceOpening!.Value;
        var temperature = derivation.Given("owner-rules/setting/temperature", "T_ref", "reference temperature", Quantity.Temperature, rule.Temperature);
        return derivation.Use(RuleFormulas.FromReference, "", opening, Rate(movements.Demand, movements.Occasion, derivation), movements.Temperature, temperature);
    }

    private static Number? FromMidRange(IReadOnlyList<Limit> limits, CountedMovements movements)
    {
        var (derivation, demand) = (movements.Derivation, movements.Demand);
        if (Temperatures(demand, derivation) is not { } ends) return null;
        var (lower, upper) = InService(limits, movements);
        return derivation.Use(RuleFormulas.FromMidRange, "",
            derivation.Use(RuleFormulas.MiddleOfLimits, "", lower, upper),
            Rate(demand, movements.Occasion, derivation),
            movements.Temperature,
            derivation.Use(RuleFormulas.MidTemperature, "", ends.Min, ends.Max),
            Irreversible(RuleFormulas.IrreversibleOpening, demand, p => p.OpensBy, derivation),
            Irreversible(RuleFormulas.IrreversibleClosing, demand, p => p.ClosesBy, derivation));
    }

    private static Number? FromRangeShare(IReadOnlyList<Limit> limits, CountedMovements movements)
    {
        if (Temperatures(movements.Demand, movements.Derivation) is not { } ends || ends.Max.Value <= ends.Min.Value) return null;
        var (lower, upper) = InService(limits, movements);
        return movements.Derivation.Use(RuleFormulas.FromRangeShare, "", upper, lower, movements.Temperature, ends.Min, ends.Max);
    }

    private static (Number Lower, Number Upper) InService(IReadOnlyList<Limit> limits, CountedMovements movements) => (
        limits.Where(l => l.Bound == Bound.Lower && !l.IsAtInstallation).Select(movements.Normal).MaxBy(n => n.Value),
        limits.Where(l => l.Bound == Bound.Upper && !l.IsAtInstallation).Select(movements.Normal).MinBy(n => n.Value));

    private static Number Irreversible(Formula formula, JointDemand demand, Func<OtherPart, Number> movement, Derivation derivation)
    {
        var parts = demand.Others.Where(p => p.IsIrreversible).Select(movement).Where(n => n.Value > 0).ToImmutableArray();
        return parts.IsEmpty
            ? derivation.Table(formula.Symbol, formula.Meaning, formula.Quantity, 0, Provenance.Derived("none is still to come"), "nil")
            : derivation.Use(formula, "", [demand.CosSkew, .. parts]);
    }
}
