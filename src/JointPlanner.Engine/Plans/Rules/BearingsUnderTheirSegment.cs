using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A bearing line stands under the segment that it carries, and on what it says it stands on.</summary>
public sealed class BearingsUnderTheirSegment : PlanRule
{
    /// <summary>How far a line may stand from its support's station, or beyond the end of a carrying segment (a nib), m.</summary>
    public const double Reach = 5;

    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var bearing in check.Plan.Bearings)
        {
            var (path, on) = ($"bearings/{bearing.Id}", $"bearings/{bearing.Id}/on");
            if (!check.Knows($"{path}/segment", on)) continue;
            if (bearing.On == bearing.Segment)
            {
                yield return new("bearings.on-itself", on, $"Bearing line {bearing.Id} stands on the segment that it carries.",
                    "Allowed: a support, or another segment.", "Name what is below it.");
                continue;
            }
            if (check.SegmentOf(bearing.Segment) is not { } segment || !check.Knows($"{path}/station") || !check.KnowsStationsOf(bearing.On)) continue;
            var (start, end) = ($"segments/{segment.Id}/start", $"segments/{segment.Id}/end");
            if (check.KnowsStationsOf(segment.Id) && (bearing.Station < segment.Start || bearing.Station > segment.End))
                yield return new("bearings.beyond-segment", $"{path}/station",
                    $"Bearing line {bearing.Id} stands at {{0}}, but segment {segment.Id} reaches from {{{start}}} to {{{end}}}.",
                    $"Allowed: from {{{start}}} to {{{end}}}.", "Correct the bearing's station, the segment's ends, or the segment that it carries.")
                {
                    Numbers = [(Quantity.Length, bearing.Station)],
                };
            else if (IsFarFrom(check, bearing))
                yield return new("bearings.off-support", $"{path}/station",
                    $"Bearing line {bearing.Id} stands at {{0}}, more than {{1}} away from {bearing.On}, on which it says it stands.",
                    $"Allowed: within {{1}} of {bearing.On}.", "Correct the station, or name what it stands on.")
                {
                    Numbers = [(Quantity.Length, bearing.Station), (Quantity.Length, Reach)],
                };
        }
    }

    private static bool IsFarFrom(PlanUnderCheck check, BearingLine bearing)
    {
        if (check.SupportOf(bearing.On) is { } support) return Math.Abs(support.Station - bearing.Station) > Reach;
        return check.SegmentOf(bearing.On) is { } carrying
            && (bearing.Station < carrying.Start - Reach || bearing.Station > carrying.End + Reach);
    }
}
