using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;
using JointPlanner.Pdf;

namespace JointPlanner.Sheets.Parts;

/// <summary>What people on site need beside the tables: methods of measuring with their uncertainty, the mean temperature, how long the issue may be used.</summary>
internal static class DayPart
{
    public static IEnumerable<Block> Of(SheetPage page, StoredDay day)
    {
        yield return new Heading(2, "On the day of setting");
        var mean = day.Points.IsEmpty
            ? "The temperature of the structure is one mean temperature, found on site."
            : $"The mean temperature of the structure is Σ w·T / Σ w over {string.Join(", ", day.Points.Select(p => $"{p.Name} (w = {page.Number(Quantity.Ratio, p.Weight)})"))}.";
        yield return new Paragraph($"{mean} Each method of measuring has a table of its own in fine steps, attached as results.json, with its own reserve in place of that of the tables above. " +
            $"Between two rows nothing is interpolated: what both rows allow may be set. Do not set by this sheet later than {page.WithUnit(Quantity.Age, day.UseWithin)} after its issue.");
        yield return Table.Of("Methods of measuring",
            [new("Method") { NamesRows = true }, new($"u(T), {page.Unit(Quantity.TemperatureDifference)}", Align.Decimal), new("Source")],
            day.Methods.Select(m => (IReadOnlyList<Words>)[m.Name, page.Number(Quantity.TemperatureDifference, m.TemperatureUncertainty), m.Source]));
    }
}
