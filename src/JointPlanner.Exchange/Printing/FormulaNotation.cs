using System.Collections.Immutable;
using System.Globalization;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>Lays out a formula's expression: the same tree that is computed, so that text and code cannot differ.</summary>
internal sealed class FormulaNotation
{
    /// <summary>Above this number the terms of a sum or extreme stand in a table of their own.</summary>
    public const int MostTermsInLine = 4;

    private readonly Formula formula;
    private readonly DisplayProfile profile;
    private readonly ImmutableArray<ValueMark>? values;
    private readonly double[] exact;

    private FormulaNotation(Formula formula, DisplayProfile profile, ImmutableArray<ValueMark>? values, double[] exact) =>
        (this.formula, this.profile, this.values, this.exact) = (formula, profile, values, exact);

    /// <summary>The right-hand side in symbols.</summary>
    public static Notation Symbolic(Formula formula, DisplayProfile profile) => new FormulaNotation(formula, profile, null, []).Lay(formula.Body);

    /// <summary>The right-hand side with values in place of symbols.</summary>
    /// <param name="formula">The formula.</param>
    /// <param name="profile">Profile of the reader.</param>
    /// <param name="values">Printed operands in order.</param>
    /// <param name="exact">The same operands unrounded, SI: they decide which side of a choice applies.</param>
    public static Notation Substituted(Formula formula, DisplayProfile profile, ImmutableArray<ValueMark> values, double[] exact) =>
        new FormulaNotation(formula, profile, values, exact).Lay(formula.Body);

    private Notation Lay(Expression e) => e switch
    {
        Operand o => values is { } v ? v[IndexOf(o)] : new SymbolMark(o.Symbol),
        Constant c => new ValueMark(Plain(c.Value), "", null),
        Zero z => new ValueMark("0", profile[z.Quantity].Unit.Name, null),
        Binary { Sign: '/' } b => new Fraction(Lay(b.Left), Lay(b.Right)),
        Binary b => new Infix(Lay(b.Left), b.Sign, Lay(b.Right)),
        Powered p => new Raised(Lay(p.Base), p.Exponent),
        RaisedTo p => new RaisedBy(Lay(p.Base), Lay(p.Exponent)),
        Function { Name: "√" } f => new Radical(Lay(f.Argument)),
        Function f => new Call(f.Name, [Lay(f.Argument)]),
        Extreme x => new Call(x.IsLarger ? "max" : "min", [Lay(x.Left), Lay(x.Right)]),
        Aggregate a => Series(a),
        Rounded r => new Call("round", [Lay(r.Value), Lay(r.Step), new Wording(Word(r.Rounding))]),
        Choice c => Pick(c),
        // The number of units in a value is the value divided by one unit.
        Measured m => new Fraction(Lay(m.Value), new ValueMark("1", m.Unit.Name, null)),
        _ => throw new ArgumentException($"No rule to print {e.GetType().Name}."),
    };

    private Notation Series(Aggregate aggregate)
    {
        var name = NameOf(aggregate.Kind);
        if (values is not { } v) return new Call(name, [new SymbolMark(aggregate.Each.Symbol)]);
        var terms = v[IndexOf(aggregate.Each)..];
        if (terms.Length > MostTermsInLine)
            return new Call(name, [new Wording(FormattableString.Invariant($"{terms.Length} terms"))]);
        return aggregate.Kind == AggregateKind.Total
            ? terms.Skip(1).Aggregate((Notation)terms[0], (sum, term) => new Infix(sum, '+', term))
            : new Call(name, [.. terms]);
    }

    private Notation Pick(Choice choice)
    {
        if (values is null)
            return new Alternatives(Lay(choice.Left), SignOf(choice.Relation), Lay(choice.Right), Lay(choice.Then), Lay(choice.Otherwise));
        var holds = formula.Holds(choice, exact);
        return new Decision(
            Lay(choice.Left), SignOf(holds ? choice.Relation : Opposite(choice.Relation)), Lay(choice.Right), Lay(holds ? choice.Then : choice.Otherwise));
    }

    private int IndexOf(Operand operand)
    {
        for (var i = 0; i < formula.Operands.Count; i++)
            if (ReferenceEquals(formula.Operands[i], operand)) return i;
        throw new ArgumentException($"Operand {operand.Symbol} is not listed with formula {formula.Id}.");
    }

    private static string NameOf(AggregateKind kind) => kind switch
    {
        AggregateKind.Total => "Σ",
        AggregateKind.Largest => "max",
        AggregateKind.Smallest => "min",
        _ => throw new ArgumentOutOfRangeException(nameof(kind)),
    };

    private static char SignOf(Relation relation) => relation switch
    {
        Relation.AtMost => '≤',
        Relation.AtLeast => '≥',
        Relation.Below => '<',
        Relation.Above => '>',
        _ => throw new ArgumentOutOfRangeException(nameof(relation)),
    };

    private static Relation Opposite(Relation relation) => relation switch
    {
        Relation.AtMost => Relation.Above,
        Relation.AtLeast => Relation.Below,
        Relation.Below => Relation.AtLeast,
        Relation.Above => Relation.AtMost,
        _ => throw new ArgumentOutOfRangeException(nameof(relation)),
    };

    private static string Word(Rounding rounding) => rounding switch
    {
        Rounding.Nearest => "nearest",
        Rounding.Up => "up",
        Rounding.Down => "down",
        Rounding.TowardZero => "toward zero",
        _ => throw new ArgumentOutOfRangeException(nameof(rounding)),
    };

    private static string Plain(double value)
    {
        var text = value.ToString("R", CultureInfo.InvariantCulture).Replace('-', '−');
        var at = text.IndexOf('E', StringComparison.Ordinal);
        if (at < 0) return text;
        var power = int.Parse(text[(at + 1)..].Replace('−', '-'), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        return text[..at] + NumberText.PowerOfTen(power);
    }
}
