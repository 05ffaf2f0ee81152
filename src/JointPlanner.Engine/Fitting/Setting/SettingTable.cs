using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>Openings to set by temperature and deck age, for one joint and the size chosen. Openings are normal to the joint; along the road = normal / cos β.</summary>
/// <param name="Joint">Id of the joint.</param>
/// <param name="Rate">k = Σα·L·cos β, how much the normal opening closes per degree of warming, m/K, without factor; negative where warming opens.</param>
/// <param name="Min">Lowest temperature at which a value is given, °C.</param>
/// <param name="Max">Highest, °C.</param>
/// <param name="LeastAge">Least deck age at which the joint may be set, s; null for none.</param>
/// <param name="Ages">Deck ages tabulated, s; one null entry where age plays no part.</param>
/// <param name="Rows">Rows by age, then temperature.</param>
public sealed record SettingTable(
    string Joint, Number Rate, Number Min, Number Max, double? LeastAge, ImmutableArray<double?> Ages, ImmutableArray<SettingRow> Rows);

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
    double Temperature, double? DeckAge, SettingWindow? Window, Number? Set, Number? Minus, Number? Plus, Number? Reserve, Finding? Refusal);

/// <summary>Least and greatest normal opening that may be set, and what governs each end.</summary>
/// <param name="Least">G_lo, m.</param>
/// <param name="Greatest">G_hi, m; less than G_lo when nothing fits.</param>
/// <param name="LeastBy">Limit that governs the lower end.</param>
/// <param name="GreatestBy">Limit that governs the upper end.</param>
public sealed record SettingWindow(Number Least, Number Greatest, Limit LeastBy, Limit GreatestBy)
{
    /// <summary>True when nothing fits at this temperature and age.</summary>
    public bool IsEmpty => Least.Value > Greatest.Value;
}
