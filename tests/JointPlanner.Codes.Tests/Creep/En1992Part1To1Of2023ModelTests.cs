using JointPlanner.Codes.En1992Part1To1Of2023;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests.Creep;

public sealed class En1992Part1To1Of2023ModelTests : CreepModelSpecification
{
    protected override CreepModel Model { get; } = new En1992Part1To1Of2023Model();

    private static Concrete Slab => new()
    {
        Source = "test",
        Strength = 35 * Mpa,
        CuringEnd = Day,
        Humidity = 0.8,
        Size = new SectionSize(3.9, 11.6),
        EndOfLife = 100 * Year,
    };

    /// <summary>Published: an open-source finite-element library's verification file to the 2021 draft of EN 1992-1-1 (seen).</summary>
    [Theory]
    [InlineData("ε_cbs,0", 7.88272e-5, 0.5e-10)]
    [InlineData("β_bs", 0.8270915, 0.5e-7)]
    [InlineData("ε_cbs", 6.51973e-5, 0.5e-10)]
    [InlineData("ε_cds,0", 3.939562e-4, 0.5e-10)]
    [InlineData("RH_eq", 0.969829, 0.5e-6)]
    [InlineData("β_RH", 0.6800061, 0.5e-7)]
    [InlineData("β_ds", 0.0691347, 0.5e-7)]
    [InlineData("ε_cds", 1.852067e-5, 0.5e-11)]
    [InlineData("ε_cs", 8.371798e-5, 0.5e-11)]
    public void Shrinkage_at_77_days_is_as_printed(string symbol, double printed, double halfDigit) => Assert.Equal(printed, Steps(Slab, 77, 28)[symbol], halfDigit);

    /// <summary>Regression check, own arithmetic, not published.</summary>
    [Theory]
    [InlineData(18250, 2.749e-4)]
    [InlineData(36500, 3.026e-4)]
    public void Shrinkage_at_the_end_of_life(double age, double strain) => Assert.Equal(strain, Shrinkage(Slab, age), 0.0005e-4);

    /// <summary>Regression check, own arithmetic, not published.</summary>
    [Theory]
    [InlineData(1, 18250, 2.586)]
    [InlineData(28, 18250, 1.528)]
    [InlineData(28, 36500, 1.620)]
    public void Creep_never_ends(double loadedAt, double age, double coefficient) => Assert.Equal(coefficient, Creep(Slab, age, loadedAt), 0.0006);

    [Fact]
    public void The_modulus_at_another_age_is_not_held()
    {
        var derivation = new Derivation();
        Assert.Contains("give the modulus", Assert.IsType<Silent<Number>>(Model.ElasticModulus(Of(Slab), Age(90, derivation), derivation)).Why, StringComparison.Ordinal);
    }
}
