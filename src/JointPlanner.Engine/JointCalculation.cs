using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine;

/// <summary>One joint from its expansion lengths to its setting table.</summary>
internal sealed class JointCalculation(Plan plan, CountingTable counting, Derivation derivation)
{
    public JointResult Of(
        Joint joint, ImmutableArray<(Segment Segment, Number Length)> lengths, Func<string, SegmentTemperature> temperatureOf)
    {
        var demands = new JointDemands(plan, joint, lengths, temperatureOf);
        var demand = demands.At(null, derivation);
        var set = derivation.Given($"joints/{joint.Id}/setting/temperature", "T_set", "structure temperature at setting, as expected",
            Quantity.Temperature, joint.SettingTemperature);
        var movements = JointMovements.Of(demand, set, derivation);
        var missing = IncludedCauses.Missing(plan, joint, [.. lengths.Select(l => l.Segment)], counting);
        if (!missing.IsEmpty)
            derivation.Note(new("causes-not-included", Severity.BlocksIssue, $"joints/{joint.Id}",
                $"Not included at joint {joint.Id}: {string.Join(", ", missing.Select(Keys.Words))}. Give each as a movement with its source, zero where none acts and why."));
        return new JointResult(joint, lengths, movements, missing, NotCounted(movements), demand, null, null);
    }

    private ImmutableArray<CauseMovement> NotCounted(ImmutableArray<CauseMovement> movements) =>
        [.. movements.Where(m => counting[m.Cause, Column.GapService] is NotCounted && m.OpensBy.Value + m.ClosesBy.Value > 0)];
}
