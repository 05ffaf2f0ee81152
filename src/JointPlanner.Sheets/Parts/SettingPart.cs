using JointPlanner.Engine;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>Setting tables: by temperature and deck age the window, the value to set and how far off it may be.</summary>
internal static class SettingPart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        yield return new Heading(1, "Setting tables") { Number = "2" };
        foreach (var joint in page.Result.Joints.Where(j => j.Table is not null))
        {
            yield return new Heading(2, $"Joint {SheetPage.MarkOf(joint.Joint.Mark, joint.Joint.Id)}");
            yield return new Paragraph(Introduction(page, joint, joint.Table!));
            foreach (var age in joint.Table!.Ages) yield return TableAt(page, joint, age);
        }
        if (page.Facts.Day is { } day) foreach (var block in DayPart.Of(page, day)) yield return block;
    }

    private static string Introduction(SheetPage page, JointResult joint, SettingTable table)
    {
        var k = page.WithUnit(Quantity.Rate, Math.Abs(table.Rate.Value));
        // Below 0.05 mm/K temperature hardly matters: the sentence comes from the sign of the slope, never from a fixed phrase.
        var direction = Math.Abs(table.Rate.Value) < 0.05e-3
            ? "Temperature hardly changes this gap."
            : table.Rate.Value > 0 ? "On a colder day this gap is wider." : "On a colder day this gap is narrower.";
        var least = table.LeastAge is { } age ? $" Do not set below a deck age of {page.WithUnit(Quantity.Age, age)}." : "";
        return $"{direction} The normal opening changes by {k} (step {SheetPage.StepOf(table.Rate)}). " +
            $"Valid from {page.WithUnit(Quantity.Temperature, table.Min.Value)} to {page.WithUnit(Quantity.Temperature, table.Max.Value)} structure temperature.{least} " +
            $"Skew {page.WithUnit(Quantity.Angle, joint.Joint.Skew)}: the opening along the road is the normal one / cos β, rounded in its own direction.";
    }

    private static Table TableAt(SheetPage page, JointResult joint, double? age)
    {
        var rows = joint.Table!.Rows.Where(r => Nullable.Equals(r.DeckAge, age)).Select(r => Row(page, joint, r));
        var caption = age is { } a ? $"Deck age at setting {page.WithUnit(Quantity.Age, a)}" : null;
        return Table.Of(caption,
        [
            new($"Structure {page.Unit(Quantity.Temperature)}", Align.Decimal) { NamesRows = true },
            new("Least, normal", Align.Right), new("Set, normal", Align.Right), new("−", Align.Right), new("+", Align.Right), new("Greatest, normal", Align.Right),
            new("Set, along road", Align.Right), new("Least by; greatest by"),
        ], rows);
    }

    private static IReadOnlyList<Words> Row(SheetPage page, JointResult joint, SettingRow row)
    {
        var t = page.Number(Quantity.Temperature, row.Temperature);
        var window = row.Window;
        var least = window is null ? "" : page.Number(Quantity.Opening, window.Least.Value);
        var greatest = window is null ? "" : page.Number(Quantity.Opening, window.Greatest.Value);
        var by = window is null ? "" : $"{window.LeastBy.Name}; {window.GreatestBy.Name}";
        if (row.Set is not { } set) return [t, least, Words.Strong("do not set"), "", "", greatest, "", Why(page, row)];
        return
        [
            t, least, Words.Strong(page.Opening(set.Value)), page.Opening(row.Minus!.Value.Value), page.Opening(row.Plus!.Value.Value), greatest,
            row.Along is { } along ? page.Opening(along.Set.Value) : "measure normal", row.ByGauge ? $"{by}; measure by gauge" : by,
        ];
    }

    private static string Why(SheetPage page, SettingRow row) => row.Refusal is { } refusal ? FindingText.Of(refusal, page.Profile, NumberStyle.Sheet) : "";
}
