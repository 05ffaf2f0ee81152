using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests.Creep;

/// <summary>What every model of creep and shrinkage must fulfil.</summary>
public abstract class CreepModelSpecification
{
    protected const double Day = 86400, Year = 365.25 * Day, Mpa = 1e6, Mm = 1e-3;
    protected static readonly double Ksi = Unit.KipPerSquareInch.Factor, Inch = Unit.InchUnit.Factor;

    private static readonly double[] Ages = [7, 28, 60, 90, 180, 365, 1000, 3650, 18263, 36525];

    protected abstract CreepModel Model { get; }

    /// <summary>A concrete within the model's limits.</summary>
    protected virtual Concrete Ordinary => new()
    {
        Source = "test",
        Strength = 40 * Mpa,
        CuringEnd = 3 * Day,
        Humidity = 0.7,
        Size = new NotionalSize(Thickness),
        EndOfLife = 100 * Year,
    };

    /// <summary>An ordinary notional size, m.</summary>
    protected virtual double Thickness => 0.4;

    /// <summary>Notional sizes between which creep and shrinkage rise steadily, m.</summary>
    protected virtual double[] Sizes => [0.8, 0.5, 0.3, 0.2, 0.1];

    /// <summary>Humidities between which creep and shrinkage fall steadily.</summary>
    protected virtual double[] Humidities => [0.4, 0.5, 0.6, 0.7, 0.8, 0.9];

    [Fact]
    public void It_is_found_in_the_catalogue_by_its_id() => Assert.Same(Model.GetType(), Catalogue.FindCreepModel(Model.Id)?.GetType());

    [Fact]
    public void It_names_its_published_examples_or_why_there_are_none() => Assert.NotEmpty(Model.PublishedExamples);

    [Fact]
    public void Creep_is_nothing_when_the_stress_comes_and_grows_from_then()
    {
        Assert.Equal(0, Creep(Ordinary, 28, 28), 1e-12);
        Rises([.. Ages.Where(t => t > 28).Select(t => Creep(Ordinary, t, 28))]);
    }

    [Fact]
    public void Shrinkage_is_nothing_at_first_and_grows()
    {
        Assert.InRange(Shrinkage(Ordinary, 0), -1e-12, 1e-12);
        Rises([.. Ages.Select(t => Shrinkage(Ordinary, t))]);
    }

    [Fact]
    public void A_stress_on_older_concrete_creeps_less() => Rises([.. new[] { 365.0, 90, 28, 14, 7 }.Select(t0 => Creep(Ordinary, 36525, t0))]);

    [Fact]
    public void In_drier_air_it_creeps_and_shrinks_more()
    {
        Rises([.. Humidities.Reverse().Select(rh => Creep(Ordinary with { Humidity = rh }, 36525, 28))]);
        Rises([.. Humidities.Reverse().Select(rh => Shrinkage(Ordinary with { Humidity = rh }, 36525))]);
    }

    [Fact]
    public void A_thicker_section_has_dried_less_at_the_same_age()
    {
        Rises([.. Sizes.Select(h => Shrinkage(Ordinary with { Size = new NotionalSize(h) }, 365))]);
        Rises([.. Sizes.Select(h => Creep(Ordinary with { Size = new NotionalSize(h) }, 365, 28))]);
    }

    [Fact]
    public void The_three_ways_to_give_the_size_are_one()
    {
        var section = Ordinary with { Size = new SectionSize(5 * Thickness, 10) };
        foreach (ConcreteSize size in new ConcreteSize[] { new NotionalSize(Thickness), new VolumeToSurface(Thickness / 2) })
        {
            Assert.Equal(Creep(section, 1000, 28), Creep(section with { Size = size }, 1000, 28), 1e-12);
            Assert.Equal(Shrinkage(section, 1000), Shrinkage(section with { Size = size }, 1000), 1e-15);
        }
    }

    [Fact]
    public void A_given_modulus_takes_the_place_of_the_formula()
    {
        var derivation = new Derivation();
        Assert.Equal(30e9, Said(Model.CreepModulus(Of(Ordinary with { Modulus = 30e9 }), Age(28, derivation), derivation)));
        Assert.InRange(Said(Model.CreepModulus(Of(Ordinary), Age(28, derivation), derivation)), 25e9, 45e9);
    }

    [Fact]
    public void Strengths_beyond_its_limits_are_answered_with_silence_and_the_limits()
    {
        var derivation = new Derivation();
        var strong = Of(Ordinary with { Strength = 150 * Mpa });
        Assert.NotEmpty(Assert.IsType<Silent<Number>>(Model.CreepCoefficient(strong, Age(100, derivation), Age(28, derivation), derivation)).Why);
        Assert.NotEmpty(Assert.IsType<Silent<Number>>(Model.Shrinkage(strong, Age(100, derivation), derivation)).Why);
    }

    [Fact]
    public void Every_step_names_document_and_place_and_every_memory_one_an_id_to_confirm()
    {
        var derivation = new Derivation();
        var concrete = Of(Ordinary);
        Model.CreepCoefficient(concrete, Age(100, derivation), Age(28, derivation), derivation);
        Model.CreepModulus(concrete, Age(28, derivation), derivation);
        Model.ElasticModulus(concrete, Age(28, derivation), derivation);
        Model.Shrinkage(concrete, Age(100, derivation), derivation);
        var sources = derivation.Steps.Select(s => s.Origin switch
        {
            TableOrigin table => table.Source,
            FormulaOrigin formula => formula.Formula.Source,
            _ => null,
        }).OfType<Provenance>().ToArray();
        Assert.True(sources.Length > 6, "a model has steps");
        Assert.All(sources, s =>
        {
            Assert.NotEmpty(s.Document);
            Assert.NotEmpty(s.Place);
            Assert.Equal(s.Mark == Mark.Memory, s.ValueId.Length > 0);
        });
    }

    [Fact]
    public void Without_steps_the_same_bits_come_out()
    {
        var (kept, bare) = (new Derivation(), new Derivation(keepsSteps: false));
        Assert.Equal(Values(kept), Values(bare));

        double[] Values(Derivation d) =>
            [Said(Model.CreepCoefficient(Of(Ordinary), Age(1000, d), Age(28, d), d)), Said(Model.Shrinkage(Of(Ordinary), Age(1000, d), d))];
    }

    /// <summary>Creep coefficient, ages in days.</summary>
    protected double Creep(Concrete concrete, double age, double loadedAt)
    {
        var derivation = new Derivation(keepsSteps: false);
        return Said(Model.CreepCoefficient(Of(concrete), Age(age, derivation), Age(loadedAt, derivation), derivation));
    }

    /// <summary>Shrinkage strain, age in days.</summary>
    protected double Shrinkage(Concrete concrete, double age)
    {
        var derivation = new Derivation(keepsSteps: false);
        return Said(Model.Shrinkage(Of(concrete), Age(age, derivation), derivation));
    }

    /// <summary>Steps of creep coefficient and shrinkage by symbol, ages in days.</summary>
    protected IReadOnlyDictionary<string, double> Steps(Concrete concrete, double age, double loadedAt)
    {
        var derivation = new Derivation();
        Model.CreepCoefficient(Of(concrete), Age(age, derivation), Age(loadedAt, derivation), derivation);
        Model.Shrinkage(Of(concrete), Age(age, derivation), derivation);
        return derivation.Steps.GroupBy(s => s.Symbol).ToDictionary(g => g.Key, g => g.Last().Value);
    }

    protected static DescribedConcrete Of(Concrete concrete)
    {
        var segment = new Segment { Id = "deck", Start = 0, End = 100, Kind = DeckKind.Concrete, AxialStiffness = 1e11, Concrete = concrete };
        var plan = new Plan
        {
            Structure = new("T", "Test", "nowhere", "Etc/UTC", null),
            Basis = new BasisChoice { Code = "test" },
            Climate = new Climate(),
            Segments = [segment],
            Supports = [],
            Bearings = [],
            Joints = [],
        };
        return new DescribedConcrete(plan, segment);
    }

    protected static Number Age(double days, Derivation derivation) =>
        derivation.Given(FormattableString.Invariant($"age/{days:R}"), "t", "age", Quantity.Age, days * Day);

    protected static double Said(Answer<Number> answer) => Assert.IsType<Said<Number>>(answer).Value.Value;

    private static void Rises(double[] values) => Assert.All(values.Zip(values.Skip(1)), pair => Assert.True(pair.Second > pair.First, $"{pair.First} is followed by {pair.Second}"));
}
