using JointPlanner.Engine.Bases;

namespace JointPlanner.Engine;

/// <summary>What the owner brings to a calculation.</summary>
/// <param name="Rules">The owner's rule set.</param>
/// <param name="SettingStep">Step to which set values are rounded where the rules state none, m.</param>
public sealed record Owner(OwnerRuleSet Rules, double SettingStep);
