using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Bases;

/// <summary>How one cause counts in one column.</summary>
public abstract record CountingEntry
{
    /// <summary>Where the entry comes from; null for silence.</summary>
    public Provenance? Source { get; init; }
}

/// <summary>Counts with a factor on the movement from the setting state; never on the range, never on the gap.</summary>
/// <param name="Factor">The factor.</param>
public sealed record Counted(double Factor) : CountingEntry;

/// <summary>Left out by rule; the movement is printed in mm beside the result it was left out of.</summary>
public sealed record NotCounted : CountingEntry;

/// <summary>The basis says nothing; the designer must answer before anything is issued.</summary>
public sealed record SilentEntry : CountingEntry;

/// <summary>How each cause of movement counts in each judgement. Later layers (owner's rules, the designer's answers) cover earlier ones entry by entry.</summary>
/// <param name="Entries">What is said; anything absent is silence.</param>
public sealed record CountingTable(ImmutableDictionary<(Cause, Column), CountingEntry> Entries)
{
    private static readonly SilentEntry Silence = new();

    /// <summary>A table that says nothing.</summary>
    public static readonly CountingTable Empty = new(ImmutableDictionary<(Cause, Column), CountingEntry>.Empty);

    /// <summary>How the cause counts in the column.</summary>
    public CountingEntry this[Cause cause, Column column] => Entries.GetValueOrDefault((cause, column), Silence);

    /// <summary>This table with another laid over it.</summary>
    public CountingTable Under(CountingTable over) => new(Entries.SetItems(over.Entries));

    /// <summary>This table with one entry set.</summary>
    public CountingTable With(Cause cause, Column column, CountingEntry entry) => new(Entries.SetItem((cause, column), entry));
}
