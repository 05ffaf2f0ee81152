using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace JointPlanner.Exchange.Quantities;

/// <summary>
/// A number as people type it, whatever the machine's culture: decimal point, or decimal comma where it cannot be a thousands separator;
/// fractions ("6 1/2"); powers of ten ("12e-6", "12×10⁻⁶"). Thousands separators are refused, thin spaces between groups of three tolerated.
/// </summary>
internal static partial class TypedNumber
{
    private const string SuperscriptDigits = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static readonly Dictionary<char, string> Fractions = new()
    {
        ['½'] = "1/2",
        ['¼'] = "1/4",
        ['¾'] = "3/4",
        ['⅓'] = "1/3",
        ['⅔'] = "2/3",
        ['⅛'] = "1/8",
        ['⅜'] = "3/8",
        ['⅝'] = "5/8",
        ['⅞'] = "7/8",
    };

    [GeneratedRegex(@"(?<=[0-9])[\u2009\u202F\u00A0\u2007](?=[0-9]{3}(?![0-9]))")]
    private static partial Regex GroupSpace { get; }

    [GeneratedRegex(@"^(?<sign>[+-]?) ?(?:(?:(?<whole>[0-9]+)[ -])?(?<upper>[0-9]+)/(?<lower>[0-9]+)|(?<digits>[0-9][0-9.,]*|[.,][0-9]+)(?:(?:[eE]| ?[x×·*] ?10\^?)(?<exponent>[+-]?[0-9]{1,4}))?)(?![0-9])")]
    private static partial Regex Number { get; }

    [GeneratedRegex(@"^[1-9][0-9]{0,2},[0-9]{3}$")]
    private static partial Regex CommaOfEitherKind { get; }

    /// <summary>One minus sign, one kind of space, written-out fractions and powers.</summary>
    public static string Plain(string text)
    {
        var plain = new StringBuilder();
        foreach (var c in GroupSpace.Replace(text.Trim().Normalize(), ""))
        {
            if (Fractions.TryGetValue(c, out var fraction))
            {
                if (plain.Length > 0 && char.IsAsciiDigit(plain[^1])) plain.Append(' ');
                plain.Append(fraction);
            }
            else if (c == '⁻' && plain.Length > 1 && plain[^1] == '0') plain.Append('-');
            else if (SuperscriptDigits.IndexOf(c, StringComparison.Ordinal) is >= 0 and var digit && FollowsPowerOfTen(plain)) plain.Append((char)('0' + digit));
            else plain.Append(c switch { '\u2212' => '-', '\u2032' or '\u2019' => '\'', '\u2033' or '\u201D' => '"', _ => char.IsWhiteSpace(c) ? ' ' : c });
        }
        return plain.ToString();
    }

    private static bool FollowsPowerOfTen(StringBuilder plain)
    {
        var end = plain.Length;
        while (end > 0 && char.IsAsciiDigit(plain[end - 1]) && !(end > 1 && plain[end - 1] == '0' && plain[end - 2] == '1')) end--;
        if (end > 0 && plain[end - 1] == '-') end--;
        return end > 2 && plain[end - 1] == '0' && plain[end - 2] == '1' && plain[end - 3] is '×' or 'x' or '·' or '*' or ' ';
    }

    /// <summary>Reads the number at the start of a text made plain.</summary>
    /// <param name="plain">The text.</param>
    /// <param name="rest">What follows the number, trimmed.</param>
    /// <param name="readings">Where a comma or point could mean two things: what the number may be, ready to type.</param>
    /// <returns>The number; null where the text does not start with one or it may mean two things.</returns>
    public static double? Take(string plain, out string rest, out string[] readings)
    {
        (rest, readings) = ("", []);
        var match = Number.Match(plain);
        if (!match.Success) return null;
        rest = plain[match.Length..].Trim();
        var sign = match.Groups["sign"].Value == "-" ? -1 : 1;
        if (match.Groups["lower"].Success)
        {
            var whole = match.Groups["whole"].Success ? Of(match.Groups["whole"].Value) : 0;
            return sign * (whole + (Of(match.Groups["upper"].Value) / Of(match.Groups["lower"].Value)));
        }
        var digits = match.Groups["digits"].Value;
        readings = ReadingsOf(digits);
        if (readings.Length > 0)
        {
            readings = [.. readings.Select(r => match.Groups["sign"].Value + r)];
            return null;
        }
        var exponent = match.Groups["exponent"].Success ? "e" + match.Groups["exponent"].Value : "";
        return sign * Of(digits.Replace(',', '.') + exponent);
    }

    /// <summary>True where digits other than zero were typed.</summary>
    public static bool SaysMoreThanZero(string plain) => plain.TakeWhile(c => c is not ('e' or 'E' or ' ')).Any(c => c is >= '1' and <= '9');

    private static string[] ReadingsOf(string digits)
    {
        var (commas, points) = (digits.Count(c => c == ','), digits.Count(c => c == '.'));
        if (commas > 0 && points > 0)
        {
            var last = digits.LastIndexOfAny([',', '.']);
            return [Without(digits[..last]) + "." + Without(digits[(last + 1)..])];
        }
        if (commas > 1 || points > 1) return [Without(digits)];
        return CommaOfEitherKind.IsMatch(digits) ? [digits.Replace(',', '.'), Without(digits)] : [];
    }

    private static string Without(string digits) => digits.Replace(",", "", StringComparison.Ordinal).Replace(".", "", StringComparison.Ordinal);

    private static double Of(string digits) => double.Parse(digits, NumberStyles.Float, CultureInfo.InvariantCulture);
}
