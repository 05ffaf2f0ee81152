using System.Collections.Immutable;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Sections;

/// <summary>The section of one segment: stiffness, and what acts between slab and steel.</summary>
/// <param name="Properties">Layers, stiffness, neutral axis.</param>
/// <param name="EffectiveExpansion">Best estimate of the coefficient of expansion of the whole section, 1/K; null where no layer has its own.</param>
/// <param name="PerDegree">What one degree of uniform warming does by the different coefficients of the layers, beyond the lengthening of the whole.</param>
/// <param name="Interactions">Slab against steel, in each state computed.</param>
/// <param name="ReliefMovement">Movement of steel against slab between relief joints, m; null where both expand alike or one of them is not there.</param>
public sealed record SectionResult(
    SectionProperties Properties, Number? EffectiveExpansion, SectionState? PerDegree, ImmutableArray<Interaction> Interactions, Number? ReliefMovement)
{
    /// <summary>Every number of it, so that a sheet can print how each came about.</summary>
    public IEnumerable<Number> Numbers =>
    [
        Properties.AxialStiffness, Properties.NeutralAxis, Properties.BendingStiffness,
        .. new[] { EffectiveExpansion, ReliefMovement }.OfType<Number>(),
        .. Interactions.SelectMany(i => new Number?[] { i.State.AxialStrain, i.State.Curvature, i.Force, i.EndSlip, i.EndShearFlow }).OfType<Number>(),
        .. Interactions.SelectMany(i => i.State.Stresses).Select(s => s.Stress),
    ];

    /// <summary>The section's result; null where it is not described.</summary>
    public static SectionResult? Of(Plan plan, SectionProperties? section, SegmentTemperature temperature, Derivation derivation)
    {
        if (section is null) return null;
        var effective = section.EffectiveExpansion(temperature.Expansion, derivation);
        if (!section.Section.IsComposite) return new SectionResult(section, effective, null, [], null);
        var (strains, between) = (new FreeStrains(section, temperature.Expansion, derivation), new SlabAndSteel(plan, section, derivation));
        var half = derivation.Use(HalfRange, "", temperature.Max, temperature.Min);
        var warmed = effective is null ? null : strains.Of("whole section warmed from mean temperature to its highest", _ => half);
        return new SectionResult(section, effective, warmed, warmed is null ? [] : [between.Of(warmed)], between.BetweenReliefJoints(temperature));
    }

    private static readonly Operand Hot = new("T_max", "highest effective temperature", Quantity.Temperature);
    private static readonly Operand Cold = new("T_min", "lowest effective temperature", Quantity.Temperature);

    /// <summary>Half of the range of effective temperature.</summary>
    public static readonly Formula HalfRange = new(
        "section.half-range", "ΔT_h", "half of the range of effective temperature", Quantity.TemperatureDifference, [Hot, Cold], (Hot - Cold) / 2,
        Provenance.Derived("from mean temperature to either extreme"), new(30, 1e-9, "own arithmetic", 40, -20));
}
