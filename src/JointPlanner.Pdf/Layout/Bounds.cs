namespace JointPlanner.Pdf.Layout;

/// <summary>A rectangle on a page, in points from the left and top edges.</summary>
internal readonly record struct Bounds(int Page, double Left, double Top, double Right, double Bottom)
{
    public Bounds Around(Bounds other) =>
        new(Page, Math.Min(Left, other.Left), Math.Min(Top, other.Top), Math.Max(Right, other.Right), Math.Max(Bottom, other.Bottom));
}
