using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Bases;

/// <summary>The counting table in force: the code's, under the owner's rules, under the designer's answers.</summary>
public static class CountingLayers
{
    /// <summary>All layers laid over each other.</summary>
    public static CountingTable Of(Plan plan, CodeBasis basis, OwnerRuleSet? rules)
    {
        var table = basis.Counting(DeckTemperatures.SafetyOf(plan, basis)).Under(rules?.Counting ?? CountingTable.Empty);
        foreach (var answer in plan.Basis.Answers)
        {
            var source = Provenance.By(answer.Source);
            table = table.With(answer.Cause, answer.Column,
                answer.Factor is { } factor ? new Counted(factor) { Source = source } : new NotCounted { Source = source });
        }
        return table;
    }
}
