namespace JointPlanner.Engine.Formulas;

/// <summary>The physical dimension of a value as whole powers of the SI base quantities that bridges need. Angles are plain ratios.</summary>
/// <param name="Length">Power of the metre.</param>
/// <param name="Mass">Power of the kilogram.</param>
/// <param name="Time">Power of the second.</param>
/// <param name="Temperature">Power of the kelvin.</param>
public readonly record struct Dimension(int Length, int Mass = 0, int Time = 0, int Temperature = 0)
{
    /// <summary>A plain number.</summary>
    public static readonly Dimension None = new(0);

    /// <summary>The dimension of a product.</summary>
    public static Dimension operator *(Dimension a, Dimension b) =>
        new(a.Length + b.Length, a.Mass + b.Mass, a.Time + b.Time, a.Temperature + b.Temperature);

    /// <summary>The dimension of a quotient.</summary>
    public static Dimension operator /(Dimension a, Dimension b) =>
        new(a.Length - b.Length, a.Mass - b.Mass, a.Time - b.Time, a.Temperature - b.Temperature);

    /// <summary>The dimension of a whole power.</summary>
    public Dimension Power(int exponent) => new(Length * exponent, Mass * exponent, Time * exponent, Temperature * exponent);

    /// <summary>The dimension of a square root.</summary>
    /// <exception cref="ArgumentException">The powers are not even.</exception>
    public Dimension Root() =>
        Length % 2 == 0 && Mass % 2 == 0 && Time % 2 == 0 && Temperature % 2 == 0
            ? new(Length / 2, Mass / 2, Time / 2, Temperature / 2)
            : throw new ArgumentException($"{this} has no square root in whole powers.");
}
