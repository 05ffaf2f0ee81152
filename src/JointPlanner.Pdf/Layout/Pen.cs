namespace JointPlanner.Pdf.Layout;

/// <summary>How an outline and its area are painted.</summary>
/// <param name="Weight">Line weight in points; 0 for no line.</param>
/// <param name="Grey">Shade of the line.</param>
/// <param name="Fill">Shade of the area; null for none.</param>
/// <param name="Dashes">Lengths of drawn and open parts in points; null or empty for a solid line.</param>
internal sealed record Pen(double Weight, double Grey, double? Fill = null, IReadOnlyList<double>? Dashes = null)
{
    public static Pen Hair { get; } = new(Measures.Hairline, Measures.Rule);

    public static Pen Thin { get; } = new(Measures.ThinRule, Measures.Quiet);

    public static Pen Strong { get; } = new(Measures.StrongRule, Measures.Ink);

    public static Pen Area(double grey) => new(0, 0, grey);
}
