using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>
/// A rule that a plan does not keep. In its sentences {0}, {1} … stand for <see cref="Numbers"/>, and a path in braces for what was
/// typed there; whoever shows it puts them in.
/// </summary>
/// <param name="Id">Permanent id of the kind of fault.</param>
/// <param name="Path">Path of the field to change.</param>
/// <param name="Wrong">What is wrong, a sentence.</param>
/// <param name="Allowed">What is allowed, a sentence.</param>
/// <param name="Remedy">What to do, a sentence.</param>
public sealed record Breach(string Id, string Path, string Wrong, string Allowed, string Remedy)
{
    /// <summary>True when the plan can be computed all the same.</summary>
    public bool IsWarning { get; init; }

    /// <summary>Numbers of the sentences, in SI, with their kinds.</summary>
    public IReadOnlyList<(Quantity Quantity, double Value)> Numbers { get; init; } = [];
}
