using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Joints.Modulars;

public sealed class ModularJointTests
{
    private const string Range = "movement between least cell gap and greatest cell gap";

    private readonly Derivation d = new();

    // From memory, check against the licensed text: WSDOT modular method: face to face of the edge beams = (n − 1) · beam + n · gap.
    [Fact]
    public void Three_closed_cells_leave_the_two_centre_beams_between_the_edge_beams()
    {
        var size = Only([("cells", 3), ("least-cell-gap", 0)]);

        Assert.Equal(2 * 0.080, size.Limits.Single(l => l.Bound == Bound.Lower).Value.Value, 1e-12);
        Assert.Equal((2 * 0.080) + (3 * 0.080), size.Limits.Single(l => l.Bound == Bound.Upper).Value.Value, 1e-12);
    }

    [Fact]
    public void The_smallest_number_of_cells_that_takes_the_movement_is_taken()
    {
        var owner = Owner(Family("modular", Common, ("2 cells", [("cells", 2)]), ("3 cells", [("cells", 3)]), ("4 cells", [("cells", 4)])));

        // 200 mm of movement, 75 mm a cell
        Assert.Equal("3 cells", Fit(Demand(d, Joint(10), [Thermal(d, 5e-3, -10, 30)]), owner, d).Chosen!.Size);
    }

    [Fact]
    public void Cells_are_rejected_by_their_gaps() => Assert.Equal(Range, Only([("cells", 2)]).RejectedBy!.Name);

    [Fact]
    public void A_cell_gap_measured_along_the_road_gives_less_normal_movement_on_a_skew()
    {
        var along = ImmutableSortedDictionary<string, FigureNote>.Empty.Add("greatest-cell-gap", new FigureNote(Measure: Measure.Along));
        var limit = Only([("cells", 3)], skew: 30, notes: along).Limits.Single(l => l.Bound == Bound.Upper);

        Assert.Equal((3 * 0.080 * Math.Cos(Degrees(30))) + (2 * 0.080), limit.Value.Value, 1e-12);
        Assert.Equal(Measure.Normal, limit.Measure);
    }

    [Fact]
    public void Cells_are_rejected_by_the_movement_of_one_cell()
    {
        var rejected = Only([("cells", 3), ("greatest-cell-movement", 0.060)]).RejectedBy!;

        Assert.Equal("movement of all cells", rejected.Name);
        Assert.Equal((0.200, 0.180), (rejected.Value.Value, rejected.Limit.Value));
    }

    [Fact]
    public void The_movement_of_a_cell_along_the_road_counts_by_its_normal_part()
    {
        var along = ImmutableSortedDictionary<string, FigureNote>.Empty.Add("greatest-cell-movement", new FigureNote(Measure: Measure.Along));
        var rule = Only([("cells", 3), ("greatest-cell-movement", 0.060)], skew: 30, notes: along).Rules.Single(r => r.Name == "movement of all cells");

        Assert.Equal(0.180 * Math.Cos(Degrees(30)), rule.Limit.Value, 1e-12);
    }

    [Fact]
    public void Cells_are_rejected_by_racking_and_by_skew()
    {
        Assert.Equal("racking of all cells", Only([("cells", 3), ("racking-per-cell", 0.016)], skew: 30).RejectedBy!.Name);
        Assert.Null(Only([("cells", 4), ("racking-per-cell", 0.016)], skew: 30).RejectedBy);
        Assert.Equal("skew", Only([("cells", 4), ("greatest-skew", Degrees(20))], skew: -21).RejectedBy!.Name);
    }

    [Fact]
    public void Cells_are_rejected_at_installation()
    {
        Assert.Equal("movement between least installation cell gap and greatest cell gap",
            Only([("cells", 3), ("least-installation-cell-gap", 0.050)]).RejectedBy!.Name);
        Assert.Equal("movement between least cell gap and greatest installation cell gap",
            Only([("cells", 3), ("greatest-installation-cell-gap", 0.035)]).RejectedBy!.Name);
    }

    [Fact]
    public void Cells_are_rejected_by_an_opening_of_the_owners_rule() =>
        Assert.Equal("movement between least cell gap and opening by the owner's rule",
            Only([("cells", 4), ("reference-opening", 0.350)], rule: new FixedReference(10, null)).RejectedBy!.Name);

    // From memory, check against the licensed text: AASHTO LRFD 14.5.3.2, 3.0 in per gap along the road.
    [Fact]
    public void The_codes_bound_on_each_gap_is_carried_to_the_whole_joint()
    {
        var code = new CodeGapLimits([], [Limit("each gap at most 3.0 in", Bound.Upper, In(3), Column.GapStrength, Measure.Along)]);
        var size = Only([("cells", 3)], skew: 20, code: code);
        var limit = size.Limits.Single(l => l.Name == "each gap at most 3.0 in");

        Assert.Equal((3 * In(3) * Math.Cos(Degrees(20))) + 0.160, limit.Value.Value, 1e-12);
        Assert.Equal("movement between least cell gap and each gap at most 3.0 in", Only([("cells", 3)], code: Tight).RejectedBy!.Name);
    }

    private static readonly (string, double)[] Common = [("centre-beam-width", 0.080), ("least-cell-gap", 0.005), ("greatest-cell-gap", 0.080)];
    private static readonly CodeGapLimits Tight = new([], [Limit("each gap at most 3.0 in", Bound.Upper, 0.070, Column.GapStrength, Measure.Along)]);

    /// <summary>The only size, at a joint that closes 100 mm and opens 100 mm.</summary>
    private SizeFit Only(
        (string, double)[] figures, double skew = 0, ImmutableSortedDictionary<string, FigureNote>? notes = null, CodeGapLimits? code = null, SettingRule? rule = null)
    {
        var demand = Demand(d, Joint(10, Degrees(skew)), [Thermal(d, 5e-3, -10, 30)]);
        var family = Family("modular", Common, ("only", figures)) with { Notes = notes ?? ImmutableSortedDictionary<string, FigureNote>.Empty };
        return Fit(demand, Owner(family) with { SettingRule = rule ?? new MidWindow() }, d, code: code).Families[0].Sizes.Single();
    }
}
