using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Frames;

public sealed class ExpansionLengthsTests
{
    [Fact]
    public void A_deck_fixed_at_one_end_moves_the_joint_at_the_other_by_its_whole_length()
    {
        var plan = Of([Abutment("a1", 0), Abutment("a2", 60)], [Deck("deck", 0, 60)],
            [Fixed("b1", "deck", "a1", 0), Free("b2", "deck", "a2", 60)], Joint("j", "deck", "a2"));
        Assert.Equal(60, LengthAt(plan, "j", "deck"), 1e-9);
    }

    [Fact]
    public void Two_equal_pads_share_the_length_in_halves()
    {
        var plan = Of([Abutment("a1", 0), Abutment("a2", 60)], [Deck("deck", 0, 60)],
            [Pads("b1", "deck", "a1", 0, 2e6), Pads("b2", "deck", "a2", 60, 2e6)], Joint("j1", "a1", "deck"), Joint("j2", "deck", "a2"));
        Assert.Equal(LengthAt(plan, "j1", "deck"), LengthAt(plan, "j2", "deck"), 1e-9);
        Assert.Equal(30, LengthAt(plan, "j1", "deck"), 0.02);
    }

    [Fact]
    public void A_joint_beside_a_fixed_bearing_on_a_yielding_abutment_opens_by_nothing()
    {
        var plan = Of([Abutment("a1", 0, new GivenStiffness(50e6)), Abutment("a2", 60, new GivenStiffness(80e6))], [Deck("deck", 0, 60)],
            [Fixed("b1", "deck", "a1", 0), Pads("b2", "deck", "a2", 60, 9e6)], Joint("j1", "a1", "deck"), Joint("j2", "deck", "a2"));
        Assert.Empty(Lengths(plan, "j1"));
        // By hand, the deck being stiff: pads and far abutment in series 9·80/89 = 8.090, zero point 8.090·60/58.090 = 8.356 m,
        // deck end 51.644 m, of which the far backwall follows 8.090/80.
        Assert.Equal(46.42, LengthAt(plan, "j2", "deck"), 0.2);
    }

    [Fact]
    public void An_overhang_beyond_the_fixed_bearing_closes_the_joint_by_its_own_length()
    {
        var plan = Of([Abutment("a1", 0, new GivenStiffness(50e6)), Abutment("a2", 60)], [Deck("deck", -0.8, 60)],
            [Fixed("b1", "deck", "a1", 0), Free("b2", "deck", "a2", 60)], Joint("j1", "a1", "deck"));
        Assert.Equal(0.8, LengthAt(plan, "j1", "deck"), 1e-9);
    }

    [Fact]
    public void A_joint_between_two_decks_closes_by_both()
    {
        var plan = Of([Abutment("a1", 0), Pier("p2", 40), Abutment("a3", 100)], [Deck("west", 0, 40), Deck("east", 40, 100)],
            [Fixed("b1", "west", "a1", 0), Free("b2", "west", "p2", 40), Free("b3", "east", "p2", 40), Fixed("b4", "east", "a3", 100)],
            Joint("j", "west", "east"));
        Assert.Equal(40, LengthAt(plan, "j", "west"), 1e-9);
        Assert.Equal(60, LengthAt(plan, "j", "east"), 1e-9);
    }

    [Fact]
    public void A_carried_deck_tied_to_its_carrier_travels_with_it()
    {
        var plan = Of([Abutment("a1", 0), Pier("p2", 40), Abutment("a3", 90)], [Deck("west", 0, 50), Deck("east", 50, 90)],
            [Fixed("b1", "west", "a1", 0), Free("b2", "west", "p2", 40), Fixed("h", "east", "west", 50), Free("b3", "east", "a3", 90)],
            Joint("hinge", "west", "east"), Joint("end", "east", "a3"));
        Assert.Empty(Lengths(plan, "hinge"));
        Assert.Equal(50, LengthAt(plan, "end", "west"), 1e-9);
        Assert.Equal(40, LengthAt(plan, "end", "east"), 1e-9);
    }

    [Fact]
    public void A_deck_on_sliders_alone_is_a_mechanism_that_is_named()
    {
        var plan = Of([Abutment("a1", 0), Abutment("a2", 60)], [Deck("deck", 0, 60)],
            [Free("b1", "deck", "a1", 0), Free("b2", "deck", "a2", 60)], Joint("j", "deck", "a2"));
        var fault = Assert.Throws<MechanismException>(() => Lengths(plan, "j"));
        Assert.StartsWith("deck#", fault.Node.Name, StringComparison.Ordinal);
    }

    [Fact]
    public void The_zero_movement_point_lies_where_stiffness_times_distance_balances()
    {
        var plan = Of([Abutment("a1", 0), Pier("p2", 30), Abutment("a3", 90)], [Deck("deck", 0, 90, 1e14)],
            [Pads("b1", "deck", "a1", 0, 1e6), Pads("b2", "deck", "p2", 30, 4e6), Pads("b3", "deck", "a3", 90, 1e6)], Joint("j", "deck", "a3"));
        var derivation = new Derivation();
        var zero = ZeroMovementPoints.Of(plan.Segments[0], ExpansionLengths.Of(plan, derivation), _ => 12e-6, derivation);
        Assert.NotNull(zero);
        // Σkx/Σk = (1·0 + 4·30 + 1·90)/6 = 35 m, the deck being stiff
        Assert.Equal(35, zero.Value.Value, 1e-3);
    }

    [Fact]
    public void The_residual_and_the_refinement_are_at_rounding_level()
    {
        var plan = Of([Abutment("a1", 0), Pier("p2", 30, new GivenStiffness(7e6)), Abutment("a3", 90)], [Deck("deck", 0, 90)],
            [Pads("b1", "deck", "a1", 0, 1e6), Fixed("b2", "deck", "p2", 30), Pads("b3", "deck", "a3", 90, 1e6)], Joint("j", "deck", "a3"));
        var lengths = ExpansionLengths.Of(plan, new Derivation());
        Assert.InRange(lengths.Residual, 0, 1e-12);
        Assert.InRange(lengths.RefinementChange, 0, 1e-9);
    }

    private static System.Collections.Immutable.ImmutableArray<(Segment Segment, Number Length)> Lengths(Plan plan, string joint) =>
        ExpansionLengths.Of(plan, new Derivation()).Of(plan.Joints.First(j => j.Id == joint));

    private static double LengthAt(Plan plan, string joint, string segment) => Lengths(plan, joint).First(l => l.Segment.Id == segment).Length.Value;
}
