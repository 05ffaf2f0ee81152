using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Comparing;

/// <summary>A text that differs between two calculations.</summary>
/// <param name="Path">Path in the plan or rule set, or empty.</param>
/// <param name="Name">What people call it.</param>
/// <param name="Before">Text before; null where nothing stood there.</param>
/// <param name="After">Text after; null where nothing stands there now.</param>
public sealed record TextDifference(string Path, string Name, string? Before, string? After);

/// <summary>How two numbers of one kind stand to each other.</summary>
public enum Sameness
{
    /// <summary>The same bits.</summary>
    Same,
    /// <summary>Not the same bits, but no further apart than two machines may compute them.</summary>
    WithinRounding,
    /// <summary>Another number.</summary>
    Changed,
}

/// <summary>A result that differs.</summary>
/// <param name="Key">Its key.</param>
/// <param name="Meaning">What it is, in the words of its step; the key where no step says it.</param>
/// <param name="Quantity">What kind of number it is.</param>
/// <param name="Before">SI value before; null where there was none.</param>
/// <param name="After">SI value after; null where there is none now.</param>
public sealed record ResultDifference(string Key, string Meaning, Quantity Quantity, double? Before, double? After);

/// <summary>A setting table that differs.</summary>
/// <param name="Joint">Id of the joint.</param>
/// <param name="Method">How the temperature is measured; empty for the table of the sheet.</param>
/// <param name="Rows">Rows that stand in either table.</param>
/// <param name="Differing">Rows of which something differs by more than rounding, or that only one table has.</param>
/// <param name="Largest">The row whose set value moved most, with its value before and after; null where no row has both.</param>
public sealed record TableDifference(string Joint, string Method, int Rows, int Differing, SetDifference? Largest);

/// <summary>A set value that moved.</summary>
/// <param name="Temperature">Of the row, °C.</param>
/// <param name="DeckAge">Of the row, s; null where it plays no part.</param>
/// <param name="Before">Normal opening before, m.</param>
/// <param name="After">Normal opening after, m.</param>
public sealed record SetDifference(double Temperature, double? DeckAge, double Before, double After);

/// <summary>A finding that came, went or now says something else.</summary>
/// <param name="Before">As it was; null where it is new.</param>
/// <param name="After">As it is; null where it is gone.</param>
public sealed record FindingDifference(StoredFinding? Before, StoredFinding? After);

/// <summary>Everything in which two frozen calculations differ.</summary>
public sealed record Differences
{
    /// <summary>Inputs, by path in the plan.</summary>
    public ImmutableArray<TextDifference> Inputs { get; init; } = [];
    /// <summary>Code edition, program, units, climate record.</summary>
    public ImmutableArray<TextDifference> Basis { get; init; } = [];
    /// <summary>The owner's rules, by path in the rule set.</summary>
    public ImmutableArray<TextDifference> OwnerRules { get; init; } = [];
    /// <summary>Confirmations of values held from memory, by the value's id.</summary>
    public ImmutableArray<TextDifference> Confirmations { get; init; } = [];
    /// <summary>What is chosen for each joint.</summary>
    public ImmutableArray<TextDifference> Choices { get; init; } = [];
    /// <summary>Results that changed by more than rounding, came or went.</summary>
    public ImmutableArray<ResultDifference> Results { get; init; } = [];
    /// <summary>Setting tables with at least one row that differs.</summary>
    public ImmutableArray<TableDifference> Tables { get; init; } = [];
    /// <summary>Findings.</summary>
    public ImmutableArray<FindingDifference> Findings { get; init; } = [];
    /// <summary>How many numbers were compared.</summary>
    public int Compared { get; init; }
    /// <summary>How many of them differ in bits and are the same within rounding.</summary>
    public int WithinRounding { get; init; }

    /// <summary>True where no result, choice, table or finding differs by more than rounding.</summary>
    public bool SameResults => Results.IsEmpty && Choices.IsEmpty && Tables.IsEmpty && Findings.IsEmpty;

    /// <summary>True where nothing that goes in differs.</summary>
    public bool SameInputs => Inputs.IsEmpty && Basis.IsEmpty && OwnerRules.IsEmpty && Confirmations.IsEmpty;
}
