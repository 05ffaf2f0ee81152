using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A movement that is computed is not given beside it, and a given one is given once.</summary>
public sealed class MovementsAreNotComputedToo : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        var seen = new Dictionary<(string, Cause), string>();
        foreach (var movement in check.Plan.GivenMovements)
        {
            var path = $"movements/{movement.Id}";
            if (!check.Knows($"{path}/cause", $"{path}/joint")) continue;
            var word = Keys.Word(movement.Cause);
            if (IsComputed(check, movement))
                yield return new("movements.computed", $"{path}/cause", $"Movement {movement.Id} gives {word} at joint {movement.Joint}, which is computed already: it would count twice.",
                    "Allowed: causes that are not computed.", "Take the movement out, or take out what it is computed from.");
            else if (!seen.TryAdd((movement.Joint, movement.Cause), movement.Id))
                yield return new("movements.repeated", $"{path}/cause", $"Movements {seen[(movement.Joint, movement.Cause)]} and {movement.Id} both give {word} at joint {movement.Joint}.",
                    "Allowed: one movement for each cause at a joint.", "Put them together into one, with both sources.");
        }
    }

    private static bool IsComputed(PlanUnderCheck check, GivenMovement movement)
    {
        if (movement.Cause == Cause.UniformTemperature) return true;
        var joint = check.Plan.Joints.FirstOrDefault(j => j.Id == movement.Joint);
        if (joint is not null && ComputedCauses.ByFrame(check.Plan, joint, movement.Cause)) return true;
        return joint is not null && new[] { joint.Near, joint.Far }.Select(check.SegmentOf)
            .Any(s => s is not null && RemainingStrains.Has(movement.Cause, s));
    }
}
