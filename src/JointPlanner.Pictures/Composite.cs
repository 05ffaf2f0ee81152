namespace JointPlanner.Pictures;

/// <summary>An element made of simpler ones, so that every writer draws it alike.</summary>
/// <param name="Role">What it stands for.</param>
public abstract record Composite(Role Role) : Element(Role)
{
    /// <summary>The simpler elements, in drawing order.</summary>
    public abstract IReadOnlyList<Element> Parts { get; }
}
