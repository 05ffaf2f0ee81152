using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Fraction = JointPlanner.Exchange.Printing.Fraction;

namespace JointPlanner.Sheets.Parts;

/// <summary>Turns printed notation into type: fractions stacked, roots and powers set, symbols leaning.</summary>
internal static class FormulaBoxes
{
    /// <summary>The notation as boxes.</summary>
    public static MathNode Of(Notation notation) => notation switch
    {
        SymbolMark s => Symbol(s.Text),
        Wording w => MathNode.Upright(w.Text),
        ValueMark v => Value(v, MathKind.Upright),
        Infix { Sign: '·' } i => MathNode.Row(Within(i.Left, Rank.Product), MathNode.Operator("·"), Within(i.Right, Rank.Product)),
        Infix i => MathNode.Row(Within(i.Left, Rank.Sum), MathNode.Operator(i.Sign.ToString()), Within(i.Right, Rank.Product)),
        Fraction f => new Pdf.Fraction(Of(f.Above), Of(f.Below)),
        Raised r => new Script(r.Base is ValueMark ? new Parentheses(Of(r.Base)) : Within(r.Base, Rank.Atom), null, MathNode.Upright(Whole(r.Exponent))),
        RaisedBy r => new Script(r.Base is ValueMark ? new Parentheses(Of(r.Base)) : Within(r.Base, Rank.Atom), null, Of(r.Exponent)),
        Radical r => new Root(Of(r.Under)),
        Call c => MathNode.Row([MathNode.Upright(c.Name), new Parentheses(List(c))]),
        Alternatives a => MathNode.Row(MathNode.Upright("if "), Of(a.Left), MathNode.Operator(a.Sign.ToString()), Of(a.Right), MathNode.Upright(": "), Of(a.Then),
            MathNode.Upright(", otherwise "), Of(a.Otherwise)),
        Decision d => MathNode.Row(MathNode.Upright("since "), Of(d.Left), MathNode.Operator(d.Sign.ToString()), Of(d.Right), MathNode.Upright(": "), Of(d.Taken)),
        _ => throw new ArgumentException($"No rule to set {notation.GetType().Name}."),
    };

    /// <summary>A symbol; what follows an underscore is its index.</summary>
    public static MathNode Symbol(string text) => text.Split('_', 2) is [var letters, var index]
        ? MathNode.Indexed(letters, index)
        : MathNode.Variable(text);

    /// <summary>A value with its unit and the step it comes from.</summary>
    public static MathNode Value(ValueMark value, MathKind kind)
    {
        var text = new MathText(NumberText.Join(value.Number, value.Unit).Replace(' ', '\u00A0'), kind);
        return value.Step is { } step ? MathNode.Row(text, MathNode.Upright(FormattableString.Invariant($"\u00A0[{step}]"))) : text;
    }

    private static MathNode List(Call call)
    {
        var parts = new List<MathNode>();
        foreach (var argument in call.Arguments)
        {
            if (parts.Count > 0) parts.Add(MathNode.Upright(", "));
            parts.Add(Of(argument));
        }
        return MathNode.Row(parts);
    }

    private static MathNode Within(Notation inner, Rank least) => inner.Rank < least ? new Parentheses(Of(inner)) : Of(inner);

    private static string Whole(int exponent) => exponent.ToString(System.Globalization.CultureInfo.InvariantCulture).Replace('-', '−');
}
