namespace JointPlanner.Pdf;

/// <summary>What follows begins on a new page; nothing happens where a page has just begun.</summary>
public sealed record PageBreak : Block;
