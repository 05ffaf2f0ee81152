using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Plans;

/// <summary>Station order of supports and segments: a support added last may stand between two others.</summary>
public static class PlanOrder
{
    /// <summary>True where each item of the list whose station can be read stands at or after the one before it.</summary>
    /// <param name="plan">The plan as typed.</param>
    /// <param name="list">supports or segments.</param>
    public static bool Holds(PlanDocument plan, string list)
    {
        var stations = Stations(plan, list).OfType<double>().ToArray();
        return stations.Zip(stations.Skip(1)).All(pair => pair.First <= pair.Second);
    }

    /// <summary>The plan with the list in station order, texts as typed. What has no station that can be read comes last, in the order it stood.</summary>
    /// <param name="plan">The plan as typed.</param>
    /// <param name="list">supports or segments.</param>
    public static PlanDocument ByStation(PlanDocument plan, string list)
    {
        if (plan.Root[list] is not ListNode { Items: var items }) return plan;
        var sorted = items.Zip(Stations(plan, list)).OrderBy(pair => pair.Second ?? double.PositiveInfinity).Select(pair => pair.First);
        return PlanDocument.Of(plan.Root.With(list, new ListNode([.. sorted])));
    }

    private static IEnumerable<double?> Stations(PlanDocument plan, string list) =>
        plan.Items(list).Select(item => plan.TextAt($"{list}/{item}/{(list == "segments" ? "start" : "station")}"))
            .Select(text => text is not null && QuantityText.Parse(text, Quantity.Length) is { Fault: null } read ? read.Value : (double?)null);
}
