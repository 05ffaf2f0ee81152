namespace JointPlanner.Pictures;

/// <summary>Which part of a text stands at its point, across the text.</summary>
public enum Level
{
    /// <summary>The line on which the letters stand.</summary>
    Baseline,

    /// <summary>Half the height of a capital.</summary>
    Middle,

    /// <summary>The top of a capital.</summary>
    Top,
}
