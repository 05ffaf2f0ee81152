namespace JointPlanner.Pdf.Layout;

/// <summary>Cuts a table row into strips of one line each, so that a row higher than a page can part.</summary>
internal sealed record RowSlices(IReadOnlyList<TableCell> Cells, double Left, double Right)
{
    public const double PadX = 5, PadY = 2.1;

    public TextLook Look { get; init; } = TextLook.Cell;

    /// <summary>A rule above the row; null for none.</summary>
    public Pen? Above { get; init; }

    /// <summary>A rule below the row; null for none.</summary>
    public Pen? Below { get; init; }

    /// <summary>Parts of the width that the rule below covers; null for the whole.</summary>
    public IReadOnlyList<(double From, double To)>? BelowParts { get; init; }

    public double SpaceBefore { get; init; }

    /// <summary>Whether short cells end with the row instead of beginning with it, as heads do.</summary>
    public bool SitLow { get; init; }

    public RepeatedHead? Head { get; init; }

    public List<Strip> Strips()
    {
        var count = Math.Max(1, Cells.Max(c => c.Lines.Count));
        List<Strip> strips = [];
        for (var i = 0; i < count; i++)
        {
            var index = i;
            var (first, last) = (i == 0, i == count - 1);
            var line = Cells.Max(c => Line(c, index, count) is { } l ? Frame.LineHeight(l, Look) : Look.LineHeight);
            var height = line + (first ? PadY : 0) + (last ? PadY : 0);
            strips.Add(new(height, (canvas, top) =>
            {
                if (first && Above is not null) canvas.Furniture(() => canvas.Line(Left, top, Right, top, Above));
                foreach (var cell in Cells)
                    cell.PaintLine(canvas, index - Shift(cell, count), top + (first ? PadY : 0), line);
                if (last && Below is not null) canvas.Furniture(() => Rule(canvas, top + height, Below));
            })
            {
                SpaceBefore = first ? SpaceBefore : 0,
                Link = last ? Link.None : Link.Strong,
                Head = Head,
            });
        }
        return strips;
    }

    private void Rule(PageCanvas canvas, double y, Pen pen)
    {
        foreach (var (from, to) in BelowParts ?? [(Left, Right)]) canvas.Line(from, y, to, y, pen);
    }

    private int Shift(TableCell cell, int count) => SitLow ? count - cell.Lines.Count : 0;

    private Piece? Line(TableCell cell, int index, int count)
    {
        var at = index - Shift(cell, count);
        return at >= 0 && at < cell.Lines.Count ? cell.Lines[at] : null;
    }
}
