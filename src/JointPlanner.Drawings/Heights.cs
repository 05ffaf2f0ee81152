using JointPlanner.Engine.Plans;

namespace JointPlanner.Drawings;

/// <summary>Heights and places that a plan may leave open and a drawing must have.</summary>
internal static class Heights
{
    /// <summary>Depth of the segment over or beside a station, m; a twenty-fifth of a usual span where none is given.</summary>
    internal static double Depth(Segment segment) => segment.Depth > 0 ? segment.Depth : Math.Clamp(segment.Length / 40, 0.8, 3);

    /// <summary>Height of the deck's soffit over a support, m, negative.</summary>
    internal static double Soffit(Plan plan, Support support)
    {
        var over = plan.Bearings.Where(b => b.On == support.Id).Select(b => plan.Segments.FirstOrDefault(s => s.Id == b.Segment)).OfType<Segment>().ToList();
        return -(over.Count > 0 ? over.Max(Depth) : plan.Segments.Select(Depth).DefaultIfEmpty(1.5).Max());
    }

    /// <summary>Height of a support's foot, m, negative; 6 m below the soffit of a pier and 4 m of an abutment where no height is given.</summary>
    internal static double Foot(Plan plan, Support support) =>
        Soffit(plan, support) - (support.Height ?? (support.Kind == SupportKind.Abutment ? 4 : 6));

    /// <summary>Station of a joint: where the deck that it ends has its face.</summary>
    internal static double Station(Plan plan, Joint joint)
    {
        if (plan.Segments.FirstOrDefault(s => s.Id == joint.Near) is { } near) return near.End;
        if (plan.Segments.FirstOrDefault(s => s.Id == joint.Far) is { } far) return far.Start;
        return plan.Supports.FirstOrDefault(s => s.Id == joint.Near || s.Id == joint.Far)?.Station ?? 0;
    }
}
