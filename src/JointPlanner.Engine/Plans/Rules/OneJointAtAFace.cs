namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A deck end has one joint.</summary>
public sealed class OneJointAtAFace : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        var ends = new Dictionary<(string Segment, bool IsUpper), string>();
        foreach (var joint in check.Plan.Joints)
        {
            foreach (var (word, body, isUpper) in new[] { ("near", joint.Near, true), ("far", joint.Far, false) })
            {
                var path = $"joints/{joint.Id}/{word}";
                if (!check.Knows($"joints/{joint.Id}/near", $"joints/{joint.Id}/far") || check.SegmentOf(body) is null || ends.TryAdd((body, isUpper), joint.Id)) continue;
                yield return new("joints.same-face", path,
                    $"Joints {ends[(body, isUpper)]} and {joint.Id} both lie at the {(isUpper ? "upper" : "lower")} end of segment {body}.",
                    "Allowed: one joint at a deck end.", "Take one of them out, or name the body that it belongs to.");
            }
        }
    }
}
