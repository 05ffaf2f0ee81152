namespace JointPlanner.Pdf.Layout;

/// <summary>Round brackets drawn as high as what they hold, where letters would be too low.</summary>
internal sealed class BracketPiece : Piece
{
    private const int Chords = 10;
    private readonly Piece _inner;
    private readonly double _room, _grey;

    public BracketPiece(Piece inner, double size, double grey)
    {
        (_inner, _room, _grey) = (inner, 0.36 * size, grey);
        Width = inner.Width + (2 * _room);
        (Ascent, Descent) = (inner.Ascent + (0.04 * size), inner.Descent + (0.04 * size));
    }

    public override void Paint(PageCanvas canvas, double x, double y)
    {
        Bow(canvas, x + (_room * 0.8), -_room * 0.5, y);
        _inner.Paint(canvas, x + _room, y);
        Bow(canvas, x + Width - (_room * 0.8), _room * 0.5, y);
    }

    private void Bow(PageCanvas canvas, double x, double bulge, double y)
    {
        var points = new (double X, double Y)[Chords + 1];
        for (var i = 0; i <= Chords; i++)
        {
            var share = (double)i / Chords;
            points[i] = (x + (bulge * 4 * share * (1 - share)), y - Ascent + (share * (Ascent + Descent)));
        }
        canvas.Path(points, false, new(0.6, _grey));
    }
}
