namespace JointPlanner.Pdf;

/// <summary>A paragraph that must not be overlooked, set apart by a rule at its left.</summary>
/// <param name="Lead">The word that opens it in strong letters: Note, Caution, From memory.</param>
/// <param name="Words">The text.</param>
public sealed record Note(string Lead, Words Words) : Block
{
    /// <summary>Whether the rule is heavy: work can hurt, or the sheet cannot be relied on.</summary>
    public bool Caution { get; init; }
}
