namespace JointPlanner.Pdf;

/// <summary>Text with some of its words strong, leaning or set as a formula. A plain string is such a text too.</summary>
/// <param name="Runs">The parts in order.</param>
public sealed record Words(IReadOnlyList<Run> Runs)
{
    /// <summary>No words.</summary>
    public static Words None { get; } = new([]);

    /// <summary>The text in one line, formulas in their linear form.</summary>
    public string Linear => string.Concat(Runs.Select(r => r.Linear));

    /// <summary>Plain text.</summary>
    public static implicit operator Words(string text) => FromString(text);

    /// <summary>Text that is one formula.</summary>
    public static implicit operator Words(MathNode formula) => new([new MathRun(formula)]);

    /// <summary>Plain text.</summary>
    public static Words FromString(string text) => text.Length == 0 ? None : new([new TextRun(text)]);

    /// <summary>Text in strong letters.</summary>
    public static Words Strong(string text) => new([new TextRun(text, Emphasis.Strong)]);

    /// <summary>Several texts after one another.</summary>
    public static Words Join(params IEnumerable<Words> parts) => new([.. parts.SelectMany(p => p.Runs)]);
}
