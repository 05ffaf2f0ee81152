using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests;

/// <summary>What every code edition must fulfil. A class per edition says what the edition is silent on: a change of that list is seen in review.</summary>
public abstract class BasisSpecification
{
    protected abstract CodeBasis Basis { get; }

    /// <summary>A plan that the edition can answer.</summary>
    protected abstract Plan Answerable { get; }

    /// <summary>What the edition is silent on, in words, sorted.</summary>
    protected abstract string[] SilentOn { get; }

    [Fact]
    public void It_is_found_in_the_catalogue_by_its_id() => Assert.Same(Basis.GetType(), Catalogue.Find(Basis.Id)?.GetType());

    [Fact]
    public void It_names_its_published_examples_or_why_there_are_none() => Assert.NotEmpty(Basis.PublishedExamples);

    [Fact]
    public void Its_silences_are_these()
    {
        var derivation = new Derivation();
        var silent = new List<string>();
        void Ask<T>(string question, Answer<T> answer)
        {
            if (answer is Silent<T>) silent.Add(question);
        }
        foreach (var kind in Enum.GetValues<DeckKind>())
        {
            Ask($"temperature {kind}", Basis.UniformTemperature(kind, Answerable, derivation));
            Ask($"expansion {kind}", Basis.ExpansionCoefficient(kind, derivation));
            Ask($"temperature difference {kind}", Basis.TemperatureDifference(Sections.Of(kind, derivation), derivation));
        }
        Ask("live load", Basis.LiveLoad(Traffic, derivation));
        foreach (var doubt in Basis.Doubts.Where(d => d != SettingDoubt.None)) Ask($"doubt {doubt}", Basis.DoubtAllowance(doubt, derivation));
        Ask("safety degrees", Basis.SafetyDegrees(derivation));
        var counting = Basis.Counting(Basis.SafetyFormats[0]);
        foreach (var cause in Enum.GetValues<Cause>())
            if (Enum.GetValues<Column>().All(c => counting[cause, c] is SilentEntry)) silent.Add($"counting {cause}");
        Assert.Equal(SilentOn, silent.Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Every_table_value_names_document_and_place_and_every_memory_value_an_id_to_confirm()
    {
        var derivation = new Derivation();
        foreach (var kind in Enum.GetValues<DeckKind>())
        {
            Basis.UniformTemperature(kind, Answerable, derivation);
            Basis.ExpansionCoefficient(kind, derivation);
            Basis.SingleGapLimits(kind, kind, derivation);
            Basis.TemperatureDifference(Sections.Of(kind, derivation), derivation);
        }
        Basis.LiveLoad(Traffic, derivation);
        Basis.ModularGapLimits(derivation);
        Basis.SafetyDegrees(derivation);
        var sources = derivation.Steps.Select(s => s.Origin).OfType<TableOrigin>().Select(o => o.Source)
            .Concat(Basis.Counting(Basis.SafetyFormats[0]).Entries.Values.Select(e => e.Source).OfType<Provenance>());
        Assert.All(sources, s =>
        {
            Assert.NotEmpty(s.Document);
            Assert.NotEmpty(s.Place);
            Assert.Equal(s.Mark == Mark.Memory, s.ValueId.Length > 0);
        });
    }

    [Fact]
    public void A_warming_allowance_raises_the_maximum_and_leaves_the_minimum()
    {
        var derivation = new Derivation(keepsSteps: false);
        var compared = 0;
        var wider = Answerable with { Climate = Answerable.Climate with { Warming = Answerable.Climate.Warming + 3 } };
        foreach (var kind in Enum.GetValues<DeckKind>())
            if (Basis.UniformTemperature(kind, Answerable, derivation) is Said<TemperatureRange> base_
                && Basis.UniformTemperature(kind, wider, derivation) is Said<TemperatureRange> warmed)
            {
                Assert.Equal(base_.Value.Max.Value + 3, warmed.Value.Max.Value, 1e-9);
                Assert.Equal(base_.Value.Min.Value, warmed.Value.Min.Value, 1e-9);
                compared++;
            }
        Assert.Equal(Enum.GetValues<DeckKind>().Length, compared);
    }

    protected static LiveLoad Traffic { get; } = new() { StandsFor = FrameShare.WholeWidth, Lanes = 2, Carriageway = 8 };

    protected static Plan PlanWith(string code, Climate climate, string profile = "") => new()
    {
        Structure = new("T", "Test", "nowhere", "Etc/UTC", null),
        Basis = new BasisChoice { Code = code, Profile = profile },
        Climate = climate,
        Segments = [],
        Supports = [],
        Bearings = [],
        Joints = [],
    };
}
