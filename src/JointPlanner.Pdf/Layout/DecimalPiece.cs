namespace JointPlanner.Pdf.Layout;

/// <summary>A number set so that its decimal point falls on a given place.</summary>
internal sealed class DecimalPiece : Piece
{
    private readonly Piece _number;
    private readonly double _indent;

    /// <param name="number">The number.</param>
    /// <param name="indent">Open space before it.</param>
    /// <param name="width">Width of the whole column of numbers.</param>
    public DecimalPiece(Piece number, double indent, double width)
    {
        (_number, _indent) = (number, indent);
        (Width, Ascent, Descent) = (width, number.Ascent, number.Descent);
    }

    public override void Paint(PageCanvas canvas, double x, double y) => _number.Paint(canvas, x + _indent, y);
}
