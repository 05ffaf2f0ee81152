namespace JointPlanner.Pdf.Layout;

/// <summary>A fraction: top, bar at the height of a minus sign, bottom.</summary>
internal sealed class FractionPiece : Piece
{
    private readonly Piece _top, _bottom;
    private readonly double _axis, _gap, _pad, _grey;

    public FractionPiece(Piece top, Piece bottom, double size, double grey)
    {
        (_top, _bottom, _grey) = (top, bottom, grey);
        (_axis, _gap, _pad) = (0.31 * size, 0.12 * size, 0.12 * size);
        Width = Math.Max(top.Width, bottom.Width) + (4 * _pad);
        Ascent = _axis + _gap + top.Descent + top.Ascent;
        Descent = bottom.Ascent + bottom.Descent + _gap - _axis;
    }

    public override void Paint(PageCanvas canvas, double x, double y)
    {
        _top.Paint(canvas, x + ((Width - _top.Width) / 2), y - _axis - _gap - _top.Descent);
        canvas.Line(x + _pad, y - _axis, x + Width - _pad, y - _axis, new(0.55, _grey));
        _bottom.Paint(canvas, x + ((Width - _bottom.Width) / 2), y - _axis + _gap + _bottom.Ascent);
    }
}
