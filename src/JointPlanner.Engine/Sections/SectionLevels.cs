using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Sections;

/// <summary>Levels of a section as steps: depths below the top of the section, and their distances from the neutral axis.</summary>
public static class SectionLevels
{
    private static readonly Operand Surfacing = new("t_s", "height of the road surface above the top of the section", Quantity.Size);
    private static readonly Operand Bottom = new("y_b", "depth of bearing level", Quantity.Size);

    private static readonly Provenance Measured = Provenance.Derived("depths are measured downward from the top of the section");

    /// <summary>Depth of the road surface: above the top, so negative.</summary>
    public static readonly Formula SurfaceDepth = new(
        "section.surface-depth", "y_s", "depth of the road surface, negative above the top of the section", Quantity.Size, [Surfacing], -1 * Surfacing,
        Measured, new(-0.1, 1e-12, "own arithmetic", 0.1));

    /// <summary>Height of the road surface above bearing level.</summary>
    public static readonly Formula SurfaceAboveBearing = new(
        "section.surface-above-bearing", "h", "height of the road surface above bearing level", Quantity.Size, [Bottom, Surfacing], Bottom + Surfacing,
        Measured, new(1.8, 1e-12, "own arithmetic", 1.7, 0.1));

    /// <summary>Road surface.</summary>
    public static Number Surface(SectionProperties section, Derivation derivation) => derivation.Use(SurfaceDepth, "", Paving(section, derivation));

    /// <summary>Bearing level.</summary>
    public static Number Bearing(SectionProperties section, Derivation derivation) => derivation.Given(
        $"segments/{section.Segment.Id}/section/bearing-depth", "y_b", Bottom.Meaning, Quantity.Size, section.Section.BearingDepth);

    /// <summary>Height of the road surface above bearing level.</summary>
    public static Number Height(SectionProperties section, Derivation derivation) =>
        derivation.Use(SurfaceAboveBearing, "", Bearing(section, derivation), Paving(section, derivation));

    internal static Number Modulus(SectionProperties section, LayerProperties layer, Derivation derivation) => derivation.Given(
        $"segments/{section.Segment.Id}/section/layers/{layer.Layer.Id}/modulus", "E", $"modulus of elasticity of the layer {layer.Layer.Id}",
        Quantity.Stress, layer.Layer.Modulus);

    private static Number Paving(SectionProperties section, Derivation derivation) => derivation.Given(
        $"segments/{section.Segment.Id}/section/surfacing", "t_s", Surfacing.Meaning, Quantity.Size, section.Section.Surfacing);
}
