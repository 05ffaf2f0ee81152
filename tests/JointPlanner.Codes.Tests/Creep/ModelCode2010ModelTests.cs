using JointPlanner.Codes.ModelCode2010;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests.Creep;

public sealed class ModelCode2010ModelTests : CreepModelSpecification
{
    protected override CreepModel Model { get; } = new ModelCode2010Model();

    private static Concrete Slab => new()
    {
        Source = "test",
        Strength = 35 * Mpa,
        CuringEnd = Day,
        Humidity = 0.8,
        Size = new SectionSize(3.9, 11.6),
        EndOfLife = 100 * Year,
    };

    /// <summary>Regression check, own arithmetic, not published.</summary>
    [Theory]
    [InlineData(77, 8.580e-5)]
    [InlineData(18250, 2.969e-4)]
    [InlineData(36500, 3.277e-4)]
    public void Shrinkage_of_a_slab_in_moist_air(double age, double strain) => Assert.Equal(strain, Shrinkage(Slab, age), strain < 1e-4 ? 0.0005e-5 : 0.0005e-4);

    /// <summary>Regression check, own arithmetic, not published: basic, drying and whole creep coefficient after fifty years.</summary>
    [Theory]
    [InlineData(1, 2.150, 0.437, 2.586)]
    [InlineData(7, 1.648, 0.303, 1.951)]
    [InlineData(28, 1.295, 0.232, 1.528)]
    [InlineData(88, 1.016, 0.186, 1.202)]
    public void Creep_is_basic_and_drying_creep(double loadedAt, double basic, double drying, double whole)
    {
        var steps = Steps(Slab, 18250, loadedAt);
        Assert.Equal(basic, steps["φ_bc"], 0.0006);
        Assert.Equal(drying, steps["φ_dc"], 0.0006);
        Assert.Equal(whole, steps["φ"], 0.0006);
    }

    [Fact]
    public void In_water_the_concrete_swells() => Assert.True(Steps(Slab with { Humidity = 1.0 }, 36500, 28)["ε_cds"] < 0);

    [Fact]
    public void Below_forty_per_cent_its_shrinkage_is_silent()
    {
        var derivation = new Derivation();
        Assert.Contains("40 %", Assert.IsType<Silent<Number>>(Model.Shrinkage(Of(Slab with { Humidity = 0.39 }), Age(100, derivation), derivation)).Why, StringComparison.Ordinal);
    }
}
