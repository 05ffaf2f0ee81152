using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Joints.StripSeals;

public sealed class StripSealTests
{
    private const string Range = "movement between least opening and greatest opening";
    private const string AfterInstallation = "movement between least installation opening and greatest opening";

    private readonly Derivation d = new();

    // Inputs published (seen): Colorado DOT BDM Appendix A Example 5, Jan 2018. Regression check, own arithmetic, not published.
    [Fact]
    public void At_60_degrees_Fahrenheit_the_installation_opening_leaves_the_300_ft_deck_the_least_room()
    {
        var fit = Fit(PublishedJoints.StripSeal300Ft(d), PublishedJoints.StripSealRules(), d, Counts(1.2));
        var rules = fit.Chosen!.Rules;

        Assert.True(fit.Chosen.Fits);
        Assert.Equal(AfterInstallation, rules.MinBy(r => r.Room)!.Name);
        Assert.Equal(1.309, rules.Min(r => r.Room) / In(1), 0.0005);
        Assert.Equal(1.191, rules.Single(r => r.Name == AfterInstallation).Value.Value / In(1), 0.0005);
        Assert.Equal(2.5, rules.Single(r => r.Name == AfterInstallation).Limit.Value / In(1), 1e-9);
        Assert.Equal(1.7997, rules.Single(r => r.Name == Range).Value.Value / In(1), 0.00005);
    }

    [Fact]
    public void A_strip_seal_is_rejected_by_its_range() => Assert.Equal(Range, Only([("greatest-opening", 0.049)]).RejectedBy!.Name);

    [Fact]
    public void A_strip_seal_that_takes_the_movement_but_cannot_be_put_in_is_rejected_at_installation()
    {
        var size = Only([("greatest-opening", 0.060), ("least-installation-opening", 0.041)]);

        Assert.True(size.Rules.Single(r => r.Name == Range).Holds);
        Assert.Equal(AfterInstallation, size.RejectedBy!.Name);
        Assert.True(size.RejectedBy.IsAtInstallation);
        Assert.Equal(-0.001, size.RejectedBy.Room, 1e-12);
    }

    [Fact]
    public void A_strip_seal_is_rejected_by_the_greatest_opening_at_which_it_can_be_put_in()
    {
        var rejected = Only([("greatest-opening", 0.060), ("greatest-installation-opening", 0.029)]).RejectedBy!;

        Assert.Equal("movement between least opening and greatest installation opening", rejected.Name);
        Assert.True(rejected.IsAtInstallation);
    }

    [Fact]
    public void Installation_openings_that_exclude_each_other_reject()
    {
        var size = Only([("greatest-opening", 0.120), ("least-installation-opening", 0.050), ("greatest-installation-opening", 0.045)]);

        Assert.Equal("movement between least installation opening and greatest installation opening", size.RejectedBy!.Name);
    }

    // Published: Missouri table for preformed silicone or EPDM seals (seen): racking 15 % of the allowed normal movement, 0.34 in for 2¼ in.
    [Fact]
    public void Racking_of_15_percent_of_a_range_of_2_and_a_quarter_in_is_0_34_in()
    {
        var size = Only([("least-opening", In(0.75)), ("greatest-opening", In(3)), ("greatest-racking-share", 0.15)], skew: 1);

        Assert.Equal(0.34, size.Rules.Single(r => r.Name == "racking as a share of the range").Limit.Value / In(1), 0.005);
    }

    [Fact]
    public void A_strip_seal_is_rejected_by_racking_and_by_skew()
    {
        Assert.Equal("racking", Only([("greatest-opening", 0.080), ("greatest-racking", 0.009)], skew: 30).RejectedBy!.Name);
        Assert.Equal("racking as a share of the range", Only([("greatest-opening", 0.080), ("greatest-racking-share", 0.12)], skew: 30).RejectedBy!.Name);
        Assert.Equal("skew", Only([("greatest-opening", 0.080), ("greatest-skew", Degrees(45))], skew: 46).RejectedBy!.Name);
    }

    [Fact]
    public void Racking_is_judged_by_its_total_only_where_the_owner_says_so()
    {
        var figures = new[] { ("greatest-opening", 0.080), ("greatest-racking", 0.015) };

        Assert.True(Only(figures, skew: 30).Fits);
        Assert.Equal("racking", Only(figures, skew: 30, rackingIsTotal: true).RejectedBy!.Name);
    }

    // The same seal passes by its own limit and is rejected by the code's, which is measured along the road.
    [Fact]
    public void The_codes_bound_along_the_road_is_tighter_on_a_skew()
    {
        var code = new CodeGapLimits([Limit("code's greatest gap", Bound.Upper, 0.060, Column.GapStrength, Measure.Along)], []);
        var square = Only([("greatest-opening", 0.060)], code: code);
        var skewed = Only([("greatest-opening", 0.060)], code: code, skew: 45);

        Assert.True(square.Fits);
        Assert.Equal(60 * Math.Cos(Degrees(45)) - 10, skewed.Rules.Single(r => r.Name.EndsWith("code's greatest gap", StringComparison.Ordinal)).Limit.Value * 1000, 1e-9);
    }

    [Fact]
    public void An_opening_by_the_owners_rule_outside_the_limits_rejects()
    {
        var size = Only([("greatest-opening", 0.060), ("reference-opening", 0.045)], rule: new FixedReference(10, null));

        Assert.Equal("movement between opening by the owner's rule and greatest opening", size.RejectedBy!.Name);
    }

    [Fact]
    public void A_column_named_in_the_rule_set_judges_instead_of_the_familys_own()
    {
        var atService = Family("strip-seal", [("least-opening", 0.010)], ("only", [("greatest-opening", 0.060)])) with
        {
            Notes = System.Collections.Immutable.ImmutableSortedDictionary<string, FigureNote>.Empty
                .Add("greatest-opening", new FigureNote(Column.GapService))
                .Add("least-opening", new FigureNote(Column.GapService, Source: Provenance.By("another page"))),
        };
        var counting = Counts().With(Cause.UniformTemperature, Column.SealRange, new Counted(1.5) { Source = Source });
        var demand = Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30)]);

        var rule = Fit(demand, Owner(atService), d, counting).Chosen!.Rules.Single(r => r.Name == Range);
        Assert.Equal(0.040, rule.Value.Value, 1e-12);
        Assert.Equal(Column.GapService, rule.JudgedBy);
        Assert.Equal("another page", Fit(demand, Owner(atService), d, counting).Chosen!.Limits[0].Source.Document);
    }

    /// <summary>The only size, at a joint that closes 20 mm and opens 20 mm; least opening 10 mm unless given.</summary>
    private SizeFit Only((string, double)[] figures, double skew = 0, bool rackingIsTotal = false, CodeGapLimits? code = null, SettingRule? rule = null)
    {
        var demand = Demand(d, Joint(10, Degrees(skew)), [Thermal(d, 1e-3, -10, 30)]);
        var owner = Owner(Family("strip-seal", [("least-opening", 0.010)], ("only", figures))) with
        {
            RackingIsTotalRange = rackingIsTotal,
            SettingRule = rule ?? new MidWindow(),
        };
        return Fit(demand, owner, d, code: code).Families[0].Sizes.Single();
    }
}
