using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>Where in a plan a path leads, in people's words.</summary>
internal static class FieldPlace
{
    /// <summary>For instance "Pier 2: station of the support"; "plan" for the file as a whole.</summary>
    internal static string Of(PlanDocument? plan, string path)
    {
        if (path.Length == 0) return "plan";
        var parts = path.Split('/');
        if (parts[^1] == "(order)") return $"order of the {PlanFields.Table.At(parts[0])?.Name ?? parts[0]}";
        var field = PlanFields.Table.At(path)?.Name;
        var item = parts.Length > 1 && PlanFields.Table.ItemsHaveIds(parts[0]) ? $"{parts[0]}/{parts[1]}" : null;
        if (item is null) return field ?? path;
        var called = plan is null ? parts[1] : PlanParts.Called(plan, item);
        return parts.Length == 2 ? called : $"{called}: {field ?? path}";
    }
}
