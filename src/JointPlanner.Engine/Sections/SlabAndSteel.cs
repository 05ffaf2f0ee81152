using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Sections;

/// <summary>Slab and steel against each other, from one state of the section.</summary>
/// <param name="State">The state.</param>
/// <param name="Force">Force of the slab with full interaction, N, tension positive.</param>
/// <param name="EndSlip">Slip at the end of the deck, m; null where the connection's stiffness is not given.</param>
/// <param name="EndShearFlow">Longitudinal shear per length at the end, N/m; null likewise.</param>
public sealed record Interaction(SectionState State, Number Force, Number? EndSlip, Number? EndShearFlow);

/// <summary>What acts between a slab and the steel under it.</summary>
/// <param name="plan">The plan.</param>
/// <param name="section">A section with slab and steel.</param>
/// <param name="derivation">Where the steps go.</param>
public sealed class SlabAndSteel(Plan plan, SectionProperties section, Derivation derivation)
{
    /// <summary>Force, end slip and end shear flow in one state.</summary>
    public Interaction Of(SectionState state)
    {
        var slab = section.Layers.Where(l => l.Layer.Material == LayerMaterial.Concrete).ToArray();
        var steel = section.Layers.Where(l => l.Layer.Material == LayerMaterial.Steel).ToArray();
        var forces = slab.Select(l =>
        {
            var edges = state.Stresses.Where(s => s.Layer == l.Layer.Id).ToArray();
            return derivation.Use(InteractionFormulas.LayerForce, "", edges[0].Stress, edges[1].Stress, derivation.Given(
                $"segments/{section.Segment.Id}/section/layers/{l.Layer.Id}/area", "A", $"area of the layer {l.Layer.Id}", Quantity.Area, l.Layer.Area));
        }).ToArray();
        var force = derivation.Use(InteractionFormulas.InterfaceForce, "", forces);
        if (section.Section.Connection is not { } connection) return new Interaction(state, force, null, null);

        var (slabPart, steelPart) = (Part(slab), Part(steel));
        var own = derivation.Use(SectionFormulas.BendingStiffness, "", slabPart.Bending, steelPart.Bending);
        Number[] two = [slabPart.Axial, steelPart.Axial, slabPart.Depth, steelPart.Depth, own];
        var difference = derivation.Use(InteractionFormulas.FreeDifference, "", [force, .. two]);
        var transfer = derivation.Use(InteractionFormulas.TransferLength, "", [GivenValues.Of(plan, derivation,
            $"segments/{section.Segment.Id}/section/connection", "k_v", "stiffness of the connection per length of deck", Quantity.ConnectionStiffness, connection), .. two]);
        var length = derivation.Use(InteractionFormulas.DeckLength, "",
            GivenValues.End(plan, section.Segment, derivation), GivenValues.Start(plan, section.Segment, derivation));
        return new Interaction(state, force,
            derivation.Use(InteractionFormulas.EndSlip, "", difference, transfer, length),
            derivation.Use(InteractionFormulas.EndShearFlow, "", force, transfer, length));
    }

    /// <summary>Movement of steel against slab over the spacing of relief joints; null where both expand alike.</summary>
    public Number? BetweenReliefJoints(SegmentTemperature temperature)
    {
        var slab = section.ExpansionOf(section.Layers.First(l => l.Layer.Material == LayerMaterial.Concrete), temperature.Expansion, derivation);
        var steel = section.ExpansionOf(section.Layers.First(l => l.Layer.Material == LayerMaterial.Steel), temperature.Expansion, derivation);
        if (slab.Value == steel.Value) return null;
        var spacing = GivenValues.Of(plan, derivation, $"segments/{section.Segment.Id}/section/relief-spacing", "s", "spacing of the relief joints",
            Quantity.Length, section.Section.ReliefSpacing);
        return derivation.Use(InteractionFormulas.BetweenReliefJoints, Keys.ReliefMovement(section.Segment.Id), steel, slab, spacing, temperature.Max, temperature.Min);
    }

    /// <summary>Slab or steel on its own: its stiffnesses and the depth of its own centroid.</summary>
    private (Number Axial, Number Depth, Number Bending) Part(LayerProperties[] layers)
    {
        var axial = derivation.Use(SectionFormulas.AxialStiffness, "", [.. layers.Select(l => l.AxialStiffness)]);
        var moments = layers.Select(l => derivation.Use(SectionFormulas.MomentOfLayer, "", l.AxialStiffness, l.Depth)).ToArray();
        var depth = derivation.Use(SectionFormulas.NeutralAxis, "", derivation.Use(SectionFormulas.Moments, "", moments), axial);
        var bending = layers.Select(l => derivation.Use(SectionFormulas.BendingOfLayer, "", l.OwnBending, l.AxialStiffness, l.Depth, depth)).ToArray();
        return (axial, depth, derivation.Use(SectionFormulas.BendingStiffness, "", bending));
    }
}
