namespace JointPlanner.Pdf.Layout;

/// <summary>A cell ready to be painted.</summary>
/// <param name="Lines">Its lines.</param>
/// <param name="Left">Its left edge.</param>
/// <param name="Width">Its width without padding.</param>
/// <param name="Align">Where its lines stand.</param>
/// <param name="Element">Its element of the structure; null for a repeated head.</param>
internal sealed record TableCell(IReadOnlyList<Piece> Lines, double Left, double Width, Align Align, StructureElement? Element)
{
    public void PaintLine(PageCanvas canvas, int index, double top, double height)
    {
        if (index < 0 || index >= Lines.Count || Lines[index].Width == 0) return;
        var line = Lines[index];
        var x = Align switch
        {
            Align.Left => Left,
            Align.Centre => Left + ((Width - line.Width) / 2),
            Align.Right or Align.Decimal => Left + Width - line.Width,
            _ => throw new InvalidOperationException($"There is no alignment {Align}."),
        };
        if (Element is null) Frame.PaintLine(canvas, line, x, top, height);
        else canvas.For(Element, () => Frame.PaintLine(canvas, line, x, top, height));
    }
}
