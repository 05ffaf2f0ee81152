using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.HandChecks;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine;

/// <summary>Everything that came out of one plan.</summary>
public sealed record Result
{
    /// <summary>The plan.</summary>
    public required Plan Plan { get; init; }
    /// <summary>How each cause counts, all layers laid over each other.</summary>
    public required CountingTable Counting { get; init; }
    /// <summary>What each segment still shortens by after any setting state.</summary>
    public required RemainingStrains Strains { get; init; }
    /// <summary>Per segment.</summary>
    public ImmutableArray<SegmentResult> Segments { get; init; } = [];
    /// <summary>Per joint.</summary>
    public ImmutableArray<JointResult> Joints { get; init; } = [];
    /// <summary>Travel of the bearing lines over which the deck moves.</summary>
    public ImmutableArray<BearingTravel> Bearings { get; init; } = [];
    /// <summary>What each cause computed by the frame does to each bearing line.</summary>
    public ImmutableArray<BearingMovement> BearingMovements { get; init; } = [];
    /// <summary>Sections under vertical temperature differences, warmer above and cooler above.</summary>
    public ImmutableArray<(string Segment, SectionState Warm, SectionState Cool)> Gradients { get; init; } = [];
    /// <summary>Force by which each holding line holds the deck; empty where nothing restrains it.</summary>
    public ImmutableArray<RestraintForce> Restraints { get; init; } = [];
    /// <summary>The solved model; null where it could not be solved.</summary>
    public ModelListing? Model { get; init; }
    /// <summary>Solved numbers beside their elementary checks.</summary>
    public ImmutableArray<HandCheck> HandChecks { get; init; } = [];
    /// <summary>Steps in order of making.</summary>
    public required IReadOnlyList<Step> Steps { get; init; }
    /// <summary>What a person must know.</summary>
    public required IReadOnlyList<Finding> Findings { get; init; }
    /// <summary>Values held from memory that this result rests on; each is to be confirmed by an owner before anything is issued.</summary>
    public ImmutableArray<Provenance> MemoryValues { get; init; } = [];

    /// <summary>True when nothing but unconfirmed memory values stands in the way of issuing.</summary>
    public bool CanBeIssued => Findings.All(f => f.Severity < Severity.BlocksIssue);

    /// <summary>Results by key: the last step made under each.</summary>
    public IReadOnlyDictionary<string, Step> ByKey() =>
        Steps.Where(s => s.Key.Length > 0).GroupBy(s => s.Key).ToDictionary(g => g.Key, g => g.Last());
}

/// <summary>One segment: its temperatures and where it stands still.</summary>
/// <param name="Segment">The segment.</param>
/// <param name="Temperature">Temperatures and coefficient of expansion.</param>
/// <param name="ZeroMovementPoint">Station, m; null where every point moves.</param>
/// <param name="Section">What its section is and does; null where it is not described.</param>
public sealed record SegmentResult(Segment Segment, SegmentTemperature Temperature, Number? ZeroMovementPoint, SectionResult? Section);

/// <summary>One joint: what moves it, what fits it, how it is set.</summary>
/// <param name="Joint">The joint.</param>
/// <param name="ExpansionLengths">Closing per unit strain of each segment that moves it, m.</param>
/// <param name="Movements">Movement table, without factors.</param>
/// <param name="NotIncluded">Causes that are neither computed nor given and that the basis does not leave out.</param>
/// <param name="NotCounted">Causes that are left out by rule although they move the joint.</param>
/// <param name="Demand">Demand at the joint's own setting state.</param>
/// <param name="Fit">What fits; null without an owner's rule set.</param>
/// <param name="Table">Setting table of the size chosen; null where none is.</param>
public sealed record JointResult(
    Joint Joint, ImmutableArray<(Segment Segment, Number Length)> ExpansionLengths, ImmutableArray<CauseMovement> Movements,
    ImmutableArray<Cause> NotIncluded, ImmutableArray<CauseMovement> NotCounted, JointDemand Demand, JointFit? Fit, SettingTable? Table);

/// <summary>Force of a bearing line on the deck, positive up-station, N.</summary>
/// <param name="Bearing">Id of the line.</param>
/// <param name="Hot">At the highest temperature, from setting, before any shortening.</param>
/// <param name="Cold">At the lowest temperature with all shortening.</param>
public sealed record RestraintForce(string Bearing, Number Hot, Number Cold);

/// <summary>The frame as solved: enough to type it into any frame program.</summary>
/// <param name="Model">Nodes, members, springs.</param>
/// <param name="Residual">Largest out-of-balance of all states, relative to the largest load.</param>
/// <param name="PivotRatio">Smallest pivot relative to its diagonal entry.</param>
/// <param name="RefinementChange">Largest change by one refinement step, relative.</param>
/// <param name="States">What acted on it beside a unit strain of each segment and a unit of each movement under traffic: cause, state and the numbers of it.</param>
public sealed record ModelListing(
    FrameModel Model, double Residual, double PivotRatio, double RefinementChange, ImmutableArray<(Cause Cause, string State, ImmutableArray<Number> Numbers)> States);
