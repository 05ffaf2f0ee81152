namespace JointPlanner.Pdf;

/// <summary>A paragraph of running text.</summary>
/// <param name="Words">The text.</param>
public sealed record Paragraph(Words Words) : Block;
