using JointPlanner.Engine.Plans;

namespace JointPlanner.Drawings;

/// <summary>Where things stand on an elevation's paper, mm from its left edge.</summary>
/// <param name="WidthMm">Width of the paper.</param>
/// <param name="Segments">From face to face.</param>
/// <param name="Joints">At the joint.</param>
/// <param name="Supports">At the support line.</param>
public sealed record ElevationColumns(double WidthMm, IReadOnlyList<DrawnSpan> Segments, IReadOnlyList<DrawnPlace> Joints, IReadOnlyList<DrawnPlace> Supports)
{
    internal static ElevationColumns Of(Plan plan, ElevationFrame frame)
    {
        double X(double station) => frame.View.ToPaper(new(station, 0)).X;
        return new ElevationColumns(
            frame.WidthMm,
            [.. plan.Segments.Select(s => new DrawnSpan($"segments/{s.Id}", X(s.Start), X(s.End)))],
            [.. plan.Joints.Select(j => new DrawnPlace($"joints/{j.Id}", X(Heights.Station(plan, j))))],
            [.. plan.Supports.Select(s => new DrawnPlace($"supports/{s.Id}", X(s.Station)))]);
    }
}

/// <summary>A segment on the paper.</summary>
/// <param name="Path">Path in the plan.</param>
/// <param name="FromMm">Left end.</param>
/// <param name="ToMm">Right end.</param>
public sealed record DrawnSpan(string Path, double FromMm, double ToMm);

/// <summary>A support or joint on the paper.</summary>
/// <param name="Path">Path in the plan.</param>
/// <param name="AtMm">Its line.</param>
public sealed record DrawnPlace(string Path, double AtMm);
