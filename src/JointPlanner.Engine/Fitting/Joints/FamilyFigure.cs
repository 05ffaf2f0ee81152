using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>A figure that a joint family reads from an owner's rule set.</summary>
/// <param name="Word">Word of the figure in rule sets.</param>
/// <param name="Quantity">Kind of value.</param>
/// <param name="IsRequired">True when no size can be judged without it.</param>
/// <param name="Meaning">What the value means, with its direction where it has one.</param>
public sealed record FamilyFigure(string Word, Quantity Quantity, bool IsRequired, string Meaning)
{
    /// <summary>Printed symbol.</summary>
    public required string Symbol { get; init; }

    /// <summary>Column of the counting table whose movements are set against it where the rule set does not say; null where it holds as it stands.</summary>
    public Column? JudgedBy { get; init; }

    /// <summary>Direction in which it is measured where the rule set does not say; null where it has no direction.</summary>
    public Measure? Measure { get; init; }
}
