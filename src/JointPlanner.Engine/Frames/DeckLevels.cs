using System.Collections.Immutable;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Frames;

/// <summary>Levels of bearing lines against the neutral axes of the segments that meet there.</summary>
internal static class DeckLevels
{
    /// <summary>How far the line lies below the neutral axis of the segment that it carries, m; 0 where the section is not described.</summary>
    public static double DropOf(BearingLine bearing, ImmutableDictionary<string, SectionProperties> sections) =>
        sections.GetValueOrDefault(bearing.Segment) is { } section ? DepthOf(bearing, section) - section.NeutralAxis.Value : 0;

    /// <summary>How far the line lies above the neutral axis of the segment that carries it, m: both road surfaces are at one level.</summary>
    public static double HeightOn(BearingLine bearing, ImmutableDictionary<string, SectionProperties> sections) =>
        sections.GetValueOrDefault(bearing.On) is { } below && sections.GetValueOrDefault(bearing.Segment) is { } above
            ? below.SurfaceHeight - DepthOf(bearing, above) - above.Section.Surfacing
            : 0;

    private static double DepthOf(BearingLine bearing, SectionProperties section) => bearing.Depth ?? section.Section.BearingDepth;
}
