namespace JointPlanner.Pictures;

/// <summary>Elements that belong together and are pressed together, such as all lines of one support.</summary>
/// <param name="Role">What they stand for.</param>
/// <param name="Elements">The elements, in drawing order.</param>
public sealed record Group(Role Role, IReadOnlyList<Element> Elements) : Composite(Role)
{
    /// <inheritdoc/>
    public override IReadOnlyList<Element> Parts => Elements;
}
