namespace JointPlanner.Engine.Plans.Rules;

/// <summary>An elastomeric line has pads, and no other line has.</summary>
public sealed class PadsWhereTheyBelong : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var bearing in check.Plan.Bearings)
        {
            var path = $"bearings/{bearing.Id}/pads";
            if (!check.Knows($"bearings/{bearing.Id}/kind", path)) continue;
            if (bearing.Kind == BearingKind.Elastomeric && bearing.Pads is null)
                yield return new("bearings.no-pads", path, $"Bearing line {bearing.Id} is elastomeric, but its pads are not given.",
                    "Allowed: count, shear modulus, plan area and elastomer thickness.", "Give the pads, or choose another kind of bearing.");
            if (bearing.Kind != BearingKind.Elastomeric && bearing.Pads is not null)
                yield return new("bearings.pads-unused", path, $"Bearing line {bearing.Id} has pads, but is not elastomeric.",
                    "Allowed: pads with elastomeric lines only.", "Take the pads out, or choose the elastomeric kind.");
        }
    }
}
