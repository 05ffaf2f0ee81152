namespace JointPlanner.Engine.Plans.Rules;

/// <summary>Where a deck shortens over time, the joint at its end says how old it will be at setting.</summary>
public sealed class DeckAgesAreGiven : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var joint in check.Plan.Joints)
            foreach (var (word, body, age) in new[] { ("near", joint.Near, joint.NearAge), ("far", joint.Far, joint.FarAge) })
            {
                var path = $"joints/{joint.Id}/setting/{word}-deck-age";
                if (age is not null || !check.Knows($"joints/{joint.Id}/{word}", path) || check.SegmentOf(body) is not { } deck || !Develops(deck)) continue;
                yield return new("joints.no-deck-age", path, $"Segment {deck.Id} shortens over time, but its age when joint {joint.Id} is set is not given.",
                    "Allowed: an age from the deck's concreting to the setting of the joint.", "Give the age, for instance 90 d.");
            }
    }

    /// <summary>True where how much is still to come depends on the age at setting.</summary>
    internal static bool Develops(Segment segment) =>
        segment.Concrete is not null || segment.Creep is { Development.IsEmpty: false } || segment.Shrinkage is { Development.IsEmpty: false };
}
