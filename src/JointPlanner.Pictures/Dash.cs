namespace JointPlanner.Pictures;

/// <summary>The dash pattern of a line.</summary>
public enum Dash
{
    /// <summary>Unbroken.</summary>
    Solid,

    /// <summary>Hidden or assumed edges.</summary>
    Dashed,

    /// <summary>Limits, past positions.</summary>
    Dotted,

    /// <summary>Long and short: centre lines and axes.</summary>
    Chain,
}
