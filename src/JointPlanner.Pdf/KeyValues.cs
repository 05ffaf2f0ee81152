namespace JointPlanner.Pdf;

/// <summary>Facts about the sheet or a thing on it: project, structure, revision, hashes.</summary>
/// <param name="Pairs">The facts in order.</param>
public sealed record KeyValues(IReadOnlyList<KeyValue> Pairs) : Block
{
    /// <summary>Whether two short facts stand side by side.</summary>
    public bool TwoAcross { get; init; }
}
