using System.Globalization;
using System.Text.RegularExpressions;

namespace JointPlanner.Recomputation.Tests.Reading;

/// <summary>An amount with what it measures.</summary>
public readonly record struct Amount(double Value, Powers Powers);

/// <summary>
/// Computes one printed line: values with units, + − · /, powers, roots, cos, sin, exp, ln, max, min, round, Σ over rows, and decisions, whose comparison
/// it checks. Written from the grammar that the program documents, sharing none of its code.
/// </summary>
public sealed partial class Calculator
{
    private readonly string text;
    private readonly IReadOnlyList<string> rows;
    private readonly Func<int, PrintedValue, double> amountOf;
    private readonly bool checksDecisions;
    private int at;

    private Calculator(string text, IReadOnlyList<string> rows, Func<int, PrintedValue, double> amountOf, bool checksDecisions) =>
        (this.text, this.rows, this.amountOf, this.checksDecisions) = (text, rows, amountOf, checksDecisions);

    /// <summary>The value of a line.</summary>
    /// <param name="text">The line.</param>
    /// <param name="rows">The rows under it.</param>
    /// <param name="amountOf">Called for every value that refers to a step; gives the amount to compute with.</param>
    /// <param name="checksDecisions">False to follow a decision without checking its comparison.</param>
    /// <exception cref="FormatException">The line cannot be read, adds unlike things, or states a comparison that does not hold.</exception>
    public static Amount Compute(string text, IReadOnlyList<string> rows, Func<int, PrintedValue, double> amountOf, bool checksDecisions = true)
    {
        var calculator = new Calculator(text, rows, amountOf, checksDecisions);
        var value = calculator.Case();
        return calculator.at == text.Length ? value : throw calculator.Unreadable();
    }

    private Amount Case()
    {
        if (!Takes("since ")) return Sum();
        var left = Sum();
        var sign = Takes(" ≤ ") ? '≤' : Takes(" ≥ ") ? '≥' : Takes(" < ") ? '<' : Takes(" > ") ? '>' : throw Unreadable();
        var right = Sum();
        Like(left, right);
        var holds = sign switch
        {
            '≤' => left.Value <= right.Value,
            '≥' => left.Value >= right.Value,
            '<' => left.Value < right.Value,
            _ => left.Value > right.Value,
        };
        if (!holds && checksDecisions) throw new FormatException($"the comparison with {sign} does not hold for the printed digits in '{text}'");
        Expect(": ");
        return Case();
    }

    private Amount Sum()
    {
        var sum = Product();
        while (true)
        {
            if (Takes(" + ")) sum = sum with { Value = sum.Value + Like(sum, Product()).Value };
            else if (Takes(" − ")) sum = sum with { Value = sum.Value - Like(sum, Product()).Value };
            else return sum;
        }
    }

    private Amount Product()
    {
        var product = Power();
        while (true)
        {
            if (Takes(" · "))
            {
                var by = Power();
                product = new(product.Value * by.Value, product.Powers + by.Powers);
            }
            else if (Takes(" / ") || Takes("/")) // a sheet sets a fraction, whose line form has a bare bar
            {
                var by = Power();
                product = new(product.Value / by.Value, product.Powers - by.Powers);
            }
            else return product;
        }
    }

    private Amount Power()
    {
        var value = Atom();
        if (Takes("^")) return Raised(value); // any exponent on a line, and a whole one where a sheet raises it
        if (at >= text.Length || text[at] is not ('⁻' or '⁰' or '¹' or '²' or '³' or '⁴' or '⁵' or '⁶' or '⁷' or '⁸' or '⁹')) return value;
        var exponent = PrintedValue.RaisedNumber(text, ref at);
        return new(Math.Pow(value.Value, exponent), value.Powers * exponent);
    }

    private Amount Raised(Amount value)
    {
        var exponent = Plain(Takes("(") ? Closed(Case()) : Value() ?? throw Unreadable());
        return exponent == Math.Round(exponent)
            ? new(Math.Pow(value.Value, exponent), value.Powers * (int)exponent)
            : new(Math.Pow(Plain(value), exponent), default);
    }

    private Amount Atom()
    {
        if (Takes("(")) return Closed(Case());
        if (Takes("√("))
        {
            var under = Closed(Case());
            return new(Math.Sqrt(under.Value), under.Powers.Half());
        }
        if (Takes("exp(")) return new(Math.Exp(Plain(Closed(Sum()))), default);
        if (Takes("ln(")) return new(Math.Log(Plain(Closed(Sum()))), default);
        if (Takes("cos(")) return new(Math.Cos(Plain(Closed(Sum()))), default);
        if (Takes("tanh(")) return new(Math.Tanh(Plain(Closed(Sum()))), default);
        if (Takes("sin(")) return new(Math.Sin(Plain(Closed(Sum()))), default);
        if (Takes("max(")) return Extreme(Arguments(), Math.Max);
        if (Takes("min(")) return Extreme(Arguments(), Math.Min);
        if (Takes("Σ(")) return Arguments().Aggregate((a, b) => a with { Value = a.Value + Like(a, b).Value });
        if (Takes("round(")) return Rounded();
        return Value() ?? throw Unreadable();
    }

    private Amount? Value()
    {
        if (PrintedValue.At(text, ref at) is not { } value) return null;
        if (!Takes(" [")) return new(value.Amount, value.Powers);
        var end = text.IndexOf(']', at);
        if (end < 0) throw Unreadable();
        var step = int.Parse(text[at..end], CultureInfo.InvariantCulture);
        at = end + 1;
        return new(amountOf(step, value), value.Powers);
    }

    /// <summary>Arguments up to the closing bracket, or the rows where the bracket says how many terms stand there.</summary>
    private List<Amount> Arguments()
    {
        if (TermsInRows().Match(text, at) is { Success: true } terms)
        {
            var told = int.Parse(terms.Groups[1].Value, CultureInfo.InvariantCulture);
            if (told != rows.Count) throw new FormatException($"{told} terms are told, {rows.Count} stand in rows");
            at += terms.Length;
            return [.. rows.Select(r => Compute(r, [], amountOf))];
        }
        var arguments = new List<Amount> { Sum() };
        while (Takes(", ")) arguments.Add(Sum());
        Expect(")");
        return arguments;
    }

    private static Amount Extreme(List<Amount> arguments, Func<double, double, double> pick) =>
        arguments.Aggregate((a, b) => a with { Value = pick(a.Value, Like(a, b).Value) });

    private Amount Rounded()
    {
        var value = Sum();
        Expect(", ");
        var step = Like(value, Sum());
        Expect(", ");
        var steps = value.Value / step.Value;
        var near = Math.Round(steps, MidpointRounding.AwayFromZero);
        var whole = Takes("nearest)") ? near
            : Takes("up)") ? Careful(Math.Ceiling)
            : Takes("down)") ? Careful(Math.Floor)
            : Takes("toward zero)") ? Careful(Math.Truncate)
            : throw Unreadable();
        return value with { Value = whole * step.Value };

        double Careful(Func<double, double> round) => Math.Abs(steps - near) < 1e-9 ? near : round(steps);
    }

    private static Amount Like(Amount a, Amount b) => a.Powers == b.Powers
        ? b
        : throw new FormatException($"{a.Powers} and {b.Powers} stand together");

    private static double Plain(Amount angle) => angle.Powers == default ? angle.Value : throw new FormatException($"{angle.Powers} is no plain number");

    private Amount Closed(Amount inner)
    {
        Expect(")");
        return inner;
    }

    private bool Takes(string word)
    {
        if (string.CompareOrdinal(text, at, word, 0, word.Length) != 0) return false;
        at += word.Length;
        return true;
    }

    private void Expect(string word)
    {
        if (!Takes(word)) throw Unreadable();
    }

    [GeneratedRegex(@"\G(\d+) terms\)")]
    private static partial Regex TermsInRows();

    private FormatException Unreadable() => new($"cannot read '{text}' at '{text[Math.Min(at, text.Length)..]}'");
}
