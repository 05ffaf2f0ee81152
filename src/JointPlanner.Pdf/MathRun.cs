namespace JointPlanner.Pdf;

/// <summary>A formula or symbol within running text or a cell; it never breaks.</summary>
/// <param name="Formula">The formula.</param>
public sealed record MathRun(MathNode Formula) : Run
{
    /// <inheritdoc/>
    public override string Linear => Formula.Linear;
}
