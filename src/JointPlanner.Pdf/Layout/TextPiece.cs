using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Letters of one style and size.</summary>
internal sealed class TextPiece : Piece
{
    private readonly List<FaceRun> _runs;
    private readonly double _size, _grey;

    public TextPiece(TypeSet faces, string settable, FaceStyle style, double size, double grey)
    {
        (_runs, _size, _grey) = (faces.Split(settable, style), size, grey);
        Width = _runs.Sum(r => r.Width) * size;
        (Ascent, Descent) = (0.76 * size, 0.24 * size);
    }

    public override void Paint(PageCanvas canvas, double x, double y)
    {
        foreach (var run in _runs)
        {
            canvas.Text(x, y, run.Face, _size, run.Text, _grey);
            x += run.Width * _size;
        }
    }
}
