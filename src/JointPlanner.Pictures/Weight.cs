namespace JointPlanner.Pictures;

/// <summary>How strong letters are.</summary>
public enum Weight
{
    /// <summary>The text weight.</summary>
    Regular,

    /// <summary>The stronger weight, for names.</summary>
    Semibold,
}
