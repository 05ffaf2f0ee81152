namespace JointPlanner.Pdf.Layout;

/// <summary>A piece that is copied and searched as a given text.</summary>
internal sealed class ReadingPiece : Piece
{
    private readonly Piece _inner;
    private readonly string _text;

    public ReadingPiece(Piece inner, string text)
    {
        (_inner, _text) = (inner, text);
        (Width, Ascent, Descent) = (inner.Width, inner.Ascent, inner.Descent);
    }

    public override void Paint(PageCanvas canvas, double x, double y) => canvas.ReadAs(_text, () => _inner.Paint(canvas, x, y));
}
