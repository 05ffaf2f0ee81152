using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Frames;

/// <summary>Closed forms of elementary beam theory; each expected value follows from the formula beside it.</summary>
public sealed class FrameSolverTests
{
    private const double Bending = 1.05e10;

    [Fact]
    public void A_uniform_load_turns_the_ends_of_a_simple_span_and_moves_surface_and_bearing()
    {
        // θ = wL³/(24EI) = 10e3·40³/(24·1.05e10) = 2.540e-3; own arithmetic: y_b 1.2 m, y_t 0.6 m: A opens 4.57 mm, bearing B slides 6.10 mm
        // outward, the surface at B moves 1.52 mm toward B.
        var plan = Simple(new CrossSection
        {
            Layers = [new Layer { Id = "all", Material = LayerMaterial.Steel, Modulus = 1e9, Area = 1e4, Depth = 0.6, Inertia = Bending / 1e9 }],
            Depth = 1.8,
            BearingDepth = 1.8,
        });
        var (deck, solver) = Beams.Solved(plan);
        var loaded = solver.Solve(new FrameLoad(deck.Model).Uniform("deck", 10e3, 0, 40));
        Assert.Equal(-2.540e-3, loaded.Of(deck.DeckAt("deck", 0), Direction.Turning), 0.0005e-3);
        Assert.Equal(-4.57e-3, loaded.Of(deck.Closing(plan.Joints[0])), 0.005e-3);
        Assert.Equal(6.10e-3, loaded.Of(deck.Travel(plan.Bearings[1])), 0.005e-3);
        Assert.Equal(1.52e-3, loaded.Of(deck.Closing(plan.Joints[1])), 0.005e-3);
    }

    [Theory]
    [InlineData(1, 0.5)]
    [InlineData(2, 0.25)]
    [InlineData(3, 0.3)]
    public void A_curvature_turns_the_end_of_equal_spans_by_its_share_of_the_span(int spans, double share)
    {
        // κL/2 for one span, κL/4 for two, 0.3κL for three: elementary beam theory.
        var plan = Beams.Continuous(Bending, [.. Enumerable.Repeat(40.0, spans)]);
        var (deck, solver) = Beams.Solved(plan);
        var bent = solver.Solve(new FrameLoad(deck.Model).Strained("deck", 0, 1e-4));
        // A longer underside sags the deck: its first end falls up-station.
        Assert.Equal(-share * 1e-4 * 40, bent.Of(deck.DeckAt("deck", 0), Direction.Turning), 1e-12);
    }

    [Fact]
    public void A_settled_middle_support_turns_both_ends_of_two_spans_alike()
    {
        // Two spans L, middle support down by s: M = 3EI·s/L², end rotation s/L + ML/(6EI) = 1.5·s/L.
        var plan = Beams.Continuous(Bending, 40, 40);
        var (deck, solver) = Beams.Solved(plan);
        var settled = solver.Solve(new FrameLoad(deck.Model).Moved(3, 0.02));
        Assert.Equal(-1.5 * 0.02 / 40, settled.Of(deck.DeckAt("deck", 0), Direction.Turning), 1e-12);
        Assert.Equal(1.5 * 0.02 / 40, settled.Of(deck.DeckAt("deck", 80), Direction.Turning), 1e-12);
    }

    [Fact]
    public void An_overhang_hangs_like_a_cantilever_behind_its_support()
    {
        // Overhang a with load w behind a span L: support rotation M·L/(3EI) with M = wa²/2, tip −wa⁴/(8EI) − θ·a.
        var plan = Of([Abutment("a1", 0), Pier("p2", 40)], [Deck("deck", 0, 50) with { Section = Beams.Section(Bending) }],
            [Fixed("b1", "deck", "a1", 0), Free("b2", "deck", "p2", 40)], Joint("j", "a1", "deck"));
        var (deck, solver) = Beams.Solved(plan);
        var loaded = solver.Solve(new FrameLoad(deck.Model).Uniform("deck", 1e4, 40, 50));
        var turned = 1e4 * 50 * 40 / (3 * Bending);
        Assert.Equal(-turned, loaded.Of(deck.DeckAt("deck", 40), Direction.Turning), 1e-12);
        Assert.Equal(-(1e4 * 1e4 / (8 * Bending)) - (turned * 10), loaded.Of(deck.DeckAt("deck", 50), Direction.Vertical), 1e-12);
    }

    [Fact]
    public void A_column_built_into_the_deck_of_one_span_gives_a_portal()
    {
        // Portal with fixed feet, beam L, columns h, all EI alike, uniform load w on the beam: corner moment wL²/(6(2 + k)), k = h/L;
        // corner rotation = M·h/(4EI) inward of the column (far end clamped): textbook portal formula.
        var column = new ColumnStiffness(20, 1e9, Bending / 1e9, null, null);
        var plan = Of([Pier("p1", 0, column), Pier("p2", 40, column)], [Deck("deck", 0, 40) with { Section = Beams.Section(Bending, depth: 1e-6, axial: 1e16) }],
            [Monolithic("m1", "p1", 0), Monolithic("m2", "p2", 40)]);
        var (deck, solver) = Beams.Solved(plan);
        var loaded = solver.Solve(new FrameLoad(deck.Model).Uniform("deck", 1e4, 0, 40));
        var corner = 1e4 * 1600 / (6 * (2 + 0.5));
        Assert.Equal(-corner * 20 / (4 * Bending), loaded.Of(deck.DeckAt("deck", 0), Direction.Turning), 1e-9);
    }

    [Fact]
    public void A_yielding_column_leans_its_backwall_with_it()
    {
        // Cantilever h pushed by F at its top: u = Fh³/(3EI), lean Fh²/(2EI) = 1.5·u/h; at a height H above the top the wall moves u + 1.5·u·H/h.
        var column = new ColumnStiffness(6, 30e9, 0.5, null, null);
        var plan = Of([Abutment("a1", 0, column), Abutment("a2", 40)], [Deck("deck", 0, 40) with { Section = Beams.Section(Bending) }],
            [Pads("b1", "deck", "a1", 0, 20e6), Fixed("b2", "deck", "a2", 40)], Joint("j", "a1", "deck"));
        var (deck, solver) = Beams.Solved(plan);
        var warmed = solver.Strained(_ => 1e-4);
        var (wall, end) = (warmed.Of(deck.SupportAt("a1")), warmed.Of(Response.Along(deck.DeckAt("deck", 0), 1)));
        Assert.True(wall < 0, "warming pushes the abutment back");
        Assert.Equal((wall * (1 + (1.5 * 2 / 6))) - end, warmed.Of(deck.Closing(plan.Joints[0])), 1e-12);
    }

    [Fact]
    public void A_deck_on_one_line_can_turn_and_that_is_named()
    {
        var plan = Of([Abutment("a1", 0), Abutment("a2", 40)], [Deck("deck", 0, 40) with { Section = Beams.Section(Bending) }],
            [Fixed("b1", "deck", "a1", 0)], Joint("j", "a1", "deck"));
        var fault = Assert.Throws<MechanismException>(() => Beams.Solved(plan));
        Assert.NotEqual(Direction.Along, fault.Direction);
        Assert.Equal("deck", fault.Node.Body);
    }

    private static BearingLine Monolithic(string id, string on, double station) => Fixed(id, "deck", on, station) with { Kind = BearingKind.Monolithic };

    private static Plan Simple(CrossSection section) => Of([Abutment("a", 0), Abutment("b", 40)], [Deck("deck", 0, 40) with { Section = section }],
        [Fixed("b1", "deck", "a", 0), Free("b2", "deck", "b", 40)], Joint("j1", "a", "deck"), Joint("j2", "deck", "b"));
}
