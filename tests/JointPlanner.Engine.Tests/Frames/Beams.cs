using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Frames;

/// <summary>Beams for tests: one layer, so that its own axis is the neutral axis.</summary>
internal static class Beams
{
    /// <summary>A section of one layer with the given EI; neutral axis at half depth, bearings at the soffit.</summary>
    public static CrossSection Section(double bending, double depth = 2, double axial = 1e11, double surfacing = 0) => new()
    {
        Layers = [new Layer { Id = "all", Material = LayerMaterial.Steel, Modulus = 1e9, Area = axial / 1e9, Depth = depth / 2, Inertia = bending / 1e9 }],
        Depth = depth,
        BearingDepth = depth,
        Surfacing = surfacing,
    };

    /// <summary>A continuous deck on unyielding supports, fixed at its first one.</summary>
    public static Plan Continuous(double bending, params double[] spans)
    {
        var stations = new double[spans.Length + 1];
        for (var i = 0; i < spans.Length; i++) stations[i + 1] = stations[i] + spans[i];
        var supports = stations.Select((x, i) => i == 0 || i == spans.Length ? Abutment($"s{i}", x) : Pier($"s{i}", x)).ToArray();
        return Of(supports, [Deck("deck", 0, stations[^1]) with { Section = Section(bending) }],
            [.. stations.Select((x, i) => i == 0 ? Fixed("b0", "deck", "s0", x) : Free($"b{i}", "deck", $"s{i}", x))],
            Joint("j1", "s0", "deck"), Joint("j2", "deck", $"s{spans.Length}"));
    }

    public static (DeckModel Deck, FrameSolver Solver) Solved(Plan plan)
    {
        var deck = DeckModel.Of(plan, new Derivation());
        return (deck, new FrameSolver(deck.Model));
    }
}
