namespace JointPlanner.Engine.Frames;

/// <summary>Roots of a cubic inside an interval that begins at 0, in rising order.</summary>
internal static class CubicRoots
{
    /// <summary>Where c0 + c1·t + c2·t² + c3·t³ changes its sign between 0 and the end.</summary>
    public static double[] Within(double c0, double c1, double c2, double c3, double end)
    {
        double[] turns = [0, .. Quadratic(c1, 2 * c2, 3 * c3).Where(t => t > 0 && t < end).Order(), end];
        var roots = new List<double>();
        for (var i = 1; i < turns.Length; i++)
        {
            var (low, high) = (turns[i - 1], turns[i]);
            if (Value(low) * Value(high) < 0) roots.Add(Between(low, high));
        }
        return [.. roots];

        double Value(double t) => c0 + (t * (c1 + (t * (c2 + (t * c3)))));

        double Between(double low, double high)
        {
            var rises = Value(high) > 0;
            // Halving to the last bit: at most 60 steps, and no step can leave the interval.
            for (var i = 0; i < 60; i++)
            {
                var middle = low + ((high - low) / 2);
                if (middle <= low || middle >= high) break;
                if (Value(middle) > 0 == rises) high = middle;
                else low = middle;
            }
            return low + ((high - low) / 2);
        }
    }

    private static IEnumerable<double> Quadratic(double c, double b, double a)
    {
        if (a == 0)
        {
            if (b != 0) yield return -c / b;
            yield break;
        }
        var under = (b * b) - (4 * a * c);
        if (under < 0) yield break;
        var q = -0.5 * (b + Math.CopySign(Math.Sqrt(under), b));
        yield return q / a;
        if (q != 0) yield return c / q;
    }
}
