namespace JointPlanner.Pdf;

/// <summary>A stretch of one kind in a text.</summary>
public abstract record Run
{
    /// <summary>The stretch in one line.</summary>
    public abstract string Linear { get; }
}
