using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Joints.Fingers;

public sealed class FingerJointTests
{
    private const string Range = "movement between least clearance at the tips and greatest opening with overlap";

    private readonly Derivation d = new();

    // Root to root is opening + ℓ; the overlap is 2ℓ less that. Own arithmetic, not published.
    [Fact]
    public void At_the_greatest_opening_exactly_the_least_overlap_is_left()
    {
        var limit = Only([("finger-length", 0.300), ("least-overlap", 0.038)]).Limits.Single(l => l.Bound == Bound.Upper);
        var rootToRoot = limit.Value.Value + 0.300;

        Assert.Equal(0.038, (2 * 0.300) - rootToRoot, 1e-12);
        Assert.Equal(Measure.Along, limit.Measure);
    }

    [Fact]
    public void Fingers_are_rejected_by_overlap_and_clearance_together()
    {
        Assert.Equal(Range, Only([("finger-length", 0.302), ("least-overlap", 0.038)]).RejectedBy!.Name);
        Assert.Null(Only([("finger-length", 0.304), ("least-overlap", 0.038)]).RejectedBy);
    }

    [Fact]
    public void On_a_skew_the_fingers_along_the_road_need_the_same_length()
    {
        // both bounds and the movement shrink by cos β
        Assert.Equal(Range, Only([("finger-length", 0.302), ("least-overlap", 0.038)], skew: 40).RejectedBy!.Name);
        Assert.Null(Only([("finger-length", 0.304), ("least-overlap", 0.038)], skew: 40).RejectedBy);
    }

    [Fact]
    public void Fingers_are_rejected_at_installation()
    {
        Assert.Equal("movement between least installation opening and greatest opening with overlap",
            Only([("finger-length", 0.310), ("least-overlap", 0.038), ("least-installation-opening", 0.160)]).RejectedBy!.Name);
        Assert.Equal("movement between least clearance at the tips and greatest installation opening",
            Only([("finger-length", 0.310), ("least-overlap", 0.038), ("greatest-installation-opening", 0.140)]).RejectedBy!.Name);
    }

    [Fact]
    public void Fingers_square_to_a_skewed_joint_meet_sideways_and_fingers_along_the_road_do_not()
    {
        (string, double)[] figures = [("finger-length", 0.400), ("least-overlap", 0.038), ("lateral-clearance", 0.050)];

        Assert.Null(Only(figures, skew: 30).RejectedBy);
        Assert.Equal("movement across the fingers", Only(figures, skew: 30, fingersAre: Measure.Normal).RejectedBy!.Name);
        Assert.Null(Only(figures, skew: 20, fingersAre: Measure.Normal).RejectedBy);
    }

    [Fact]
    public void Fingers_are_rejected_by_skew() =>
        Assert.Equal("skew", Only([("finger-length", 0.400), ("least-overlap", 0.038), ("greatest-skew", Degrees(30))], skew: 31).RejectedBy!.Name);

    [Fact]
    public void Fingers_are_rejected_by_an_opening_of_the_owners_rule()
    {
        var rejected = Only([("finger-length", 0.400), ("least-overlap", 0.038), ("reference-opening", 0.140)], rule: new FixedReference(10, null)).RejectedBy!;

        Assert.Equal("movement between least clearance at the tips and opening by the owner's rule", rejected.Name);
    }

    [Fact]
    public void The_codes_bound_on_one_open_gap_does_not_hold_for_fingers()
    {
        var code = new CodeGapLimits([Limit("code's greatest gap", Bound.Upper, 0.100, Column.GapStrength, Measure.Along)], []);

        Assert.True(Only([("finger-length", 0.310), ("least-overlap", 0.038)], code: code).Fits);
    }

    [Fact]
    public void Overlap_is_judged_at_strength()
    {
        var counting = Counts().With(Cause.UniformTemperature, Column.GapStrength, new Counted(1.2) { Source = Source });
        var size = Only([("finger-length", 0.310), ("least-overlap", 0.038)], counting: counting);

        Assert.Equal(1.2 * 0.240, size.RejectedBy!.Value.Value, 1e-12);
        Assert.Equal(Column.GapStrength, size.RejectedBy.JudgedBy);
    }

    /// <summary>The only size, at a joint that closes 120 mm and opens 120 mm; least clearance 25 mm.</summary>
    private SizeFit Only(
        (string, double)[] figures, double skew = 0, Measure? fingersAre = null, CodeGapLimits? code = null, CountingTable? counting = null, SettingRule? rule = null)
    {
        var demand = Demand(d, Joint(10, Degrees(skew)), [Thermal(d, 6e-3, -10, 30)]);
        var family = Family("finger", [("least-clearance", 0.025)], ("only", figures)) with
        {
            Notes = ImmutableSortedDictionary<string, FigureNote>.Empty.Add("finger-length", new FigureNote(Measure: fingersAre)),
        };
        return Fit(demand, Owner(family) with { SettingRule = rule ?? new MidWindow() }, d, counting, code).Families[0].Sizes.Single();
    }
}
