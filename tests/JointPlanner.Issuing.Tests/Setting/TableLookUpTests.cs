using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Setting;
using static JointPlanner.Issuing.Tests.Setting.PlantedJoint;

namespace JointPlanner.Issuing.Tests.Setting;

/// <summary>The look-up by planted tables; the numbers beside each case are worked out by hand from the intersection of both rows.</summary>
public sealed class TableLookUpTests
{
    private static readonly IssuedJoint Two = Square(Row(10, 50, 5, 5), Row(11, 49, 4, 6));

    [Fact]
    public void On_a_row_its_own_value_is_given()
    {
        var set = Two.At("surface", 10, null, Direction.Normal).Sets();
        Assert.Equal((0.050, 0.005, 0.005), (set.Set, set.Minus, set.Plus), Near);
        Assert.Equal((0.044, 0.056, 0.001), (set.Least, set.Greatest, set.Reserve), Near);
        Assert.Equal(("least gap in service", "greatest gap in service"), (set.LeastBy, set.GreatestBy));
    }

    // Rows allow 45–55 and 45–55: together 45–55. Nearer the first its 50, nearer the second its 49; in the very middle the first.
    [Theory]
    [InlineData(10.2, 50, 5, 5)]
    [InlineData(10.8, 49, 4, 6)]
    [InlineData(10.5, 50, 5, 5)]
    public void Between_two_rows_the_nearer_value_is_given_within_what_both_allow(double t, double set, double minus, double plus)
    {
        var answer = Two.At("surface", t, null, Direction.Normal).Sets();
        Assert.Equal((Mm(set), Mm(minus), Mm(plus)), (answer.Set, answer.Minus, answer.Plus), Near);
    }

    // 50 ± 1 allows 49–51, 48 −1 +2.5 allows 47–50.5: together 49–50.5. The nearer row's 48 is outside, so the other's 50 is given: −1 +0.5.
    [Fact]
    public void Where_the_nearer_value_is_outside_the_other_is_given()
    {
        var answer = Square(Row(10, 50, 1, 1), Row(11, 48, 1, 2.5)).At("surface", 10.9, null, Direction.Normal).Sets();
        Assert.Equal((0.050, 0.001, 0.0005), (answer.Set, answer.Minus, answer.Plus), Near);
    }

    // 50 ± 1 allows 49–51, 48 ± 1 allows 47–49: they touch at 49, which leaves no tolerance.
    [Fact]
    public void Two_rows_without_a_common_opening_give_no_value()
    {
        var joint = Square(Row(10, 50, 1, 1), Row(11, 48, 1, 1));
        Assert.Equal("setting-between-rows", joint.At("surface", 10.5, null, Direction.Normal).Refuses());
        Assert.Equal(0.050, joint.At("surface", 10, null, Direction.Normal).Sets().Set);
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(40.1)]
    public void Outside_the_temperatures_nothing_is_given(double t)
    {
        var joint = Square(Row(0, 55, 5, 5), Row(40, 45, 5, 5));
        Assert.Equal("setting-outside-temperatures", joint.At("surface", t, null, Direction.Normal).Refuses());
        var why = Assert.IsType<DoNotSet>(joint.At("surface", t, null, Direction.Normal)).Why;
        Assert.EndsWith("values are given from 0.0 °C to 40.0 °C only.", FindingText.Of(why, DisplayProfile.Metric), StringComparison.Ordinal);
    }

    [Fact]
    public void A_row_that_says_do_not_set_closes_what_lies_beside_it_and_its_own_reason_is_given()
    {
        var joint = Square(Row(10, 50, 5, 5), Closed(11));
        Assert.Equal("setting-no-window", joint.At("surface", 10.1, null, Direction.Normal).Refuses());
        var why = Assert.IsType<DoNotSet>(joint.At("surface", 11, null, Direction.Normal)).Why;
        Assert.Equal("Do not set at 51.8 °F: the joint is too small.", FindingText.Of(why, DisplayProfile.Us));
    }

    [Fact]
    public void A_joint_that_depends_on_age_asks_for_it_and_refuses_a_younger_deck()
    {
        var joint = Of(0, 28, Row(10, 50, 5, 5, age: 90), Row(10, 52, 5, 5, age: 365));
        Assert.Equal("setting-no-age", joint.At("surface", 10, null, Direction.Normal).Refuses());
        Assert.Equal("setting-too-young", joint.At("surface", 10, 20 * Day, Direction.Normal).Refuses());
        // Its least age is 28 d, but the youngest row is 90 d: for what lies between nothing was issued.
        Assert.Equal("setting-too-young", joint.At("surface", 10, 60 * Day, Direction.Normal).Refuses());
    }

    // 90 d allows 45–55, 365 d allows 47–57: between them 47–55, at 100 d by the nearer 50 (−3 +5), at 300 d by 52 (−5 +3); from 365 d on the last row.
    [Theory]
    [InlineData(100, 50, 3, 5)]
    [InlineData(300, 52, 5, 3)]
    [InlineData(365, 52, 5, 5)]
    [InlineData(900, 52, 5, 5)]
    public void Between_two_ages_what_both_allow_is_given_and_beyond_the_last_its_row(double age, double set, double minus, double plus)
    {
        var answer = Of(0, 28, Row(10, 50, 5, 5, age: 90), Row(10, 52, 5, 5, age: 365)).At("surface", 10, age * Day, Direction.Normal).Sets();
        Assert.Equal((Mm(set), Mm(minus), Mm(plus)), (answer.Set, answer.Minus, answer.Plus), Near);
    }

    // cos 60° = 0.5: the window 44–56 normal is 88–112 along; the value along has its own rounding and tolerance.
    [Fact]
    public void Along_the_road_the_row_s_own_value_is_given()
    {
        var row = Row(10, 50, 5, 5) with { Along = new StoredOpening(0.101, 0.010, 0.008) };
        var answer = Of(Math.PI / 3, null, row).At("surface", 10, null, Direction.Along).Sets();
        Assert.Equal((0.101, 0.010, 0.008), (answer.Set, answer.Minus, answer.Plus), Near);
        Assert.Equal((0.088, 0.112, 0.002), (answer.Least, answer.Greatest, answer.Reserve), Near);
        Assert.Equal("setting-along", Of(Math.PI / 3, null, Row(10, 50, 5, 5)).At("surface", 10, null, Direction.Along).Refuses());
    }

    [Fact]
    public void A_method_that_was_not_issued_has_no_table() => Assert.Throws<ArgumentException>(() => Two.At("", 10, null, Direction.Normal));

    internal static bool Near((double, double, double) a, (double, double, double) b) =>
        Math.Abs(a.Item1 - b.Item1) < 1e-12 && Math.Abs(a.Item2 - b.Item2) < 1e-12 && Math.Abs(a.Item3 - b.Item3) < 1e-12;
}
