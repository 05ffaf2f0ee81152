using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>The steps to which a set value is rounded, from the wanted one to ever finer ones that a rule or tape still shows.</summary>
/// <remarks>A step that is a whole number of 1/64 in is halved down to 1/64 in; any other goes to 1 mm and to 0.5 mm. After the last rung the value is made with a gauge.</remarks>
public static class RoundingLadder
{
    /// <summary>Step of a value that is made with a gauge, m.</summary>
    public const double Gauge = 0.0001;

    private static readonly double Sixtyfourth = Unit.InchUnit.Factor / 64;

    /// <summary>The wanted step, then finer ones, m.</summary>
    public static IEnumerable<double> From(double step)
    {
        for (double? rung = step; rung is { } current; rung = Finer(current)) yield return current;
    }

    /// <summary>The next finer step, m; null where there is none.</summary>
    public static double? Finer(double step)
    {
        var parts = step / Sixtyfourth;
        if (Math.Abs(parts - Math.Round(parts)) < 1e-9 && parts > 0.5)
            return Math.Round(parts) % 2 == 0 ? step / 2 : null;
        return step > 0.001 + 1e-12 ? 0.001 : step > 0.0005 + 1e-12 ? 0.0005 : null;
    }

    /// <summary>Step to which tolerances beside a set value are rounded: one rung finer, so that a small tolerance is not rounded away.</summary>
    public static double OfTolerance(double step) => Finer(step) ?? Math.Min(step, Gauge);
}
