namespace JointPlanner.Pdf;

/// <summary>The document's name on its first page.</summary>
/// <param name="Title">The name.</param>
/// <param name="Subtitle">A second line; null for none.</param>
public sealed record TitleBlock(string Title, string? Subtitle = null) : Block;
