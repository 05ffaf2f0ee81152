namespace JointPlanner.Cli;

/// <summary>Rows of text in aligned columns: words to the left, numbers to the right.</summary>
internal sealed class TextTable
{
    private readonly (string Heading, bool IsNumber)[] columns;
    private readonly List<string[]> rows = [];

    /// <summary>A table with these headings; one that begins with # holds numbers.</summary>
    public TextTable(params string[] headings) =>
        columns = [.. headings.Select(h => h.StartsWith('#') ? (h[1..], true) : (h, false))];

    /// <summary>Adds a row.</summary>
    public void Add(params string[] cells)
    {
        if (cells.Length != columns.Length) throw new ArgumentException($"A row of {cells.Length} cells in a table of {columns.Length} columns.");
        rows.Add(cells);
    }

    /// <summary>True when there is no row.</summary>
    public bool IsEmpty => rows.Count == 0;

    /// <summary>The lines, headings first.</summary>
    public IEnumerable<string> Lines(string indent)
    {
        var widths = columns.Select((c, i) => rows.Select(r => r[i].Length).Prepend(c.Heading.Length).Max()).ToArray();
        return rows.Prepend([.. columns.Select(c => c.Heading)]).Select(row => (indent + string.Join("  ", row.Select(Padded))).TrimEnd());

        string Padded(string cell, int i) => columns[i].IsNumber ? cell.PadLeft(widths[i]) : cell.PadRight(widths[i]);
    }
}
