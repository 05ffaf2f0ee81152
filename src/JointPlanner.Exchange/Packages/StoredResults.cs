using System.Collections.Immutable;

namespace JointPlanner.Exchange.Packages;

/// <summary>Results of one calculation as they are stored and signed: SI, shortest digits that read back the same. What was issued is read from here and never computed anew.</summary>
/// <param name="Schema">What this file is: results/1.</param>
/// <param name="Engine">Version of the program that computed.</param>
/// <param name="Package">SHA-256 of the package that was computed.</param>
/// <param name="Values">Every result by key, in order of making.</param>
/// <param name="Joints">Choice and setting tables of each joint.</param>
/// <param name="Findings">What a person must know.</param>
/// <param name="Day">What holds for every joint on the day of setting; null where no joint is set by these results.</param>
public sealed record StoredResults(
    string Schema, string Engine, string Package, ImmutableArray<StoredValue> Values, ImmutableArray<StoredJoint> Joints, ImmutableArray<StoredFinding> Findings,
    StoredDay? Day = null);

/// <summary>What holds for every joint on the day of setting.</summary>
/// <param name="Units">Word of the units in which the sheet is printed: metric or us.</param>
/// <param name="UseWithin">How long after the issue joints may be set by these results, s.</param>
/// <param name="Methods">Methods of measuring; each joint has a table for each of them.</param>
/// <param name="Points">Points that are measured, with their weights in the mean temperature; empty for one mean temperature.</param>
public sealed record StoredDay(string Units, double UseWithin, ImmutableArray<StoredMethod> Methods, ImmutableArray<StoredPoint> Points);

/// <summary>A method of measuring the temperature of the structure.</summary>
/// <param name="Id">Id of the method, by which its tables go.</param>
/// <param name="Name">What people call it.</param>
/// <param name="TemperatureUncertainty">u(T), one standard deviation, K, fixed at issue.</param>
/// <param name="Source">Where the uncertainty comes from.</param>
public sealed record StoredMethod(string Id, string Name, double TemperatureUncertainty, string Source);

/// <summary>A point that is measured.</summary>
/// <param name="Id">Id of the point.</param>
/// <param name="Name">Where it lies.</param>
/// <param name="Weight">Its weight in the mean, on any scale.</param>
public sealed record StoredPoint(string Id, string Name, double Weight);

/// <summary>One result.</summary>
/// <param name="Key">Path of plan ids and fixed words.</param>
/// <param name="Quantity">Kind of quantity.</param>
/// <param name="Value">Value in SI, temperature readings in °C.</param>
/// <param name="Formula">Id of the formula that made it; solved, search, table or given where none did.</param>
public sealed record StoredValue(string Key, string Quantity, double Value, string Formula);

/// <summary>What was chosen for a joint, and how it is set.</summary>
/// <param name="Joint">Id of the joint.</param>
/// <param name="Mark">What the drawing calls it; empty for nothing.</param>
/// <param name="Family">Family chosen; empty for none.</param>
/// <param name="Size">Name of the size; empty for none.</param>
/// <param name="Skew">Skew, rad; openings are normal, along the road = normal / cos(skew).</param>
/// <param name="Limits">Bounds on the gap.</param>
/// <param name="Tables">Setting tables: that of the sheet, and one for each method of measuring on the day.</param>
/// <param name="ToCome">Movement still to come, by column and deck age.</param>
public sealed record StoredJoint(
    string Joint, string Mark, string Family, string Size, double Skew, ImmutableArray<StoredLimit> Limits, ImmutableArray<StoredTable> Tables,
    ImmutableArray<StoredMovement> ToCome);

/// <summary>Movement still to come after setting, by one column of the counting table; factored, normal to the joint.</summary>
/// <param name="JudgedBy">The column.</param>
/// <param name="Swings">By temperature, one for each segment.</param>
/// <param name="ClosesBy">By everything else the joint closes by this, m.</param>
/// <param name="OpensBy">By everything else the joint opens by this, m.</param>
/// <param name="DeckAge">Deck age at setting, s; null where it plays no part.</param>
public sealed record StoredMovement(string JudgedBy, ImmutableArray<StoredSwing> Swings, double ClosesBy, double OpensBy, double? DeckAge = null);

/// <summary>How the temperature of one segment moves the joint.</summary>
/// <param name="Rate">How much the normal opening closes per degree of warming, with the column's factor, m/K.</param>
/// <param name="Min">Lowest temperature with its safety degrees, °C.</param>
/// <param name="Max">Highest, °C.</param>
public sealed record StoredSwing(double Rate, double Min, double Max);

/// <summary>A bound on the gap.</summary>
/// <param name="Name">The rule in a few words.</param>
/// <param name="Value">The bound, m.</param>
/// <param name="Bound">lower or upper.</param>
/// <param name="Measure">normal or along.</param>
/// <param name="JudgedBy">Column of the counting table; null for a bound that holds on the day of setting.</param>
public sealed record StoredLimit(string Name, double Value, string Bound, string Measure, string? JudgedBy = null);

/// <summary>A setting table.</summary>
/// <param name="Method">Id of the method by which the temperature is measured; empty for the table of the sheet.</param>
/// <param name="TemperatureUncertainty">One standard deviation of the temperature so measured, K.</param>
/// <param name="Rate">k, how much the normal opening closes per degree of warming, m/K.</param>
/// <param name="Min">Lowest temperature at which a value is given, °C.</param>
/// <param name="Max">Highest, °C.</param>
/// <param name="Rows">Rows by age, then temperature.</param>
/// <param name="LeastAge">Least deck age at which the joint may be set, s; null for none.</param>
public sealed record StoredTable(
    string Method, double TemperatureUncertainty, double Rate, double Min, double Max, ImmutableArray<StoredRow> Rows, double? LeastAge = null);

/// <summary>A row of a setting table; openings normal to the joint, m.</summary>
/// <param name="Temperature">Structure temperature, °C.</param>
/// <param name="DeckAge">Deck age, s; null where it plays no part.</param>
/// <param name="Least">G_lo; null where there is no window.</param>
/// <param name="Set">Value to set; null: do not set.</param>
/// <param name="Greatest">G_hi; null where there is no window.</param>
/// <param name="Minus">How much smaller it may be made; null where no value is given.</param>
/// <param name="Plus">How much larger.</param>
/// <param name="Reserve">U, m.</param>
/// <param name="LeastBy">Name of the limit that governs the lower end; null where there is no window.</param>
/// <param name="GreatestBy">Name of the limit that governs the upper end.</param>
/// <param name="Refusal">Why no value is given; null where one is.</param>
/// <param name="Along">The same opening measured along the road; null where the joint is square, and where only measuring normal to it leaves a tolerance.</param>
public sealed record StoredRow(
    double Temperature, double? DeckAge = null, double? Least = null, double? Set = null, double? Greatest = null, double? Minus = null, double? Plus = null,
    double? Reserve = null, string? LeastBy = null, string? GreatestBy = null, StoredFinding? Refusal = null, StoredOpening? Along = null);

/// <summary>An opening to set, rounded in its own direction of measure.</summary>
/// <param name="Set">Value to set, m.</param>
/// <param name="Minus">How much smaller it may be made, m.</param>
/// <param name="Plus">How much larger, m.</param>
public sealed record StoredOpening(double Set, double Minus, double Plus);

/// <summary>Something a person must know; the sentence holds {0}, {1} … where numbers go.</summary>
/// <param name="Id">Permanent id of the sentence.</param>
/// <param name="Severity">note, warning, blocks-issue or error.</param>
/// <param name="Path">Path in the plan.</param>
/// <param name="Sentence">The sentence.</param>
/// <param name="Numbers">Its numbers in SI.</param>
public sealed record StoredFinding(string Id, string Severity, string Path, string Sentence, ImmutableArray<StoredNumber> Numbers);

/// <summary>A number of a sentence.</summary>
/// <param name="Quantity">Kind of quantity.</param>
/// <param name="Value">Value in SI.</param>
public sealed record StoredNumber(string Quantity, double Value);
