using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>The temperatures that a setting table has rows for.</summary>
public static class TableTemperatures
{
    /// <summary>
    /// From the one to the other end by the step. Where the request leaves an end open, it is the table's own end, and the rows between
    /// lie on whole steps of the scale that the step is whole in: Celsius, else Fahrenheit.
    /// </summary>
    /// <param name="request">What the plan asks for.</param>
    /// <param name="min">Lowest temperature at which a value is given, °C.</param>
    /// <param name="max">Highest, °C.</param>
    /// <returns>Rising temperatures, °C.</returns>
    public static IReadOnlyList<double> Of(SettingTableRequest request, double min, double max)
    {
        var (from, to) = (request.From ?? min, request.To ?? max);
        var zero = request.From ?? Zero(request.Step);
        var first = (int)Math.Ceiling(((from - zero) / request.Step) - 1e-9);
        var last = (int)Math.Floor(((to - zero) / request.Step) + 1e-9);
        var rows = new List<double>();
        for (var i = first; i <= last; i++) rows.Add(zero + (i * request.Step));
        if (request.From is null && (rows.Count == 0 || rows[0] > from + 1e-9)) rows.Insert(0, from);
        if (request.To is null && rows.Count > 0 && rows[^1] < to - 1e-9) rows.Add(to);
        return rows;
    }

    private static double Zero(double step)
    {
        var inFahrenheit = step / Unit.FahrenheitDifference.Factor;
        return !IsWhole(step) && IsWhole(inFahrenheit) ? Unit.Fahrenheit.Zero : 0;
    }

    private static bool IsWhole(double value) => Math.Abs(value - Math.Round(value)) < 1e-9;
}
