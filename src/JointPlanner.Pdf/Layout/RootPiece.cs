namespace JointPlanner.Pdf.Layout;

/// <summary>A root sign with its roof over what it holds.</summary>
internal sealed class RootPiece : Piece
{
    private readonly Piece _inner;
    private readonly double _size, _grey;

    public RootPiece(Piece inner, double size, double grey)
    {
        (_inner, _size, _grey) = (inner, size, grey);
        Width = inner.Width + (0.78 * size);
        Ascent = inner.Ascent + (0.16 * size);
        Descent = inner.Descent;
    }

    public override void Paint(PageCanvas canvas, double x, double y)
    {
        double roof = y - Ascent + (0.05 * _size), foot = y + (_inner.Descent * 0.8);
        canvas.Path(
            [
                (x + (0.06 * _size), y - (0.26 * _size)), (x + (0.18 * _size), y - (0.34 * _size)), (x + (0.36 * _size), foot),
                (x + (0.56 * _size), roof), (x + Width - (0.04 * _size), roof),
            ],
            false,
            new(0.55, _grey));
        _inner.Paint(canvas, x + (0.64 * _size), y);
    }
}
