namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A plan whose fields may be faulty one by one: a number that could not be read is NaN, and its path stands among the unread ones.</summary>
/// <param name="plan">The plan as far as it could be read.</param>
/// <param name="unread">Paths that could not be read.</param>
public sealed class PlanUnderCheck(Plan plan, IReadOnlySet<string> unread)
{
    private readonly Dictionary<string, Support> supports = plan.Supports.DistinctBy(s => s.Id).ToDictionary(s => s.Id);
    private readonly Dictionary<string, Segment> segments = plan.Segments.DistinctBy(s => s.Id).ToDictionary(s => s.Id);

    /// <summary>The plan as far as it could be read.</summary>
    public Plan Plan => plan;

    /// <summary>True where the field, everything around it and everything in it could be read: a rule judges only what it knows.</summary>
    public bool Knows(string path)
    {
        if (unread.Count == 0) return true;
        for (var end = path.Length; end > 0; end = path.LastIndexOf('/', end - 1))
            if (unread.Contains(path[..end]))
                return false;
        return !unread.Any(u => u.Length > path.Length && u[path.Length] == '/' && u.StartsWith(path, StringComparison.Ordinal));
    }

    /// <summary>True where all of the fields could be read.</summary>
    public bool Knows(params ReadOnlySpan<string> paths)
    {
        foreach (var path in paths)
            if (!Knows(path))
                return false;
        return true;
    }

    /// <summary>The support of this id; null where there is none.</summary>
    public Support? SupportOf(string id) => supports.GetValueOrDefault(id);

    /// <summary>The segment of this id; null where there is none.</summary>
    public Segment? SegmentOf(string id) => segments.GetValueOrDefault(id);

    /// <summary>True where the body of this id, a support or a segment, says where it is.</summary>
    public bool KnowsStationsOf(string id) => supports.ContainsKey(id)
        ? Knows($"supports/{id}/station")
        : segments.ContainsKey(id) && Knows($"segments/{id}/start", $"segments/{id}/end");
}
