namespace JointPlanner.Engine.Plans.Rules;

/// <summary>
/// Every segment is held along the deck: by a fixed or elastomeric line on a support, or on a segment that is held itself. Sliders hold
/// nothing as long as friction is not counted.
/// </summary>
public sealed class DeckIsHeld : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        var plan = check.Plan;
        if (plan.Bearings.IsEmpty || plan.Bearings.Any(b => !check.Knows($"bearings/{b.Id}/segment"))) yield break;
        var held = new HashSet<string>();
        for (var grows = true; grows;)
        {
            grows = false;
            foreach (var bearing in plan.Bearings.Where(b => !held.Contains(b.Segment) || !held.Contains(b.On)))
            {
                if (bearing.Kind == BearingKind.Free && check.Knows($"bearings/{bearing.Id}/kind")) continue;
                // What could not be read is taken to hold: no fault is made of another one.
                var isOnSegment = check.SegmentOf(bearing.On) is not null && check.Knows($"bearings/{bearing.Id}/kind", $"bearings/{bearing.Id}/on");
                if (!isOnSegment || held.Contains(bearing.On)) grows |= held.Add(bearing.Segment);
                else if (held.Contains(bearing.Segment)) grows |= held.Add(bearing.On);
            }
        }
        foreach (var segment in plan.Segments.Where(s => !held.Contains(s.Id)))
            yield return new("deck.not-held", $"segments/{segment.Id}", Sentence(plan, segment),
                "Allowed: at least one fixed or elastomeric line on a support, or on a segment that is held itself.",
                "Make one of its bearing lines fixed or elastomeric.");
    }

    private static string Sentence(Plan plan, Segment segment)
    {
        var lines = plan.Bearings.Where(b => b.Segment == segment.Id).ToArray();
        if (lines.Length == 0) return $"Segment {segment.Id} has no bearing line: nothing carries or holds it.";
        var free = lines.Where(b => b.Kind == BearingKind.Free).Select(b => b.Id).ToArray();
        if (free.Length == lines.Length)
            return $"Segment {segment.Id} is held along the deck by sliders alone ({string.Join(", ", free)}). Friction of sliders is not counted yet, so "
                + "nothing says where the deck stays and the movements at its joints have no answer.";
        var carriers = lines.Where(b => b.Kind != BearingKind.Free).Select(b => b.On).Distinct();
        return $"Segment {segment.Id} is held only to {string.Join(", ", carriers)}, which is not held along the deck itself.";
    }
}
