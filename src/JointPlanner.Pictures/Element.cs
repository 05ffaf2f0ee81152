namespace JointPlanner.Pictures;

/// <summary>One thing on a picture, already laid out in paper millimetres. Later elements cover earlier ones.</summary>
/// <param name="Role">What it stands for.</param>
public abstract record Element(Role Role)
{
    /// <summary>The path in the plan of what is drawn, such as <c>supports/p2</c>; a screen then knows what was pressed.</summary>
    public string? PlanPath { get; init; }

    /// <summary>The name that a pointer or a screen reader gets.</summary>
    public string? Title { get; init; }
}
