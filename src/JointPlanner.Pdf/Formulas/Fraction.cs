namespace JointPlanner.Pdf;

/// <summary>A fraction with a bar.</summary>
/// <param name="Top">Above the bar.</param>
/// <param name="Bottom">Below the bar.</param>
public sealed record Fraction(MathNode Top, MathNode Bottom) : MathNode
{
    /// <inheritdoc/>
    public override string Linear => Top.Bound + "/" + Bottom.Bound;
}
