using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Sections;

/// <summary>One layer with its stiffnesses.</summary>
/// <param name="Layer">The layer.</param>
/// <param name="Depth">Depth of its centroid, m.</param>
/// <param name="Height">Height of the strip that stands for it, m.</param>
/// <param name="AxialStiffness">E·A, N.</param>
/// <param name="OwnBending">E·I about its own centroid, N·m².</param>
public sealed record LayerProperties(Layer Layer, Number Depth, Number Height, Number AxialStiffness, Number OwnBending)
{
    /// <summary>Depth of its upper edge, m.</summary>
    public double Top => Depth.Value - (Height.Value / 2);
    /// <summary>Depth of its lower edge, m.</summary>
    public double Bottom => Depth.Value + (Height.Value / 2);
}

/// <summary>Stiffness of the section of one segment, short-term and uncracked.</summary>
public sealed class SectionProperties
{
    private SectionProperties(Segment segment, CrossSection section) => (Segment, Section) = (segment, section);

    /// <summary>The segment.</summary>
    public Segment Segment { get; }
    /// <summary>What the plan says of its section.</summary>
    public CrossSection Section { get; }
    /// <summary>Layers in the plan's order.</summary>
    public ImmutableArray<LayerProperties> Layers { get; private init; }
    /// <summary>EA, N.</summary>
    public Number AxialStiffness { get; private init; }
    /// <summary>ȳ, depth of the neutral axis, m.</summary>
    public Number NeutralAxis { get; private init; }
    /// <summary>EI, N·m².</summary>
    public Number BendingStiffness { get; private init; }
    /// <summary>Height of the road surface above the neutral axis, m.</summary>
    public double SurfaceHeight => NeutralAxis.Value + Section.Surfacing;
    /// <summary>Depth of bearing level below the neutral axis, m.</summary>
    public double BearingDrop => Section.BearingDepth - NeutralAxis.Value;

    /// <summary>Properties of a segment's section as steps; null where its section is not described.</summary>
    public static SectionProperties? Of(Plan plan, Segment segment, Derivation derivation)
    {
        if (segment.Section is not { } section) return null;
        var layers = section.Layers.Select(l => Layer(plan, segment, l, derivation)).ToImmutableArray();
        var axial = derivation.Use(SectionFormulas.AxialStiffness, Keys.SectionAxialStiffness(segment.Id), [.. layers.Select(l => l.AxialStiffness)]);
        var moments = layers.Select(l => derivation.Use(SectionFormulas.MomentOfLayer, "", l.AxialStiffness, l.Depth)).ToArray();
        var neutral = derivation.Use(SectionFormulas.NeutralAxis, Keys.NeutralAxis(segment.Id), derivation.Use(SectionFormulas.Moments, "", moments), axial);
        var bendings = layers.Select(l =>
            derivation.Use(SectionFormulas.BendingOfLayer, "", l.OwnBending, l.AxialStiffness, l.Depth, neutral)).ToArray();
        return new SectionProperties(segment, section)
        {
            Layers = layers,
            AxialStiffness = axial,
            NeutralAxis = neutral,
            BendingStiffness = derivation.Use(SectionFormulas.BendingStiffness, Keys.SectionBendingStiffness(segment.Id), bendings),
        };
    }

    /// <summary>α_eff as a step; null where no layer has a coefficient of its own.</summary>
    /// <param name="segmentExpansion">Coefficient of the layers that have none.</param>
    /// <param name="derivation">Where the steps go.</param>
    public Number? EffectiveExpansion(Number segmentExpansion, Derivation derivation)
    {
        if (Layers.All(l => l.Layer.Expansion is null)) return null;
        var weights = Layers.Select(l =>
            derivation.Use(SectionFormulas.WeightOfLayer, "", ExpansionOf(l, segmentExpansion, derivation), l.AxialStiffness)).ToArray();
        return derivation.Use(SectionFormulas.EffectiveExpansion, Keys.EffectiveExpansion(Segment.Id),
            derivation.Use(SectionFormulas.Weights, "", weights), AxialStiffness);
    }

    /// <summary>A layer's coefficient of expansion: its own, or the segment's.</summary>
    public Number ExpansionOf(LayerProperties layer, Number segmentExpansion, Derivation derivation) => layer.Layer.Expansion is { } own
        ? derivation.Given($"segments/{Segment.Id}/section/layers/{layer.Layer.Id}/expansion", "α_i",
            $"coefficient of expansion of layer {layer.Layer.Id}", Quantity.Expansion, own)
        : segmentExpansion;

    private static LayerProperties Layer(Plan plan, Segment segment, Layer layer, Derivation derivation)
    {
        var path = $"segments/{segment.Id}/section/layers/{layer.Id}";
        var modulus = Given("modulus", SectionFormulas.Modulus, layer.Modulus);
        var area = Given("area", SectionFormulas.Area, layer.Area);
        var height = layer.Height is { } h ? Given("height", SectionFormulas.LayerHeight, h) : (Number?)null;
        var inertia = height is { } given
            ? derivation.Use(SectionFormulas.StripInertia, "", area, given)
            : Given("inertia", SectionFormulas.Inertia, layer.Inertia ?? throw new InvalidOperationException($"Layer {layer.Id} has neither height nor inertia."));
        return new LayerProperties(layer, Given("depth", SectionFormulas.Depth, layer.Depth),
            height ?? derivation.Use(SectionFormulas.StripHeight, "", inertia, area),
            derivation.Use(SectionFormulas.OfLayer, "", modulus, area), derivation.Use(SectionFormulas.OwnBending, "", modulus, inertia));

        Number Given(string word, Operand operand, double value) => GivenValues.Of(plan, derivation, $"{path}/{word}", operand.Symbol,
            $"{operand.Meaning} {layer.Id}", operand.Quantity, value);
    }
}
