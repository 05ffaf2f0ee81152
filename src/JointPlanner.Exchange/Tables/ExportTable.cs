using System.Text;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tables;

/// <summary>A table of the screen as text for other programs: with commas for a file, with tabs for pasting. Units stand in the head, numbers as numbers with a decimal point.</summary>
/// <param name="profile">Units.</param>
public sealed class ExportTable(DisplayProfile profile)
{
    private readonly List<(string Name, Quantity? Quantity)> columns = [];
    private readonly List<IReadOnlyList<object?>> rows = [];

    /// <summary>A column of texts.</summary>
    public ExportTable Text(string name)
    {
        columns.Add((name, null));
        return this;
    }

    /// <summary>A column of numbers of one kind; its unit goes into the head.</summary>
    public ExportTable Numbers(string name, Quantity quantity)
    {
        columns.Add((name, quantity));
        return this;
    }

    /// <summary>A row: for each column a text, an SI value or a <see cref="Number"/>, or null for an empty cell.</summary>
    /// <exception cref="ArgumentException">There are not as many cells as columns.</exception>
    public ExportTable Row(params object?[] cells)
    {
        if (cells.Length != columns.Count) throw new ArgumentException($"A row has {cells.Length} cells; the table has {columns.Count} columns.", nameof(cells));
        rows.Add(cells);
        return this;
    }

    /// <summary>With commas, lines ending as RFC 4180 says. A text that a spreadsheet would take for a formula gets an apostrophe in front; numbers never do.</summary>
    public string ToCsv() => Lines(cell => Quoted(Harmless(cell)), Quoted, ",", "\r\n");

    /// <summary>With tabs, for pasting into a spreadsheet.</summary>
    public string ToTabs() => Lines(cell => Flat(Harmless(cell)), Flat, "\t", "\n");

    private string Lines(Func<string, string> text, Func<string, string> number, string between, string end)
    {
        var lines = new StringBuilder();
        lines.AppendJoin(between, columns.Select(c => text(c.Quantity is { } q && profile[q].Unit.Name is { Length: > 0 } unit ? $"{c.Name} ({unit})" : c.Name))).Append(end);
        foreach (var row in rows)
            lines.AppendJoin(between, row.Select((cell, i) => cell switch
            {
                null => "",
                string words => text(words),
                Number { Value: var value } => number(Shown(value, i)),
                double value => number(Shown(value, i)),
                _ => throw new InvalidOperationException($"A cell cannot hold {cell.GetType().Name}."),
            })).Append(end);
        return lines.ToString();
    }

    private string Shown(double si, int column) =>
        NumberText.Of(si, columns[column].Quantity ?? throw new InvalidOperationException($"“{columns[column].Name}” is a column of texts."), profile, NumberStyle.File);

    private static string Harmless(string text) => text.Length > 0 && text[0] is '=' or '+' or '-' or '−' or '@' or '\t' or '\r' ? "'" + text : text;

    private static string Quoted(string cell) =>
        cell.AsSpan().IndexOfAny(",\"\r\n") < 0 ? cell : $"\"{cell.Replace("\"", "\"\"", StringComparison.Ordinal)}\"";

    private static string Flat(string cell) => cell.Replace('\t', ' ').ReplaceLineEndings(" ");
}
