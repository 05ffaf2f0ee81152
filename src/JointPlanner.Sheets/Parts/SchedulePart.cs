using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>The joint schedule: one row a joint, what is chosen and how it is set.</summary>
internal static class SchedulePart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        yield return new Heading(1, "Joint schedule") { Number = "1" };
        yield return Table.Of(null,
        [
            new("Joint") { NamesRows = true }, new("Device"), new("Set at, structure"), new("Set, normal"), new("−"), new("+"), new("Governed by"), new("Share used"),
        ], page.Result.Joints.Select(j => Row(page, j)));
        yield return new Paragraph(
            "Set values are normal to the joint line; − and + say how much smaller or larger the opening may be made, after the reserve for measuring. " +
            "The setting table of each joint holds other temperatures and deck ages.");
    }

    private static IReadOnlyList<Words> Row(SheetPage page, JointResult joint)
    {
        var mark = SheetPage.MarkOf(joint.Joint.Mark, joint.Joint.Id);
        if (joint.Fit is not { Chosen: { } size } fit) return [mark, joint.Fit is null ? "no owner's rule set" : "none fits", "", "", "", "", "", ""];
        var design = joint.Table?.Design;
        return
        [
            mark, $"{size.Family}, {size.Size}{(fit.ChosenByDesigner ? " (designer's choice)" : "")}",
            page.WithUnit(Quantity.Temperature, joint.Joint.SettingTemperature),
            design?.Set is { } set ? Words.Strong(page.Opening(set.Value)) : "do not set",
            design?.Minus is { } minus ? page.Opening(minus.Value) : "", design?.Plus is { } plus ? page.Opening(plus.Value) : "",
            size.Governing?.Name ?? "", size.Governing?.Share is { } share ? ShareText.Of(share) : "",
        ];
    }
}
