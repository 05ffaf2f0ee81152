using JointPlanner.Codes.En1991Part1To5;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests;

public sealed class En1991Part1To5BasisTests : BasisSpecification
{
    protected override CodeBasis Basis { get; } = new En1991Part1To5Basis();

    protected override Plan Answerable => PlanWith("en-1991-1-5-2003", new Climate { ShadeMax = 34, ShadeMin = -18, Source = "test" });

    protected override string[] SilentOn =>
    [
        "counting Braking", "counting Clearance", "counting Friction", "counting LiveLoad", "counting Prestress", "counting Seismic", "counting Wind",
    ];

    /// <summary>
    /// Published: C. Sigmund, "EN 1990, EN 1991 - Eurocodes 0-1 - Worked Examples", 2014, 34-Q and 35-S, as quoted in an open-source
    /// finite-element library's verification file: shade −18 and 34 °C, figure read off the graph.
    /// </summary>
    [Theory]
    [InlineData(DeckKind.Steel, -21, 50)]
    [InlineData(DeckKind.Composite, -14, 38)]
    [InlineData(DeckKind.Concrete, -10, 36)]
    public void The_graph_reading_gives_the_worked_example(DeckKind kind, double min, double max) =>
        AssertRange(kind, -18, 34, "graph-reading", min, max);

    /// <summary>Published: JCSS Probabilistic Model Code part 2, analytic offsets of the same figure (seen).</summary>
    [Theory]
    [InlineData(DeckKind.Composite, -13.5, 38.5)]
    [InlineData(DeckKind.Concrete, -10, 35.5)]
    public void The_generic_profile_differs_from_the_graph_reading_as_its_source_does(DeckKind kind, double min, double max) =>
        AssertRange(kind, -18, 34, "generic", min, max);

    /// <summary>Published: Dutch Platform Voegovergangen &amp; Opleggingen, handbook on bearings 3.9.1 (seen): shade −25 and 30 °C.</summary>
    [Theory]
    [InlineData(DeckKind.Steel, -28, 46)]
    [InlineData(DeckKind.Concrete, -17, 32)]
    public void The_Dutch_profile_gives_the_national_range(DeckKind kind, double min, double max) => AssertRange(kind, -25, 30, "nl", min, max);

    [Theory]
    [InlineData(29.9, -10)]
    [InlineData(50.1, -10)]
    [InlineData(40, -50.1)]
    [InlineData(40, 0.1)]
    public void Outside_the_figure_it_is_silent(double shadeMax, double shadeMin)
    {
        var plan = PlanWith(Basis.Id, new Climate { ShadeMax = shadeMax, ShadeMin = shadeMin });
        Assert.Contains("figure 6.1", Assert.IsType<Silent<TemperatureRange>>(Basis.UniformTemperature(DeckKind.Steel, plan, new Derivation())).Why, StringComparison.Ordinal);
    }

    /// <summary>From memory, check against the licensed text: 6.1.3.3(3), note 2.</summary>
    [Fact]
    public void The_allowance_is_ten_kelvin_when_the_setting_temperature_is_specified_and_twenty_when_not()
    {
        Assert.Equal(10, ((Said<Number>)Basis.DoubtAllowance(SettingDoubt.Specified, new Derivation())).Value.Value, 1e-12);
        Assert.Equal(20, ((Said<Number>)Basis.DoubtAllowance(SettingDoubt.Unspecified, new Derivation())).Value.Value, 1e-12);
    }

    [Fact]
    public void Degrees_and_factor_are_never_both_put_on()
    {
        Assert.Equal(1.0, ((Counted)Basis.Counting(SafetyFormat.Degrees)[Cause.UniformTemperature, Column.GapStrength]).Factor);
        Assert.Equal(1.5, ((Counted)Basis.Counting(SafetyFormat.Factor)[Cause.UniformTemperature, Column.GapStrength]).Factor);
    }

    private void AssertRange(DeckKind kind, double shadeMin, double shadeMax, string profile, double min, double max)
    {
        var plan = PlanWith(Basis.Id, new Climate { ShadeMax = shadeMax, ShadeMin = shadeMin }, profile);
        var range = Assert.IsType<Said<TemperatureRange>>(Basis.UniformTemperature(kind, plan, new Derivation())).Value;
        Assert.Equal(min, range.Min.Value, 1e-9);
        Assert.Equal(max, range.Max.Value, 1e-9);
    }
}
