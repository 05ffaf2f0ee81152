namespace JointPlanner.Engine.Formulas;

/// <summary>How grave a finding is.</summary>
public enum Severity
{
    /// <summary>Worth knowing.</summary>
    Note,
    /// <summary>To be looked at; does not stop the calculation.</summary>
    Warning,
    /// <summary>The calculation stands as a draft but cannot be issued until it is answered.</summary>
    BlocksIssue,
    /// <summary>Nothing can be computed for this part.</summary>
    Error,
}

/// <summary>
/// Something a person must know, as a sentence with places for numbers. The numbers stay SI; whoever prints the sentence puts the unit in.
/// </summary>
/// <param name="Id">Permanent id of the sentence.</param>
/// <param name="Severity">How grave.</param>
/// <param name="Path">Path in the plan that it belongs to.</param>
/// <param name="Template">Sentence with {0}, {1} … where numbers go.</param>
/// <param name="Values">The numbers, in SI, with their kinds.</param>
public sealed record Finding(string Id, Severity Severity, string Path, string Template, IReadOnlyList<(Quantity Quantity, double Value)> Values)
{
    /// <summary>A finding without numbers.</summary>
    public Finding(string id, Severity severity, string path, string sentence)
        : this(id, severity, path, sentence, [])
    {
    }
}
