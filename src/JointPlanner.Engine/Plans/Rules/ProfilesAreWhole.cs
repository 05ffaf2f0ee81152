namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A temperature difference given as profiles has both, each with points of rising depth, and a source; it needs the segment's section.</summary>
public sealed class ProfilesAreWhole : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var segment in check.Plan.Segments.Where(s => s.Gradient is not null))
        {
            var (gradient, path) = (segment.Gradient!, $"segments/{segment.Id}/gradient");
            if (segment.Section is null && check.Knows($"segments/{segment.Id}/section"))
                yield return new("gradient.without-section", path, $"Segment {segment.Id} has a temperature difference, but its section is not described: nothing says how it bends.",
                    "Allowed: with a section.", "Describe the section of the segment, or take the temperature difference out and give its movement.");
            if (!check.Knows($"{path}/warm", $"{path}/cool")) continue;
            if (gradient.Warm.IsEmpty != gradient.Cool.IsEmpty)
                yield return new("gradient.half", gradient.Warm.IsEmpty ? $"{path}/warm" : $"{path}/cool", $"Segment {segment.Id} has a profile only for the deck {(gradient.Warm.IsEmpty ? "cooler" : "warmer")} above.",
                    "Allowed: both profiles, or none for those of the basis.", $"Give the profile for the deck {(gradient.Warm.IsEmpty ? "warmer" : "cooler")} above too.");
            if (gradient.IsGiven && gradient.Source.Length == 0 && check.Knows($"{path}/source"))
                yield return new("gradient.no-source", $"{path}/source", $"The temperature profiles of segment {segment.Id} have no source.", "Allowed: a sentence.", "Say where the profiles come from.");
            foreach (var (word, points) in new[] { ("warm", gradient.Warm), ("cool", gradient.Cool) })
            {
                if (points.Length == 1)
                    yield return new("gradient.one-point", $"{path}/{word}", $"The {word} profile of segment {segment.Id} has one point.", "Allowed: two points or more.",
                        "Give the temperature difference at the top and where it changes.");
                for (var i = 1; i < points.Length; i++)
                    if (points[i].Depth <= points[i - 1].Depth)
                    {
                        var (at, before) = (FormattableString.Invariant($"{path}/{word}/#{i + 1}/depth"), FormattableString.Invariant($"{path}/{word}/#{i}/depth"));
                        yield return new("gradient.depths", at, $"The {word} profile of segment {segment.Id} has {{{at}}} after {{{before}}}.", $"Allowed: more than {{{before}}}.",
                            "Put the points in order of depth, each depth once.");
                    }
            }
        }
    }
}
