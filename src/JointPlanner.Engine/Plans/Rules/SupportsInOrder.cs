namespace JointPlanner.Engine.Plans.Rules;

/// <summary>Supports stand in the order of their stations, no two at one station.</summary>
public sealed class SupportsInOrder : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        for (var i = 1; i < check.Plan.Supports.Length; i++)
        {
            var (before, support) = (check.Plan.Supports[i - 1], check.Plan.Supports[i]);
            var (pathBefore, path) = ($"supports/{before.Id}/station", $"supports/{support.Id}/station");
            // NaN, a station that could not be read, is not in any order.
            if (!(support.Station <= before.Station)) continue;
            yield return support.Station < before.Station
                ? new("supports.out-of-order", path, $"Support {support.Id} stands at {{{path}}}, before support {before.Id} at {{{pathBefore}}}: the span between them would be negative.",
                    $"Allowed: a station greater than {{{pathBefore}}}.", "Correct the station, or put the supports in station order.")
                : new("supports.same-station", path, $"Supports {before.Id} and {support.Id} stand at the same station, {{{path}}}.",
                    $"Allowed: a station greater than {{{pathBefore}}}.", "Correct the station, or describe them as one support.");
        }
    }
}
