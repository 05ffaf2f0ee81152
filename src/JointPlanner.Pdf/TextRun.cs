namespace JointPlanner.Pdf;

/// <summary>Letters of one kind.</summary>
/// <param name="Text">The letters; lines break at its spaces, never at no-break and thin spaces.</param>
/// <param name="Emphasis">How they are set.</param>
public sealed record TextRun(string Text, Emphasis Emphasis = Emphasis.None) : Run
{
    /// <inheritdoc/>
    public override string Linear => Text;
}
