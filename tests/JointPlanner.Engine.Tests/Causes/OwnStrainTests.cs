using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Tests.Causes;

public class OwnStrainTests
{
    private const double Day = 86400;

    /// <summary>
    /// Published: bearing movement sheet of a 26 m beam (seen on a public page): creep 36e-6 per N/mm² at 12 N/mm² and shrinkage 200e-6, half of each
    /// still to come: 5.616 mm and 2.6 mm.
    /// </summary>
    [Theory]
    [InlineData(36e-6 * 12, 5.616e-3, 0.0005e-3)]
    [InlineData(200e-6, 2.6e-3, 0.05e-3)]
    public void Half_of_a_beams_shortening_is_as_printed(double strain, double printed, double halfDigit)
    {
        var shortening = new Shortening(strain, "published sheet", [new(90 * Day, 0.5)]);
        Assert.Equal(printed, 26 * ToCome(shortening, 90), halfDigit);
    }

    [Theory]
    [InlineData(0, 200e-6)]
    [InlineData(14, 160e-6)]
    [InlineData(28, 120e-6)]
    [InlineData(64, 80e-6)]
    [InlineData(100, 40e-6)]
    [InlineData(5000, 40e-6)]
    public void Between_two_ages_the_share_is_linear_and_beyond_the_last_it_stays(double age, double strain) =>
        Assert.Equal(strain, ToCome(new Shortening(200e-6, "test", [new(28 * Day, 0.4), new(100 * Day, 0.8)]), age), 1e-12);

    [Fact]
    public void Without_a_development_all_of_it_is_still_to_come() => Assert.Equal(200e-6, ToCome(new Shortening(200e-6, "test", []), 1000), 1e-15);

    private static double ToCome(Shortening shortening, double age) =>
        OwnStrain.ToCome("s", "shrinkage", shortening, new Number(-1, age * Day), new Derivation(keepsSteps: false)).Value;
}
