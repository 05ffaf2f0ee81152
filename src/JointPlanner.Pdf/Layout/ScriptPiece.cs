namespace JointPlanner.Pdf.Layout;

/// <summary>A base with a small piece below, above, or both, at its right.</summary>
internal sealed class ScriptPiece : Piece
{
    private readonly Piece _base;
    private readonly Piece? _sub, _super;
    private readonly double _down, _up, _gap;

    public ScriptPiece(Piece @base, Piece? sub, Piece? super, double size)
    {
        (_base, _sub, _super) = (@base, sub, super);
        (_down, _gap) = (0.19 * size, 0.03 * size);
        // A superscript on something high, such as a bracket, climbs with it.
        _up = Math.Max(0.36 * size, @base.Ascent - (0.42 * size));
        Width = @base.Width + _gap + Math.Max(sub?.Width ?? 0, super?.Width ?? 0) + _gap;
        Ascent = Math.Max(@base.Ascent, super is null ? 0 : super.Ascent + _up);
        Descent = Math.Max(@base.Descent, sub is null ? 0 : sub.Descent + _down);
    }

    public override void Paint(PageCanvas canvas, double x, double y)
    {
        _base.Paint(canvas, x, y);
        _sub?.Paint(canvas, x + _base.Width + _gap, y + _down);
        _super?.Paint(canvas, x + _base.Width + _gap, y - _up);
    }
}
