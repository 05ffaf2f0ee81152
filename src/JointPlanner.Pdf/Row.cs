namespace JointPlanner.Pdf;

/// <summary>A row of a table.</summary>
/// <param name="Cells">One cell for each column.</param>
public sealed record Row(IReadOnlyList<Words> Cells)
{
    /// <summary>Whether the row stands out: what governs, a sum.</summary>
    public bool Strong { get; init; }
}
