namespace JointPlanner.Pictures;

/// <summary>A place on the paper.</summary>
/// <param name="X">Millimetres from the picture's left edge, growing to the right.</param>
/// <param name="Y">Millimetres from the picture's top edge, growing downwards.</param>
public readonly record struct PaperPoint(double X, double Y)
{
    /// <summary>The point moved by so many millimetres to the right and downwards.</summary>
    public PaperPoint Moved(double right, double down) => new(X + right, Y + down);

    /// <summary>The straight distance to another point, in millimetres.</summary>
    public double DistanceTo(PaperPoint other) => Math.Sqrt(((other.X - X) * (other.X - X)) + ((other.Y - Y) * (other.Y - Y)));
}
