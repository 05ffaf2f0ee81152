using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Counting;

public sealed class CountedMovementsTests
{
    private readonly Derivation d = new();

    // UK, 20 m deck, BS 5400-2 temperatures −11 to +36 °C, α 12e-6. Published: worked example of bearing design to BD 30 (seen),
    // range of movement 11.3 mm, one way at the ultimate limit state 8 mm = 11.3/2 · 1.1 · 1.3.
    [Fact]
    public void A_deck_of_20_m_moves_8_mm_each_way_at_the_ultimate_limit_state()
    {
        var demand = Demand(d, Joint(12.5), [Thermal(d, 12e-6 * 20, -11, 36)]);
        var ultimate = Movements(demand, Counts(1.1 * 1.3), Occasion.Setting, 12.5).In(Column.GapStrength);
        var service = Movements(demand, Counts(), Occasion.Setting, 12.5).In(Column.GapService);

        Assert.Equal(11.3, (service.ClosesBy.Value + service.OpensBy.Value) * 1000, 0.05);
        Assert.Equal(8, ultimate.ClosesBy.Value * 1000, 0.5);
        Assert.Equal(8, ultimate.OpensBy.Value * 1000, 0.5);
        Assert.Equal(8.07, ultimate.ClosesBy.Value * 1000, 0.005);
    }

    // Inputs published (seen): Colorado DOT BDM Appendix A Example 5, Jan 2018. Regression check, own arithmetic, not published.
    [Fact]
    public void The_factor_is_on_temperature_alone_and_shrinkage_only_opens()
    {
        var demand = PublishedJoints.StripSeal300Ft(d);
        var at60 = Movements(demand, Counts(1.2), Occasion.Sizing, F(60)).In(Column.SealRange);

        Assert.Equal(1.191, at60.OpensBy.Value / In(1), 0.0005);
        Assert.Equal(0.609, at60.ClosesBy.Value / In(1), 0.0005);
        Assert.Equal(1.7997, (at60.OpensBy.Value + at60.ClosesBy.Value) / In(1), 0.00005);
        Assert.Equal(0.6550, Movements(demand, Counts(1.2), Occasion.Sizing, F(60)).Racking(true).Demand.Value / In(1), 0.00005);
    }

    [Fact]
    public void Racking_is_the_larger_one_way_value_unless_the_owner_judges_the_total()
    {
        var demand = Demand(d, Joint(10, Degrees(-30)), [Thermal(d, 1e-3, 0, 40)]);
        var movements = Movements(demand, Counts(), Occasion.Setting, 10);

        Assert.Equal(0.5 * 0.030, movements.Racking(false).Demand.Value, 1e-12);
        Assert.Equal(0.5 * 0.040, movements.Racking(true).Demand.Value, 1e-12);
    }

    [Fact]
    public void A_segment_whose_warming_opens_the_joint_closes_it_by_cooling()
    {
        var demand = Demand(d, Joint(10), [Thermal(d, -1e-3, -20, 40)]);
        var movement = Movements(demand, Counts(1.5), Occasion.Setting, 10).In(Column.GapStrength);

        Assert.Equal(1.5 * 0.030, movement.ClosesBy.Value, 1e-12);
        Assert.Equal(1.5 * 0.030, movement.OpensBy.Value, 1e-12);
    }

    [Fact]
    public void Two_decks_are_not_set_off_against_each_other()
    {
        var demand = Demand(d, Joint(10),
            [Thermal(d, 2e-3, 0, 30, segment: "near"), Thermal(d, -1e-3, -10, 40, segment: "far")]);
        var movement = Movements(demand, Counts(), Occasion.Setting, 10).In(Column.GapService);

        // closes: 2·20 by warming of the near deck and 1·20 by cooling of the far one; opens: 2·10 and 1·30
        Assert.Equal(0.060, movement.ClosesBy.Value, 1e-12);
        Assert.Equal(0.050, movement.OpensBy.Value, 1e-12);
    }

    [Fact]
    public void Irreversible_opening_never_lessens_closing()
    {
        var without = Movements(Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40)]), Counts(), Occasion.Setting, 10).In(Column.GapService);
        var with = Movements(Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40)], Other(d, Cause.Creep, opens: 0.02)), Counts(), Occasion.Setting, 10)
            .In(Column.GapService);

        Assert.Equal(without.ClosesBy.Value, with.ClosesBy.Value);
        Assert.Equal(without.OpensBy.Value + 0.02, with.OpensBy.Value, 1e-12);
    }

    [Fact]
    public void Above_the_highest_temperature_nothing_closes_by_warming_any_more()
    {
        var movement = Movements(Demand(d, Joint(50), [Thermal(d, 1e-3, 0, 40)]), Counts(), Occasion.Setting, 50).In(Column.GapService);

        Assert.Equal(0, movement.ClosesBy.Value);
        Assert.Equal(0.050, movement.OpensBy.Value, 1e-12);
    }

    [Fact]
    public void The_doubt_about_setting_counts_when_sizing_and_not_on_the_day()
    {
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40, doubt: 10)]);

        Assert.Equal(0.040, Movements(demand, Counts(), Occasion.Sizing, 10).In(Column.GapService).ClosesBy.Value, 1e-12);
        Assert.Equal(0.020, Movements(demand, Counts(), Occasion.Sizing, 10).In(Column.GapService).OpensBy.Value, 1e-12);
        Assert.Equal(0.030, Movements(demand, Counts(), Occasion.Setting, 10).In(Column.GapService).ClosesBy.Value, 1e-12);
        Assert.Equal(0.010, Movements(demand, Counts(), Occasion.Setting, 10).In(Column.GapService).OpensBy.Value, 1e-12);
    }

    [Fact]
    public void The_window_of_the_day_takes_the_larger_coefficient_of_expansion()
    {
        var demand = Demand(d, Joint(10), [Thermal(d, 1.0e-3, 0, 40, windowRate: 1.1e-3)]);

        Assert.Equal(0.030, Movements(demand, Counts(), Occasion.Sizing, 10).In(Column.GapService).ClosesBy.Value, 1e-12);
        Assert.Equal(0.033, Movements(demand, Counts(), Occasion.Setting, 10).In(Column.GapService).ClosesBy.Value, 1e-12);
    }

    [Fact]
    public void A_silent_entry_leaves_the_movement_out_and_stops_issue()
    {
        var counting = Counts() with { Entries = Counts().Entries.Remove((Cause.LiveLoad, Column.SealRange)) };
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40)], Other(d, Cause.LiveLoad, opens: 0.003, closes: 0.002, isIrreversible: false));
        var movement = Movements(demand, counting, Occasion.Sizing, 10).In(Column.SealRange);
        var finding = Assert.Single(LeftOutFindings.Of("j1", [movement]));

        Assert.Equal(0.030, movement.ClosesBy.Value, 1e-12);
        Assert.Equal(0.010, movement.OpensBy.Value, 1e-12);
        Assert.Equal(("counting-silent", Severity.BlocksIssue, "joints/j1"), (finding.Id, finding.Severity, finding.Path));
        Assert.Contains("live load", finding.Template, StringComparison.Ordinal);
        Assert.Contains("seal range", finding.Template, StringComparison.Ordinal);
        Assert.Equal([(Quantity.Movement, 0.002), (Quantity.Movement, 0.003)], finding.Values);
    }

    [Fact]
    public void A_movement_that_does_not_count_by_rule_is_told_with_its_size_and_stops_nothing()
    {
        var counting = Counts().With(Cause.Braking, Column.SealRange, new NotCounted { Source = Source });
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40)], Other(d, Cause.Braking, opens: 0.004, closes: 0.004, isIrreversible: false));
        var movement = Movements(demand, counting, Occasion.Sizing, 10).In(Column.SealRange);
        var finding = Assert.Single(LeftOutFindings.Of("j1", [movement]));

        Assert.Equal(0.030, movement.ClosesBy.Value, 1e-12);
        Assert.Equal(("counting-left-out", Severity.Note), (finding.Id, finding.Severity));
        Assert.Equal([(Quantity.Movement, 0.004), (Quantity.Movement, 0.004)], finding.Values);
    }

    [Fact]
    public void Silence_about_a_cause_that_does_not_move_the_joint_asks_for_no_answer()
    {
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40)], Other(d, Cause.Wind, opens: 0));
        var counting = Counts() with { Entries = Counts().Entries.Remove((Cause.Wind, Column.SealRange)) };

        Assert.Empty(Movements(demand, counting, Occasion.Sizing, 10).In(Column.SealRange).LeftOut);
    }

    [Fact]
    public void Silence_about_temperature_is_told_with_the_movement_of_every_segment()
    {
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40, segment: "near"), Thermal(d, 2e-3, 0, 40, segment: "far")]);
        var movement = Movements(demand, CountingTable.Empty, Occasion.Sizing, 10).In(Column.SealRange);
        var finding = Assert.Single(LeftOutFindings.Of("j1", [movement]));

        Assert.Equal(0, movement.ClosesBy.Value);
        Assert.Equal(0.090, finding.Values[0].Value, 1e-12);
        Assert.Equal(0.030, finding.Values[1].Value, 1e-12);
    }

    [Fact]
    public void A_column_asked_for_twice_is_computed_once()
    {
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, 0, 40)]);
        var movements = Movements(demand, Counts(), Occasion.Setting, 10, d);
        movements.In(Column.GapService);
        var steps = d.Steps.Count;
        movements.In(Column.GapService);

        Assert.Equal(steps, d.Steps.Count);
    }
}
