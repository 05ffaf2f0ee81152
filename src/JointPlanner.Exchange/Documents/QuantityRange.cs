using System.Globalization;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Documents;

/// <summary>Is a quantity within what its field allows, and within what is usual?</summary>
internal static class QuantityRange
{
    private const double AbsoluteZero = -273.15;

    public static FieldValue Check(Field field, QuantityEntry entry, QuantityReading read)
    {
        var (value, unit) = (read.Value, read.Unit ?? Unit.One);
        if (!entry.Allows(value))
            return new(null, null, [entry.Kind.IsReading && value < AbsoluteZero
                ? new Fault("field.absolute-zero", "", "", $"{field.Name}: {Neat(value, unit)} is below absolute zero ({Neat(AbsoluteZero, unit)}).", Allowed(entry, unit),
                    "Correct the temperature." + OtherScale(entry, value, unit))
                : new Fault("field.range", "", "", $"{field.Name}: {Neat(value, unit)} is out of range.", Allowed(entry, unit),
                    "Correct the value or its unit." + OtherScale(entry, value, unit))]);
        if (entry.Usual is { } usual && !entry.IsUsual(value))
            return new(value, null, [new Fault("field.unusual", "", "", $"{field.Name}: {Neat(value, unit)} is unusual.",
                $"Usual: from {Bound(entry, usual.Low, unit)} to {Bound(entry, usual.High, unit)}.",
                "Check the value and its unit; leave it where it is meant." + OtherScale(entry, value, unit), IsWarning: true)]);
        return new(value, null, []);
    }

    public static string Allowed(QuantityEntry entry, Unit? unit)
    {
        var word = entry.OrWord.Length > 0 ? $", or the word “{entry.OrWord}”" : "";
        var kind = UnitTable.Of(entry.Kind);
        return $"Allowed: {kind.Words} from {Bound(entry, entry.Allowed.Low, unit)} to {Bound(entry, entry.Allowed.High, unit)}, in {kind.UnitNames}{word}.";
    }

    /// <summary>A number typed in one temperature scale and meant in the other is the commonest slip of all.</summary>
    private static string OtherScale(QuantityEntry entry, double value, Unit unit)
    {
        if (!entry.Kind.IsReading) return "";
        var other = unit == Unit.Celsius ? Unit.Fahrenheit : Unit.Celsius;
        var meant = other.ToSi(unit.FromSi(value));
        return entry.Allows(meant) && entry.IsUsual(meant)
            ? $" Was it meant in {other.Name}? {Neat(meant, other)} is {Neat(meant, unit)}."
            : "";
    }

    private static string Bound(QuantityEntry entry, string bound, Unit? unit)
    {
        if (unit is null || QuantityText.Parse(bound, entry.Kind).Unit == unit) return bound;
        return Neat(entry.ValueOf(bound), unit);
    }

    private static string Neat(double si, Unit unit)
    {
        var number = double.Parse(unit.FromSi(si).ToString("G5", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return QuantityText.Write(number) + (unit == Unit.One || unit == Unit.Degree ? unit.Name : " " + unit.Name);
    }
}
