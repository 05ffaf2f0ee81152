namespace JointPlanner.Pdf;

/// <summary>A line of a calculation step. A line wider than the page breaks before an operator.</summary>
/// <param name="Left">What stands before the relation sign; null on the lines that carry on.</param>
/// <param name="Relation">The sign: =, ≤, ≈; empty for none.</param>
/// <param name="Right">What stands after it.</param>
public sealed record FormulaLine(MathNode? Left, string Relation, MathNode Right)
{
    /// <summary>The line as text.</summary>
    public string Linear => (Left is null ? "" : Left.Linear + " ") + (Relation.Length == 0 ? "" : Relation + " ") + Right.Linear;
}
