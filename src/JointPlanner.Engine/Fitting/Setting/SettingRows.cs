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

        var choice = new RoundedChoice(demand.Joint.Id, window, reserve, middle, manner.RoundingStep);
        if (choice.Normal(byRule, derivation) is { } set)
            return row with
            {
                Set = set.Set,
                Minus = set.Minus,
                Plus = set.Plus,
                Step = set.Step,
                ByGauge = set.Step == RoundingLadder.Gauge,
                Along = demand.CosSkew.Value == 1 ? set : choice.Along(byRule, demand.CosSkew, derivation),
            };
        if (rule is MidWindow) return row with { Refusal = SettingRefusals.TooNarrow(demand, row) };
        var beside = choice.Normal(middle, new Derivation(keepsSteps: false))?.Set;
        return row with { MidWindow = beside, Refusal = SettingRefusals.RuleOutside(demand, row, beside ?? middle) };
    }

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
