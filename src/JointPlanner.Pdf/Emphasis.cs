namespace JointPlanner.Pdf;

/// <summary>How letters stand out.</summary>
public enum Emphasis
{
    /// <summary>They do not.</summary>
    None,

    /// <summary>Stronger.</summary>
    Strong,

    /// <summary>Leaning.</summary>
    Italic,

    /// <summary>Greyer, for sources and remarks.</summary>
    Quiet,
}
