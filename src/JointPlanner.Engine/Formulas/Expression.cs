namespace JointPlanner.Engine.Formulas;

/// <summary>Which of two compared values decides a choice.</summary>
public enum Relation
{
    /// <summary>Left ≤ right.</summary>
    AtMost,
    /// <summary>Left ≥ right.</summary>
    AtLeast,
    /// <summary>Left &lt; right.</summary>
    Below,
    /// <summary>Left &gt; right.</summary>
    Above,
}

/// <summary>Which way a value is rounded to a step.</summary>
public enum Rounding
{
    /// <summary>To the nearest step, halves away from zero.</summary>
    Nearest,
    /// <summary>To the next step up.</summary>
    Up,
    /// <summary>To the next step down.</summary>
    Down,
    /// <summary>To the next step toward zero.</summary>
    TowardZero,
}

/// <summary>
/// A formula's right-hand side as a tree. It knows its dimension, is compiled for computing and walked for printing,
/// so that the printed line and the code cannot differ.
/// </summary>
public abstract record Expression
{
    private protected Expression(Dimension dimension, bool isReading = false) => (Dimension, IsReading) = (dimension, isReading);

    /// <summary>Dimension of the value.</summary>
    public Dimension Dimension { get; }

    /// <summary>True when the value is a temperature reading rather than a difference.</summary>
    public bool IsReading { get; }

    /// <summary>Sum; a reading plus a difference is a reading, two readings cannot be added.</summary>
    public static Expression operator +(Expression a, Expression b) => new Binary('+', a, b);
    /// <summary>Difference; two readings give a difference.</summary>
    public static Expression operator -(Expression a, Expression b) => new Binary('−', a, b);
    /// <summary>Product.</summary>
    public static Expression operator *(Expression a, Expression b) => new Binary('·', a, b);
    /// <summary>Quotient.</summary>
    public static Expression operator /(Expression a, Expression b) => new Binary('/', a, b);
    /// <summary>A plain number in a formula.</summary>
    public static implicit operator Expression(double value) => new Constant(value);

    /// <summary>Whole power.</summary>
    public static Expression Power(Expression a, int exponent) => new Powered(a, exponent);
    /// <summary>A power with any exponent; both must be plain numbers.</summary>
    public static Expression ToThe(Expression a, Expression exponent) => new RaisedTo(a, exponent);
    /// <summary>e raised to a plain number.</summary>
    public static Expression Exp(Expression a) => new Function("exp", a, Dimension.None);
    /// <summary>Natural logarithm of a plain number.</summary>
    public static Expression Ln(Expression a) => new Function("ln", a, Dimension.None);
    /// <summary>Square root.</summary>
    public static Expression Root(Expression a) => new Function("√", a, a.Dimension.Root());
    /// <summary>Cosine of an angle in radians.</summary>
    public static Expression Cos(Expression angle) => new Function("cos", angle, Dimension.None);
    /// <summary>Sine of an angle in radians.</summary>
    public static Expression Sin(Expression angle) => new Function("sin", angle, Dimension.None);
    /// <summary>Hyperbolic tangent of a plain number.</summary>
    public static Expression Tanh(Expression value) => new Function("tanh", value, Dimension.None);
    /// <summary>The larger of two values.</summary>
    public static Expression Larger(Expression a, Expression b) => new Extreme(true, a, b);
    /// <summary>The smaller of two values.</summary>
    public static Expression Smaller(Expression a, Expression b) => new Extreme(false, a, b);
    /// <summary>The value where it is above zero, else zero.</summary>
    public static Expression Positive(Expression value, Quantity quantity) => new Extreme(true, new Zero(quantity), value);
    /// <summary>Sum over the repeated last operand of a formula.</summary>
    public static Expression Total(Operand each) => new Aggregate(AggregateKind.Total, each);
    /// <summary>Largest of the repeated last operand of a formula.</summary>
    public static Expression Largest(Operand each) => new Aggregate(AggregateKind.Largest, each);
    /// <summary>Smallest of the repeated last operand of a formula.</summary>
    public static Expression Smallest(Operand each) => new Aggregate(AggregateKind.Smallest, each);
    /// <summary>A value rounded to a whole number of steps.</summary>
    public static Expression RoundTo(Expression value, Expression step, Rounding rounding) => new Rounded(value, step, rounding);
    /// <summary>One of two values by a comparison; only the side that applies is evaluated.</summary>
    public static Expression Choose(Expression left, Relation relation, Expression right, Expression then, Expression otherwise) =>
        new Choice(left, relation, right, then, otherwise);
    /// <summary>The plain number of units in a value, for empirical formulas bound to a unit.</summary>
    public static Expression InUnits(Expression value, Unit unit) => new Measured(value, unit);
}

/// <summary>A named place for a value.</summary>
/// <param name="Symbol">Printed symbol.</param>
/// <param name="Meaning">What the value is, in words.</param>
/// <param name="Quantity">Kind of value.</param>
public sealed record Operand(string Symbol, string Meaning, Quantity Quantity) : Expression(Quantity.Dimension, Quantity.IsReading);

/// <summary>A plain number written in a formula.</summary>
public sealed record Constant(double Value) : Expression(Dimension.None);

/// <summary>Nothing at all of a kind that has a dimension, for "the larger of nothing and …".</summary>
public sealed record Zero(Quantity Quantity) : Expression(Quantity.Dimension);

/// <summary>Sum, difference, product or quotient.</summary>
public sealed record Binary(char Sign, Expression Left, Expression Right)
    : Expression(Dimensions.Of(Sign, Left, Right), Dimensions.IsReading(Sign, Left, Right));

/// <summary>A whole power.</summary>
public sealed record Powered(Expression Base, int Exponent) : Expression(Base.Dimension.Power(Exponent));

/// <summary>A power whose exponent is any plain number.</summary>
public sealed record RaisedTo(Expression Base, Expression Exponent) : Expression(Dimensions.OfRaisedTo(Base, Exponent));

/// <summary>Square root, sine, cosine, hyperbolic tangent, exponential or logarithm.</summary>
public sealed record Function(string Name, Expression Argument, Dimension Result) : Expression(Dimensions.ArgumentOf(Name, Argument, Result));

/// <summary>The larger or smaller of two values.</summary>
public sealed record Extreme(bool IsLarger, Expression Left, Expression Right)
    : Expression(Dimensions.Same(Left, Right), Left.IsReading);

/// <summary>What is taken over a repeated operand.</summary>
public enum AggregateKind
{
    /// <summary>The sum.</summary>
    Total,
    /// <summary>The largest.</summary>
    Largest,
    /// <summary>The smallest.</summary>
    Smallest,
}

/// <summary>Sum, largest or smallest over the repeated last operand.</summary>
public sealed record Aggregate(AggregateKind Kind, Operand Each) : Expression(Each.Dimension, Each.IsReading);

/// <summary>A value rounded to steps.</summary>
public sealed record Rounded(Expression Value, Expression Step, Rounding Rounding) : Expression(Dimensions.Same(Value, Step));

/// <summary>One of two values by a comparison.</summary>
public sealed record Choice(Expression Left, Relation Relation, Expression Right, Expression Then, Expression Otherwise)
    : Expression(Dimensions.OfChoice(Left, Right, Then, Otherwise), Then.IsReading);

/// <summary>The number of units in a value.</summary>
public sealed record Measured(Expression Value, Unit Unit) : Expression(Dimensions.OfMeasured(Value, Unit));
