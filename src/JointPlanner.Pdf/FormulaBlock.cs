namespace JointPlanner.Pdf;

/// <summary>One step of a calculation: what it is, where it comes from, and its lines aligned at their relation signs.</summary>
/// <param name="Lines">The lines: symbol = expression, = numbers, = result.</param>
public sealed record FormulaBlock(IReadOnlyList<FormulaLine> Lines) : Block
{
    /// <summary>What is worked out, in words; <see cref="Words.None"/> for nothing.</summary>
    public Words Label { get; init; } = Words.None;

    /// <summary>The clause or source, at the right edge; null for none.</summary>
    public string? Source { get; init; }

    /// <summary>A remark below the lines; <see cref="Words.None"/> for nothing.</summary>
    public Words Remark { get; init; } = Words.None;

    /// <summary>The whole step in one line, for reading aloud.</summary>
    public string Linear => string.Concat(Lines.Select((l, i) => (i > 0 ? " " : "") + l.Linear)).Trim();
}
