using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Codes.Tests;

/// <summary>A section for tests of temperature differences.</summary>
internal static class Sections
{
    /// <summary>One layer, 2 m deep, its neutral axis at 0.8 m.</summary>
    public static SectionProperties Of(DeckKind kind, Derivation derivation, double depth = 2, double surfacing = 0.05, DeckSurface surface = DeckSurface.Surfaced)
    {
        var segment = new Segment
        {
            Id = "deck",
            Start = 0,
            End = 40,
            Kind = kind,
            AxialStiffness = 1,
            Gradient = new Gradient { Zone = "1", Surface = surface },
            Section = new CrossSection
            {
                Depth = depth,
                BearingDepth = depth,
                Surfacing = surfacing,
                Layers = [new Layer { Id = "all", Material = LayerMaterial.Steel, Modulus = 1e9, Area = 10, Depth = 0.4 * depth, Inertia = 10 }],
            },
        };
        var plan = new Plan
        {
            Structure = new("T", "Test", "nowhere", "Etc/UTC", null),
            Basis = new BasisChoice { Code = "test" },
            Climate = new Climate(),
            Segments = [segment],
            Supports = [],
            Bearings = [],
            Joints = [],
        };
        return SectionProperties.Of(plan, segment, derivation)!;
    }
}
