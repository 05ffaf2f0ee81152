using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Joints.CompressionSeals;

public sealed class CompressionSealTests
{
    private const string Range = "movement between least seal width and greatest seal width";
    private const string FromReference = "movement between opening by the owner's rule and greatest seal width";
    private const string RackingShare = "racking as a share of the width";

    private readonly Derivation d = new();

    // From memory, check against the licensed text: WSDOT BDM 9.1.3. The printed figures round intermediates, hence 0.02 in.
    [Theory]
    [InlineData(Range, 1.96)]
    [InlineData(FromReference, 2.51)]
    [InlineData(RackingShare, 1.07)]
    public void A_seal_of_the_200_ft_deck_needs_the_printed_width_by_each_rule(string rule, double width)
    {
        var fit = Fit(PublishedJoints.CompressionSeal200Ft(d), PublishedJoints.CompressionSealRules(), d);
        var threeInch = fit.Families[0].Sizes.Single(s => s.Size == "3.0 in");

        // each of these limits is a share of the width, so the least width is the share used of this one
        Assert.Equal(width, threeInch.Rules.Single(r => r.Name == rule).Share!.Value * 3, 0.02);
    }

    // From memory, check against the licensed text: WSDOT BDM 9.1.3.
    [Fact]
    public void The_200_ft_deck_gets_a_3_in_seal_and_each_smaller_one_names_its_rule()
    {
        var fit = Fit(PublishedJoints.CompressionSeal200Ft(d), PublishedJoints.CompressionSealRules(), d);
        var search = d.Steps.Select(s => s.Origin).OfType<SearchOrigin>().Single();

        Assert.Equal("3.0 in", fit.Chosen!.Size);
        Assert.False(fit.ChosenByDesigner);
        Assert.Equal(In(1.80), fit.Chosen.ReferenceOpening!.Value.Value, 1e-9);
        Assert.Equal(
            [("1.0 in", Range), ("1.5 in", Range), ("2.0 in", FromReference), ("2.5 in", FromReference), ("3.0 in", "")],
            search.Candidates.Select(c => (c.Name, c.RejectedBy)));
    }

    [Fact]
    public void Another_working_range_in_the_rule_set_gives_another_size()
    {
        var rules = PublishedJoints.CompressionSealRules();
        var narrower = rules with { Families = [rules.Families[0] with { Figures = rules.Families[0].Figures.SetItem("greatest-width-share", 0.75) }] };

        Assert.Equal("4.5 in", Fit(PublishedJoints.CompressionSeal200Ft(d), narrower, d).Chosen!.Size);
    }

    [Fact]
    public void Another_factor_in_the_counting_table_gives_another_size()
    {
        var fit = Fit(PublishedJoints.CompressionSeal200Ft(d), PublishedJoints.CompressionSealRules(), d, Counts(1.5));

        Assert.Equal("3.5 in", fit.Chosen!.Size);
    }

    // Published: FHWA technical advisory on pavement joints, pp. 32-34, example A (seen): joint spacing 60 ft, restraint factor 0.8,
    // α 5.5e-6 per °F, shrinkage 1.0e-4, 14 to 90 °F, seal works between 20 and 55 % compression; ΔL 0.3 in, W ≥ 0.86 in, 1 in taken.
    [Fact]
    public void A_pavement_seal_of_60_ft_spacing_is_1_in_wide()
    {
        var demand = Demand(d, Joint(F(80)), [Thermal(d, 0.8 * In(720) * PerF(5.5e-6), F(14), F(90))],
            Other(d, Cause.Shrinkage, 0.8 * In(720) * 1.0e-4));
        var rules = Owner(Family("compression-seal", [("least-width-share", 1 - 0.55), ("greatest-width-share", 1 - 0.20)],
            ("1/2 in", [("width", In(0.5))]), ("3/4 in", [("width", In(0.75))]), ("1 in", [("width", In(1))])));
        var fit = Fit(demand, rules, d);
        var rule = fit.Chosen!.Rules.Single(r => r.Name == Range);

        Assert.Equal(0.3, rule.Value.Value / In(1), 0.05);
        Assert.Equal(0.86, rule.Share!.Value, 0.01);
        Assert.Equal("1 in", fit.Chosen.Size);
    }

    [Fact]
    public void A_seal_is_rejected_by_its_range()
    {
        var size = Only([("width", 0.10)], rate: 0.9e-3);

        Assert.Equal(Range, size.RejectedBy!.Name);
        Assert.Equal(0.036 - (0.35 * 0.10), size.RejectedBy.Value.Value - size.RejectedBy.Limit.Value, 1e-12);
    }

    [Fact]
    public void A_seal_is_rejected_by_a_reference_opening_from_which_it_cannot_move_so_far()
    {
        // works from 45 to 80 mm; closes and opens 12 mm from the reference
        Assert.Equal(FromReference, At(0.70).RejectedBy!.Name);
        Assert.Equal("movement between least seal width and opening by the owner's rule", At(0.50).RejectedBy!.Name);
        Assert.Null(At(0.60).RejectedBy);
        Assert.False(At(0.70).RejectedBy!.IsAtInstallation);

        SizeFit At(double share) => Only([("width", 0.10), ("set-width-share", share)], rate: 0.6e-3, rule: new FixedReference(10, null));
    }

    [Fact]
    public void A_seal_is_rejected_by_racking_as_a_share_and_by_racking_as_a_length()
    {
        Assert.Equal(RackingShare, Only([("width", 0.10), ("greatest-racking-share", 0.04)], skew: 30).RejectedBy!.Name);
        Assert.Equal("racking", Only([("width", 0.10), ("greatest-racking", 0.004)], skew: 30).RejectedBy!.Name);
    }

    [Fact]
    public void A_seal_is_rejected_by_skew_to_either_side()
    {
        Assert.Equal("skew", Only([("width", 0.10), ("greatest-skew", Degrees(20))], skew: 25).RejectedBy!.Name);
        Assert.Equal("skew", Only([("width", 0.10), ("greatest-skew", Degrees(20))], skew: -25).RejectedBy!.Name);
        Assert.Null(Only([("width", 0.10), ("greatest-skew", Degrees(20))], skew: -20).RejectedBy);
    }

    [Fact]
    public void A_seal_is_rejected_by_the_opening_at_which_it_can_be_put_in()
    {
        var tooWide = Only([("width", 0.10), ("least-installation-opening", 0.075)]);
        var tooNarrow = Only([("width", 0.10), ("greatest-installation-opening", 0.050)]);

        Assert.Equal("movement between least installation opening and greatest seal width", tooWide.RejectedBy!.Name);
        Assert.Equal("movement between least seal width and greatest installation opening", tooNarrow.RejectedBy!.Name);
        Assert.True(tooWide.RejectedBy.IsAtInstallation && tooNarrow.RejectedBy.IsAtInstallation);
    }

    [Fact]
    public void The_bounds_of_the_code_on_one_gap_hold_for_it_unless_the_owner_replaces_them()
    {
        var code = new CodeGapLimits([Limit("code's greatest gap", Bound.Upper, 0.050, Column.GapStrength, Measure.Along)], []);

        Assert.Equal("movement between least seal width and code's greatest gap", Only([("width", 0.10)], code: code).RejectedBy!.Name);
        Assert.Null(Only([("width", 0.10)], code: code, replacesCode: true).RejectedBy);
    }

    /// <summary>The only size of a seal that works between 45 and 80 % of its width, at a joint that closes 20 and opens 20 K times the rate.</summary>
    private SizeFit Only(
        (string, double)[] figures, double rate = 0.5e-3, double skew = 0, SettingRule? rule = null, CodeGapLimits? code = null,
        bool replacesCode = false)
    {
        var family = Family("compression-seal", [("least-width-share", 0.45), ("greatest-width-share", 0.80)], ("only", figures)) with { ReplacesCodeLimits = replacesCode };
        var demand = Demand(d, Joint(10, Degrees(skew)), [Thermal(d, rate, -10, 30)]);
        return Fit(demand, Owner(family) with { SettingRule = rule ?? new MidWindow() }, d, code: code).Families[0].Sizes.Single();
    }
}
