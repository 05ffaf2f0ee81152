using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Combining;

/// <summary>Setting temperature of a bearing line: its own, or for steel decks that of the nearest joint of its segment, which is an assumption.</summary>
internal static class SettingTemperatures
{
    public static double Of(BearingLine bearing, Plan plan)
    {
        if (bearing.SettingTemperature is { } own) return own;
        var segment = plan.SegmentOf(bearing.Segment);
        var nearest = plan.Joints
            .Where(j => j.Near == segment.Id || j.Far == segment.Id)
            .MinBy(j => Math.Abs((j.Near == segment.Id ? segment.End : segment.Start) - bearing.Station));
        return (nearest ?? plan.Joints[0]).SettingTemperature;
    }
}
