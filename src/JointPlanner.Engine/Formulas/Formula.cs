using System.Collections.Concurrent;

namespace JointPlanner.Engine.Formulas;

/// <summary>
/// A formula, made once: permanent id, symbol, meaning, clause, and an expression in its operands. It computes through a compiled
/// delegate, and its expression is what gets printed.
/// </summary>
public sealed class Formula
{
    private readonly Lazy<Func<double[], double>> compiled;
    private readonly ConcurrentDictionary<Choice, Func<double[], bool>> comparisons = new(ReferenceEqualityComparer.Instance);

    /// <summary>Makes a formula and checks its dimensions.</summary>
    /// <param name="id">Permanent id, never reused, dots between words.</param>
    /// <param name="symbol">Printed symbol of the result.</param>
    /// <param name="meaning">What the result is, with direction where it has one.</param>
    /// <param name="quantity">Kind of the result.</param>
    /// <param name="operands">Operands in the order in which values are handed over; where the expression takes a total or an extreme over an operand, that operand is the last and may repeat.</param>
    /// <param name="body">Right-hand side.</param>
    /// <param name="source">Clause, or the reasoning of our own derivation.</param>
    /// <param name="example">A worked example the formula must reproduce.</param>
    /// <exception cref="ArgumentException">The expression's dimension is not that of the result.</exception>
    public Formula(
        string id, string symbol, string meaning, Quantity quantity, Operand[] operands, Expression body, Provenance source, Example example)
    {
        if (body.Dimension != quantity.Dimension || body.IsReading != quantity.IsReading)
            throw new ArgumentException($"Formula {id} gives {body.Dimension}, but its result is a {quantity.Id} ({quantity.Dimension}).");
        (Id, Symbol, Meaning, Quantity, Operands, Body, Source, Example) = (id, symbol, meaning, quantity, operands, body, source, example);
        Repeats = Contains(body, e => e is Aggregate);
        compiled = new(() => Compiler.Compile(body, operands));
    }

    /// <summary>The same formula where another document prints it too: its own id and source, the same expression.</summary>
    public Formula Restated(string id, Provenance source) => new(id, Symbol, Meaning, Quantity, [.. Operands], Body, source, Example);

    /// <summary>Permanent id.</summary>
    public string Id { get; }
    /// <summary>Printed symbol of the result.</summary>
    public string Symbol { get; }
    /// <summary>What the result is.</summary>
    public string Meaning { get; }
    /// <summary>Kind of the result.</summary>
    public Quantity Quantity { get; }
    /// <summary>Operands in order.</summary>
    public IReadOnlyList<Operand> Operands { get; }
    /// <summary>Right-hand side.</summary>
    public Expression Body { get; }
    /// <summary>Clause or derivation.</summary>
    public Provenance Source { get; }
    /// <summary>Worked example.</summary>
    public Example Example { get; }
    /// <summary>True when the last operand may be given any number of times.</summary>
    public bool Repeats { get; }

    /// <summary>Computes the result in SI from operands in SI.</summary>
    /// <exception cref="ArgumentException">The number of values does not match the operands.</exception>
    public double Compute(params double[] values)
    {
        var fits = Repeats ? values.Length >= Operands.Count : values.Length == Operands.Count;
        return fits
            ? compiled.Value(values)
            : throw new ArgumentException($"Formula {Id} takes {Operands.Count} operands, {values.Length} were given.");
    }

    /// <summary>Whether the comparison of one of this formula's choices holds for these values, in SI; printers show only the side that applies.</summary>
    public bool Holds(Choice choice, params double[] values) =>
        comparisons.GetOrAdd(choice, c => Compiler.CompileComparison(c, Operands))(values);

    private static bool Contains(Expression e, Predicate<Expression> wanted) => wanted(e) || e switch
    {
        Binary b => Contains(b.Left, wanted) || Contains(b.Right, wanted),
        Powered p => Contains(p.Base, wanted),
        RaisedTo p => Contains(p.Base, wanted) || Contains(p.Exponent, wanted),
        Function f => Contains(f.Argument, wanted),
        Extreme x => Contains(x.Left, wanted) || Contains(x.Right, wanted),
        Rounded r => Contains(r.Value, wanted) || Contains(r.Step, wanted),
        Choice c => new[] { c.Left, c.Right, c.Then, c.Otherwise }.Any(x => Contains(x, wanted)),
        Measured m => Contains(m.Value, wanted),
        _ => false,
    };

    /// <inheritdoc/>
    public override string ToString() => Id;
}
