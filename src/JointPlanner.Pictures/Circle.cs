namespace JointPlanner.Pictures;

/// <summary>A circle.</summary>
/// <param name="Role">What it stands for.</param>
/// <param name="Centre">Its middle.</param>
/// <param name="RadiusMm">Its radius on paper, above zero.</param>
/// <param name="Stroke">Weight and dash of the outline.</param>
/// <param name="Fill">The filling.</param>
public sealed record Circle(Role Role, PaperPoint Centre, double RadiusMm, Stroke Stroke, Fill Fill = Fill.None) : Element(Role);
