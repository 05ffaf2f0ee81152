using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>One step in a reader's units, ready to be laid out on a console, a screen or a sheet.</summary>
public sealed record PrintedStep
{
    /// <summary>The number by which later steps refer to it: its place in the calculation, counted from 1.</summary>
    public required int Number { get; init; }
    /// <summary>Symbol of the value.</summary>
    public required string Symbol { get; init; }
    /// <summary>What the value is, in words.</summary>
    public required string Meaning { get; init; }
    /// <summary>Result key; empty for an intermediate value.</summary>
    public required string Key { get; init; }
    /// <summary>The formula's right-hand side in symbols; null where no formula was used.</summary>
    public Notation? Formula { get; init; }
    /// <summary>The same with the printed values of earlier steps.</summary>
    public Notation? Substituted { get; init; }
    /// <summary>Terms of a sum or extreme that is too long for a line; empty otherwise.</summary>
    public ImmutableArray<ValueMark> Terms { get; init; } = [];
    /// <summary>The value with the digits its kind wants; a given value may show more, so that it stands in full.</summary>
    public required ValueMark Result { get; init; }
    /// <summary>The value as later steps use it, where they need more digits; null otherwise.</summary>
    public ValueMark? CarriedOn { get; init; }
    /// <summary>Where it comes from, a sentence.</summary>
    public required string Origin { get; init; }
    /// <summary>What a reader gets from the printed digits, where they do not suffice for the result; null where they do.</summary>
    public string? Shortfall { get; init; }
    /// <summary>Candidates of a search in order of trying; empty otherwise.</summary>
    public ImmutableArray<Candidate> Candidates { get; init; } = [];
    /// <summary>True when the formula or value is held from memory.</summary>
    public bool IsFromMemory { get; init; }
    /// <summary>True when nobody gave the value and a stated default stands in.</summary>
    public bool IsDefault { get; init; }
}
