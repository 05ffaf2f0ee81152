using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A rule that looks at several fields of a plan together.</summary>
public abstract class PlanRule
{
    /// <summary>Every rule. What a rule finds broken the rules after it do not judge.</summary>
    public static readonly ImmutableArray<PlanRule> All =
    [
        new SupportsInOrder(), new SegmentsInOrder(), new SpansAreUsual(), new BearingsUnderTheirSegment(), new PadsWhereTheyBelong(),
        new LayersAreWhole(), new ColumnsBuiltIn(), new ProfilesAreWhole(), new TrafficIsWhole(),
        new JointsBetweenTwoBodies(), new OneJointAtAFace(), new DeckIsHeld(), new DevelopmentRises(), new ConcreteFitsItsDeck(), new DeckAgesAreGiven(),
        new BearingSettingsAreGiven(), new SettingNotBeforeLeastAge(), new ClimateInOrder(), new MovementsAreNotComputedToo(), new SettingTableHasRows(),
    ];

    /// <summary>Where the plan does not keep this rule.</summary>
    public abstract IEnumerable<Breach> Breaches(PlanUnderCheck check);
}
