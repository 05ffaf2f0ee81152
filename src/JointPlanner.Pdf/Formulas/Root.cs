namespace JointPlanner.Pdf;

/// <summary>A square root.</summary>
/// <param name="Inner">What stands under it.</param>
public sealed record Root(MathNode Inner) : MathNode
{
    /// <inheritdoc/>
    public override string Linear => "√(" + Inner.Linear + ")";

    internal override bool Binds => true;
}
