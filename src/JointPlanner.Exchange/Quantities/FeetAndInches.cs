using System.Text.RegularExpressions;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Quantities;

/// <summary>A length in feet and inches: 12 ft 6 1/2 in, 12'-6 1/2", 12' 6.5".</summary>
internal static partial class FeetAndInches
{
    [GeneratedRegex("""^(?<sign>[+-]?) ?(?<feet>[0-9][0-9.,]*) ?(?:ft\.?|feet|foot|FT|') ?-? ?(?<inches>[0-9][0-9.,/ -]*?) ?(?<mark>in\.?|inches|inch|IN|"|'')?$""")]
    private static partial Regex Compound { get; }

    /// <summary>Reads the text; null where it is not of this shape.</summary>
    public static QuantityReading? Read(string plain)
    {
        var match = Compound.Match(plain);
        if (!match.Success) return null;
        var (feet, inchText) = (match.Groups["feet"].Value, match.Groups["inches"].Value);
        var inches = TypedNumber.Take(inchText, out var rest, out _);
        if (!match.Groups["mark"].Success)
            return Failed("the inches have no mark", $"Write {feet} ft {inchText} in.");
        if (!feet.All(char.IsAsciiDigit) || feet.Length > 9)
            return Failed("feet beside inches must be a whole number", "Write the whole length in feet, or whole feet and inches.");
        if (inches is not { } given || !double.IsFinite(given) || rest.Length > 0)
            return Failed($"“{inchText}” is not a number of inches", "Write the inches as 6, 6.5 or 6 1/2.");
        if (given >= 12)
            return Failed($"{inchText} in is a foot or more", "Write less than 12 in beside the feet.");
        var feetInInches = Unit.InchUnit.FromSi(Unit.Foot.ToSi(1)) * int.Parse(feet, System.Globalization.CultureInfo.InvariantCulture);
        var length = Unit.InchUnit.ToSi(Math.Round(feetInInches) + given);
        return QuantityReading.Of(match.Groups["sign"].Value == "-" ? -length : length, Unit.Foot);
    }

    private static QuantityReading Failed(string wrong, string remedy) => QuantityReading.Failed(
        "quantity.feet-and-inches", $"Read as feet and inches, but {wrong}.", "whole feet and less than 12 inches, as 12 ft 6 1/2 in or 12'-6 1/2\"", remedy);
}
