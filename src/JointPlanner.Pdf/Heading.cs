namespace JointPlanner.Pdf;

/// <summary>A heading; it also stands in the document's outline and never alone at the foot of a page.</summary>
/// <param name="Rank">1 for a chapter, 2 for a part of one.</param>
/// <param name="Text">The words.</param>
public sealed record Heading(int Rank, string Text) : Block
{
    /// <summary>The number before the words, such as 2.1; null for none.</summary>
    public string? Number { get; init; }
}
