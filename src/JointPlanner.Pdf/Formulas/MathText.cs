namespace JointPlanner.Pdf;

/// <summary>Letters, digits or a sign of a formula.</summary>
/// <param name="Text">The text.</param>
/// <param name="Kind">How it is set.</param>
public sealed record MathText(string Text, MathKind Kind) : MathNode
{
    /// <inheritdoc/>
    public override string Linear => Kind == MathKind.Operator ? " " + Text + " " : Text;

    internal override bool Binds => Kind != MathKind.Operator && Text.All(c => char.IsLetterOrDigit(c) || c is '.' or '−' or '\u2009' or '\u202F' or '°' or '′');
}
