namespace JointPlanner.Engine.Formulas;

/// <summary>The rules by which the dimension of an expression follows from its parts; a breach is a fault of the formula, found when it is made.</summary>
internal static class Dimensions
{
    public static Dimension Of(char sign, Expression left, Expression right) => sign switch
    {
        '+' or '−' => left.Dimension == right.Dimension
            ? left.Dimension
            : throw new ArgumentException($"Cannot put {sign} between {left.Dimension} and {right.Dimension}."),
        '·' => Plain(left) * Plain(right),
        '/' => Plain(left) / Plain(right),
        _ => throw new ArgumentException($"Unknown sign {sign}."),
    };

    public static bool IsReading(char sign, Expression left, Expression right) => (sign, left.IsReading, right.IsReading) switch
    {
        ('+', true, true) => throw new ArgumentException("Two temperature readings cannot be added."),
        ('+', var a, var b) => a || b,
        ('−', true, true) => false,
        ('−', false, true) => throw new ArgumentException("A reading cannot be taken from a difference."),
        ('−', var a, _) => a,
        _ => false,
    };

    public static Dimension Same(Expression a, Expression b) => a.Dimension == b.Dimension && a.IsReading == b.IsReading
        ? a.Dimension
        : throw new ArgumentException($"Cannot compare {a.Dimension} with {b.Dimension}.");

    public static Dimension OfChoice(Expression left, Expression right, Expression then, Expression otherwise)
    {
        Same(left, right);
        return Same(then, otherwise);
    }

    public static Dimension ArgumentOf(string function, Expression argument, Dimension result) =>
        function == "√" || argument.Dimension == Dimension.None
            ? result
            : throw new ArgumentException($"{function} wants a plain number, not {argument.Dimension}.");

    public static Dimension OfRaisedTo(Expression @base, Expression exponent) => @base.Dimension == Dimension.None && exponent.Dimension == Dimension.None
        ? Dimension.None
        : throw new ArgumentException($"{@base.Dimension} cannot be raised to {exponent.Dimension}: both must be plain numbers.");

    public static Dimension OfMeasured(Expression value, Unit unit) => value.Dimension == unit.Dimension
        ? Dimension.None
        : throw new ArgumentException($"{unit.Name} does not measure {value.Dimension}.");

    private static Dimension Plain(Expression e) => e.IsReading
        ? throw new ArgumentException("A temperature reading cannot be multiplied or divided; take a difference first.")
        : e.Dimension;
}
