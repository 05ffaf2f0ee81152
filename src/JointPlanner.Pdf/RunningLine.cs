namespace JointPlanner.Pdf;

/// <summary>A line repeated on every page.</summary>
/// <param name="Left">Words at the left edge.</param>
/// <param name="Right">Words at the right edge.</param>
public sealed record RunningLine(string Left, string Right);
