using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>One row: the window at one temperature and deck age, the value to set, and how far off it may be.</summary>
/// <param name="Temperature">Structure temperature, °C.</param>
/// <param name="DeckAge">Deck age, s; null where it plays no part.</param>
/// <param name="Window">The window; null outside the temperatures of the table or below the least age.</param>
/// <param name="Set">Recommended normal opening after rounding, m; null: do not set.</param>
/// <param name="Minus">How much smaller it may be made, m, after the reserve U, rounded toward zero.</param>
/// <param name="Plus">How much larger, likewise.</param>
/// <param name="Reserve">U, m.</param>
/// <param name="Refusal">Why no value is given; null where one is.</param>
public sealed record SettingRow(
    double Temperature, double? DeckAge, SettingWindow? Window, Number? Set, Number? Minus, Number? Plus, Number? Reserve, Finding? Refusal)
{
    /// <summary>The value by the rule before rounding, m; null where none was computed.</summary>
    public Number? ByRule { get; init; }

    /// <summary>Step to which the value was rounded, m; null where no value is given.</summary>
    public double? Step { get; init; }

    /// <summary>True where no step of a rule or tape falls inside the window, so that the value must be made with a gauge.</summary>
    public bool ByGauge { get; init; }

    /// <summary>The middle of the window, rounded, shown beside an owner's rule that falls outside; null elsewhere and where not even it may be used.</summary>
    public Number? MidWindow { get; init; }

    /// <summary>The same opening measured along the road, rounded there with tolerances of its own; null where no value is given, or where only measuring normal to the joint leaves a tolerance.</summary>
    public RoundedOpening? Along { get; init; }

    /// <summary>The smaller of both tolerances, for those who print one; null where no value is given.</summary>
    public double? Both => Minus is { } minus && Plus is { } plus ? Math.Min(minus.Value, plus.Value) : null;
}

/// <summary>An opening to set in one direction of measure, after rounding.</summary>
/// <param name="Set">Recommended opening, m.</param>
/// <param name="Minus">How much smaller it may be made, m.</param>
/// <param name="Plus">How much larger, m.</param>
/// <param name="Step">Step to which it was rounded, m.</param>
public sealed record RoundedOpening(Number Set, Number Minus, Number Plus, double Step);
