namespace JointPlanner.Pdf;

/// <summary>A base with a subscript, a superscript or both.</summary>
/// <param name="Base">What carries them.</param>
/// <param name="Sub">Low, to the right; null for none.</param>
/// <param name="Super">High, to the right; null for none.</param>
public sealed record Script(MathNode Base, MathNode? Sub, MathNode? Super) : MathNode
{
    /// <inheritdoc/>
    public override string Linear => Base.Bound + (Sub is null ? "" : "_" + Sub.Bound) + (Super is null ? "" : "^" + Super.Bound);

    // a_b^c^d could be read both ways, so a base that carries a superscript already is put in parentheses.
    internal override bool Binds => Super is null && Base.Binds;
}
