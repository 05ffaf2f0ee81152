using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Where a table's columns stand and how its cells are broken into lines.</summary>
internal sealed class TableColumns
{
    private readonly Table _table;
    private readonly TextSetter _set;
    private readonly DecimalColumn?[] _decimals;
    private readonly double[] _widths, _lefts;

    public TableColumns(Table table, Frame frame)
    {
        (_table, _set) = (table, frame.Set);
        _decimals = [.. table.Columns.Select(c => c.Align == Align.Decimal ? new DecimalColumn(frame.Set) : null)];
        foreach (var row in table.Groups.SelectMany(g => g.Rows))
        {
            for (var i = 0; i < row.Cells.Count; i++) _decimals[i]?.Measure(row.Cells[i], LookOf(row));
        }
        _widths = Widths(frame.Width);
        _lefts = new double[_widths.Length];
        _lefts[0] = Frame.Left;
        for (var i = 1; i < _lefts.Length; i++) _lefts[i] = _lefts[i - 1] + _widths[i - 1];
    }

    public static TextLook HeadLook => TextLook.Cell with { Style = FaceStyle.Strong, LineHeight = 10 };

    public double Left => _lefts[0];

    public double Right => _lefts[^1] + _widths[^1];

    /// <summary>Edges of the content of a column, or of several side by side.</summary>
    public (double Left, double Width) Inner(int column, int span = 1)
    {
        var width = _lefts[column + span - 1] + _widths[column + span - 1] - _lefts[column];
        return (_lefts[column] + RowSlices.PadX, width - (2 * RowSlices.PadX));
    }

    public TableCell Cell(Row row, int column, StructureElement? element)
    {
        var (left, width) = Inner(column);
        var look = LookOf(row);
        // A number too wide for its column falls back to broken lines.
        var number = _decimals[column]?.Set(row.Cells[column], look);
        if (number is not null && number.Width <= width + 0.01) return new([number], left, width, Align.Decimal, element);
        return new(_set.Lines(row.Cells[column], width, look), left, width, _table.Columns[column].Align, element);
    }

    public TableCell Head(Words words, int column, int span, Align align, StructureElement? element)
    {
        var (left, width) = Inner(column, span);
        return new(_set.Lines(words, width, HeadLook), left, width, align, element);
    }

    private static TextLook LookOf(Row row) => row.Strong ? TextLook.Cell with { Style = FaceStyle.Strong } : TextLook.Cell;

    private double[] Widths(double room)
    {
        var count = _table.Columns.Count;
        var fixedWidths = _table.Columns.Select(c => c.WidthMm * Measures.Mm).ToArray();
        var least = new double[count];
        var natural = new double[count];
        for (var i = 0; i < count; i++)
        {
            Widen(i, _table.Columns[i].Head, HeadLook, wraps: true);
            if (_decimals[i] is { } numbers) (least[i], natural[i]) = (Math.Max(least[i], numbers.Width), Math.Max(natural[i], numbers.Width));
        }
        foreach (var row in _table.Groups.SelectMany(g => g.Rows))
        {
            for (var i = 0; i < count; i++) Widen(i, row.Cells[i], LookOf(row), wraps: _table.Columns[i].Align is Align.Left or Align.Centre);
        }
        for (var i = 0; i < count; i++) (least[i], natural[i]) = (least[i] + (2 * RowSlices.PadX), natural[i] + (2 * RowSlices.PadX));
        return ColumnWidths.Share(fixedWidths, least, natural, room, _table.FullWidth);

        void Widen(int column, Words words, TextLook look, bool wraps)
        {
            var whole = _set.OneLine(words, look).Width;
            natural[column] = Math.Max(natural[column], whole);
            least[column] = Math.Max(least[column], wraps ? WidestPart(words, look) : whole);
        }
    }

    private double WidestPart(Words words, TextLook look)
    {
        double widest = 0;
        foreach (var run in words.Runs)
        {
            widest = run is TextRun text
                ? Math.Max(widest, _set.Settable(text.Text).Split(' ', '\n').Max(w => _set.Width(w, look.With(text.Emphasis))))
                : Math.Max(widest, _set.OneLine(new([run]), look).Width);
        }
        return widest;
    }
}
