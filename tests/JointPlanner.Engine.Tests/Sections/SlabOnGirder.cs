using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Sections;

/// <summary>
/// One girder under its slab, 40 m long: slab 2500 mm by 250 mm of 34.077 GPa; girder of 210 GPa with bottom flange 500 by 40, web 1200 by 14, top
/// flange 400 by 25 mm; two studs of 100 kN/mm every 200 mm.
/// </summary>
internal static class SlabOnGirder
{
    public static CrossSection Section { get; } = new()
    {
        Depth = 1.515,
        BearingDepth = 1.515,
        Connection = 1e9,
        Layers =
        [
            new Layer { Id = "slab", Material = LayerMaterial.Concrete, Modulus = 34.077e9, Area = 2.5 * 0.25, Depth = 0.125, Height = 0.25 },
            Plate("top", 0.4, 0.025, 0.2625), Plate("web", 0.014, 1.2, 0.875), Plate("bottom", 0.5, 0.04, 1.495),
        ],
    };

    public static Plan Plan { get; } = Of([Abutment("a", 0), Abutment("b", 40)], [Deck("deck", 0, 40) with { Section = Section, Kind = DeckKind.Composite }],
        [Fixed("b1", "deck", "a", 0), Free("b2", "deck", "b", 40)], Joint("j1", "a", "deck"), Joint("j2", "deck", "b"));

    private static Layer Plate(string id, double width, double height, double depth) =>
        new() { Id = id, Material = LayerMaterial.Steel, Modulus = 210e9, Area = width * height, Depth = depth, Height = height };
}
