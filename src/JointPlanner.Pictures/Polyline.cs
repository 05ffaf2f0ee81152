namespace JointPlanner.Pictures;

/// <summary>A line with corners, open at its ends.</summary>
/// <param name="Role">What it stands for.</param>
/// <param name="Points">Two points or more.</param>
/// <param name="Stroke">Weight and dash.</param>
public sealed record Polyline(Role Role, IReadOnlyList<PaperPoint> Points, Stroke Stroke) : Element(Role);
