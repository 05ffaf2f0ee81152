using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>Every layer of a section has one height or one second moment of area, and lies within the section.</summary>
public sealed class LayersAreWhole : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var segment in check.Plan.Segments.Where(s => s.Section is not null))
        {
            var (section, path) = (segment.Section!, $"segments/{segment.Id}/section");
            foreach (var layer in section.Layers)
            {
                var at = $"{path}/layers/{layer.Id}";
                if (!check.Knows($"{at}/height", $"{at}/inertia", $"{at}/depth", $"{at}/area")) continue;
                if (layer.Height is null == layer.Inertia is null)
                    yield return new("layers.height-or-inertia", $"{at}/height",
                        layer.Height is null ? $"Layer {layer.Id} of segment {segment.Id} has neither a height nor a second moment of area."
                            : $"Layer {layer.Id} of segment {segment.Id} has a height and a second moment of area.",
                        "Allowed: one of the two.", "Give the height of a layer of uniform width, or the own second moment of area of any other.");
                else if (check.Knows($"{path}/depth") && LowerEdge(layer) > section.Depth * (1 + Touching))
                    yield return new("layers.below-soffit", $"{at}/depth",
                        $"Layer {layer.Id} of segment {segment.Id} reaches down to {{0}}, below the soffit at {{{path}/depth}}.",
                        $"Allowed: a layer within {{{path}/depth}}.", "Correct the depth of the layer or of the section; depths are measured from the top of the section.")
                    {
                        Numbers = [(Quantity.Size, LowerEdge(layer))],
                    };
            }
        }
    }

    /// <summary>A layer may reach this share of the section's depth below it: rounding of typed figures.</summary>
    private const double Touching = 1e-3;

    private static double LowerEdge(Layer layer) => layer.Depth + ((layer.Height ?? 0) / 2);
}
