using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Tests.Frames;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Causes;

/// <summary>One span of 40 m, EI 1.05e7 kNm², neutral axis 1.2 m above the bearings, road surface 0.6 m above it, fixed at its first end: closed forms of elementary beam theory beside each.</summary>
public sealed class FrameCausesTests
{
    private const double Bending = 1.05e10;

    private static readonly Plan Simple = Of([Abutment("a", 0), Abutment("b", 40)],
        [Deck("deck", 0, 40) with
        {
            Section = new CrossSection
            {
                Layers = [new Layer { Id = "all", Material = LayerMaterial.Steel, Modulus = 1e9, Area = 100, Depth = 0.6, Inertia = Bending / 1e9 }],
                Depth = 1.8,
                BearingDepth = 1.8,
            },
        }],
        [Fixed("b1", "deck", "a", 0), Free("b2", "deck", "b", 40)], Joint("j1", "a", "deck"), Joint("j2", "deck", "b"));

    [Fact]
    public void A_temperature_difference_opens_the_fixed_end_while_the_top_is_cooler()
    {
        // κ = α·ΔT/h = 12e-6·15/1.8 = 1e-4 /m, θ = κL/2 = 2e-3, θ·h = 3.6 mm; the free end closes by y_b·θ − y_t·θ = 1.2 mm.
        var plan = With(s => s with
        {
            Gradient = new Gradient { Warm = [new(0, 5), new(1.8, -10)], Cool = [new(0, -5), new(1.8, 10)], Source = "test" },
        });
        var result = Movements.Of(plan, new PlainBasis(), null);
        AssertMoves(result, "j1", Cause.TemperatureDifference, opens: 3.6e-3, closes: 3.6e-3);
        AssertMoves(result, "j2", Cause.TemperatureDifference, opens: 1.2e-3, closes: 1.2e-3);
        var bearing = result.BearingMovements.First(b => b.Bearing == "b2");
        Assert.Equal(2 * 1.2 * 2e-3, bearing.TravelMost.Value, 1e-9);
        Assert.Equal(2e-3, bearing.RotationMost!.Value.Value, 1e-9);
        Assert.Contains(result.HandChecks, c => c is { Agrees: true, ByHand: not null } && c.Quantity == Quantity.Movement);
    }

    [Fact]
    public void Dead_load_still_to_come_opens_the_fixed_end_and_closes_the_free_one()
    {
        // θ = gL³/(24EI) = 2.540e-3: opens by θ·1.8 = 4.571 mm, closes by θ·(1.2 − 0.6) = 1.524 mm.
        var result = Movements.Of(With(s => s with { DeadLoad = new(10e3, "test") }), new PlainBasis(), null);
        var turned = 10e3 * 64000 / (24 * Bending);
        AssertMoves(result, "j1", Cause.DeadLoad, opens: turned * 1.8, closes: 0);
        AssertMoves(result, "j2", Cause.DeadLoad, opens: 0, closes: turned * 0.6);
        Assert.All(result.Joints[0].Demand.Others.Where(o => o.Cause == Cause.DeadLoad), o => Assert.True(o.IsIrreversible));
        Assert.All(result.HandChecks.Where(c => c.Quantity == Quantity.Movement && c.ByHand is not null), c => Assert.True(c.Agrees));
    }

    [Fact]
    public void A_settled_support_turns_the_span_and_a_tilted_abutment_takes_its_backwall_along()
    {
        // Support b down by s: the whole span falls by s/L up-station. At j1 the surface moves ahead by 1.8·s/L: opens. The abutment a leans up-station
        // by φ about its bearings: its backwall moves ahead by 1.8·φ at the surface and closes.
        var plan = Simple with
        {
            Supports = [Simple.Supports[0] with { Movement = new(0, 0, 1e-3, "test") }, Simple.Supports[1] with { Movement = new(0.02, 0, 0, "test") }],
        };
        var result = Movements.Of(plan, new PlainBasis(), null);
        AssertMoves(result, "j1", Cause.Substructure, opens: 1.8 * 0.02 / 40, closes: 1.8e-3);
    }

    [Fact]
    public void An_abutment_pushed_along_closes_its_own_joint_unless_the_deck_is_fixed_to_it()
    {
        var plan = Simple with { Supports = [Simple.Supports[0] with { Movement = new(0, 5e-3, 0, "test") }, Simple.Supports[1] with { Movement = new(0, -4e-3, 0, "test") }] };
        var result = Movements.Of(plan, new PlainBasis(), null);
        AssertMoves(result, "j1", Cause.Substructure, opens: 0, closes: 0);
        AssertMoves(result, "j2", Cause.Substructure, opens: 0, closes: 9e-3);
    }

    [Fact]
    public void Own_loads_stand_where_the_influence_line_is_largest()
    {
        // One axle of 500 kN at L/√3 from the far end: θ = PL²/(9√3·EI); a load of 10 kN/m: θ = qL³/(24EI). Dynamic factor on the axle alone, two lanes.
        var plan = Simple with
        {
            LiveLoad = new LiveLoad
            {
                StandsFor = FrameShare.WholeWidth,
                Lanes = 2,
                Own = new OwnLoads([new OwnTrain("axle", [new OwnAxle(500e3, 0, null)])], 10e3, 1.3, "test"),
            },
        };
        var result = Movements.Of(plan, new PlainBasis(), null);
        var turned = (2 * 1.3 * 500e3 * 1600 / (9 * Math.Sqrt(3) * Bending)) + (2 * 10e3 * 64000 / (24 * Bending));
        AssertMoves(result, "j1", Cause.LiveLoad, opens: turned * 1.8, closes: 0);
        Assert.Equal(-turned, result.BearingMovements.First(b => b.Bearing == "b1").RotationLeast!.Value.Value, 1e-9);
    }

    [Fact]
    public void Braking_moves_a_deck_on_pads_by_force_over_stiffness()
    {
        var plan = Of([Abutment("a", 0), Abutment("b", 40)], [Deck("deck", 0, 40, 1e14) with { Braking = new(300e3, "test") }],
            [Pads("b1", "deck", "a", 0, 10e6), Pads("b2", "deck", "b", 40, 20e6)], Joint("j1", "a", "deck"));
        AssertMoves(Movements.Of(plan, new PlainBasis(), null), "j1", Cause.Braking, opens: 0.01, closes: 0.01, 1e-7);
    }

    [Fact]
    public void What_the_frame_computes_may_not_be_given_too_and_is_not_missing()
    {
        var plan = With(s => s with { DeadLoad = new(10e3, "test") }) with { GivenMovements = [new("m", "j1", Cause.DeadLoad, 0.001, 0, "test")] };
        var check = new JointPlanner.Engine.Plans.Rules.PlanUnderCheck(plan, new HashSet<string>());
        Assert.Contains(new JointPlanner.Engine.Plans.Rules.MovementsAreNotComputedToo().Breaches(check), b => b.Id == "movements.computed");
        var result = Movements.Of(plan with { GivenMovements = [] }, new PlainBasis(), null);
        Assert.DoesNotContain(Cause.DeadLoad, result.Joints[0].NotIncluded);
        Assert.Contains(Cause.LiveLoad, result.Joints[0].NotIncluded);
    }

    [Theory]
    [InlineData(13e-6, 13e-6)]
    [InlineData(10e-6, 12e-6)]
    public void The_window_slopes_with_the_larger_of_the_basis_and_the_best_estimate(double layers, double expected)
    {
        var section = Simple.Segments[0].Section!;
        var result = Movements.Of(With(s => s with { Section = section with { Layers = [.. section.Layers.Select(l => l with { Expansion = layers })] } }), new PlainBasis(), null);
        var part = Assert.Single(result.Joints[1].Demand.Thermal);
        Assert.Equal(12e-6 * 40, part.Rate.Value, 1e-12);
        Assert.Equal(expected * 40, part.WindowRate.Value, 1e-12);
    }

    [Fact]
    public void A_deck_fixed_at_bearing_level_stands_still_there_though_its_axis_lies_above() =>
        Assert.Equal(0, Movements.Of(Simple, new PlainBasis(), null).Segments[0].ZeroMovementPoint!.Value.Value, 1e-9);

    [Fact]
    public void A_basis_without_profiles_is_told_to_be_silent()
    {
        var result = Movements.Of(With(s => s with { Gradient = new Gradient() }), new PlainBasis(), null);
        Assert.Contains(result.Findings, f => f is { Id: "basis-silent", Severity: Severity.Error, Path: "segments/deck/gradient" });
    }

    private static Plan With(Func<Segment, Segment> change) => Simple with { Segments = [change(Simple.Segments[0])] };

    private static void AssertMoves(Result result, string joint, Cause cause, double opens, double closes, double tolerance = 1e-9)
    {
        var found = result.Joints.First(j => j.Joint.Id == joint).Movements.First(m => m.Cause == cause);
        Assert.Equal(opens, found.OpensBy.Value, tolerance);
        Assert.Equal(closes, found.ClosesBy.Value, tolerance);
    }
}
