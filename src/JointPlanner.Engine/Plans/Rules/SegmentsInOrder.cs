namespace JointPlanner.Engine.Plans.Rules;

/// <summary>Each segment has a length, and none begins before the one behind it ends.</summary>
public sealed class SegmentsInOrder : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        var segments = check.Plan.Segments;
        for (var i = 0; i < segments.Length; i++)
        {
            var (segment, start, end) = (segments[i], $"segments/{segments[i].Id}/start", $"segments/{segments[i].Id}/end");
            if (segment.End <= segment.Start)
            {
                yield return new("segments.no-length", end,
                    segment.End < segment.Start
                        ? $"Segment {segment.Id} ends at {{{end}}}, before it starts at {{{start}}}: its length would be negative."
                        : $"Segment {segment.Id} ends where it starts, at {{{start}}}: it has no length.",
                    $"Allowed: a station greater than {{{start}}}.", "Correct the end or the start; stations rise from the first abutment to the last.");
                continue;
            }
            // A segment behind that has no length itself says nothing about where this one may begin.
            if (i == 0 || !(segment.Start < segments[i - 1].End) || segments[i - 1].End <= segments[i - 1].Start) continue;
            var before = $"segments/{segments[i - 1].Id}/end";
            yield return new("segments.overlap", start,
                $"Segment {segment.Id} starts at {{{start}}}, before segment {segments[i - 1].Id} ends at {{{before}}}.",
                $"Allowed: {{{before}}} or more.", "Correct the stations, or put the segments in station order.");
        }
    }
}
