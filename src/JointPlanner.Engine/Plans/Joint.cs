using JointPlanner.Engine.Bases;

namespace JointPlanner.Engine.Plans;

/// <summary>An expansion joint between two bodies: a deck end and another deck end, or a deck end and an abutment's backwall.</summary>
public sealed record Joint
{
    /// <summary>Id in the plan.</summary>
    public required string Id { get; init; }
    /// <summary>What the drawing calls it.</summary>
    public string Mark { get; init; } = "";
    /// <summary>Id of the body whose face is at the smaller station: a segment or a support.</summary>
    public required string Near { get; init; }
    /// <summary>Id of the body ahead.</summary>
    public required string Far { get; init; }
    /// <summary>Skew: angle between the joint line and the line square to the deck axis, rad, signed.</summary>
    public double Skew { get; init; }
    /// <summary>Temperature of the structure at which the joint is expected to be set, °C.</summary>
    public required double SettingTemperature { get; init; }
    /// <summary>One standard deviation of the structure temperature as it will be measured, K.</summary>
    public double TemperatureUncertainty { get; init; }
    /// <summary>One standard deviation of the measured gap, m.</summary>
    public double MeasureUncertainty { get; init; }
    /// <summary>One standard deviation of the movement still to come, m.</summary>
    public double RemainingUncertainty { get; init; }
    /// <summary>Age of the near deck at setting, s; null where it does not shorten.</summary>
    public double? NearAge { get; init; }
    /// <summary>Age of the far deck at setting, s; null where it does not shorten.</summary>
    public double? FarAge { get; init; }
    /// <summary>Least deck age at which the joint may be set, s; null for none.</summary>
    public double? LeastAge { get; init; }
    /// <summary>The designer's choice of family; empty for the best that fits.</summary>
    public string ChosenFamily { get; init; } = "";
    /// <summary>The designer's choice of size by name; empty for the smallest that fits.</summary>
    public string ChosenSize { get; init; } = "";
    /// <summary>Why the designer chose so.</summary>
    public string ChoiceReason { get; init; } = "";
}

/// <summary>A movement of a joint by a cause that is not computed, given by the designer with its source.</summary>
/// <param name="Id">Id in the plan.</param>
/// <param name="Joint">Joint.</param>
/// <param name="Cause">Cause.</param>
/// <param name="OpensBy">How far it opens the joint along the deck, m, ≥ 0.</param>
/// <param name="ClosesBy">How far it closes the joint along the deck, m, ≥ 0.</param>
/// <param name="Source">Where it comes from, or why none acts where both are zero.</param>
public sealed record GivenMovement(string Id, string Joint, Cause Cause, double OpensBy, double ClosesBy, string Source);

/// <summary>Rows of the setting table.</summary>
public sealed record SettingTableRequest
{
    /// <summary>Lowest temperature row, °C; null for the lowest effective temperature.</summary>
    public double? From { get; init; }
    /// <summary>Highest temperature row, °C; null for the highest.</summary>
    public double? To { get; init; }
    /// <summary>Step between rows, K.</summary>
    public double Step { get; init; } = 5;
    /// <summary>Further deck ages to tabulate, s, beside that of each joint's setting.</summary>
    public System.Collections.Immutable.ImmutableArray<double> Ages { get; init; } = [];
}
