namespace JointPlanner.Pictures;

/// <summary>
/// A place in the drawn world, in any one unit of length that the caller keeps to. In an elevation X runs along the deck and Z upwards;
/// in a view from above Z is the distance to the left of the X direction; in a diagram both are the quantities of the axes.
/// </summary>
public readonly record struct WorldPoint(double X, double Z);
