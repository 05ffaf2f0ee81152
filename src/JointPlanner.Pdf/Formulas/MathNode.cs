namespace JointPlanner.Pdf;

/// <summary>
/// A part of a formula. Each part can be set in type and can be read in one line; the line is what a text search, a screen reader and a
/// copied text get, so that the printed formula and its text cannot differ.
/// </summary>
public abstract record MathNode
{
    /// <summary>The part in one line: <c>(a + b)/(2·c)</c>, <c>T_max</c>, <c>x^2</c>, <c>√(x)</c>.</summary>
    public abstract string Linear { get; }

    /// <summary>Whether the line form needs no parentheses when something binds tighter than its own operators.</summary>
    internal virtual bool Binds => false;

    /// <summary>The line form, in parentheses where it needs them.</summary>
    internal string Bound => Binds ? Linear : "(" + Linear + ")";

    /// <summary>A variable in leaning letters: <c>T</c>, <c>α</c>.</summary>
    public static MathNode Variable(string letters) => new MathText(letters, MathKind.Variable);

    /// <summary>Upright text: a number, a unit, a name.</summary>
    public static MathNode Upright(string text) => new MathText(text, MathKind.Upright);

    /// <summary>Upright text in strong letters: a result.</summary>
    public static MathNode Strong(string text) => new MathText(text, MathKind.Strong);

    /// <summary>An operator or relation with space on both sides; a long formula may break before it.</summary>
    public static MathNode Operator(string sign) => new MathText(sign, MathKind.Operator);

    /// <summary>Parts one after another.</summary>
    public static MathNode Row(params IReadOnlyList<MathNode> parts) => new MathRow(parts);

    /// <summary>A variable with a subscript in upright letters: <c>T</c> with <c>max</c>.</summary>
    public static MathNode Indexed(string letters, string subscript) => new Script(Variable(letters), Upright(subscript), null);
}
