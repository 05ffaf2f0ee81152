namespace JointPlanner.Pictures;

/// <summary>The part of the world that a picture must show.</summary>
/// <param name="Left">Smallest X.</param>
/// <param name="Right">Largest X.</param>
/// <param name="Bottom">Smallest Z.</param>
/// <param name="Top">Largest Z.</param>
public readonly record struct WorldBox(double Left, double Right, double Bottom, double Top)
{
    /// <summary>Extent along X.</summary>
    public double Width => Right - Left;

    /// <summary>Extent along Z.</summary>
    public double Height => Top - Bottom;

    /// <summary>The smallest box round all the points.</summary>
    /// <exception cref="ArgumentException">There is no point.</exception>
    public static WorldBox Around(IEnumerable<WorldPoint> points)
    {
        var list = points.ToList();
        if (list.Count == 0) throw new ArgumentException("A box needs at least one point to stand round.", nameof(points));
        return new(list.Min(p => p.X), list.Max(p => p.X), list.Min(p => p.Z), list.Max(p => p.Z));
    }
}
