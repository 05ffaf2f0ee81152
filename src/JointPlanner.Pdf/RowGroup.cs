namespace JointPlanner.Pdf;

/// <summary>Rows that belong together.</summary>
/// <param name="Rows">The rows.</param>
public sealed record RowGroup(IReadOnlyList<Row> Rows)
{
    /// <summary>A line above the rows across the table; null for none.</summary>
    public string? Title { get; init; }
}
