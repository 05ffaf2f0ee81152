using System.Globalization;

namespace JointPlanner.Recomputation.Tests.Reading;

/// <summary>A number as it stands in the text, with its unit.</summary>
/// <param name="Text">Number and unit exactly as printed.</param>
/// <param name="Amount">In metres, kilograms, seconds, kelvins.</param>
/// <param name="Powers">What it measures.</param>
/// <param name="LastDigit">One unit of its last digit.</param>
public sealed record PrintedValue(string Text, double Amount, Powers Powers, double LastDigit)
{
    private const string Raised = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    /// <summary>Reads the value at a place and moves the place behind it; null where no number begins.</summary>
    public static PrintedValue? At(string text, ref int place)
    {
        var at = place;
        var digits = "";
        var decimals = 0;
        if (at < text.Length && text[at] == '−') (digits, at) = ("-", at + 1);
        if (at >= text.Length || !char.IsAsciiDigit(text[at])) return null;
        var seenPoint = false;
        for (; at < text.Length; at++)
        {
            if (char.IsAsciiDigit(text[at])) (digits, decimals) = (digits + text[at], decimals + (seenPoint ? 1 : 0));
            else if (text[at] == '.' && !seenPoint) (digits, seenPoint) = (digits + '.', true);
            else if (text[at] != '\u2009') break; // thin spaces group the digits of a sheet
        }
        var exponent = PowerOfTen(text, ref at);
        var (factor, powers) = (1.0, default(Powers));
        if (at < text.Length && text[at] == '°' && PrintedUnits.At(text, at) is { Name: "°" } degree)
            (factor, powers, at) = (degree.Factor, degree.Powers, at + 1);
        else if (at < text.Length && text[at] == ' ' && PrintedUnits.At(text, at + 1) is { } unit)
            (factor, powers, at) = (unit.Factor, unit.Powers, at + 1 + unit.Name.Length);
        var number = double.Parse($"{digits}E{exponent.ToString(CultureInfo.InvariantCulture)}", CultureInfo.InvariantCulture);
        var value = new PrintedValue(text[place..at], number * factor, powers, Math.Pow(10, exponent - decimals) * factor);
        place = at;
        return value;
    }

    /// <summary>Reads a text that is one value and nothing else.</summary>
    public static PrintedValue Whole(string text)
    {
        var place = 0;
        var value = At(text, ref place) ?? throw new FormatException($"'{text}' is not a value");
        return place == text.Length ? value : throw new FormatException($"'{text[place..]}' is left over behind the value in '{text}'");
    }

    private static int PowerOfTen(string text, ref int at)
    {
        if (string.CompareOrdinal(text, at, "×10", 0, 3) != 0) return 0;
        at += 3;
        return RaisedNumber(text, ref at);
    }

    /// <summary>Reads raised figures; 1 where there are none.</summary>
    public static int RaisedNumber(string text, ref int at)
    {
        var (sign, number, any) = (1, 0, false);
        if (at < text.Length && text[at] == '⁻') (sign, at) = (-1, at + 1);
        for (; at < text.Length && Raised.Contains(text[at], StringComparison.Ordinal); at++)
            (number, any) = ((number * 10) + Raised.IndexOf(text[at], StringComparison.Ordinal), true);
        return any ? sign * number : 1;
    }
}
