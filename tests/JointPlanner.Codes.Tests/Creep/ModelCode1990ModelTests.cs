using JointPlanner.Codes.ModelCode1990;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests.Creep;

public sealed class ModelCode1990ModelTests : CreepModelSpecification
{
    protected override CreepModel Model { get; } = new ModelCode1990Model();

    private static Concrete Member(double humidity, double size) => new()
    {
        Source = "test",
        Strength = 30 * Mpa,
        CuringEnd = 0,
        Humidity = humidity,
        Size = new NotionalSize(size * Mm),
        EndOfLife = 100 * Year,
    };

    /// <summary>From memory, check against the licensed text: CEB-FIP Model Code 1990, table 2.1.11, shrinkage after 70 years, per mille, f_cm 38 MPa.</summary>
    [Theory]
    [InlineData(0.50, 50, 0.57)]
    [InlineData(0.50, 150, 0.56)]
    [InlineData(0.50, 600, 0.47)]
    [InlineData(0.80, 50, 0.32)]
    [InlineData(0.80, 150, 0.31)]
    [InlineData(0.80, 600, 0.26)]
    public void Shrinkage_after_seventy_years_is_that_of_the_table(double humidity, double size, double perMille) =>
        Assert.Equal(perMille, 1000 * Shrinkage(Member(humidity, size), 70 * 365.25), 0.005);

    /// <summary>
    /// A public hand calculation to this document (seen) prints a development of 0.7632 for a hundred years at 100 mm; the document's own formula gives 0.995.
    /// The printed value is not met.
    /// </summary>
    [Fact]
    public void A_misprinted_development_is_not_reproduced()
    {
        var development = Steps(Member(0.50, 100), 36500, 28)["β_s"];
        Assert.Equal(0.995, development, 0.0005);
        Assert.True(development > 0.7632 + 0.1);
    }

    [Fact]
    public void In_water_the_concrete_swells() => Assert.True(Shrinkage(Member(1.0, 100), 36500) < 0);
}
