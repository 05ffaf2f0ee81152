using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Combining;

/// <summary>
/// What one joint must take from its setting state at one deck age: thermal parts that depend on the temperature at setting, and all
/// other parts as closings and openings. Everything along the deck axis; skew turns it into normal movement and racking.
/// </summary>
public sealed record JointDemand
{
    /// <summary>The joint.</summary>
    public required Joint Joint { get; init; }
    /// <summary>Deck age at setting that the remaining creep and shrinkage belong to, s; null where no deck at the joint shortens.</summary>
    public required double? DeckAge { get; init; }
    /// <summary>One part per deck segment whose warming moves the joint.</summary>
    public required ImmutableArray<ThermalPart> Thermal { get; init; }
    /// <summary>Every other cause, unfactored.</summary>
    public required ImmutableArray<OtherPart> Others { get; init; }
    /// <summary>cos β.</summary>
    public required Number CosSkew { get; init; }
    /// <summary>|sin β|.</summary>
    public required Number SinSkew { get; init; }
}

/// <summary>One segment's share in a joint's thermal movement.</summary>
/// <param name="Segment">Id of the segment.</param>
/// <param name="Rate">α·L along the deck, m/K: positive when warming closes the joint.</param>
/// <param name="WindowRate">The same with the larger of the code's α and the best estimate, for the slope of the window, m/K.</param>
/// <param name="Min">Lowest effective temperature with the safety degrees of the chosen format, without setting doubt, °C.</param>
/// <param name="Max">Highest, likewise, °C.</param>
/// <param name="DoubtAllowance">Allowance on both ends for the doubt about the setting temperature when sizing before the day, K.</param>
public sealed record ThermalPart(string Segment, Number Rate, Number WindowRate, Number Min, Number Max, Number DoubtAllowance);

/// <summary>A cause's movement of a joint from its setting state, along the deck, m, both ≥ 0. Closing parts count in closing only, opening parts in opening only.</summary>
/// <param name="Cause">The cause.</param>
/// <param name="OpensBy">Opens by, m.</param>
/// <param name="ClosesBy">Closes by, m.</param>
/// <param name="IsIrreversible">True for what does not come back: creep, shrinkage, prestress, dead load.</param>
public sealed record OtherPart(Cause Cause, Number OpensBy, Number ClosesBy, bool IsIrreversible);
