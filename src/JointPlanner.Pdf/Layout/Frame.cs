namespace JointPlanner.Pdf.Layout;

/// <summary>What every block needs in order to be laid out: the setter of text, the room, and the root of the structure.</summary>
internal sealed record Frame(TextSetter Set, PaperSize Paper, StructureElement Root)
{
    public static double Left => Measures.Left;

    public double Width => Paper.WidthPoints - Measures.Left - Measures.Right;

    public double Right => Left + Width;

    /// <summary>Height of the text on a page.</summary>
    public double Height => Paper.HeightPoints - Measures.Top - Measures.Bottom;

    /// <summary>Height of a line of text.</summary>
    public static double LineHeight(Piece line, TextLook look) => Math.Max(look.LineHeight, line.Ascent + line.Descent + 2);

    /// <summary>Paints a line in the middle of its height.</summary>
    public static void PaintLine(PageCanvas canvas, Piece line, double x, double top, double height)
    {
        if (line.Width > 0) line.Paint(canvas, x, top + ((height - line.Ascent - line.Descent) / 2) + line.Ascent);
    }

    /// <summary>Lines of running text as strips; the first two and the last two stay together.</summary>
    public List<Strip> TextStrips(StructureElement element, Words words, TextLook look, double indent, double spaceBefore, Action<PageCanvas, double, double>? beside = null)
    {
        var lines = Set.Lines(words, Width - indent, look);
        List<Strip> strips = [];
        for (var i = 0; i < lines.Count; i++)
        {
            var line = lines[i];
            var height = LineHeight(line, look);
            strips.Add(new(height, (canvas, top) =>
            {
                beside?.Invoke(canvas, top, height);
                canvas.For(element, () => PaintLine(canvas, line, Left + indent, top, height));
            })
            {
                SpaceBefore = i == 0 ? spaceBefore : 0,
                Link = i + 1 < lines.Count && (i == 0 || i == lines.Count - 2) ? Link.Strong : Link.None,
            });
        }
        return strips;
    }
}
