namespace JointPlanner.Engine.Formulas;

/// <summary>The arithmetic that compiled formulas call.</summary>
internal static class Arithmetic
{
    public static double Power(double value, int exponent)
    {
        var result = 1.0;
        for (var i = 0; i < Math.Abs(exponent); i++) result *= value;
        return exponent < 0 ? 1 / result : result;
    }

    public static double ToThe(double value, double exponent) => Math.Pow(value, exponent);
    public static double Exp(double value) => Math.Exp(value);
    public static double Ln(double value) => Math.Log(value);
    public static double Root(double value) => Math.Sqrt(value);
    public static double Cos(double angle) => Math.Cos(angle);
    public static double Sin(double angle) => Math.Sin(angle);
    public static double Tanh(double value) => Math.Tanh(value);
    public static double Larger(double a, double b) => Math.Max(a, b);
    public static double Smaller(double a, double b) => Math.Min(a, b);

    public static double Total(double[] values, int from)
    {
        var sum = 0.0;
        for (var i = from; i < values.Length; i++) sum += values[i];
        return sum;
    }

    public static double Largest(double[] values, int from)
    {
        var best = double.NegativeInfinity;
        for (var i = from; i < values.Length; i++) best = Math.Max(best, values[i]);
        return best;
    }

    public static double Smallest(double[] values, int from)
    {
        var best = double.PositiveInfinity;
        for (var i = from; i < values.Length; i++) best = Math.Min(best, values[i]);
        return best;
    }

    /// <summary>Rounds to whole steps; a value within a billionth of a step of a whole number counts as that number, so that 3.0000000001 steps is not "up" to 4.</summary>
    public static double RoundTo(double value, double step, Rounding rounding)
    {
        var steps = value / step;
        var near = Math.Round(steps, MidpointRounding.AwayFromZero);
        if (Math.Abs(steps - near) < 1e-9) return near * step;
        return step * rounding switch
        {
            Rounding.Nearest => near,
            Rounding.Up => Math.Ceiling(steps),
            Rounding.Down => Math.Floor(steps),
            Rounding.TowardZero => Math.Truncate(steps),
            _ => throw new ArgumentOutOfRangeException(nameof(rounding)),
        };
    }
}
