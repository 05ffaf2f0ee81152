namespace JointPlanner.Pdf;

/// <summary>Round brackets as high as what they hold.</summary>
/// <param name="Inner">What stands between them.</param>
public sealed record Parentheses(MathNode Inner) : MathNode
{
    /// <inheritdoc/>
    public override string Linear => "(" + Inner.Linear + ")";

    internal override bool Binds => true;
}
