using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>Adding and taking out whole parts of a plan, with what hangs on them.</summary>
internal static class PlanParts
{
    /// <summary>A new support at the end, with nothing said yet but its kind.</summary>
    internal static PlanDocument WithSupport(PlanDocument plan, IEnumerable<string> used)
    {
        var (added, path) = plan.WithItem("supports", "p", null, used);
        return added.With($"{path}/kind", "pier");
    }

    /// <summary>A new segment that starts where the last one ends.</summary>
    internal static PlanDocument WithSegment(PlanDocument plan, IEnumerable<string> used)
    {
        var last = Last(plan, "segments");
        var (added, path) = plan.WithItem("segments", "s", null, used);
        return added.With($"{path}/kind", last is null ? "concrete" : plan.TextAt($"segments/{last}/kind"))
            .With($"{path}/start", last is null ? null : plan.TextAt($"segments/{last}/end"));
    }

    /// <summary>A new joint, to be told between which bodies.</summary>
    internal static PlanDocument WithJoint(PlanDocument plan, IEnumerable<string> used)
    {
        var last = Last(plan, "joints");
        var (added, path) = plan.WithItem("joints", "j", null, used);
        return added.With($"{path}/setting/temperature", last is null ? null : plan.TextAt($"joints/{last}/setting/temperature"));
    }

    /// <summary>A new line of bearings on a support, carrying the first segment that has none there.</summary>
    internal static PlanDocument WithBearing(PlanDocument plan, string support, IEnumerable<string> used)
    {
        var carried = plan.Items("bearings").Where(b => plan.TextAt($"bearings/{b}/on") == support).Select(b => plan.TextAt($"bearings/{b}/segment")).ToHashSet();
        var segment = plan.Items("segments").FirstOrDefault(s => !carried.Contains(s)) ?? Last(plan, "segments");
        var (added, path) = plan.WithItem("bearings", "b", null, used);
        return added.With($"{path}/segment", segment).With($"{path}/on", support).With($"{path}/kind", "free");
    }

    /// <summary>The plan without an item and without what only hangs on it.</summary>
    internal static PlanDocument Without(PlanDocument plan, string path) =>
        GoesWith(plan, path).Aggregate(plan.Without(path), (changed, also) => changed.Without(also));

    /// <summary>Paths of what has no sense without an item and goes with it: the bearing lines on a support or of a segment, the movements given for a joint.</summary>
    internal static IReadOnlyList<string> GoesWith(PlanDocument plan, string path)
    {
        var (list, id) = Of(path);
        return list switch
        {
            "supports" or "segments" => Naming(plan, "bearings", id, "on", "segment"),
            "joints" => Naming(plan, "movements", id, "joint"),
            _ => [],
        };
    }

    /// <summary>Paths of what stays though it names an item, and must then be told another: the joints at a support or segment.</summary>
    internal static IReadOnlyList<string> MustBeToldAnother(PlanDocument plan, string path)
    {
        var (list, id) = Of(path);
        return list is "supports" or "segments" ? Naming(plan, "joints", id, "near", "far") : [];
    }

    /// <summary>What a person calls an item: its mark, else its id.</summary>
    internal static string Called(PlanDocument plan, string path) => plan.TextAt($"{path}/mark") is { Length: > 0 } mark ? mark : Of(path).Id;

    private static (string List, string Id) Of(string path) => (path[..path.IndexOf('/', StringComparison.Ordinal)], path[(path.LastIndexOf('/') + 1)..]);

    private static IReadOnlyList<string> Naming(PlanDocument plan, string list, string id, params string[] words) =>
        [.. plan.Items(list).Select(item => $"{list}/{item}").Where(item => words.Any(word => plan.TextAt($"{item}/{word}") == id))];

    private static string? Last(PlanDocument plan, string list) => plan.Items(list) is [.., var last] ? last : null;
}
