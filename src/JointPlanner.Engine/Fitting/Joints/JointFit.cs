using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>All families tried at one joint, best first, and the one that is taken.</summary>
/// <param name="Families">Families in order of rank: those that fit before those that do not.</param>
/// <param name="Chosen">The size taken: the designer's choice, else the best that fits; null where none fits.</param>
/// <param name="ChosenByDesigner">True when the designer chose it, with a reason.</param>
public sealed record JointFit(ImmutableArray<FamilyFit> Families, SizeFit? Chosen, bool ChosenByDesigner);

/// <summary>One family tried at one joint.</summary>
/// <param name="Family">Family word.</param>
/// <param name="Sizes">Every size tried, from small to large.</param>
/// <param name="Best">The smallest size that fits; null where none does.</param>
/// <param name="Rejection">Why the family is left, as a finding with numbers; null where it fits.</param>
public sealed record FamilyFit(string Family, ImmutableArray<SizeFit> Sizes, SizeFit? Best, Finding? Rejection);

/// <summary>One size tried at one joint.</summary>
/// <param name="Family">Family word.</param>
/// <param name="Size">Name of the size.</param>
/// <param name="Rules">Every rule with value, limit, share used and room left.</param>
/// <param name="Limits">Bounds on the gap, for the setting window.</param>
/// <param name="ReferenceOpening">Normal opening at the owner's reference temperature, where the setting rule wants one, m.</param>
public sealed record SizeFit(
    string Family, string Size, ImmutableArray<RuleCheck> Rules, ImmutableArray<Limit> Limits, Number? ReferenceOpening)
{
    /// <summary>What the joint asks in each column that the size is judged by, counted for sizing: what the rules rest on, and what was left out.</summary>
    public ImmutableArray<ColumnMovement> Movements { get; init; } = [];

    /// <summary>True when every rule holds.</summary>
    public bool Fits => Rules.All(r => r.Holds);

    /// <summary>The first rule that does not hold.</summary>
    public RuleCheck? RejectedBy => Rules.FirstOrDefault(r => !r.Holds);

    /// <summary>The rule with least room left, as a share of its limit.</summary>
    public RuleCheck? Governing => Rules.Where(r => r.Share is not null).MaxBy(r => r.Share);
}

/// <summary>One rule of a family judged at one joint.</summary>
/// <param name="Name">The rule in a few words.</param>
/// <param name="Quantity">Kind of value.</param>
/// <param name="Value">What the joint asks.</param>
/// <param name="Limit">What the rule allows.</param>
/// <param name="Bound">Whether the value must stay above or below.</param>
/// <param name="Measure">Direction of measure for gaps; null where there is none.</param>
/// <param name="JudgedBy">Column judged by; null at installation or where no movement is concerned.</param>
/// <param name="IsAtInstallation">True when it is judged on the day of setting.</param>
/// <param name="Share">Share of the limit used, 0 to 1 when it holds; null where a share has no meaning.</param>
/// <param name="Room">Room left, in the unit of the value, negative when it does not hold.</param>
/// <param name="Source">Clause or owner's rule.</param>
public sealed record RuleCheck(
    string Name, Quantity Quantity, Number Value, Number Limit, Bound Bound, Measure? Measure, Column? JudgedBy, bool IsAtInstallation,
    double? Share, double Room, Provenance Source)
{
    /// <summary>True when the rule holds.</summary>
    public bool Holds => Room >= 0;
}
