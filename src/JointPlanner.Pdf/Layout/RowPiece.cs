namespace JointPlanner.Pdf.Layout;

/// <summary>Pieces side by side on one baseline, with open space where asked.</summary>
internal sealed class RowPiece : Piece
{
    private readonly IReadOnlyList<(Piece Piece, double SpaceBefore)> _pieces;

    public RowPiece(IReadOnlyList<(Piece Piece, double SpaceBefore)> pieces, double spaceAfter = 0)
    {
        _pieces = pieces;
        Width = pieces.Sum(p => p.SpaceBefore + p.Piece.Width) + spaceAfter;
        Ascent = pieces.Select(p => p.Piece.Ascent).DefaultIfEmpty(0).Max();
        Descent = pieces.Select(p => p.Piece.Descent).DefaultIfEmpty(0).Max();
    }

    public override void Paint(PageCanvas canvas, double x, double y)
    {
        foreach (var (piece, space) in _pieces)
        {
            piece.Paint(canvas, x + space, y);
            x += space + piece.Width;
        }
    }
}
