using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Sections;

/// <summary>
/// The one mechanism by which temperature over the depth, slabs cooler than their steel and different coefficients of expansion act: every
/// layer is held at its free strain, then the section is let go as a whole.
/// </summary>
/// <param name="section">The section.</param>
/// <param name="segmentExpansion">Coefficient of expansion of layers that have none of their own, 1/K.</param>
/// <param name="derivation">Where the steps go.</param>
public sealed class FreeStrains(SectionProperties section, Number segmentExpansion, Derivation derivation)
{
    /// <summary>Warmed by a profile over the depth.</summary>
    public SectionState Of(TemperatureProfile profile) => Of(profile.Name, layer => Over(layer, profile), (layer, depth) => profile.At(depth, derivation));

    /// <summary>Every layer warmed by its own uniform difference; null where it keeps its temperature.</summary>
    /// <param name="name">What it is.</param>
    /// <param name="differenceOf">Temperature difference of a layer, K.</param>
    public SectionState Of(string name, Func<LayerProperties, Number?> differenceOf) =>
        Of(name, layer => (differenceOf(layer), null), (layer, _) => differenceOf(layer));

    private SectionState Of(
        string name, Func<LayerProperties, (Number? Mean, Number? Gradient)> warmthOf, Func<LayerProperties, Number, Number?> warmthAt)
    {
        var (forces, moments) = (new List<Number>(), new List<Number>());
        foreach (var layer in section.Layers)
        {
            var (mean, gradient) = warmthOf(layer);
            if (mean is not { } warmth) continue;
            var alpha = section.ExpansionOf(layer, segmentExpansion, derivation);
            var force = derivation.Use(StrainFormulas.HeldForce, "", alpha, warmth, layer.AxialStiffness);
            forces.Add(force);
            moments.Add(gradient is { } g
                ? derivation.Use(StrainFormulas.HeldMomentWithGradient, "", force, layer.Depth, section.NeutralAxis, alpha, g, layer.OwnBending)
                : derivation.Use(StrainFormulas.HeldMoment, "", force, layer.Depth, section.NeutralAxis));
        }
        var strain = derivation.Use(StrainFormulas.AxialStrain, "", derivation.Use(StrainFormulas.Forces, "", [.. forces]), section.AxialStiffness);
        var curvature = derivation.Use(StrainFormulas.Curvature, "", derivation.Use(StrainFormulas.Moments, "", [.. moments]), section.BendingStiffness);
        return new SectionState(name, strain, curvature,
            StrainAt(SectionLevels.Surface(section, derivation)), StrainAt(SectionLevels.Bearing(section, derivation)),
            [.. section.Layers.SelectMany(l => new[] { Stress(l, StrainFormulas.UpperEdge), Stress(l, StrainFormulas.LowerEdge) })]);

        Number StrainAt(Number level) => derivation.Use(StrainFormulas.StrainAt, "", strain, curvature, level, section.NeutralAxis);

        EdgeStress Stress(LayerProperties layer, Formula edge)
        {
            var depth = derivation.Use(edge, "", layer.Depth, layer.Height);
            var warmth = warmthAt(layer, depth) ?? Nothing();
            return new EdgeStress(layer.Layer.Id, depth, derivation.Use(StrainFormulas.StressAt, "", SectionLevels.Modulus(section, layer, derivation), strain, curvature,
                depth, section.NeutralAxis, section.ExpansionOf(layer, segmentExpansion, derivation), warmth));
        }
    }

    /// <summary>Mean and gradient of a profile over a layer; nothing where the profile does not reach it.</summary>
    private (Number? Mean, Number? Gradient) Over(LayerProperties layer, TemperatureProfile profile)
    {
        var depths = Breaks(layer, profile);
        var (means, slopes) = (new List<Number>(), new List<Number>());
        for (var i = 1; i < depths.Length; i++)
        {
            var (above, below) = (profile.At(depths[i - 1], derivation), profile.At(depths[i], derivation));
            if (above.Value == 0 && below.Value == 0) continue;
            means.Add(derivation.Use(StrainFormulas.PartOfMean, "", above, below, depths[i - 1], depths[i], layer.Height));
            slopes.Add(derivation.Use(StrainFormulas.PartOfSlope, "", above, below, depths[i - 1], depths[i], layer.Depth, layer.Height));
        }
        return means.Count == 0
            ? (null, null)
            : (derivation.Use(StrainFormulas.MeanOfLayer, "", [.. means]), derivation.Use(StrainFormulas.SlopeOfLayer, "", [.. slopes]));
    }

    /// <summary>The layer's edges and the points of the profile between them.</summary>
    private Number[] Breaks(LayerProperties layer, TemperatureProfile profile) =>
    [
        derivation.Use(StrainFormulas.UpperEdge, "", layer.Depth, layer.Height),
        .. profile.Points.Select(p => p.Depth).Where(d => d.Value > layer.Top + Touching && d.Value < layer.Bottom - Touching),
        derivation.Use(StrainFormulas.LowerEdge, "", layer.Depth, layer.Height),
    ];

    private Number Nothing() => derivation.Table("T", "no temperature difference there", Quantity.TemperatureDifference, 0,
        Provenance.Derived("the profile does not reach this layer"), "nil");

    /// <summary>Points closer than this to an edge lie on it, m.</summary>
    private const double Touching = 1e-9;
}
