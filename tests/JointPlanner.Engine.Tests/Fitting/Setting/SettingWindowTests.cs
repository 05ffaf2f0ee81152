using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Setting;

public sealed class SettingWindowTests
{
    private static readonly Limit Least = Limit("least opening", Bound.Lower, In(0.50));
    private static readonly Limit Greatest = Limit("greatest opening", Bound.Upper, In(4.00));
    private static readonly Limit AtInstallation = Limit("least installation opening", Bound.Lower, In(1.50), judgedBy: null);
    private static readonly Limit AlongTheRoad = Limit("greatest gap along the road", Bound.Upper, In(4.00), Column.GapStrength, Measure.Along);

    private readonly Derivation d = new();

    // Inputs published (seen): Colorado DOT BDM Appendix A Example 5, Jan 2018. Regression check, own arithmetic, not published.
    [Theory]
    [InlineData(-10, 1.961, 3.662)]
    [InlineData(0, 1.840, 3.540)]
    [InlineData(20, 1.596, 3.296)]
    [InlineData(40, 1.352, 3.053)]
    [InlineData(60, 1.109, 2.809)]
    [InlineData(80, 0.865, 2.566)]
    [InlineData(100, 0.622, 2.322)]
    [InlineData(110, 0.500, 2.200)]
    public void The_300_ft_deck_has_a_hot_and_a_cold_rule_at_every_temperature(double fahrenheit, double hot, double cold)
    {
        var window = SettingWindow.At([Least, Greatest], Movements(PublishedJoints.StripSeal300Ft(d), Counts(1.2), Occasion.Setting, F(fahrenheit)));

        Assert.Equal(hot, window.Least.Value / In(1), 0.0005);
        Assert.Equal(cold, window.Greatest.Value / In(1), 0.0005);
    }

    // The same source. Regression check, own arithmetic, not published: the installation rule governs above about 28 °F.
    [Theory]
    [InlineData(27, "least opening")]
    [InlineData(29, "least installation opening")]
    [InlineData(110, "least installation opening")]
    public void The_window_says_which_limit_governs(double fahrenheit, string governing)
    {
        var window = SettingWindow.At([Least, AtInstallation, Greatest],
            Movements(PublishedJoints.StripSeal300Ft(d), Counts(1.2), Occasion.Setting, F(fahrenheit)));

        Assert.Equal(governing, window.LeastBy.Name);
        Assert.Equal("greatest opening", window.GreatestBy.Name);
    }

    // The same source with 4.0 in along the road beside it, read at Missouri DOT EPG 751.13, rev. 7 Feb 2014 (seen). Own arithmetic, not published.
    [Fact]
    public void A_limit_along_the_road_governs_the_cold_end_at_60_degrees_Fahrenheit()
    {
        var window = SettingWindow.At([Least, AtInstallation, Greatest, AlongTheRoad],
            Movements(PublishedJoints.StripSeal300Ft(d), Counts(1.2), Occasion.Setting, F(60)));

        Assert.Equal(2.568, window.Greatest.Value / In(1), 0.0005);
        Assert.Equal(1.50, window.Least.Value / In(1), 1e-9);
        Assert.Same(AlongTheRoad, window.GreatestBy);
    }

    [Fact]
    public void At_the_highest_temperature_the_least_opening_is_the_limit_and_what_else_closes()
    {
        var demand = Demand(d, Joint(20, Degrees(30)), [Thermal(d, 1e-3, -10, 35)],
            Other(d, Cause.Braking, opens: 0.004, closes: 0.006, isIrreversible: false), Other(d, Cause.Creep, opens: 0.010));
        var window = SettingWindow.At([Least, Greatest], Movements(demand, Counts(1.2), Occasion.Setting, 35));

        Assert.Equal(Least.Value.Value + (0.006 * Math.Cos(Degrees(30))), window.Least.Value, 1e-12);
    }

    [Fact]
    public void Each_limit_takes_the_movements_of_its_own_column()
    {
        var counting = Counts().With(Cause.UniformTemperature, Column.GapStrength, new Counted(2) { Source = Source });
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 30)]);
        var window = SettingWindow.At([Limit("service", Bound.Lower, 0.020, Column.GapService), Limit("strength", Bound.Lower, 0.005, Column.GapStrength), Greatest],
            Movements(demand, counting, Occasion.Setting, 10));

        // 0.020 + 0.020 against 0.005 + 2 · 0.020
        Assert.Equal(0.045, window.Least.Value, 1e-12);
        Assert.Equal("strength", window.LeastBy.Name);
    }

    [Fact]
    public void Wider_limits_never_make_a_narrower_window()
    {
        var movements = Movements(PublishedJoints.StripSeal300Ft(d), Counts(1.2), Occasion.Setting, F(50));
        for (var inches = 0.0; inches < 2; inches += 0.1)
        {
            var narrow = SettingWindow.At([Limit("l", Bound.Lower, In(1.9 - inches)), AtInstallation, Limit("u", Bound.Upper, In(3 + inches)), AlongTheRoad], movements);
            var wide = SettingWindow.At([Limit("l", Bound.Lower, In(1.8 - inches)), AtInstallation, Limit("u", Bound.Upper, In(3.1 + inches)), AlongTheRoad], movements);
            Assert.True(wide.Least.Value <= narrow.Least.Value && wide.Greatest.Value >= narrow.Greatest.Value, $"at {inches} in");
        }
    }

    [Fact]
    public void An_older_deck_has_a_wider_window_than_a_young_one()
    {
        var young = Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30)], Other(d, Cause.Shrinkage, opens: 0.050));
        var old = young with { Others = [Other(d, Cause.Wind, opens: 0.005)] };

        Assert.True(SettingWindow.At([Least, Limit("u", Bound.Upper, 0.080)], Movements(young, Counts(), Occasion.Setting, 10)).IsEmpty);
        Assert.False(SettingWindow.At([Least, Limit("u", Bound.Upper, 0.080)], Movements(old, Counts(), Occasion.Setting, 10)).IsEmpty);
    }

    [Fact]
    public void A_window_without_an_upper_limit_is_refused() => Assert.Throws<ArgumentException>(() =>
        SettingWindow.At([Least], Movements(PublishedJoints.StripSeal300Ft(d), Counts(), Occasion.Setting, 10)));
}
