using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>Which step of rounding a value takes: the wanted one, else the first finer one that leaves a tolerance on both sides, else a gauge.</summary>
/// <param name="Window">The window.</param>
/// <param name="Reserve">U, m.</param>
/// <param name="Middle">Middle of the window, m.</param>
/// <param name="Wanted">Wanted step, m.</param>
internal sealed record RoundedChoice(SettingWindow Window, Number Reserve, Number Middle, double Wanted)
{
    /// <summary>The step for a value; null where no step leaves a tolerance on both sides, so that the value may not be used.</summary>
    public double? Of(Number value)
    {
        foreach (var rung in RoundingLadder.From(Wanted).Append(RoundingLadder.Gauge))
        {
            var set = SettingFormulas.Rounded.Compute(value.Value, Middle.Value, rung);
            var step = RoundingLadder.OfTolerance(rung);
            if (SettingFormulas.Minus.Compute(set, Window.Least.Value, Reserve.Value, step) > 0
                && SettingFormulas.Plus.Compute(Window.Greatest.Value, set, Reserve.Value, step) > 0) return rung;
        }

        return null;
    }
}
