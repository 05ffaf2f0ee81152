using System.Collections.Immutable;

namespace JointPlanner.Exchange.Printing;

/// <summary>How tightly a piece of notation holds together; a looser piece inside a tighter one is put in brackets.</summary>
public enum Rank
{
    /// <summary>A choice by a comparison.</summary>
    Case,
    /// <summary>A sum or difference, and any negative number.</summary>
    Sum,
    /// <summary>A product or quotient.</summary>
    Product,
    /// <summary>A power.</summary>
    Power,
    /// <summary>A single symbol, number or function with its arguments.</summary>
    Atom,
}

/// <summary>
/// A formula laid out for reading, with symbols or with numbers in their place, independent of where it is shown: one line of text
/// makes fractions with a stroke, a sheet stacks them.
/// </summary>
/// <param name="Rank">How tightly it holds together when written on one line.</param>
public abstract record Notation(Rank Rank);

/// <summary>A symbol; what follows an underscore is its index.</summary>
/// <param name="Text">The symbol as formulas write it.</param>
public sealed record SymbolMark(string Text) : Notation(Rank.Atom);

/// <summary>Words standing in the place of a value.</summary>
/// <param name="Text">The words.</param>
public sealed record Wording(string Text) : Notation(Rank.Atom);

/// <summary>A number with its unit and the step it comes from.</summary>
/// <param name="Number">Digits with sign and power of ten.</param>
/// <param name="Unit">Unit; empty for a plain number.</param>
/// <param name="Step">Printed number of the step it comes from; null for a constant of the formula.</param>
public sealed record ValueMark(string Number, string Unit, int? Step) : Notation(Number.StartsWith('−') ? Rank.Sum : Rank.Atom);

/// <summary>Two pieces with +, − or · between.</summary>
public sealed record Infix(Notation Left, char Sign, Notation Right) : Notation(Sign == '·' ? Rank.Product : Rank.Sum);

/// <summary>A quotient.</summary>
public sealed record Fraction(Notation Above, Notation Below) : Notation(Rank.Product);

/// <summary>A whole power.</summary>
public sealed record Raised(Notation Base, int Exponent) : Notation(Rank.Power);

/// <summary>A power with any exponent.</summary>
public sealed record RaisedBy(Notation Base, Notation Exponent) : Notation(Rank.Power);

/// <summary>A square root.</summary>
public sealed record Radical(Notation Under) : Notation(Rank.Atom);

/// <summary>A function with its arguments in brackets: cos, sin, exp, ln, max, min, round, Σ.</summary>
public sealed record Call(string Name, ImmutableArray<Notation> Arguments) : Notation(Rank.Atom);

/// <summary>Both sides of a choice, with symbols: one where the comparison holds, the other where it does not.</summary>
public sealed record Alternatives(Notation Left, char Sign, Notation Right, Notation Then, Notation Otherwise) : Notation(Rank.Case);

/// <summary>A choice that was made, with numbers: the comparison that holds and the side that applies.</summary>
public sealed record Decision(Notation Left, char Sign, Notation Right, Notation Taken) : Notation(Rank.Case);
