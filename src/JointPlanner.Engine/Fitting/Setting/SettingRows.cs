using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>Makes one row of a setting table.</summary>
public static class SettingRows
{
    /// <summary>The row at a temperature.</summary>
    /// <param name="temperature">Temperature of the structure, °C.</param>
    /// <param name="demand">What the joint must take when set at the row's deck age.</param>
    /// <param name="size">The size chosen.</param>
    /// <param name="manner">How values are chosen, rounded and guarded.</param>
    /// <param name="derivation">Where the steps go, if it keeps any.</param>
    public static SettingRow At(Number temperature, JointDemand demand, SizeFit size, SettingManner manner, Derivation derivation)
    {
        var empty = new SettingRow(temperature.Value, demand.DeckAge, null, null, null, null, null, null);
        if (SettingRefusals.BeforeComputing(temperature, demand, derivation) is { } refusal) return empty with { Refusal = refusal };

        var movements = new CountedMovements(demand, manner.Counting, Occasion.Setting, temperature, derivation);
        var window = SettingWindow.At(size.Limits, movements);
        var reserve = Reserve(demand, manner, derivation);
        var middle = derivation.Use(SettingFormulas.MiddleOfWindow, "", window.Least, window.Greatest);
        var rule = RuleOpening.For(manner.Rule, size.ReferenceOpening);
        var byRule = RuleOpening.At(rule, size.Limits, size.ReferenceOpening, movements) ?? middle;
        var row = empty with { Window = window, Reserve = reserve, ByRule = byRule };
        if (window.IsEmpty) return row with { Refusal = SettingRefusals.NoWindow(demand, row) };

        var choice = new RoundedChoice(window, reserve, middle, manner.RoundingStep);
        if (choice.Of(byRule) is { } set) return Set(demand.Joint.Id, row, set, choice, derivation);
        if (rule is MidWindow) return row with { Refusal = SettingRefusals.TooNarrow(demand, row) };
        var beside = choice.Of(middle) is { } step ? derivation.Use(SettingFormulas.Rounded, "", middle, middle, Step(step, derivation)) : (Number?)null;
        return row with { MidWindow = beside, Refusal = SettingRefusals.RuleOutside(demand, row, beside ?? middle) };
    }

    private static SettingRow Set(string joint, SettingRow row, double rung, RoundedChoice choice, Derivation derivation)
    {
        var window = choice.Window;
        var step = Step(rung, derivation);
        var ofTolerance = rung == RoundingLadder.OfTolerance(rung) ? step : derivation.Table("δ_t", "step to which tolerances are rounded",
            Quantity.Opening, RoundingLadder.OfTolerance(rung), Provenance.Derived("one step finer than that of the opening"), "");
        var set = derivation.Use(SettingFormulas.Rounded, Keys.SetValue(joint), row.ByRule!.Value, choice.Middle, step);
        return row with
        {
            Set = set,
            Minus = derivation.Use(SettingFormulas.Minus, Keys.SetMinus(joint), set, window.Least, row.Reserve!.Value, ofTolerance),
            Plus = derivation.Use(SettingFormulas.Plus, Keys.SetPlus(joint), window.Greatest, set, row.Reserve!.Value, ofTolerance),
            Step = rung,
            ByGauge = rung == RoundingLadder.Gauge,
        };
    }

    private static Number Step(double rung, Derivation derivation) => derivation.Table("δ", "step to which the opening is rounded",
        Quantity.Opening, rung, Provenance.Derived("the wanted step, or the next finer one with which the opening stays in the window"), "");

    private static Number Reserve(JointDemand demand, SettingManner manner, Derivation derivation)
    {
        var joint = demand.Joint;
        var path = $"joints/{joint.Id}/setting";
        return derivation.Use(SettingFormulas.ReserveOfTheDay, Keys.SetReserve(joint.Id),
            derivation.Given("owner-rules/uncertainty-factor", "k_U", "standard deviations in the reserve", Quantity.Ratio, manner.UncertaintyFactor),
            RuleOpening.WindowRate(demand, derivation),
            derivation.Given($"{path}/temperature-uncertainty", "u_T", "standard deviation of the temperature of the structure",
                Quantity.TemperatureDifference, joint.TemperatureUncertainty),
            derivation.Given($"{path}/measure-uncertainty", "u_m", "standard deviation of the measured gap", Quantity.Movement, joint.MeasureUncertainty),
            derivation.Given($"{path}/remaining-uncertainty", "u_r", "standard deviation of the movement still to come", Quantity.Movement, joint.RemainingUncertainty));
    }
}
