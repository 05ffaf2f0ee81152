namespace JointPlanner.Pictures;

/// <summary>A straight line.</summary>
/// <param name="Role">What it stands for.</param>
/// <param name="From">One end.</param>
/// <param name="To">The other end.</param>
/// <param name="Stroke">Weight and dash.</param>
public sealed record Line(Role Role, PaperPoint From, PaperPoint To, Stroke Stroke) : Element(Role);
