using System.Text.Json;
using System.Text.Json.Nodes;

namespace JointPlanner.Archive.Drafts;

/// <summary>A place that both sides changed, and differently. The values are JSON as typed; null where there is none.</summary>
/// <param name="Path">Names and ids from the root, parted by "/": "segments/s1/length". The order of a list is its path and "(order)".</param>
public sealed record Clash(string Path, string? Base, string? Mine, string? Theirs);

/// <summary>How a clash is decided.</summary>
public enum Take
{
    Mine,
    Theirs,
}

/// <param name="Text">The merged plan; at a clash that is not decided it holds theirs.</param>
public sealed record MergedPlan(string Text, IReadOnlyList<Clash> Clashes);

/// <summary>
/// Merges two plans that grew from one, place by place: members by name, lists of things with an "id" by id, other lists by index. What only one side changed is
/// taken; what both changed differently is a clash. Values are compared and kept as typed: "1.0" and "1" differ.
/// </summary>
public static class PlanMerge
{
    public static MergedPlan Merge(string baseText, string mine, string theirs, IReadOnlyDictionary<string, Take>? choices = null)
    {
        using var before = PlanDocument.Parse(baseText);
        using var one = PlanDocument.Parse(mine);
        using var other = PlanDocument.Parse(theirs);

        // A side that changed nothing leaves the other's text as it is, blanks and all.
        if (JsonSame.Same(one.RootElement, other.RootElement) || JsonSame.Same(before.RootElement, one.RootElement)) return new MergedPlan(theirs, []);
        if (JsonSame.Same(before.RootElement, other.RootElement)) return new MergedPlan(mine, []);

        var walk = new MergeWalk(choices ?? new Dictionary<string, Take>());
        var merged = walk.Merge("", before.RootElement, one.RootElement, other.RootElement);
        return new MergedPlan(merged.Node!.ToJsonString(MergeWalk.Written), walk.Clashes);
    }
}
