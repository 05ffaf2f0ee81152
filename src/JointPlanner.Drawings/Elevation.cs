using JointPlanner.Pictures;

namespace JointPlanner.Drawings;

/// <summary>
/// The deck seen from its right side, to scale along its length; what stands under each support, joint and segment is told beside the picture,
/// so that a table can stand exactly below it.
/// </summary>
/// <param name="Picture">The drawing.</param>
/// <param name="Columns">Where each support, joint and segment stands on the paper.</param>
/// <param name="View">The scales.</param>
public sealed record Elevation(Picture Picture, ElevationColumns Columns, View View)
{
    /// <summary>Draws it.</summary>
    public static Elevation Of(ElevationRequest request)
    {
        var frame = ElevationFrame.Of(request.Plan, request.Paper);
        return new Elevation(new ElevationPen(request, frame).Draw(), ElevationColumns.Of(request.Plan, frame), frame.View);
    }
}
