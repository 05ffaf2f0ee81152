namespace JointPlanner.Pdf;

/// <summary>The paper of a sheet.</summary>
/// <param name="Name">What it is called.</param>
/// <param name="WidthPoints">Width in points of 1/72 inch.</param>
/// <param name="HeightPoints">Height in points of 1/72 inch.</param>
public sealed record PaperSize(string Name, double WidthPoints, double HeightPoints)
{
    private const double PointsPerMm = 72 / 25.4;

    /// <summary>210 × 297 mm (ISO 216).</summary>
    public static PaperSize A4 { get; } = new("A4", 595.276, 841.89);

    /// <summary>8½ × 11 in (ANSI/ASME Y14.1).</summary>
    public static PaperSize Letter { get; } = new("Letter", 612, 792);

    /// <summary>Width of the text, in millimetres: a picture laid out this wide is printed without being scaled.</summary>
    public double TextWidthMm => (WidthPoints - Layout.Measures.Left - Layout.Measures.Right) / PointsPerMm;

    /// <summary>Height that a picture with its caption can have at most, in millimetres.</summary>
    public double TextHeightMm => (HeightPoints - Layout.Measures.Top - Layout.Measures.Bottom - 24) / PointsPerMm;
}
