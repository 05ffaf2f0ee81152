using JointPlanner.Codes.AashtoLrfdCreep;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests.Creep;

public sealed class To2004ModelTests : CreepModelSpecification
{
    private const double Forever = 1e9;

    protected override CreepModel Model { get; } = new To2004Model();

    protected override double Thickness => 0.2;

    protected override double[] Sizes => [0.3, 0.25, 0.2, 0.15, 0.1];

    /// <summary>13 020 in³ and 2 955.38 in² per foot, 6.0 ksi.</summary>
    private static Concrete Girder => new()
    {
        Source = "test",
        Strength = 6 * Ksi,
        CuringEnd = Day,
        Humidity = 0.70,
        Size = new VolumeToSurface(13020 / 2955.38 * Inch),
        EndOfLife = 100 * Year,
    };

    /// <summary>Published: FHWA prestressed-girder design example, Appendix C, step C1.2 (seen).</summary>
    [Theory]
    [InlineData("k_f", 0.748, 0.0005)]
    [InlineData("k_c", 0.759, 0.0005)]
    public void Factors_of_strength_and_size_are_as_printed(string symbol, double printed, double halfDigit) => Assert.Equal(printed, Steps(Girder, Forever, 1)[symbol], halfDigit);

    /// <summary>Published: as above; volume over surface 4.406 in, of which our quotient is 4.4055.</summary>
    [Fact]
    public void Volume_over_surface_is_as_printed() =>
        Assert.Equal(4.406, Of(Girder).VolumeOverSurface(new Engine.Formulas.Derivation()).Value / Inch, 0.00055);

    /// <summary>Regression check, own arithmetic, not published.</summary>
    [Fact]
    public void Creep_of_the_girder_for_a_long_time() => Assert.Equal(1.981, Creep(Girder, 1e14, 1), 0.0006);

    [Fact]
    public void Between_the_rows_of_the_humidity_table_it_is_linear()
    {
        Assert.Equal(1.00, Steps(Girder, 365, 1)["k_h"], 1e-12);
        Assert.Equal(0.93, Steps(Girder with { Humidity = 0.75 }, 365, 1)["k_h"], 1e-12);
    }

    [Fact]
    public void Beyond_six_inches_it_is_silent()
    {
        var derivation = new Engine.Formulas.Derivation();
        var thick = Of(Girder with { Size = new VolumeToSurface(6.1 * Inch) });
        Assert.Contains("6 in", Assert.IsType<Silent<Engine.Formulas.Number>>(Model.Shrinkage(thick, Age(100, derivation), derivation)).Why, StringComparison.Ordinal);
    }
}
