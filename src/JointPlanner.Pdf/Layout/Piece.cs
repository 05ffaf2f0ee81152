namespace JointPlanner.Pdf.Layout;

/// <summary>A laid-out part of a line: letters, or a formula with scripts, bars and roots. Lengths in points.</summary>
internal abstract class Piece
{
    public double Width { get; protected init; }

    /// <summary>Height above the baseline.</summary>
    public double Ascent { get; protected init; }

    /// <summary>Depth below the baseline.</summary>
    public double Descent { get; protected init; }

    /// <summary>Paints the piece with its baseline starting at a point.</summary>
    public abstract void Paint(PageCanvas canvas, double x, double y);
}
