using JointPlanner.Engine.Bases;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>How a set value is chosen, rounded and guarded.</summary>
/// <param name="Counting">How each cause counts: the code's table with the owner's and the designer's entries over it.</param>
/// <param name="Rule">How the value is chosen within its window.</param>
/// <param name="UncertaintyFactor">k_U: standard deviations in the reserve.</param>
/// <param name="RoundingStep">Step of rounding, m.</param>
public sealed record SettingManner(CountingTable Counting, SettingRule Rule, double UncertaintyFactor, double RoundingStep)
{
    /// <summary>The manner of an owner's rule set.</summary>
    /// <param name="rules">The rule set.</param>
    /// <param name="counting">The counting table with all layers.</param>
    /// <param name="profileStep">Step of the display profile, for rule sets that give none, m.</param>
    public static SettingManner Of(OwnerRuleSet rules, CountingTable counting, double profileStep) =>
        new(counting, rules.SettingRule, rules.UncertaintyFactor, rules.RoundingStep ?? profileStep);
}
