namespace JointPlanner.Pdf;

/// <summary>A column of a table.</summary>
/// <param name="Head">Its head.</param>
/// <param name="Align">Where its cells stand.</param>
public sealed record Column(Words Head, Align Align = Align.Left)
{
    /// <summary>Width in millimetres; null to fit the content.</summary>
    public double? WidthMm { get; init; }

    /// <summary>Whether the cells name their rows, for readers that read aloud.</summary>
    public bool NamesRows { get; init; }
}
