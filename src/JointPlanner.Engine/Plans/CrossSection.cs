using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans;

/// <summary>What a layer of a cross-section is made of.</summary>
public enum LayerMaterial
{
    /// <summary>Concrete: slab, beams, box.</summary>
    Concrete,
    /// <summary>Steel.</summary>
    Steel,
}

/// <summary>
/// The cross-section of a segment as layers. Depths are measured downward from the top of the uppermost layer, without surfacing.
/// A segment whose section is described bends in the model; one that is known by EA alone only changes its length.
/// </summary>
public sealed record CrossSection
{
    /// <summary>Layers.</summary>
    public required ImmutableArray<Layer> Layers { get; init; }
    /// <summary>Depth of the soffit, m.</summary>
    public required double Depth { get; init; }
    /// <summary>Depth of the level at which bearings turn and slide, m.</summary>
    public required double BearingDepth { get; init; }
    /// <summary>Height of the road surface above the top of the section, m.</summary>
    public double Surfacing { get; init; }
    /// <summary>Stiffness of the connection between slab and steel: force per length of deck for a unit of slip, N/m²; null where not given.</summary>
    public double? Connection { get; init; }
    /// <summary>Spacing of the relief joints of a slab that is carried by its steel without acting with it, m.</summary>
    public double ReliefSpacing { get; init; } = CommonReliefSpacing;

    /// <summary>Common practice, no source: a slab on steel framing has small relief joints about every 50 ft, m.</summary>
    public const double CommonReliefSpacing = 15.24;

    /// <summary>True where slab and steel are both there.</summary>
    public bool IsComposite => Layers.Any(l => l.Material == LayerMaterial.Concrete) && Layers.Any(l => l.Material == LayerMaterial.Steel);
}

/// <summary>One layer. In profiles that are not linear it stands for the strip of uniform width with the same area, centroid and own second moment of area.</summary>
public sealed record Layer
{
    /// <summary>Id within the section.</summary>
    public required string Id { get; init; }
    /// <summary>What it is made of.</summary>
    public required LayerMaterial Material { get; init; }
    /// <summary>Modulus of elasticity, short-term, Pa.</summary>
    public required double Modulus { get; init; }
    /// <summary>Area, m².</summary>
    public required double Area { get; init; }
    /// <summary>Depth of its centroid, m.</summary>
    public required double Depth { get; init; }
    /// <summary>Height of a layer of uniform width, m; null where its own second moment of area is given.</summary>
    public double? Height { get; init; }
    /// <summary>Own second moment of area, m⁴; null where its height is given.</summary>
    public double? Inertia { get; init; }
    /// <summary>Best estimate of its coefficient of thermal expansion, 1/K; null for that of the segment.</summary>
    public double? Expansion { get; init; }
}
