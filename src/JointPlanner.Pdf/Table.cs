namespace JointPlanner.Pdf;

/// <summary>A table. Its head is repeated on every page that it runs over.</summary>
/// <param name="Columns">The columns from left to right; one or more.</param>
/// <param name="Groups">The rows, in groups that stay on one page when they fit on one.</param>
public sealed record Table(IReadOnlyList<Column> Columns, IReadOnlyList<RowGroup> Groups) : Block
{
    /// <summary>The caption above the table, with its number; null for none.</summary>
    public string? Caption { get; init; }

    /// <summary>A line above the column heads that names several columns at once; empty for none. The spans must add up to the columns.</summary>
    public IReadOnlyList<HeadSpan> Spans { get; init; } = [];

    /// <summary>Whether the columns are spread over the whole width of the text, or stand as close as their content allows.</summary>
    public bool FullWidth { get; init; } = true;

    /// <summary>A table whose rows are all free to part.</summary>
    public static Table Of(string? caption, IReadOnlyList<Column> columns, IEnumerable<IReadOnlyList<Words>> rows) =>
        new(columns, [.. rows.Select(r => new RowGroup([new Row(r)]))]) { Caption = caption };
}
