namespace JointPlanner.Architecture.Tests.Planted.Pages;

/// <summary>Breaches for the search to find: a page that computes, in every way we could think of.</summary>
public sealed class ComputingPage
{
    private readonly double factor = 2;

    public static double Adds(double a, double b) => a + b;

    public double ScalesItsField(int steps) => factor * steps;

    public static double DividesElements(double[] values) => values[0] / values[1];

    public static string Negates(double value) => (-value).ToString("F1", null);

    public static double? AddsWhatMayBeMissing(double? a, double? b) => a + b;

    public static double SubtractsInAConditional(bool cold, List<double> extremes, double setting) => cold ? extremes[0] - setting : setting;

    public static float MultipliesSingles(ref float value) => value * 3f;

    public static double RoundsByMath(double value) => Math.Round(value);

    public static double TakesARoot(double value) => double.Sqrt(value);

    public static decimal AddsDecimals(decimal a, decimal b) => a + b;

    public static double SumsAList(List<double> values) => values.Sum();

    public static Length UsesAnOperatorOfTheProgram(Length a, Length b) => a + b;

    public static Func<double, double> AddsInALambda(double offset) => value => value + offset;

    public static async Task<double> AddsAfterWaiting(Task<double> value) => await value + 1;
}

/// <summary>Stands for a quantity of the program that brings its own operators.</summary>
public sealed record Length(int Millimetres)
{
    public static Length operator +(Length a, Length b) => new(a.Millimetres + b.Millimetres);

    public static Length Add(Length left, Length right) => left + right;
}

/// <summary>What a page may do with numbers: show them, compare them, count whole things; none of this may be taken for computing.</summary>
public sealed class ShowingPage
{
    private readonly List<double> values = [1.5, 2.5];
    private double shown;
    private int renders;

    public string Shows(IFormatProvider culture)
    {
        renders++;
        return shown.ToString("F2", culture) + renders.ToString(culture);
    }

    public IEnumerable<string> Lists()
    {
        for (var i = 0; i < values.Count; i++)
        {
            yield return $"{i + 1} of {values.Count}: {values[i]}";
        }
    }

    public bool Compares(double other) => shown > other && double.IsFinite(other);

    public double Chooses(bool first) => first ? values[0] : values[values.Count - 1];

    public void Keeps(string text)
    {
        try
        {
            shown = double.Parse(text, System.Globalization.CultureInfo.InvariantCulture);
        }
        catch (FormatException) when (text.Length > 2 * 3)
        {
            shown = 0.5;
        }
    }

    public static async Task<TimeSpan> Waits(int count)
    {
        await Task.Yield();
        return TimeSpan.FromSeconds(1.5) + TimeSpan.FromMilliseconds(count * 2L);
    }
}
