namespace JointPlanner.Pictures;

/// <summary>How a line is drawn.</summary>
/// <param name="WeightMm">Line weight on paper in millimetres; 0 draws no line.</param>
/// <param name="Dash">The dash pattern.</param>
public readonly record struct Stroke(double WeightMm, Dash Dash = Dash.Solid)
{
    /// <summary>No line: an area that is only filled.</summary>
    public static Stroke None => new(0);

    /// <summary>0.13 mm: grids, hatches.</summary>
    public static Stroke Hairline => new(0.13);

    /// <summary>0.18 mm: dimensions, guides, ground.</summary>
    public static Stroke Thin => new(0.18);

    /// <summary>0.35 mm: outlines.</summary>
    public static Stroke Medium => new(0.35);

    /// <summary>0.6 mm: what the picture is about.</summary>
    public static Stroke Heavy => new(0.6);

    /// <summary>Lengths of drawn and open parts in millimetres; empty for a solid line.</summary>
    public IReadOnlyList<double> Pattern => Dash switch
    {
        Dash.Solid => [],
        Dash.Dashed => [1.6, 1.0],
        Dash.Dotted => [0.3, 0.8],
        Dash.Chain => [3.2, 0.8, 0.5, 0.8],
        _ => throw new InvalidOperationException($"There is no dash pattern {Dash}."),
    };
}
