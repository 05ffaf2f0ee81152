namespace JointPlanner.Pdf.Layout;

/// <summary>Puts the decimal points of a column under one another.</summary>
internal sealed class DecimalColumn(TextSetter set)
{
    private double _before, _after;

    public double Width => _before + _after;

    /// <summary>Takes a cell's width into account; to be called for every cell before the first is set.</summary>
    public void Measure(Words cell, TextLook look)
    {
        if (Split(cell, look) is not var (before, after)) return;
        _before = Math.Max(_before, before);
        _after = Math.Max(_after, after);
    }

    /// <summary>The cell with its point in line; null for a cell that holds more than one run.</summary>
    public Piece? Set(Words cell, TextLook look) => Split(cell, look) is var (before, _)
        ? new DecimalPiece(set.OneLine(cell, look), _before - before, Width)
        : null;

    private (double Before, double After)? Split(Words cell, TextLook look)
    {
        if (cell.Runs is not [TextRun run]) return null;
        var runLook = look.With(run.Emphasis);
        var text = set.Settable(run.Text);
        // Only a point between or before digits is a decimal point; a whole number ends where the others have theirs.
        var point = text.IndexOf('.', StringComparison.Ordinal);
        var end = point >= 0 ? point : LastDigit(text) + 1;
        return (set.Width(text[..end], runLook), set.Width(text[end..], runLook));
    }

    private static int LastDigit(string text)
    {
        var at = text.Length - 1;
        while (at >= 0 && !char.IsAsciiDigit(text[at])) at--;
        return at < 0 ? text.Length - 1 : at;
    }
}
