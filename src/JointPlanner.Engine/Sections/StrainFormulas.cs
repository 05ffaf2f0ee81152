using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Sections;

/// <summary>From a free-strain profile over the depth to the strain and curvature of the section and the stresses that balance in themselves.</summary>
public static class StrainFormulas
{
    private static readonly Operand Above = new("T_a", "temperature difference at the point above", Quantity.TemperatureDifference);
    private static readonly Operand Below = new("T_b", "temperature difference at the point below", Quantity.TemperatureDifference);
    private static readonly Operand At = new("y", "depth asked for", Quantity.Size);
    private static readonly Operand DepthAbove = new("y_a", "depth of the point above", Quantity.Size);
    private static readonly Operand DepthBelow = new("y_b", "depth of the point below", Quantity.Size);
    private static readonly Operand Centroid = new("y_i", "depth of the layer's centroid", Quantity.Size);
    private static readonly Operand Height = new("h", "height of the layer", Quantity.Size);
    private static readonly Operand MeanPart = new("T_m", "part of the layer's mean temperature difference", Quantity.TemperatureDifference);
    private static readonly Operand Mean = new("T_i", "mean temperature difference of the layer", Quantity.TemperatureDifference);
    private static readonly Operand SlopePart = new("g_m", "part of the layer's gradient", Quantity.TemperatureGradient);
    private static readonly Operand Slope = new("g_i", "gradient over the layer, positive when warmer below", Quantity.TemperatureGradient);
    private static readonly Operand FreeForce = new("N_i", "force that would hold back the layer's free strain", Quantity.Force);
    private static readonly Operand FreeMoment = new("M_i", "moment about the neutral axis that would hold back the layer's free strain", Quantity.Moment);
    private static readonly Operand Strain = new("ε_0", "strain of the neutral axis, lengthening positive", Quantity.Strain);
    private static readonly Operand Bend = new("κ", "curvature, positive when the underside lengthens", Quantity.Curvature);
    private static readonly Operand Level = new("y", "depth of the level", Quantity.Size);
    private static readonly Operand Free = new("T", "temperature difference there", Quantity.TemperatureDifference);

    private static readonly Provenance Linear = Provenance.Derived("the profile is straight between its points");
    private static readonly Provenance OverStrip = Provenance.Derived("mean and first moment of the profile over the strip that stands for the layer");
    private static readonly Provenance Held = Provenance.Derived("ε_0 = ∫E·ε_f dA/EA and κ = ∫E·ε_f·(y − ȳ) dA/EI: hold every fibre, then let the whole section go");
    private static readonly Provenance Plane = Provenance.Derived("plane sections: strain varies linearly over the depth");

    /// <summary>Temperature difference between two points of the profile.</summary>
    public static readonly Formula Between = new(
        "section.profile-between", "T", "temperature difference between two points of the profile", Quantity.TemperatureDifference,
        [Above, Below, At, DepthAbove, DepthBelow], Above + (Below - Above) * (At - DepthAbove) / (DepthBelow - DepthAbove), Linear,
        new(12, 1e-9, "own arithmetic", 16, 4, 0.05, 0, 0.15));

    /// <summary>Upper or lower edge of a layer.</summary>
    public static readonly Formula UpperEdge = new(
        "section.upper-edge", "y_t", "depth of the layer's upper edge", Quantity.Size, [Centroid, Height], Centroid - Height / 2, OverStrip,
        new(0.1, 1e-9, "own arithmetic", 0.2, 0.2));

    /// <summary>Lower edge of a layer.</summary>
    public static readonly Formula LowerEdge = new(
        "section.lower-edge", "y_u", "depth of the layer's lower edge", Quantity.Size, [Centroid, Height], Centroid + Height / 2, OverStrip,
        new(0.3, 1e-9, "own arithmetic", 0.2, 0.2));

    /// <summary>One straight piece's share in the mean.</summary>
    public static readonly Formula PartOfMean = new(
        "section.part-of-mean", "T_m", "part of the layer's mean temperature difference", Quantity.TemperatureDifference,
        [Above, Below, DepthAbove, DepthBelow, Height], (Above + Below) / 2 * ((DepthBelow - DepthAbove) / Height), OverStrip,
        new(3.5, 1e-9, "own arithmetic", 10, 4, 0.0, 0.1, 0.2));

    /// <summary>Mean over the layer.</summary>
    public static readonly Formula MeanOfLayer = new(
        "section.mean", "T_i", "mean temperature difference of the layer", Quantity.TemperatureDifference, [MeanPart], Total(MeanPart), OverStrip,
        new(5.5, 1e-9, "own arithmetic", 3.5, 2));

    /// <summary>One straight piece's share in the gradient.</summary>
    public static readonly Formula PartOfSlope = new(
        "section.part-of-gradient", "g_m", "part of the layer's gradient", Quantity.TemperatureGradient,
        [Above, Below, DepthAbove, DepthBelow, Centroid, Height],
        12 * (DepthBelow - DepthAbove) / Power(Height, 3)
            * ((Above + Below) / 2 * ((DepthAbove + DepthBelow) / 2 - Centroid) + (Below - Above) * (DepthBelow - DepthAbove) / 12), OverStrip,
        new(-30, 1e-9, "own arithmetic: 10 K at the top to 4 K at the bottom of 0.2 m", 10, 4, 0, 0.2, 0.1, 0.2));

    /// <summary>Gradient over the layer.</summary>
    public static readonly Formula SlopeOfLayer = new(
        "section.gradient", "g_i", "gradient over the layer, positive when warmer below", Quantity.TemperatureGradient, [SlopePart], Total(SlopePart),
        OverStrip, new(-30, 1e-9, "own arithmetic", -10, -20));

    /// <summary>N_i = α·T·EA.</summary>
    public static readonly Formula HeldForce = new(
        "section.held-force", "N_i", "force that would hold back the layer's free strain", Quantity.Force,
        [SectionFormulas.Expansion, Mean, SectionFormulas.LayerStiffness], SectionFormulas.Expansion * Mean * SectionFormulas.LayerStiffness, Held,
        new(3.19471875e6, 1e-3, "own arithmetic: slab 15 K", 1e-5, 15, 21.298125e9));

    /// <summary>M_i = N_i·(y_i − ȳ).</summary>
    public static readonly Formula HeldMoment = new(
        "section.held-moment", "M_i", "moment about the neutral axis that would hold back the layer's free strain", Quantity.Moment,
        [FreeForce, Centroid, SectionFormulas.NeutralDepth], FreeForce * (Centroid - SectionFormulas.NeutralDepth), Held,
        new(-3e5, 1e-6, "own arithmetic", 1e6, 0.1, 0.4));

    /// <summary>M_i with the gradient over the layer.</summary>
    public static readonly Formula HeldMomentWithGradient = new(
        "section.held-moment-with-gradient", "M_i", "moment about the neutral axis that would hold back the layer's free strain", Quantity.Moment,
        [FreeForce, Centroid, SectionFormulas.NeutralDepth, SectionFormulas.Expansion, Slope, SectionFormulas.OwnStiffness],
        FreeForce * (Centroid - SectionFormulas.NeutralDepth) + SectionFormulas.Expansion * Slope * SectionFormulas.OwnStiffness, Held,
        new(-3.3e5, 1e-6, "own arithmetic", 1e6, 0.1, 0.4, 1e-5, -30, 1e8));

    /// <summary>ΣN.</summary>
    public static readonly Formula Forces = new(
        "section.held-forces", "ΣN", "force that would hold back all free strains", Quantity.Force, [FreeForce], Total(FreeForce), Held,
        new(3e6, 1e-6, "own arithmetic", 1e6, 2e6));

    /// <summary>ΣM.</summary>
    public static readonly Formula Moments = new(
        "section.held-moments", "ΣM", "moment that would hold back all free strains", Quantity.Moment, [FreeMoment], Total(FreeMoment), Held,
        new(3e6, 1e-6, "own arithmetic", 1e6, 2e6));

    private static readonly Operand SumOfForces = new("ΣN", "force that would hold back all free strains", Quantity.Force);
    private static readonly Operand SumOfFreeMoments = new("ΣM", "moment that would hold back all free strains", Quantity.Moment);
    private static readonly Operand Bending = new("EI", "bending stiffness of the section", Quantity.BendingStiffness);

    /// <summary>ε_0.</summary>
    public static readonly Formula AxialStrain = new(
        "section.strain", "ε_0", "strain of the neutral axis, lengthening positive", Quantity.Strain, [SumOfForces, SectionFormulas.Axial],
        SumOfForces / SectionFormulas.Axial, Held, new(1e-4, 1e-12, "own arithmetic", 3e6, 3e10));

    /// <summary>κ.</summary>
    public static readonly Formula Curvature = new(
        "section.curvature", "κ", "curvature, positive when the underside lengthens", Quantity.Curvature, [SumOfFreeMoments, Bending],
        SumOfFreeMoments / Bending, Held, new(-1e-4, 1e-12, "own arithmetic", -5e5, 5e9));

    /// <summary>Strain at a level.</summary>
    public static readonly Formula StrainAt = new(
        "section.strain-at-level", "ε", "strain at the level, lengthening positive; as movement valid for one simply supported span alone", Quantity.Strain,
        [Strain, Bend, Level, SectionFormulas.NeutralDepth], Strain + Bend * (Level - SectionFormulas.NeutralDepth), Plane,
        new(1.6e-4, 1e-12, "own arithmetic", 1e-4, 1e-4, 1, 0.4));

    /// <summary>Stress at an edge.</summary>
    public static readonly Formula StressAt = new(
        "section.stress", "σ", "stress that balances in itself, tension positive", Quantity.Stress,
        [SectionFormulas.Modulus, Strain, Bend, Level, SectionFormulas.NeutralDepth, SectionFormulas.Expansion, Free],
        SectionFormulas.Modulus * (Strain + Bend * (Level - SectionFormulas.NeutralDepth) - SectionFormulas.Expansion * Free), Plane,
        new(-1.02e6, 1e-3, "own arithmetic", 34e9, 1e-4, -1e-4, 0.1, 0.4, 1e-5, 16));
}
