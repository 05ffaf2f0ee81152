using System.Globalization;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Quantities;

/// <summary>
/// Quantities as text with their unit, the same in every culture. Whether °C and °F are a reading or a difference is said by the kind of
/// quantity; a difference may also be in K, a reading may not.
/// </summary>
public static class QuantityText
{
    /// <summary>Longest text that is looked at.</summary>
    public const int LongestText = 60;

    /// <summary>Reads a quantity.</summary>
    /// <param name="text">What was typed.</param>
    /// <param name="kind">Kind of quantity that belongs there.</param>
    /// <param name="likely">Unit that a bare number probably meant; null for the kind's usual metric one.</param>
    public static QuantityReading Parse(string text, Quantity kind, Unit? likely = null)
    {
        var row = UnitTable.Of(kind);
        var usual = likely ?? row.Metric;
        if (text.Length > LongestText)
            return Failed(row, "quantity.too-long", $"A text of {text.Length} characters is not {row.Words}.", "Write the number and its unit only.");
        var plain = TypedNumber.Plain(text);
        if (plain.Length == 0)
            return Failed(row, "quantity.empty", "Nothing is given.", $"Write {row.Words}.");
        if (kind.Dimension == Unit.Metre.Dimension && FeetAndInches.Read(plain) is { } compound) return compound;
        var number = TypedNumber.Take(plain, out var rest, out var readings);
        if (readings.Length > 0) return Ambiguous(text, row, readings, rest);
        if (number is not { } value) return NotANumber(text, plain, row, usual);
        if (UnitTable.Find(rest, row) is not { } unit) return WrongUnit(plain, rest, row, usual, value);
        var si = unit.ToSi(value);
        if (!double.IsFinite(si) || (value == 0 && TypedNumber.SaysMoreThanZero(plain)))
            return Failed(row, "quantity.not-finite", $"“{text}” is too large or too small to count with.", "Write a finite number.");
        if (kind == Quantity.Count && si != Math.Truncate(si))
            return Failed(row, "quantity.not-whole", $"“{text}” is not a whole number.", "Write a whole number.");
        return QuantityReading.Of(si, unit);
    }

    /// <summary>Writes a quantity in a unit with the fewest digits that read back as the same value; hyphen-minus, decimal point, no grouping.</summary>
    public static string Write(double si, Unit unit)
    {
        var number = NumberOf(si, unit);
        return unit == Unit.One ? number : unit == Unit.Degree ? number + unit.Name : number + " " + unit.Name;
    }

    /// <summary>A plain number with the fewest digits that read back as the same value.</summary>
    public static string Write(double value) => NumberOf(value, Unit.One);

    private static string NumberOf(double si, Unit unit)
    {
        var value = unit.FromSi(si);
        for (var digits = 1; digits <= 17; digits++)
        {
            var text = value.ToString("G" + digits.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
            var back = double.Parse(text, CultureInfo.InvariantCulture);
            if (unit.ToSi(back).Equals(si)) return Neat(back);
        }
        return Neat(value);
    }

    private static string Neat(double value)
    {
        var text = (value == 0 ? 0 : value).ToString("R", CultureInfo.InvariantCulture);
        var e = text.IndexOf('E', StringComparison.Ordinal);
        return e < 0 ? text : text[..e] + "e" + int.Parse(text[(e + 1)..], CultureInfo.InvariantCulture).ToString(CultureInfo.InvariantCulture);
    }

    private static QuantityReading Ambiguous(string text, KindOfQuantity row, string[] readings, string rest)
    {
        var unit = rest.Length > 0 ? rest : row.Metric.Name;
        var offered = string.Join("” or “", readings.Select(r => $"{r} {unit}".TrimEnd()));
        return Failed(row, "quantity.grouping",
            readings.Length > 1 ? $"“{text}” can be read in two ways." : $"“{text}” separates thousands.",
            $"Write “{offered}”, without thousands separators.");
    }

    private static QuantityReading NotANumber(string text, string plain, KindOfQuantity row, Unit usual) =>
        plain.Trim('+', '-', ' ').ToUpperInvariant() is var bare && (bare.StartsWith("INF", StringComparison.Ordinal) || bare.StartsWith("NAN", StringComparison.Ordinal) || bare.StartsWith('∞'))
            ? Failed(row, "quantity.not-finite", $"“{text}” is not a finite number.", "Write a finite number.")
            : Failed(row, "quantity.not-a-number", $"“{text}” does not start with a number that can be read.", $"Write {row.Words} as “{Example(usual)}”.");

    private static QuantityReading WrongUnit(string plain, string rest, KindOfQuantity row, Unit usual, double value)
    {
        if (rest.Length == 0)
            return Failed(row, "quantity.bare-number", $"“{plain}” has no unit.", $"Probably meant “{plain} {usual.Name}”: write the unit.");
        if (row.Kind.IsReading && rest == "K")
            return Failed(row, "quantity.kelvin-reading", "A temperature reading may not be in K; K is for differences.",
                $"Write the reading in {row.UnitNames}.");
        if (rest.Length > 0 && rest[0] is >= '0' and <= '9')
            return Failed(row, "quantity.two-numbers", $"“{plain}” holds a space inside a number, or two numbers.",
                "Write one number without spaces, then the unit.");
        var other = UnitTable.KindMeasuredIn(rest);
        if (other is not null && row.Units[0] == Unit.One)
            return Failed(row, "quantity.unit-not-wanted", $"“{rest}” is a unit, but {row.Words} has none.", $"Write “{Write(value)}”.");
        if (other is not null)
            return Failed(row, "quantity.other-kind", $"“{rest}” is the unit of {other.Words}, not of {row.Words}.", $"Write {row.Words} in {row.UnitNames}.");
        var nearest = Nearest.Of(rest, row.Units.SelectMany(UnitTable.SpellingsOf).Where(s => s.Length > 0));
        return Failed(row, "quantity.unknown-unit", $"“{rest}” is not a known unit.",
            nearest is null ? $"Write {row.Words} in {row.UnitNames}." : $"Did you mean “{nearest}”?");
    }

    private static QuantityReading Failed(KindOfQuantity row, string id, string wrong, string remedy) =>
        QuantityReading.Failed(id, wrong, row.Units is [var only] && only == Unit.One ? row.Words : $"{row.Words} in {row.UnitNames}", remedy);

    private static string Example(Unit unit) => unit == Unit.One ? "1.2" : Write(unit.ToSi(12), unit);
}
