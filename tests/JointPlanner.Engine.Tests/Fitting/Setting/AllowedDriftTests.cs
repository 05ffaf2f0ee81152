using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Setting;

public sealed class AllowedDriftTests
{
    // Regression check, own arithmetic, not published: 1/8 in either way at 0.02199 in/°F allows 5.7 °F.
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void An_eighth_of_an_inch_allows_5_7_degrees_Fahrenheit(bool isWarming)
    {
        var drift = AllowedDrift.Of(In(2), In(1.875), In(2.125), 0, Unit.InchPerFahrenheit.ToSi(0.02199), isWarming);

        Assert.Equal(5.7, drift!.Value / Unit.FahrenheitDifference.Factor, 0.05);
    }

    [Fact]
    public void When_it_warms_the_upper_end_of_the_window_comes_nearer()
    {
        Assert.Equal(20, AllowedDrift.Of(0.050, 0.040, 0.072, 0.002, 1e-3, isWarming: true)!.Value, 1e-9);
        Assert.Equal(8, AllowedDrift.Of(0.050, 0.040, 0.072, 0.002, 1e-3, isWarming: false)!.Value, 1e-9);
    }

    [Fact]
    public void Where_warming_opens_the_joint_the_ends_change_over()
    {
        Assert.Equal(8, AllowedDrift.Of(0.050, 0.040, 0.072, 0.002, -1e-3, isWarming: true)!.Value, 1e-9);
        Assert.Equal(20, AllowedDrift.Of(0.050, 0.040, 0.072, 0.002, -1e-3, isWarming: false)!.Value, 1e-9);
    }

    [Fact]
    public void An_opening_within_the_reserve_of_the_end_allows_none() =>
        Assert.True(AllowedDrift.Of(0.071, 0.040, 0.072, 0.002, 1e-3, isWarming: true) < 0);

    [Fact]
    public void A_joint_that_temperature_does_not_move_sets_no_bound() => Assert.Null(AllowedDrift.Of(0.05, 0.04, 0.06, 0.001, 0, true));
}
