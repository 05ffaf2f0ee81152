using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Tests.Causes;

/// <summary>What still comes after a setting state, with a model that can be followed in the head: 10 000 days of life.</summary>
public class RemainingStrainsTests
{
    private const double Day = 86400, Mpa = 1e6;

    private static readonly StressStage Early = new(10 * Day, 3 * Mpa, null, "test"), Late = new(200 * Day, 6 * Mpa, null, "test");

    [Fact]
    public void Shrinkage_still_to_come_is_the_difference_of_one_curve()
    {
        Assert.Equal(9900e-9, Of(Cause.Shrinkage, 100), 1e-15);
        Assert.Equal(0, Of(Cause.Shrinkage, 10000), 1e-15);
    }

    [Fact]
    public void Creep_of_a_stress_that_is_on_is_the_difference_of_one_curve() =>
        Assert.Equal(100e-6 * (9.990 - 0.090), Of(Cause.Creep, 100, Early), 1e-15);

    [Fact]
    public void A_stress_that_comes_later_counts_in_full_with_its_elastic_strain()
    {
        Assert.Equal(200e-6 * 9.8, Of(Cause.Creep, 100, Late), 1e-15);
        Assert.Equal(200e-6, Of(Cause.Prestress, 100, Late), 1e-15);
    }

    [Fact]
    public void A_stress_that_is_on_brings_no_elastic_strain_any_more()
    {
        Assert.Null(Strains().Of(Cause.Prestress, Deck(Early), new Number(-1, 100 * Day), new Derivation(false)));
        Assert.Equal(200e-6, Of(Cause.Prestress, 100, Early, Late), 1e-15);
    }

    [Fact]
    public void A_stress_put_on_at_the_very_age_of_setting_comes_after_it()
    {
        Assert.Equal(150e-6, Of(Cause.Prestress, 10, Early), 1e-15);
        Assert.Equal(Of(Cause.Creep, 9.9, Early), Of(Cause.Creep, 10, Early), 1e-15);
    }

    [Fact]
    public void The_modulus_given_with_a_stress_takes_the_place_of_the_models() =>
        Assert.Equal(300e-6, Of(Cause.Prestress, 100, Late with { Modulus = 20e9 }), 1e-15);

    [Theory]
    [InlineData(5)]
    [InlineData(100)]
    [InlineData(300)]
    public void Stresses_add(double age)
    {
        foreach (var cause in new[] { Cause.Creep, Cause.Prestress })
            Assert.Equal(Or0(cause, age, Early) + Or0(cause, age, Late), Or0(cause, age, Early, Late), 1e-15);
    }

    [Fact]
    public void Twice_the_stress_creeps_twice_as_much_and_a_loss_comes_back()
    {
        Assert.Equal(2 * Of(Cause.Creep, 100, Early), Of(Cause.Creep, 100, Early with { Stress = 2 * Early.Stress }), 1e-15);
        Assert.Equal(-Of(Cause.Creep, 100, Early), Of(Cause.Creep, 100, Early with { Stress = -Early.Stress }), 1e-15);
    }

    [Fact]
    public void The_older_the_deck_at_setting_the_less_is_to_come()
    {
        double[] ages = [5, 50, 150, 199, 201, 1000, 9999];
        var totals = ages.Select(a => Strains().Total(Deck(Early, Late), a * Day)).ToArray();
        Assert.All(totals.Zip(totals.Skip(1)), pair => Assert.True(pair.Second < pair.First));
    }

    [Fact]
    public void A_designers_own_strain_goes_before_the_models()
    {
        var own = Deck() with { Creep = new Shortening(80e-6, "designer", []) };
        Assert.Equal(80e-6, Strains().Of(Cause.Creep, own, new Number(-1, 100 * Day), new Derivation(false))!.Value.Value, 1e-15);
    }

    [Fact]
    public void Without_stresses_the_description_says_nothing_of_creep_and_prestress()
    {
        Assert.False(RemainingStrains.Has(Cause.Creep, Deck()));
        Assert.False(RemainingStrains.Has(Cause.Prestress, Deck()));
        Assert.True(RemainingStrains.Has(Cause.Shrinkage, Deck()));
        Assert.False(RemainingStrains.Has(Cause.LiveLoad, Deck(Early)));
    }

    [Fact]
    public void Steps_that_several_components_need_are_listed_once()
    {
        var derivation = new Derivation();
        var age = derivation.Given("age", "t", "age", Quantity.Age, 100 * Day);
        Strains().Of(Cause.Creep, Deck(Early), age, derivation);
        var count = derivation.Steps.Count;
        Strains().Of(Cause.Creep, Deck(Early), age, derivation);
        Assert.Equal(count, derivation.Steps.Count);
    }

    [Fact]
    public void A_silent_model_and_a_missing_one_are_named_at_the_concrete()
    {
        var moist = Deck() with { Concrete = Concrete() with { Humidity = 0.95 } };
        Assert.Equal("creep-model-silent", Refusal(Strains(), moist).Id);
        Assert.Contains("it knows no moist air", Refusal(Strains(), moist).Template, StringComparison.Ordinal);
        var unknown = Deck() with { Concrete = Concrete() with { Model = "unknown" } };
        Assert.Equal(("creep-model-missing", "segments/deck/concrete/model"), (Refusal(Strains(), unknown).Id, Refusal(Strains(), unknown).Path));
        Assert.Equal("creep-model-missing", Refusal(new RemainingStrains(Plan(Deck()), new QuietBasis(null), []), Deck()).Id);
    }

    [Theory]
    [InlineData("", ", the model of the basis.")]
    [InlineData("other", ", chosen in the plan; the model of the basis is Straight lines.")]
    public void The_result_says_whose_model_it_follows(string model, string said)
    {
        var deck = Deck(Early) with { Concrete = Concrete(Early) with { Model = model } };
        var derivation = new Derivation();
        Strains(deck).Note(derivation);
        Assert.Contains(said, derivation.Findings.Single(f => f.Id == "creep-model").Template, StringComparison.Ordinal);
    }

    [Fact]
    public void A_stress_beyond_the_proportional_share_is_a_warning()
    {
        var derivation = new Derivation();
        Strains(Deck(Early, Late with { Stress = 21 * Mpa })).Note(derivation);
        var finding = derivation.Findings.Single(f => f.Id == "creep-not-proportional");
        Assert.Equal([21 * Mpa, 0.5, 40 * Mpa], finding.Values.Select(v => v.Value));
    }

    private static Finding Refusal(RemainingStrains strains, Segment deck) => Assert.Throws<SilentBasisException>(
        () => strains.Of(Cause.Shrinkage, deck, new Number(-1, 100 * Day), new Derivation(false))).Finding;

    private static double Of(Cause cause, double age, params StressStage[] stages) =>
        Strains().Of(cause, Deck(stages), new Number(-1, age * Day), new Derivation(false))!.Value.Value;

    private static double Or0(Cause cause, double age, params StressStage[] stages) =>
        Strains().Of(cause, Deck(stages), new Number(-1, age * Day), new Derivation(false))?.Value ?? 0;

    private static RemainingStrains Strains(Segment? deck = null) =>
        new(Plan(deck ?? Deck()), new QuietBasis(new StraightModel()), [new StraightModel(), new StraightModel("other", "Other lines")]);

    private static Plan Plan(Segment deck) => SmallPlans.Of([SmallPlans.Abutment("a1", 0)], [deck], []);

    private static Segment Deck(params StressStage[] stages) => SmallPlans.Deck("deck", 0, 50) with { Kind = DeckKind.Concrete, Concrete = Concrete(stages) };

    private static Concrete Concrete(params StressStage[] stages) => new()
    {
        Source = "test",
        Strength = 40 * Mpa,
        CuringEnd = 3 * Day,
        Humidity = 0.7,
        Size = new NotionalSize(0.4),
        EndOfLife = 10000 * Day,
        Stages = [.. stages],
    };

    private sealed class QuietBasis(CreepModel? own) : CodeBasis
    {
        public override string Id => "quiet";
        public override string Title => "A quiet basis";
        public override Answer<CreepModel> CreepModel => own is null ? base.CreepModel : own;
    }
}
