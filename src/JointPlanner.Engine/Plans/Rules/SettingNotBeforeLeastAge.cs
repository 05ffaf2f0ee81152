namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A joint is not expected to be set before the least deck age that its own plan states.</summary>
public sealed class SettingNotBeforeLeastAge : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var joint in check.Plan.Joints)
            foreach (var (word, age) in new[] { ("near", joint.NearAge), ("far", joint.FarAge) })
            {
                var (path, least) = ($"joints/{joint.Id}/setting/{word}-deck-age", $"joints/{joint.Id}/setting/least-deck-age");
                if (!(age < joint.LeastAge)) continue;
                yield return new("joints.before-least-age", path, $"Joint {joint.Id} is expected to be set at a deck age of {{{path}}}, before its least deck age of {{{least}}}.",
                    $"Allowed: {{{least}}} or more.", "Correct one of the two ages.");
            }
    }
}
