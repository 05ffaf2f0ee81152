namespace JointPlanner.Pdf;

/// <summary>Parts of a formula one after another.</summary>
/// <param name="Parts">The parts.</param>
public sealed record MathRow(IReadOnlyList<MathNode> Parts) : MathNode
{
    /// <inheritdoc/>
    public override string Linear => string.Concat(Parts.Select(p => p.Linear));

    internal override bool Binds => Parts.Count == 1 && Parts[0].Binds;
}
