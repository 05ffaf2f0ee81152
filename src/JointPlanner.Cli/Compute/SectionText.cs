using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Sections;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary>Cross-sections as text: stiffness, levels, slab against steel.</summary>
internal static class SectionText
{
    public static IEnumerable<string> Lines(Result result, DisplayProfile profile)
    {
        foreach (var segment in result.Segments)
        {
            if (segment.Section is not { } section) continue;
            var p = section.Properties;
            yield return $"  {segment.Segment.Id}: EA {Say(p.AxialStiffness.Value, Quantity.AxialStiffness)}, EI {Say(p.BendingStiffness.Value, Quantity.BendingStiffness)}, " +
                $"neutral axis {Say(p.NeutralAxis.Value, Quantity.Size)} below the top; bearing level {Say(p.BearingDrop, Quantity.Size)} below it, road surface {Say(p.SurfaceHeight, Quantity.Size)} above it";
            if (section.EffectiveExpansion is { } alpha) yield return $"    best estimate of expansion of the whole: {Say(alpha.Value, Quantity.Expansion)}";
            foreach (var i in section.Interactions)
                yield return $"    {i.State.Name}: strain {Say(i.State.AxialStrain.Value, Quantity.Strain)}, curvature {Say(i.State.Curvature.Value, Quantity.Curvature)}, " +
                    $"force of the slab {Say(i.Force.Value, Quantity.Force)}{Ends(i)}";
            if (section.ReliefMovement is { } relief)
                yield return $"    slab without connection: {Say(Math.Abs(relief.Value), Quantity.Movement)} against its steel over {Say(p.Section.ReliefSpacing, Quantity.Length)} between relief joints, " +
                    "from mean temperature to either extreme";
        }

        string Ends(Interaction i) => i is { EndSlip: { } slip, EndShearFlow: { } flow }
            ? $", end slip {Say(slip.Value, Quantity.Movement)}, end shear flow {Say(flow.Value, Quantity.LineLoad)}"
            : "; end slip: connection not given";

        string Say(double value, Quantity quantity) => NumberText.WithUnit(value, quantity, profile);
    }
}
