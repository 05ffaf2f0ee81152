namespace JointPlanner.Exchange.Printing;

/// <summary>How many digits a kind of value is printed with: so many after the decimal point, or at least so many significant ones.</summary>
/// <param name="Count">The number of digits.</param>
/// <param name="AreSignificant">True for significant digits, false for decimals.</param>
public readonly record struct Digits(int Count, bool AreSignificant)
{
    /// <summary>A fixed number of digits after the decimal point.</summary>
    public static Digits Decimals(int count) => new(count, false);

    /// <summary>At least so many significant digits; digits before the decimal point are never rounded away.</summary>
    public static Digits Significant(int count) => new(count, true);

    /// <summary>The same with some digits more.</summary>
    public Digits Raised(int by) => this with { Count = Count + by };
}
