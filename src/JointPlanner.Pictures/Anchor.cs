namespace JointPlanner.Pictures;

/// <summary>Which part of a text stands at its point, along the text.</summary>
public enum Anchor
{
    /// <summary>The text begins there.</summary>
    Start,

    /// <summary>The text's middle lies there.</summary>
    Middle,

    /// <summary>The text ends there.</summary>
    End,
}
