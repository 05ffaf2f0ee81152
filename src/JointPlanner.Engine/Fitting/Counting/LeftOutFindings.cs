using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Counting;

/// <summary>What is said about movements that do not count.</summary>
internal static class LeftOutFindings
{
    /// <summary>One finding per cause and column: a silent entry stops issue, one left out by rule is printed beside the result.</summary>
    public static IEnumerable<Finding> Of(string joint, IEnumerable<ColumnMovement> movements) => movements
        .SelectMany(m => m.LeftOut)
        .GroupBy(p => (p.Cause, p.Column, p.IsSilent))
        .Select(g => Of(joint, g.First() with { ClosesBy = g.Sum(p => p.ClosesBy), OpensBy = g.Sum(p => p.OpensBy) }));

    private static Finding Of(string joint, LeftOutPart part)
    {
        var what = $"{Keys.Said(part.Cause)} (closes by {{0}}, opens by {{1}} along the deck)";
        return part.IsSilent
            ? new Finding("counting-silent", Severity.BlocksIssue, $"joints/{joint}",
                $"The basis does not say how {what} counts for {Keys.Said(part.Column)}. It is left out until you answer that entry of the counting table.",
                [(Quantity.Movement, part.ClosesBy), (Quantity.Movement, part.OpensBy)])
            : new Finding("counting-left-out", Severity.Note, $"joints/{joint}",
                $"By rule, {what} is not counted for {Keys.Said(part.Column)}.",
                [(Quantity.Movement, part.ClosesBy), (Quantity.Movement, part.OpensBy)]);
    }
}
