using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>Tries every family and size that the owner's rules allow at one joint and takes one.</summary>
public static class JointFitting
{
    /// <summary>The fit of one joint at its expected setting temperature, with the allowance for the doubt about that temperature on both ends.</summary>
    /// <param name="demand">What the joint must take when set at its own deck age.</param>
    /// <param name="rules">The owner's rules: families in order of preference, sizes from small to large.</param>
    /// <param name="counting">How each cause counts: the code's table with the owner's and the designer's entries over it.</param>
    /// <param name="code">The code's bounds on gaps.</param>
    /// <param name="derivation">Where steps and findings go.</param>
    public static JointFit Of(JointDemand demand, OwnerRuleSet rules, CountingTable counting, CodeGapLimits code, Derivation derivation)
    {
        var joint = demand.Joint;
        var temperature = derivation.Given($"joints/{joint.Id}/setting/temperature", "T_set", "temperature of the structure at setting",
            Quantity.Temperature, joint.SettingTemperature);
        var movements = new CountedMovements(demand, counting, Occasion.Sizing, temperature, derivation);
        ImmutableArray<FamilyFit> ranked = [.. rules.Families.Select(f => FamilyTrial.Of(f, rules, code, movements)).OrderBy(f => f.Best is null ? 1 : 0)];
        var (chosen, byDesigner) = JointChoice.Among(ranked, demand, derivation);
        foreach (var finding in LeftOutFindings.Of(joint.Id, (chosen ?? ranked.SelectMany(f => f.Sizes).FirstOrDefault())?.Movements ?? []))
            derivation.Note(finding);
        if (chosen is not null && FitFindings.CodeLimitsReplaced(joint.Id, chosen, rules, code) is { } replaced) derivation.Note(replaced);
        return new JointFit(ranked, chosen, byDesigner);
    }
}
