using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Sections;

/// <summary>Stiffness and neutral axis of a section of layers.</summary>
public static class SectionFormulas
{
    internal static readonly Operand Modulus = new("E", "modulus of elasticity of the layer", Quantity.Stress);
    internal static readonly Operand Area = new("A", "area of the layer", Quantity.Area);
    internal static readonly Operand Depth = new("y", "depth of the layer's centroid below the top of the section", Quantity.Size);
    internal static readonly Operand LayerHeight = new("h", "height of the layer", Quantity.Size);
    internal static readonly Operand Inertia = new("I", "own second moment of area of the layer", Quantity.Inertia);
    internal static readonly Operand LayerStiffness = new("EA_i", "axial stiffness of the layer", Quantity.AxialStiffness);
    internal static readonly Operand LayerMoment = new("EAy_i", "axial stiffness of the layer times its depth", Quantity.Moment);
    internal static readonly Operand SumOfMoments = new("ΣEAy", "sum of axial stiffness times depth", Quantity.Moment);
    internal static readonly Operand Axial = new("EA", "axial stiffness of the section", Quantity.AxialStiffness);
    internal static readonly Operand NeutralDepth = new("ȳ", "depth of the neutral axis below the top of the section", Quantity.Size);
    internal static readonly Operand OwnStiffness = new("EI_0", "own bending stiffness of the layer", Quantity.BendingStiffness);
    internal static readonly Operand LayerBending = new("EI_i", "bending stiffness of the layer about the neutral axis", Quantity.BendingStiffness);
    internal static readonly Operand Expansion = new("α_i", "coefficient of expansion of the layer", Quantity.Expansion);
    internal static readonly Operand Weighted = new("αEA_i", "coefficient of expansion times axial stiffness of the layer", Quantity.StiffnessPerDegree);
    internal static readonly Operand SumOfWeighted = new("ΣαEA", "sum of coefficient of expansion times axial stiffness", Quantity.StiffnessPerDegree);

    private static readonly Provenance Plane = Provenance.Derived("plane sections of layers that act together, each with its own modulus");

    /// <summary>EA of one layer.</summary>
    public static readonly Formula OfLayer = new(
        "section.layer-stiffness", "EA_i", "axial stiffness of the layer", Quantity.AxialStiffness, [Modulus, Area], Modulus * Area, Plane,
        new(21.298125e9, 1, "own arithmetic: slab 2500 mm by 250 mm, 34.077 GPa", 34.077e9, 0.625));

    /// <summary>EA·y of one layer.</summary>
    public static readonly Formula MomentOfLayer = new(
        "section.layer-moment", "EAy_i", "axial stiffness of the layer times its depth", Quantity.Moment, [LayerStiffness, Depth],
        LayerStiffness * Depth, Plane, new(2.5e9, 1, "own arithmetic", 2e10, 0.125));

    /// <summary>EA.</summary>
    public static readonly Formula AxialStiffness = new(
        "section.axial-stiffness", "EA", "axial stiffness of the section", Quantity.AxialStiffness, [LayerStiffness], Total(LayerStiffness), Plane,
        new(3e10, 1, "own arithmetic", 2e10, 1e10));

    /// <summary>Σ EA·y.</summary>
    public static readonly Formula Moments = new(
        "section.moments", "ΣEAy", "sum of axial stiffness times depth", Quantity.Moment, [LayerMoment], Total(LayerMoment), Plane,
        new(1.2e10, 1, "own arithmetic", 2e9, 1e10));

    /// <summary>ȳ = ΣEAy/EA.</summary>
    public static readonly Formula NeutralAxis = new(
        "section.neutral-axis", "ȳ", "depth of the neutral axis below the top of the section", Quantity.Size, [SumOfMoments, Axial],
        SumOfMoments / Axial, Plane, new(0.4, 1e-9, "own arithmetic", 1.2e10, 3e10));

    /// <summary>Own second moment of area of a strip.</summary>
    public static readonly Formula StripInertia = new(
        "section.strip-inertia", "I", "own second moment of area of a layer of uniform width", Quantity.Inertia, [Area, LayerHeight],
        Area * Power(LayerHeight, 2) / 12, Provenance.Derived("rectangle: A·h²/12"), new(3.25520833e-3, 1e-9, "own arithmetic", 0.625, 0.25));

    /// <summary>Height of the strip that stands for a layer with its own second moment of area.</summary>
    public static readonly Formula StripHeight = new(
        "section.strip-height", "h", "height of the strip that stands for the layer", Quantity.Size, [Inertia, Area],
        Root(12 * Inertia / Area), Provenance.Derived("a strip of uniform width with the same area, centroid and own second moment of area: I = A·h²/12"),
        new(0.25, 1e-9, "own arithmetic", 0.625 * 0.0625 / 12, 0.625));

    /// <summary>E·I of a layer about its own centroid.</summary>
    public static readonly Formula OwnBending = new(
        "section.layer-own-bending", "EI_0", "own bending stiffness of the layer", Quantity.BendingStiffness, [Modulus, Inertia], Modulus * Inertia,
        Plane, new(1e8, 1e-3, "own arithmetic", 34e9, 1.0 / 340));

    /// <summary>E·(I + A·(y − ȳ)²) of a layer.</summary>
    public static readonly Formula BendingOfLayer = new(
        "section.layer-bending", "EI_i", "bending stiffness of the layer about the neutral axis", Quantity.BendingStiffness,
        [OwnStiffness, LayerStiffness, Depth, NeutralDepth], OwnStiffness + LayerStiffness * Power(Depth - NeutralDepth, 2), Plane,
        new(1.9e9, 1, "own arithmetic", 1e8, 2e10, 0.1, 0.4));

    /// <summary>EI.</summary>
    public static readonly Formula BendingStiffness = new(
        "section.bending-stiffness", "EI", "bending stiffness of the section", Quantity.BendingStiffness, [LayerBending], Total(LayerBending), Plane,
        new(5e9, 1, "own arithmetic", 2e9, 3e9));

    /// <summary>α·EA of a layer.</summary>
    public static readonly Formula WeightOfLayer = new(
        "section.layer-expansion", "αEA_i", "coefficient of expansion times axial stiffness of the layer", Quantity.StiffnessPerDegree,
        [Expansion, LayerStiffness], Expansion * LayerStiffness, Plane, new(2e5, 1e-6, "own arithmetic", 1e-5, 2e10));

    /// <summary>Σα·EA.</summary>
    public static readonly Formula Weights = new(
        "section.expansions", "ΣαEA", "sum of coefficient of expansion times axial stiffness", Quantity.StiffnessPerDegree, [Weighted], Total(Weighted),
        Plane, new(3e5, 1e-6, "own arithmetic", 1e5, 2e5));

    /// <summary>α_eff = ΣαEA/ΣEA.</summary>
    public static readonly Formula EffectiveExpansion = new(
        "section.effective-expansion", "α_eff", "best estimate of the coefficient of expansion of the whole section", Quantity.Expansion,
        [SumOfWeighted, Axial], SumOfWeighted / Axial, Provenance.Derived("strain of the neutral axis per degree where the whole section warms alike"),
        new(1e-5, 1e-12, "own arithmetic", 3e5, 3e10));
}
