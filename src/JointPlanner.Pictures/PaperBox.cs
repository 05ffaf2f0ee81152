namespace JointPlanner.Pictures;

/// <summary>An upright rectangle on the paper, in millimetres from the picture's left and top edges.</summary>
public readonly record struct PaperBox(double Left, double Top, double Width, double Height)
{
    /// <summary>The right edge.</summary>
    public double Right => Left + Width;

    /// <summary>The bottom edge; larger than <see cref="Top"/> because y grows downwards.</summary>
    public double Bottom => Top + Height;

    /// <summary>The point in the middle.</summary>
    public PaperPoint Centre => new(Left + (Width / 2), Top + (Height / 2));
}
