using JointPlanner.Exchange.Packages;
using JointPlanner.Issuing.Setting;
using static JointPlanner.Issuing.Tests.Setting.PlantedJoint;

namespace JointPlanner.Issuing.Tests.Setting;

/// <summary>What people on site ask of an issued joint. Planted numbers; expected values worked out by hand.</summary>
public sealed class IssuedJointTests
{
    private static readonly IssuedJoint Joint = Square(Row(10, 50, 5, 5), Row(11, 49.5, 5, 5));

    private static SetPoint Point(double mm, double t, string place = "axis") => new(place, Mm(mm), Direction.Normal, t, "surface");

    // Weights 3 and 1: (3 · 12 + 1 · 8) / 4 = 11.
    [Fact]
    public void The_mean_temperature_is_weighted()
    {
        Assert.Equal(11, Joint.Mean([12, 8]), 1e-12);
        Assert.Throws<ArgumentException>(() => Joint.Mean([12]));
    }

    [Fact]
    public void Without_points_one_mean_temperature_is_asked_for()
    {
        var joint = new IssuedJoint(Facts with { Points = [] }, new("j1", "", "strip-seal", "80 mm", 0, [], [new("surface", 2, 0.0005, 0, 40, [])], []));
        Assert.Equal("mean temperature of the structure", Assert.Single(joint.Points).Name);
        Assert.Equal(7.5, joint.Mean([7.5]));
        Assert.Equal("j1", joint.Mark);
    }

    [Theory]
    [InlineData(54, null, 4.0, true)]
    [InlineData(58, null, 8.0, false)]
    [InlineData(45, 5.0, null, true)]
    [InlineData(44, 6.0, null, false)]
    [InlineData(50, null, null, true)]
    public void The_opening_there_now_says_what_to_do(double now, double? open, double? close, bool isWithin)
    {
        var correction = IssuedJoint.Correct(Joint.At("surface", 10, null, Direction.Normal).Sets(), Mm(now));
        Assert.Equal((open, close, isWithin), (Round(correction.OpenBy), Round(correction.CloseBy), correction.IsWithin));

        static double? Round(double? metres) => metres is { } m ? Math.Round(m * 1000, 6) : null;
    }

    // Window 44–56 mm, U = 1 mm, k = 0.5 mm/K. Set to 50: 6 mm to each end, less 1, over 0.5 = 10 K each way. Set to 53: 3 and 9 mm: 4 K of warming, 16 K of cooling.
    [Theory]
    [InlineData(50, 10, 10)]
    [InlineData(53, 4, 16)]
    [InlineData(55.5, 0, 21)]
    public void The_drift_allowed_runs_to_the_end_that_comes_nearer(double mm, double warming, double cooling)
    {
        var drift = Joint.Drift(Joint.At("surface", 10, null, Direction.Normal).Sets(), Mm(mm));
        Assert.Equal(warming, drift.Warming!.Value, 1e-9);
        Assert.Equal(cooling, drift.Cooling!.Value, 1e-9);
    }

    // From own arithmetic printed in a public description of setting practice only as a rule: mid-window, ±1/8 in, 0.02199 in/°F, reserve left out: 5.7 °F.
    [Fact]
    public void The_drift_agrees_with_the_engine_s_own_formula()
    {
        var set = Joint.At("surface", 10, null, Direction.Normal).Sets();
        foreach (var isWarming in (bool[])[true, false])
        {
            var engine = Engine.Fitting.Setting.AllowedDrift.Of(0.052, set.Least, set.Greatest, set.Reserve, Joint.Rate, isWarming);
            var drift = Joint.Drift(set, 0.052);
            Assert.Equal(engine!.Value, (isWarming ? drift.Warming : drift.Cooling)!.Value, 1e-9);
        }
    }

    // 50 mm at 10 °C: to 40 °C it closes 30 · 0.5 + 4 = 19 mm → 31 mm, limit 20, reserve 1: 10 mm left; but on the day 50 − 30 − 1 = 19 mm, which is more.
    // To 0 °C it opens 10 · 0.5 + 6 = 11 mm → 61 mm, limit 80, reserve 1: 18 mm left.
    [Fact]
    public void An_opening_is_carried_to_both_ends()
    {
        var (atMinimum, atMaximum) = Joint.Carry(Point(50, 10), null);
        Assert.Equal((true, 18.0, true, 10.0), (atMinimum.Holds, Math.Round(atMinimum.Room * 1000, 6), atMaximum.Holds, Math.Round(atMaximum.Room * 1000, 6)));
    }

    // 38 mm at 10 °C: 38 − 19 = 19 mm, limit 20, reserve 1: 2 mm too narrow. 70 mm: 70 + 11 = 81, limit 80, reserve 1: 2 mm too wide. 28 mm is 3 mm below the least at installation with the reserve.
    [Fact]
    public void One_that_fails_says_which_limit_and_by_how_much()
    {
        var (_, hot) = Joint.Judge([Point(50, 10, "left kerb"), Point(38, 10, "right kerb")], null);
        Assert.False(hot.Holds);
        Assert.Equal("right kerb: Carried to 40.0 °C with all that counts for gap in service the opening is 19.0 mm; the limit “least gap in service” is 20.0 mm, the reserve 1.0 mm: too narrow by 2.0 mm.", hot.Sentence);
        var (cold, _) = Joint.Judge([Point(70, 10), Point(50, 10)], null);
        Assert.False(cold.Holds);
        Assert.Equal("axis: Carried to 0.0 °C with all that counts for gap in service the opening is 81.0 mm; the limit “greatest gap in service” is 80.0 mm, the reserve 1.0 mm: too wide by 2.0 mm.", cold.Sentence);
    }

    // 33 mm at 35 °C: carried it is 33 − 2.5 − 4 = 26.5 mm, 5.5 mm left; on the day 33 − 30 − 1 = 2 mm are left: that speaks.
    [Fact]
    public void A_limit_that_holds_on_the_day_is_judged_as_it_stands()
    {
        var (_, hot) = Joint.Judge([Point(33, 35)], null);
        Assert.Equal("axis: On the day the opening is 33.0 mm; the limit “least gap at installation” is 30.0 mm, the reserve 1.0 mm: 2.0 mm of room is left.", hot.Sentence);
        Assert.False(Joint.Carry(Point(30.5, 35), null).AtMaximum.Holds);
    }

    // Along the road at 60° skew 100 mm are 50 mm normal.
    [Fact]
    public void An_opening_along_the_road_is_judged_normal_to_the_joint()
    {
        var skewed = Of(Math.PI / 3, null, Row(10, 50, 5, 5));
        var (_, hot) = skewed.Carry(new("axis", 0.100, Direction.Along, 10, "surface"), null);
        Assert.Equal(10, hot.Room * 1000, 1e-6);
    }

    // Movement of the youngest age: 6 mm of opening; of the older: 5 mm. An age between has not reached the older, so more is still to come.
    [Theory]
    [InlineData(90, 18)]
    [InlineData(200, 18)]
    [InlineData(365, 19)]
    public void What_is_still_to_come_follows_the_age_reached(double age, double room)
    {
        var joint = Of(0, 28, Row(10, 50, 5, 5, age: 90), Row(10, 50, 5, 5, age: 365));
        Assert.Equal(room, joint.Carry(Point(50, 10), age * Day).AtMinimum.Room * 1000, 1e-6);
    }

    [Fact]
    public void What_was_set_outside_the_table_cannot_be_judged_and_fails()
    {
        var (atMinimum, atMaximum) = Joint.Judge([Point(50, 45)], null);
        Assert.False(atMinimum.Holds || atMaximum.Holds);
        Assert.Contains("cannot be judged", atMaximum.Sentence, StringComparison.Ordinal);
        var aged = Of(0, 28, Row(10, 50, 5, 5, age: 90));
        Assert.Contains("deck age of 60 d", aged.Judge([Point(50, 10)], 60 * Day).AtMinimum.Sentence, StringComparison.Ordinal);
    }

    [Fact]
    public void It_may_be_used_for_as_long_as_was_issued() =>
        Assert.Equal(new DateTimeOffset(2031, 3, 31, 8, 0, 0, TimeSpan.Zero), Joint.UseBefore(new DateTimeOffset(2030, 12, 31, 8, 0, 0, TimeSpan.Zero)));

    [Fact]
    public void Every_value_within_its_tolerance_holds_when_carried_for_every_demo()
    {
        var judged = 0;
        foreach (var name in SeedData.StructureNames)
        {
            var calculation = Calculation.Of(SeedData.Structure((string)name.Data), SeedData.Shelf);
            foreach (var joint in IssuedJoint.All(System.Text.Encoding.UTF8.GetString(ResultsFile.ToUtf8(calculation.Stored(new string('0', 64))))))
                foreach (var method in joint.Methods)
                    foreach (var row in joint.Rows(method.Id).Where(r => r.Set is not null))
                        foreach (var opening in (double[])[row.Set!.Value, row.Set.Value - row.Minus!.Value, row.Set.Value + row.Plus!.Value])
                        {
                            var (cold, hot) = joint.Carry(new("axis", opening, Direction.Normal, row.Temperature, method.Id), row.DeckAge);
                            Assert.True(cold.Holds && hot.Holds, FormattableString.Invariant($"{name}: {joint.Id} by {method.Id} at {row.Temperature}: {opening}"));
                            judged++;
                        }
        }
        Assert.True(judged > 1000, $"only {judged} openings");
    }
}
