namespace JointPlanner.Pictures;

/// <summary>A closed area.</summary>
/// <param name="Role">What it stands for.</param>
/// <param name="Points">Three corners or more; the last joins the first.</param>
/// <param name="Stroke">Weight and dash of the outline.</param>
/// <param name="Fill">The filling; crossing outlines fill by the even-odd rule.</param>
public sealed record Polygon(Role Role, IReadOnlyList<PaperPoint> Points, Stroke Stroke, Fill Fill = Fill.None) : Element(Role);
