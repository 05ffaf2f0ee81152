namespace JointPlanner.Pdf;

/// <summary>Where the cells of a column stand.</summary>
public enum Align
{
    /// <summary>At the left edge.</summary>
    Left,

    /// <summary>In the middle.</summary>
    Centre,

    /// <summary>At the right edge.</summary>
    Right,

    /// <summary>Decimal points under one another.</summary>
    Decimal,
}
