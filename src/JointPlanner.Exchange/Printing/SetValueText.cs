using System.Globalization;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>Writes an opening to be set the way it is measured: millimetres, or inches with a fraction that a ruler carries.</summary>
public static class SetValueText
{
    private const int Parts = 32;

    /// <summary>The opening with its unit. In US units a whole number of thirty-seconds becomes a fraction, as in "1 7/8 in"; anything else keeps its decimals.</summary>
    /// <param name="si">Opening, m.</param>
    /// <param name="profile">Profile of the reader.</param>
    /// <param name="style">Where it is written.</param>
    public static string Of(double si, DisplayProfile profile, NumberStyle style = NumberStyle.Screen)
    {
        var unit = profile[Quantity.Opening].Unit;
        if (unit == Unit.InchUnit && Fraction(unit.FromSi(si)) is { } fraction)
            return (style == NumberStyle.File ? fraction.Replace('−', '-') : fraction) + " in";
        return NumberText.WithUnit(si, Quantity.Opening, profile, style);
    }

    /// <summary>The same without a decimal that is nil: "42 mm", for numbers that are read at arm's length.</summary>
    /// <param name="si">Opening, m.</param>
    /// <param name="profile">Profile of the reader.</param>
    public static string Brief(double si, DisplayProfile profile)
    {
        var text = Of(si, profile);
        var space = text.LastIndexOf(' ');
        var (number, unit) = (text[..space], text[space..]);
        return number.Contains('.', StringComparison.Ordinal) ? number.TrimEnd('0').TrimEnd('.') + unit : text;
    }

    /// <summary>Inches as whole number and fraction in lowest terms; null where no thirty-second fits.</summary>
    public static string? Fraction(double inches)
    {
        var parts = Math.Round(inches * Parts);
        if (Math.Abs((inches * Parts) - parts) > 1e-6 || Math.Abs(parts) > 1e6) return null;
        var count = (long)Math.Abs(parts);
        var sign = parts < 0 ? "−" : "";
        var (whole, rest, below) = (count / Parts, count % Parts, (long)Parts);
        while (rest > 0 && rest % 2 == 0) (rest, below) = (rest / 2, below / 2);
        if (rest == 0) return sign + whole.ToString(CultureInfo.InvariantCulture);
        var fraction = FormattableString.Invariant($"{rest}/{below}");
        return sign + (whole > 0 ? FormattableString.Invariant($"{whole} {fraction}") : fraction);
    }
}
