using System.Globalization;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>Writes SI values as numbers in a profile's units. Never uses the machine's culture.</summary>
public static class NumberText
{
    private const string Superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    /// <summary>The number without its unit.</summary>
    public static string Of(double si, Quantity quantity, DisplayProfile profile, NumberStyle style = NumberStyle.Screen) =>
        Print(si, profile[quantity], 0, style).Text;

    /// <summary>The number with its unit, as in "42.500 m".</summary>
    public static string WithUnit(double si, Quantity quantity, DisplayProfile profile, NumberStyle style = NumberStyle.Screen) =>
        Join(Of(si, quantity, profile, style), profile[quantity].Unit.Name);

    /// <summary>A number and a unit side by side: a space between, but none before the degree sign of an angle.</summary>
    public static string Join(string number, string unit) => unit switch
    {
        "" => number,
        "°" => number + unit,
        _ => $"{number} {unit}",
    };

    /// <summary>The number with some digits more than wanted, and what it reads back as.</summary>
    public static PrintedNumber Print(double si, DisplayUnit unit, int moreDigits, NumberStyle style = NumberStyle.Screen)
    {
        var digits = unit.Digits.Raised(moreDigits);
        var inUnits = unit.Unit.FromSi(si);
        var exponent = unit.Exponent;
        var shown = inUnits / Math.Pow(10, exponent);
        var decimals = digits.Count;
        if (digits.AreSignificant) (shown, exponent, decimals) = BySignificance(shown, exponent, digits.Count);

        var mantissa = WithoutNegativeZero(shown.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture));
        var readBack = double.Parse(
            FormattableString.Invariant($"{mantissa}E{exponent}"), NumberStyles.Float, CultureInfo.InvariantCulture);
        var lastDigit = Math.Pow(10, exponent - decimals) * Math.Abs(unit.Unit.Factor);
        return new(Style(mantissa, exponent, style), unit.Unit.ToSi(readBack), lastDigit);
    }

    /// <summary>The fewest digits beyond the wanted ones, up to <paramref name="most"/>, that print the value exactly; none where nothing does.</summary>
    public static int DigitsToBeExact(double si, DisplayUnit unit, int most)
    {
        for (var more = 0; more <= most; more++)
            if (Math.Abs(Print(si, unit, more).Value - si) <= 1e-12 * Math.Abs(si)) return more;
        return 0;
    }

    /// <summary>A whole power of ten as it is written after a number, as in "×10⁻⁶".</summary>
    public static string PowerOfTen(int exponent) => "×10" + Superscript(exponent);

    /// <summary>A whole number in raised figures.</summary>
    public static string Superscript(int number) =>
        (number < 0 ? "⁻" : "") + string.Concat(Math.Abs(number).ToString(CultureInfo.InvariantCulture).Select(c => Superscripts[c - '0']));

    private static (double Shown, int Exponent, int Decimals) BySignificance(double shown, int exponent, int count)
    {
        if (shown == 0) return (0, exponent, count - 1);
        // The exponent after rounding: 9.9996 to four digits is 10.00.
        var scientific = shown.ToString("E" + (count - 1).ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        var power = int.Parse(scientific.AsSpan(scientific.IndexOf('E', StringComparison.Ordinal) + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        return power is < -4 or > 6
            ? (shown / Math.Pow(10, power), exponent + power, count - 1)
            : (shown, exponent, Math.Max(0, count - 1 - power));
    }

    private static string WithoutNegativeZero(string text) => text.All(c => c is '-' or '0' or '.') ? text.TrimStart('-') : text;

    private static string Style(string mantissa, int exponent, NumberStyle style)
    {
        if (style == NumberStyle.File) return exponent == 0 ? mantissa : FormattableString.Invariant($"{mantissa}e{exponent}");
        var text = mantissa.Replace('-', '−');
        if (style == NumberStyle.Sheet) text = Grouped(text);
        return exponent == 0 ? text : text + PowerOfTen(exponent);
    }

    private static string Grouped(string text)
    {
        var point = text.IndexOf('.', StringComparison.Ordinal);
        var (whole, rest) = point < 0 ? (text, "") : (text[..point], text[point..]);
        var (sign, figures) = whole.StartsWith('−') ? ("−", whole[1..]) : ("", whole);
        if (figures.Length <= 4) return text;
        var first = figures.Length % 3;
        var groups = Enumerable.Range(0, figures.Length / 3).Select(i => figures.Substring(first + (3 * i), 3));
        return sign + string.Join('\u2009', first > 0 ? groups.Prepend(figures[..first]) : groups) + rest;
    }
}
