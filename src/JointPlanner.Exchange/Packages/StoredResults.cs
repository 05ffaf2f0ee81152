using System.Collections.Immutable;

namespace JointPlanner.Exchange.Packages;

/// <summary>Results of one calculation as they are stored and signed: SI, shortest digits that read back the same. What was issued is read from here and never computed anew.</summary>
/// <param name="Schema">What this file is: results/1.</param>
/// <param name="Engine">Version of the program that computed.</param>
/// <param name="Package">SHA-256 of the package that was computed.</param>
/// <param name="Values">Every result by key, in order of making.</param>
/// <param name="Joints">Choice and setting tables of each joint.</param>
/// <param name="Findings">What a person must know.</param>
public sealed record StoredResults(
    string Schema, string Engine, string Package, ImmutableArray<StoredValue> Values, ImmutableArray<StoredJoint> Joints, ImmutableArray<StoredFinding> Findings);

/// <summary>One result.</summary>
/// <param name="Key">Path of plan ids and fixed words.</param>
/// <param name="Quantity">Kind of quantity.</param>
/// <param name="Value">Value in SI, temperature readings in °C.</param>
/// <param name="Formula">Id of the formula that made it; solved, search, table or given where none did.</param>
public sealed record StoredValue(string Key, string Quantity, double Value, string Formula);

/// <summary>What was chosen for a joint, and how it is set.</summary>
/// <param name="Joint">Id of the joint.</param>
/// <param name="Family">Family chosen; empty for none.</param>
/// <param name="Size">Name of the size; empty for none.</param>
/// <param name="Skew">Skew, rad; openings are normal, along the road = normal / cos(skew).</param>
/// <param name="Limits">Bounds on the gap.</param>
/// <param name="Tables">Setting tables: that of the sheet, and one for each method of measuring on the day.</param>
public sealed record StoredJoint(
    string Joint, string Family, string Size, double Skew, ImmutableArray<StoredLimit> Limits, ImmutableArray<StoredTable> Tables);

/// <summary>A bound on the gap.</summary>
/// <param name="Name">The rule in a few words.</param>
/// <param name="Value">The bound, m.</param>
/// <param name="Bound">lower or upper.</param>
/// <param name="Measure">normal or along.</param>
/// <param name="JudgedBy">Column of the counting table; null for a bound that holds on the day of setting.</param>
public sealed record StoredLimit(string Name, double Value, string Bound, string Measure, string? JudgedBy);

/// <summary>A setting table.</summary>
/// <param name="Method">How the temperature is measured; empty for the table of the sheet.</param>
/// <param name="TemperatureUncertainty">One standard deviation of the temperature so measured, K.</param>
/// <param name="Rate">k, how much the normal opening closes per degree of warming, m/K.</param>
/// <param name="Min">Lowest temperature at which a value is given, °C.</param>
/// <param name="Max">Highest, °C.</param>
/// <param name="LeastAge">Least deck age at which the joint may be set, s; null for none.</param>
/// <param name="Rows">Rows by age, then temperature.</param>
public sealed record StoredTable(
    string Method, double TemperatureUncertainty, double Rate, double Min, double Max, double? LeastAge, ImmutableArray<StoredRow> Rows);

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
public sealed record StoredRow(
    double Temperature, double? DeckAge, double? Least, double? Set, double? Greatest, double? Minus, double? Plus, double? Reserve,
    string? LeastBy, string? GreatestBy, StoredFinding? Refusal);

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
