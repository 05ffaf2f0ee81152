namespace JointPlanner.Pdf.Layout;

/// <summary>Tables: caption, heads that repeat, rows that keep to their groups.</summary>
internal sealed class TableLayout
{
    private readonly Table _table;
    private readonly Frame _frame;
    private readonly StructureElement _element;
    private readonly TableColumns _columns;

    private TableLayout(Table table, Frame frame)
    {
        Check(table);
        (_table, _frame) = (table, frame);
        _element = frame.Root.Child("Table");
        _columns = new(table, frame);
    }

    public static IEnumerable<Strip> Strips(Table table, Frame frame) => new TableLayout(table, frame).Strips();

    private List<Strip> Strips()
    {
        List<Strip> strips = [];
        if (_table.Caption is not null)
        {
            strips.AddRange(_frame.TextStrips(_element.Child("Caption"), Words.Strong(_table.Caption), TextLook.Cell, 0, 9));
            strips.Add(Strip.Space(2.5));
        }
        strips.AddRange(HeadStrips(read: true, _table.Caption is null ? 9 : 0));
        foreach (var strip in strips) strip.Link = Link.Strong;
        var repeated = Repeated();
        for (var g = 0; g < _table.Groups.Count; g++)
        {
            var group = _table.Groups[g];
            var lastGroup = g == _table.Groups.Count - 1;
            if (group.Title is not null) strips.AddRange(TitleStrips(group.Title, repeated));
            for (var r = 0; r < group.Rows.Count; r++)
            {
                var lastRow = r == group.Rows.Count - 1;
                strips.AddRange(RowStrips(group.Rows[r], repeated, lastRow && lastGroup ? Pen.Thin : Pen.Hair));
                // Rows of a group stay together, and no page carries the head and one row alone when there are more.
                strips[^1].Link = !lastRow || (g == 0 && !lastGroup) ? Link.Weak : Link.None;
            }
        }
        strips.Add(Strip.Space(4));
        return strips;
    }

    private List<Strip> HeadStrips(bool read, double spaceBefore)
    {
        List<Strip> strips = [];
        if (_table.Spans.Count > 0) strips.AddRange(SpanStrips(read ? _element.Child("TR") : null, spaceBefore));
        var row = read ? _element.Child("TR") : null;
        var cells = _table.Columns.Select((c, i) => _columns.Head(c.Head, i, 1, c.Align, row?.Child("TH", scope: "Column"))).ToList();
        strips.AddRange(new RowSlices(cells, _columns.Left, _columns.Right)
        {
            Look = TableColumns.HeadLook,
            Above = strips.Count == 0 ? Pen.Thin : null,
            Below = Pen.Thin,
            SpaceBefore = strips.Count == 0 ? spaceBefore : 0,
            SitLow = true,
        }.Strips());
        return strips;
    }

    private List<Strip> SpanStrips(StructureElement? row, double spaceBefore)
    {
        List<TableCell> cells = [];
        List<(double, double)> rules = [];
        var column = 0;
        foreach (var span in _table.Spans)
        {
            var empty = span.Head.Runs.Count == 0;
            var element = empty ? row?.Child("TD", columnSpan: span.Columns) : row?.Child("TH", scope: "Column", columnSpan: span.Columns);
            cells.Add(_columns.Head(span.Head, column, span.Columns, Align.Centre, element));
            var (left, width) = _columns.Inner(column, span.Columns);
            if (!empty) rules.Add((left, left + width));
            column += span.Columns;
        }
        return new RowSlices(cells, _columns.Left, _columns.Right)
        {
            Look = TableColumns.HeadLook,
            Above = Pen.Thin,
            Below = Pen.Hair,
            BelowParts = rules,
            SpaceBefore = spaceBefore,
            SitLow = true,
        }.Strips();
    }

    // The head once more, without elements of the structure: it was read out where the table began.
    private RepeatedHead Repeated()
    {
        var caption = _table.Caption is null ? null : _frame.Set.Fitted(_table.Caption + " (continued)", _frame.Width, TextLook.Cell with { Grey = Measures.Quiet });
        var above = caption is null ? 0 : Measures.SmallLine + 2.5;
        var strips = HeadStrips(read: false, 0);
        return new(above + strips.Sum(s => s.Height), (canvas, top) =>
        {
            if (caption is not null) Frame.PaintLine(canvas, caption, Frame.Left, top, Measures.SmallLine);
            top += above;
            foreach (var strip in strips)
            {
                strip.Paint(canvas, top);
                top += strip.Height;
            }
        });
    }

    private List<Strip> TitleStrips(string title, RepeatedHead head)
    {
        var cell = _element.Child("TR").Child("TH", scope: "Column", columnSpan: _table.Columns.Count);
        var strips = new RowSlices([_columns.Head(title, 0, _table.Columns.Count, Align.Left, cell)], _columns.Left, _columns.Right)
        {
            Below = Pen.Hair,
            Head = head,
        }.Strips();
        foreach (var strip in strips) strip.Link = Link.Strong;
        return strips;
    }

    private List<Strip> RowStrips(Row row, RepeatedHead head, Pen below)
    {
        var element = _element.Child("TR");
        var cells = _table.Columns.Select((c, i) =>
            _columns.Cell(row, i, c.NamesRows ? element.Child("TH", scope: "Row") : element.Child("TD"))).ToList();
        return new RowSlices(cells, _columns.Left, _columns.Right) { Below = below, Head = head }.Strips();
    }

    private static void Check(Table table)
    {
        var name = table.Caption ?? "without a caption";
        if (table.Columns.Count == 0) throw new ArgumentException($"The table \"{name}\" has no columns.");
        if (table.Spans.Count > 0 && (table.Spans.Any(s => s.Columns < 1) || table.Spans.Sum(s => s.Columns) != table.Columns.Count))
            throw new ArgumentException($"The heads over the columns of the table \"{name}\" cover {table.Spans.Sum(s => s.Columns)} columns; it has {table.Columns.Count}.");
        if (table.Groups.SelectMany(g => g.Rows).FirstOrDefault(r => r.Cells.Count != table.Columns.Count) is { } row)
            throw new ArgumentException($"A row of the table \"{name}\" has {row.Cells.Count} cells; the table has {table.Columns.Count} columns.");
    }
}
