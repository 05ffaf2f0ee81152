namespace JointPlanner.Pictures;

/// <summary>An upright rectangle.</summary>
/// <param name="Role">What it stands for.</param>
/// <param name="Edges">Its place and size.</param>
/// <param name="Stroke">Weight and dash of the outline.</param>
/// <param name="Fill">The filling.</param>
public sealed record Box(Role Role, PaperBox Edges, Stroke Stroke, Fill Fill = Fill.None) : Element(Role);
