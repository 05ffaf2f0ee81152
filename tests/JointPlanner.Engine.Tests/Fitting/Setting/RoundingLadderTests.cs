using JointPlanner.Engine.Fitting.Setting;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Setting;

public sealed class RoundingLadderTests
{
    [Fact]
    public void Fractions_of_an_inch_are_halved_down_to_a_sixty_fourth() =>
        Assert.Equal([8, 16, 32, 64], RoundingLadder.From(In(0.125)).Select(s => Math.Round(In(1) / s, 9)));

    [Fact]
    public void Five_millimetres_go_to_one_and_to_a_half() =>
        Assert.Equal([5, 1, 0.5], RoundingLadder.From(0.005).Select(s => Math.Round(s * 1000, 9)));

    [Fact]
    public void Millimetres_go_to_half_a_millimetre() => Assert.Equal([1, 0.5], RoundingLadder.From(0.001).Select(s => Math.Round(s * 1000, 9)));

    [Fact]
    public void A_finer_step_than_a_tape_shows_stays_alone() => Assert.Equal([0.0002], RoundingLadder.From(0.0002));

    [Fact]
    public void A_tolerance_is_rounded_one_rung_finer_and_at_the_end_to_the_gauge()
    {
        Assert.Equal(In(1.0 / 32), RoundingLadder.OfTolerance(In(1.0 / 16)), 1e-12);
        Assert.Equal(0.0005, RoundingLadder.OfTolerance(0.001), 1e-12);
        Assert.Equal(RoundingLadder.Gauge, RoundingLadder.OfTolerance(0.0005));
        Assert.Equal(RoundingLadder.Gauge, RoundingLadder.OfTolerance(RoundingLadder.Gauge));
    }

    [Theory]
    [InlineData(0.0475, 0.0400, 0.047)]
    [InlineData(0.0475, 0.0500, 0.048)]
    [InlineData(0.0474, 0.0500, 0.047)]
    [InlineData(0.0476, 0.0400, 0.048)]
    [InlineData(0.0480, 0.0400, 0.048)]
    [InlineData(0.0480, 0.0500, 0.048)]
    public void A_half_goes_toward_the_middle_of_the_window(double value, double middle, double rounded) =>
        Assert.Equal(rounded, SettingFormulas.Rounded.Compute(value, middle, 0.001), 1e-12);
}
