using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>
/// Rounds a value in one direction of measure, to the wanted step, else to the first finer one that leaves a tolerance on both sides,
/// else with a gauge; and says how far off it may be.
/// </summary>
/// <param name="Joint">Id of the joint, for keys.</param>
/// <param name="Window">The window, normal to the joint.</param>
/// <param name="Reserve">U, normal to the joint, m.</param>
/// <param name="Middle">Middle of the window, normal to the joint, m.</param>
/// <param name="Wanted">Wanted step, m.</param>
internal sealed record RoundedChoice(string Joint, SettingWindow Window, Number Reserve, Number Middle, double Wanted)
{
    private static readonly Provenance FineEnough = Provenance.Derived("the wanted step, or the next finer one that leaves a tolerance on both sides");
    private static readonly Provenance OneFiner = Provenance.Derived("one step finer than that of the opening");

    private readonly Derivation withoutSteps = new(keepsSteps: false);

    /// <summary>Normal to the joint; null where no step leaves a tolerance on both sides, so that the value may not be used.</summary>
    public RoundedOpening? Normal(Number value, Derivation derivation) => First(value, Normal, derivation);

    /// <summary>Along the road, likewise.</summary>
    public RoundedOpening? Along(Number value, Number cos, Derivation derivation) => First(value, (v, rung, d) => Along(v, cos, rung, d), derivation);

    private RoundedOpening? First(Number value, Func<Number, double, Derivation, RoundedOpening> round, Derivation derivation)
    {
        foreach (var rung in RoundingLadder.From(Wanted).Append(RoundingLadder.Gauge))
        {
            var rounded = round(value, rung, withoutSteps);
            if (rounded.Minus.Value > 0 && rounded.Plus.Value > 0)
                return derivation.KeepsSteps ? round(value, rung, derivation) : rounded;
        }

        return null;
    }

    private RoundedOpening Normal(Number value, double rung, Derivation derivation)
    {
        var (step, ofTolerance) = Steps(rung, derivation);
        var set = derivation.Use(SettingFormulas.Rounded, Keys.SetValue(Joint), value, Middle, step);
        return new RoundedOpening(set,
            derivation.Use(SettingFormulas.Minus, Keys.SetMinus(Joint), set, Window.Least, Reserve, ofTolerance),
            derivation.Use(SettingFormulas.Plus, Keys.SetPlus(Joint), Window.Greatest, set, Reserve, ofTolerance), rung);
    }

    private RoundedOpening Along(Number value, Number cos, double rung, Derivation derivation)
    {
        var (step, ofTolerance) = Steps(rung, derivation);
        var set = derivation.Use(SettingFormulas.RoundedAlong, Keys.SetAlong(Joint), value, Middle, cos, step);
        return new RoundedOpening(set,
            derivation.Use(SettingFormulas.MinusAlong, Keys.SetMinusAlong(Joint), set, Window.Least, Reserve, cos, ofTolerance),
            derivation.Use(SettingFormulas.PlusAlong, Keys.SetPlusAlong(Joint), Window.Greatest, set, Reserve, cos, ofTolerance), rung);
    }

    private static (Number Step, Number OfTolerance) Steps(double rung, Derivation derivation) => (
        derivation.Table("δ", "step to which the opening is rounded", Quantity.Opening, rung, FineEnough, ""),
        derivation.Table("δ_t", "step to which tolerances are rounded", Quantity.Opening, RoundingLadder.OfTolerance(rung), OneFiner, ""));
}
