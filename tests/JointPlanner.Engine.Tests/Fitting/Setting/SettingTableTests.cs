using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Setting;

public sealed class SettingTableTests
{
    private static readonly double[] Fahrenheit = [.. Enumerable.Range(-3, 16).Select(i => F(10 * i))];

    private readonly Derivation d = new();

    // Inputs published (seen): Colorado DOT BDM Appendix A Example 5, Jan 2018, rows from −30 to 120 °F asked for; range −10 to 110 °F.
    [Fact]
    public void Rows_beyond_the_range_say_do_not_set_and_all_others_give_a_value()
    {
        var table = StripSeal(Fahrenheit);

        Assert.Equal([-30, -20, 120], table.Rows.Where(r => r.Refusal?.Id == "setting-outside-temperatures").Select(r => Math.Round((r.Temperature * 1.8) + 32)));
        Assert.All(table.Rows.Where(r => r.Refusal is null), r => Assert.NotNull(r.Set));
        Assert.Equal(16, table.Rows.Length);
        Assert.All(table.Rows.Where(r => r.Refusal is not null), r => Assert.Null(r.Window));
        Assert.Equal((F(-10), F(110)), (table.Min.Value, table.Max.Value));
    }

    // The same source; own arithmetic, not published: at 60 °F from 1.50 to 2.809 in, middle 2.154.
    [Fact]
    public void The_design_row_is_the_middle_of_the_window_rounded_with_the_room_to_each_end()
    {
        var row = StripSeal(Fahrenheit).Design;

        Assert.Equal(2.154, row.ByRule!.Value.Value / In(1), 0.001);
        Assert.Equal(2.125, row.Set!.Value.Value / In(1), 1e-9);
        Assert.Equal(20.0 / 32, row.Minus!.Value.Value / In(1), 1e-9);
        Assert.Equal(21.0 / 32, row.Plus!.Value.Value / In(1), 1e-9);
        Assert.Equal(20.0 / 32, row.Both!.Value / In(1), 1e-9);
    }

    [Fact]
    public void The_reserve_takes_its_share_of_both_tolerances()
    {
        var known = StripSeal(Fahrenheit).Design;
        var doubtful = StripSeal(Fahrenheit, uncertainty: 3).Design;

        // 2 · 150 ft · 12 · 6e-6/°F · 1.8 °F/K · cos 20° · 3 K
        Assert.Equal(2 * 1800 * 6e-6 * 1.8 * Math.Cos(Degrees(20)) * 3, doubtful.Reserve!.Value.Value / In(1), 1e-9);
        Assert.Equal(0, known.Reserve!.Value.Value);
        Assert.True(doubtful.Minus!.Value.Value < known.Minus!.Value.Value && doubtful.Plus!.Value.Value < known.Plus!.Value.Value);
    }

    [Fact]
    public void A_row_made_without_steps_has_the_same_bits_as_the_design_row()
    {
        var table = StripSeal(Fahrenheit, uncertainty: 1.5);
        var row = table.Rows.Single(r => r.Temperature == table.Design.Temperature);

        Assert.Equal(Bits(table.Design), Bits(row));
        Assert.True(table.Design.Set!.Value.Step >= 0);
        Assert.Equal(-1, row.Set!.Value.Step);

        static long[] Bits(SettingRow r) => [.. new[]
        {
            r.Window!.Least, r.Window.Greatest, r.Reserve!.Value, r.ByRule!.Value, r.Set!.Value, r.Minus!.Value, r.Plus!.Value,
            r.Along!.Set, r.Along.Minus, r.Along.Plus,
        }.Select(n => BitConverter.DoubleToInt64Bits(n.Value))];
    }

    [Fact]
    public void Only_the_design_row_leaves_steps()
    {
        StripSeal([F(60)]);
        var one = d.Steps.Count;
        var other = new Derivation();
        StripSeal(Fahrenheit, derivation: other);

        Assert.Equal(one, other.Steps.Count);
        Assert.Equal(["joint/j1/setting/set", "joint/j1/setting/minus", "joint/j1/setting/plus"],
            other.Steps.Select(s => s.Key).Where(k => k is "joint/j1/setting/set" or "joint/j1/setting/minus" or "joint/j1/setting/plus"));
    }

    [Fact]
    public void Younger_decks_than_the_least_age_get_no_value_and_older_ones_a_wider_window()
    {
        var day = Unit.Day.Factor;
        JointDemand At(double age) => Demand(d, Joint(10) with { LeastAge = 60 * day }, [Thermal(d, 1e-3, -10, 30)]) with
        {
            DeckAge = age,
            Others = [Other(new Derivation(false), Cause.Shrinkage, opens: 0.010 * 30 * day / age)],
        };
        var size = Size(null, Limit("least", Bound.Lower, 0.010), Limit("greatest", Bound.Upper, 0.080));
        var table = SettingTable.Of(At(90 * day), [0, 10], [365 * day, 30 * day], At, size, Manner(), d);

        Assert.Equal([30 * day, 90 * day, 365 * day], table.Ages.Select(a => a!.Value));
        Assert.Equal(6, table.Rows.Length);
        Assert.All(table.Rows.Take(2), r => Assert.Equal(("setting-too-young", null), (r.Refusal!.Id, r.Set)));
        Assert.Equal([(Quantity.Age, 30 * day), (Quantity.Age, 60 * day)], table.Rows[0].Refusal!.Values);
        Assert.True(table.Rows[4].Window!.Greatest.Value > table.Rows[2].Window!.Greatest.Value);
        Assert.Equal(60 * day, table.LeastAge);
    }

    [Fact]
    public void Where_no_deck_shortens_age_plays_no_part()
    {
        var table = SettingTable.Of(Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30)]), [0, 10], [1e7], _ => throw new InvalidOperationException("not asked"),
            Size(null, Limit("least", Bound.Lower, 0.010), Limit("greatest", Bound.Upper, 0.080)), Manner(), d);

        Assert.Equal([null], table.Ages);
        Assert.Equal(2, table.Rows.Length);
    }

    [Fact]
    public void A_joint_that_is_too_small_says_so_in_the_row_and_stops_issue()
    {
        var table = SettingTable.Of(Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30)]), [10], [], _ => throw new InvalidOperationException("not asked"),
            Size(null, Limit("least", Bound.Lower, 0.010), Limit("greatest", Bound.Upper, 0.045)), Manner(), d);
        var refusal = Assert.Single(d.Findings);

        Assert.Equal("setting-no-window", table.Rows[0].Refusal!.Id);
        Assert.True(table.Design.Window!.IsEmpty);
        Assert.Equal(("setting-no-window", Severity.BlocksIssue), (refusal.Id, refusal.Severity));
        Assert.Equal([10, 0.030, 0.025], refusal.Values.Select(v => Math.Round(v.Value, 12)));
    }

    [Fact]
    public void A_rule_outside_the_window_fails_with_the_middle_beside_it()
    {
        var size = Size(0.029, Limit("least", Bound.Lower, 0.010), Limit("greatest", Bound.Upper, 0.080));
        var table = SettingTable.Of(Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30)]), [], [], _ => throw new InvalidOperationException("not asked"),
            size, Manner(rule: new FixedReference(10, null)), d);

        Assert.Null(table.Design.Set);
        Assert.Equal("setting-rule-outside-window", table.Design.Refusal!.Id);
        Assert.Equal(0.029, table.Design.ByRule!.Value.Value, 1e-12);
        Assert.Equal(0.045, table.Design.MidWindow!.Value.Value, 1e-12);
    }

    [Fact]
    public void A_reference_opening_that_nobody_gives_is_said_and_the_middle_recommended()
    {
        var size = Size(null, Limit("least", Bound.Lower, 0.010), Limit("greatest", Bound.Upper, 0.080));
        var table = SettingTable.Of(Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30)]), [], [], _ => throw new InvalidOperationException("not asked"),
            size, Manner(rule: new FixedReference(10, null)), d);

        Assert.Equal("setting-no-reference", Assert.Single(d.Findings).Id);
        Assert.Equal(0.045, table.Design.Set!.Value.Value, 1e-12);
    }

    [Fact]
    public void Between_two_steps_a_narrow_window_gets_the_next_finer_step_and_then_a_gauge()
    {
        // 30.4 to 31.6 mm: neither 30 nor 35 mm lies in it, 31 mm does
        Assert.Equal((0.031, 0.001, false), Narrow(0.0304, 0.0316, 0.005));
        // 30.1 to 30.9 mm: no whole millimetre, half a one does
        Assert.Equal((0.0305, 0.0005, false), Narrow(0.0301, 0.0309, 0.005));
        // 30.1 to 30.4 mm: by gauge, a half toward the middle or down
        var (set, step, byGauge) = Narrow(0.0301, 0.0304, 0.005);
        Assert.True(byGauge);
        Assert.Equal((0.0302, RoundingLadder.Gauge), (set, step));

        (double Set, double Step, bool ByGauge) Narrow(double least, double greatest, double wanted)
        {
            var row = SettingRows.At(new Number(-1, 10), Demand(d, Joint(10), [Thermal(d, 0, -10, 30)]),
                Size(null, Limit("least", Bound.Lower, least), Limit("greatest", Bound.Upper, greatest)), Manner(step: wanted), d);
            return (Math.Round(row.Set!.Value.Value, 9), row.Step!.Value, row.ByGauge);
        }
    }

    [Fact]
    public void A_window_narrower_than_the_reserve_on_both_sides_gives_no_value()
    {
        var joint = Joint(10) with { MeasureUncertainty = 0.003 };
        var row = SettingRows.At(new Number(-1, 10), Demand(d, joint, [Thermal(d, 0, -10, 30)]),
            Size(null, Limit("least", Bound.Lower, 0.030), Limit("greatest", Bound.Upper, 0.041)), Manner(), d);

        Assert.Equal("setting-window-too-narrow", row.Refusal!.Id);
        Assert.Equal([10, 0.030, 0.041, 0.006], row.Refusal.Values.Select(v => Math.Round(v.Value, 12)));
    }

    [Fact]
    public void Two_decks_are_set_only_at_temperatures_that_both_can_have()
    {
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, -17, 32, segment: "concrete"), Thermal(d, 0.5e-3, -28, 46, segment: "steel")]);
        var table = SettingTable.Of(demand, [-20, 0, 40], [], _ => throw new InvalidOperationException("not asked"),
            Size(null, Limit("least", Bound.Lower, 0.010), Limit("greatest", Bound.Upper, 0.180)), Manner(), d);

        Assert.Equal((-17, 32), (table.Min.Value, table.Max.Value));
        Assert.Equal([true, false, true], table.Rows.Select(r => r.Refusal is not null));
        Assert.Equal(1.5e-3, table.Rate.Value, 1e-12);
    }

    private SettingTable StripSeal(double[] temperatures, double uncertainty = 0, Derivation? derivation = null)
    {
        var keeping = derivation ?? d;
        var demand = PublishedJoints.StripSeal300Ft(keeping, uncertainty);
        var size = Fit(demand, PublishedJoints.StripSealRules(), keeping, Counts(1.2)).Chosen!;
        return SettingTable.Of(demand, temperatures, [], _ => throw new InvalidOperationException("not asked"), size, Manner(Counts(1.2), step: In(1.0 / 16)), keeping);
    }
}
