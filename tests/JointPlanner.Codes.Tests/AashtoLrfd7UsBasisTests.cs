using JointPlanner.Codes.AashtoLrfd7Us;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests;

public sealed class AashtoLrfd7UsBasisTests : BasisSpecification
{
    protected override CodeBasis Basis { get; } = new AashtoLrfd7UsBasis();

    protected override Plan Answerable => PlanWith("aashto-lrfd-7-us", new Climate { Zone = "cold", Source = "test" });

    protected override string[] SilentOn =>
    [
        "counting Braking", "counting Clearance", "counting DeadLoad", "counting Friction", "counting LiveLoad", "counting Prestress",
        "counting Seismic", "counting Substructure", "counting Wind", "safety degrees",
    ];

    /// <summary>From memory, check against the licensed text: LRFD Table 3.12.2.1-1, °F.</summary>
    [Theory]
    [InlineData("moderate", DeckKind.Steel, 0, 120)]
    [InlineData("moderate", DeckKind.Composite, 0, 120)]
    [InlineData("moderate", DeckKind.Concrete, 10, 80)]
    [InlineData("cold", DeckKind.Steel, -30, 120)]
    [InlineData("cold", DeckKind.Concrete, 0, 80)]
    public void Procedure_A_gives_its_table_and_a_concrete_deck_on_steel_counts_as_steel(string zone, DeckKind kind, double min, double max)
    {
        var answer = Basis.UniformTemperature(kind, PlanWith(Basis.Id, new Climate { Zone = zone }), new Derivation());
        var range = Assert.IsType<Said<TemperatureRange>>(answer).Value;
        Assert.Equal(min, Unit.Fahrenheit.FromSi(range.Min.Value), 1e-9);
        Assert.Equal(max, Unit.Fahrenheit.FromSi(range.Max.Value), 1e-9);
    }

    /// <summary>Published: Missouri DOT EPG 751.13, rev. 7 Feb 2014 (seen): coefficients, and 1 ≤ W ≤ 4 in along travel.</summary>
    [Fact]
    public void Coefficients_and_surface_gap_limits_are_those_an_owner_restates()
    {
        var derivation = new Derivation();
        Assert.Equal(6.5e-6, Unit.PerFahrenheit.FromSi(((Said<Number>)Basis.ExpansionCoefficient(DeckKind.Composite, derivation)).Value.Value), 1e-12);
        Assert.Equal(6.0e-6, Unit.PerFahrenheit.FromSi(((Said<Number>)Basis.ExpansionCoefficient(DeckKind.Concrete, derivation)).Value.Value), 1e-12);
        var limits = Basis.SingleGapLimits(DeckKind.Steel, DeckKind.Steel, derivation);
        Assert.Equal(4.0, Unit.InchUnit.FromSi(limits.Single(l => l.Bound == Bound.Upper).Value.Value), 1e-9);
        Assert.Equal(1.0, Unit.InchUnit.FromSi(limits.Single(l => l.Bound == Bound.Lower).Value.Value), 1e-9);
        Assert.All(limits, l => Assert.Equal(Measure.Along, l.Measure));
    }

    [Fact]
    public void Concrete_decks_may_go_below_one_inch() =>
        Assert.DoesNotContain(Basis.SingleGapLimits(DeckKind.Concrete, DeckKind.Concrete, new Derivation()), l => l.Bound == Bound.Lower);

    [Fact]
    public void Without_a_climate_zone_it_is_silent_and_says_what_it_wants()
    {
        var answer = Basis.UniformTemperature(DeckKind.Steel, PlanWith(Basis.Id, new Climate()), new Derivation());
        Assert.Contains("climate zone", Assert.IsType<Silent<TemperatureRange>>(answer).Why, StringComparison.Ordinal);
    }
}
