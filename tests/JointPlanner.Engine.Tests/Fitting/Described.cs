using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Tests.Fitting;

/// <summary>What a test describes of one joint, in the units of its source; turned into the shapes that fitting reads.</summary>
internal static class Described
{
    public static readonly Provenance Source = Provenance.By("test");

    public static double In(double inches) => Unit.InchUnit.ToSi(inches);
    public static double Mm(double millimetres) => Unit.Millimetre.ToSi(millimetres);
    public static double F(double reading) => Unit.Fahrenheit.ToSi(reading);
    public static double Degrees(double angle) => Unit.Degree.ToSi(angle);
    public static double PerF(double coefficient) => Unit.PerFahrenheit.ToSi(coefficient);

    public static Joint Joint(double setAt, double skew = 0) => new()
    {
        Id = "j1",
        Near = "a1",
        Far = "deck",
        SettingTemperature = setAt,
        Skew = skew,
    };

    /// <summary>One segment's thermal part; the window's rate is the same unless given.</summary>
    public static ThermalPart Thermal(Derivation d, double rate, double min, double max, double doubt = 0, string segment = "deck", double? windowRate = null) => new(
        segment,
        d.Given($"test/{segment}/rate", "r", "rate", Quantity.Rate, rate),
        d.Given($"test/{segment}/window-rate", "r", "rate of the window", Quantity.Rate, windowRate ?? rate),
        d.Given($"test/{segment}/min", "T_min", "lowest", Quantity.Temperature, min),
        d.Given($"test/{segment}/max", "T_max", "highest", Quantity.Temperature, max),
        d.Given($"test/{segment}/doubt", "S", "doubt", Quantity.TemperatureDifference, doubt));

    public static OtherPart Other(Derivation d, Cause cause, double opens, double closes = 0, bool isIrreversible = true) => new(
        cause,
        d.Given($"test/{cause}/opens", "o", "opens by", Quantity.Movement, opens),
        d.Given($"test/{cause}/closes", "c", "closes by", Quantity.Movement, closes),
        isIrreversible);

    public static JointDemand Demand(Derivation d, Joint joint, ImmutableArray<ThermalPart> thermal, params OtherPart[] others) => new()
    {
        Joint = joint,
        DeckAge = null,
        Thermal = thermal,
        Others = [.. others],
        CosSkew = d.Given("test/cos", "cos β", "cosine", Quantity.Ratio, Math.Cos(joint.Skew)),
        SinSkew = d.Given("test/sin", "|sin β|", "sine", Quantity.Ratio, Math.Abs(Math.Sin(joint.Skew))),
    };

    /// <summary>Every cause counts once in every column, with a factor of its own on temperature.</summary>
    public static CountingTable Counts(double onTemperature = 1)
    {
        var table = CountingTable.Empty;
        foreach (var cause in Enum.GetValues<Cause>())
            foreach (var column in Enum.GetValues<Column>())
                table = table.With(cause, column, new Counted(cause == Cause.UniformTemperature ? onTemperature : 1) { Source = Source });
        return table;
    }

    public static CountedMovements Movements(JointDemand demand, CountingTable counting, Occasion occasion, double temperature, Derivation? d = null) =>
        new(demand, counting, occasion, new Number(-1, temperature), d ?? new Derivation(keepsSteps: false));

    public static Limit Limit(string name, Bound bound, double value, Column? judgedBy = Column.SealRange, Measure measure = Measure.Normal) =>
        new(name, new Number(-1, value), bound, measure, judgedBy, Source);

    /// <summary>A size with nothing but bounds, for tests of the table.</summary>
    public static SizeFit Size(double? reference, params Limit[] limits) =>
        new("strip-seal", "test size", [], [.. limits], reference is { } r ? new Number(-1, r) : null);

    public static SettingManner Manner(CountingTable? counting = null, SettingRule? rule = null, double sigmas = 2, double step = 0.001) =>
        new(counting ?? Counts(), rule ?? new MidWindow(), sigmas, step);

    public static FamilyRules Family(string family, (string, double)[] figures, params (string Name, (string, double)[] Figures)[] sizes) => new()
    {
        Family = family,
        Source = Source,
        Figures = Figures(figures),
        Sizes = [.. sizes.Select(s => new FamilySize(s.Name, Figures(s.Figures)))],
    };

    public static OwnerRuleSet Owner(params FamilyRules[] families) =>
        new() { Id = "test", Name = "test", Version = "1", Source = Source, Families = [.. families] };

    /// <summary>The fit of one joint without a code's bounds, with its steps and findings.</summary>
    public static JointFit Fit(JointDemand demand, OwnerRuleSet owner, Derivation d, CountingTable? counting = null, CodeGapLimits? code = null) =>
        JointFitting.Of(demand, owner, counting ?? Counts(), code ?? CodeGapLimits.None, d);

    private static ImmutableSortedDictionary<string, double> Figures((string Word, double Value)[] figures) =>
        figures.ToImmutableSortedDictionary(f => f.Word, f => f.Value, StringComparer.Ordinal);
}
