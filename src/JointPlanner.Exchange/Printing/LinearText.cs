namespace JointPlanner.Exchange.Printing;

/// <summary>
/// Writes notation on one line, in a small grammar that a reader with nothing but the text can compute:
/// <code>
/// case    := "since " sum ("≤"|"≥"|"&lt;"|"&gt;") sum ": " case      the comparison holds, the value is what follows
///          | "if " sum sign sum ": " case ", otherwise " case       in symbols, both sides
///          | sum
/// sum     := product { (" + " | " − ") product }                  from left to right
/// product := power { (" · " | " / ") power }                      from left to right
/// power   := atom [ raised figures | "^" atom ]
/// atom    := value | symbol | "(" case ")" | "√(" case ")" | name "(" sum { ", " sum } ")"
/// name    := "cos" | "sin" | "exp" | "ln" | "max" | "min" | "round" | "Σ"
/// value   := number [ " " unit ] [ " [" step "]" ]                no space before the degree sign of an angle
/// number  := [ "−" ] figures [ "." figures ] [ "×10" raised figures ]
/// </code>
/// A value followed by a step in square brackets is that step's printed value; one without is a constant of the formula. A unit never
/// contains a space, an operator always stands between spaces. Temperature readings and differences in °F share the unit's sign: only
/// their differences are used, so no zero is needed. round(x, s, nearest | up | down | toward zero) rounds x to whole steps s, halves away
/// from zero; a number of steps within a billionth of a whole number is that number. "Σ(7 terms)", "max(7 terms)" and "min(7 terms)" stand for
/// the rows that follow, one value each, marked with a bar.
/// </summary>
public static class LinearText
{
    /// <summary>The notation on one line.</summary>
    public static string Of(Notation notation) => notation switch
    {
        SymbolMark s => s.Text,
        Wording w => w.Text,
        ValueMark v => NumberText.Join(v.Number, v.Unit) + (v.Step is { } step ? FormattableString.Invariant($" [{step}]") : ""),
        Infix { Sign: '·' } i => $"{Within(i.Left, Rank.Product)} · {Within(i.Right, Rank.Product)}",
        Infix i => $"{Within(i.Left, Rank.Sum)} {i.Sign} {Within(i.Right, Rank.Product)}",
        Fraction f => $"{Within(f.Above, Rank.Product)} / {Within(f.Below, Rank.Power)}",
        Raised r => (r.Base is ValueMark ? $"({Of(r.Base)})" : Within(r.Base, Rank.Atom)) + NumberText.Superscript(r.Exponent),
        RaisedBy r => $"{(r.Base is ValueMark ? $"({Of(r.Base)})" : Within(r.Base, Rank.Atom))}^{Within(r.Exponent, Rank.Atom)}",
        Radical r => $"√({Of(r.Under)})",
        Call c => $"{c.Name}({string.Join(", ", c.Arguments.Select(a => Within(a, Rank.Sum)))})",
        Alternatives a => $"if {Within(a.Left, Rank.Sum)} {a.Sign} {Within(a.Right, Rank.Sum)}: {Within(a.Then, Rank.Sum)}, otherwise {Of(a.Otherwise)}",
        Decision d => $"since {Within(d.Left, Rank.Sum)} {d.Sign} {Within(d.Right, Rank.Sum)}: {Of(d.Taken)}",
        _ => throw new ArgumentException($"No rule to write {notation.GetType().Name}."),
    };

    private static string Within(Notation inner, Rank least) => inner.Rank < least ? $"({Of(inner)})" : Of(inner);
}
