using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

public sealed class PlanOrderTests
{
    [Fact]
    public void Supports_typed_in_different_units_are_put_in_station_order_as_typed()
    {
        var plan = Supports("0 m", "96 m", "137 ft 9 1/2 in", "138 m");
        Assert.False(PlanOrder.Holds(plan, "supports"));
        var ordered = PlanOrder.ByStation(plan, "supports");
        Assert.Equal(["0 m", "137 ft 9 1/2 in", "96 m", "138 m"], ordered.Items("supports").Select(s => ordered.TextAt($"supports/{s}/station")));
        Assert.True(PlanOrder.Holds(ordered, "supports"));
    }

    [Fact]
    public void What_has_no_station_yet_comes_last_and_is_no_disorder()
    {
        var plan = Supports("", "10 m", "what", "20 m");
        Assert.True(PlanOrder.Holds(plan, "supports"));
        var ordered = PlanOrder.ByStation(plan, "supports");
        Assert.Equal(["10 m", "20 m", null, "what"], ordered.Items("supports").Select(s => ordered.TextAt($"supports/{s}/station")));
    }

    [Fact]
    public void Segments_go_by_where_they_start()
    {
        var (plan, first) = PlanDocument.Empty.WithItem("segments", "s");
        (plan, var second) = plan.With($"{first}/start", "50 m").With($"{first}/end", "60 m").WithItem("segments", "s");
        plan = plan.With($"{second}/start", "0 m").With($"{second}/end", "50 m");
        Assert.Equal(["s2", "s1"], PlanOrder.ByStation(plan, "segments").Items("segments"));
    }

    [Fact]
    public void A_plan_without_the_list_stays_as_it_is() => Assert.Same(PlanDocument.Empty, PlanOrder.ByStation(PlanDocument.Empty, "supports"));

    private static PlanDocument Supports(params string[] stations) =>
        stations.Aggregate(PlanDocument.Empty, (plan, station) =>
        {
            var (added, path) = plan.WithItem("supports", "p");
            return added.With($"{path}/station", station);
        });
}
