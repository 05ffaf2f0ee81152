using JointPlanner.Engine;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>What fits each joint: every rule of the size taken, and why each other family is left.</summary>
internal static class FitPart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        yield return new Heading(1, "Joint choice") { Number = "4" };
        foreach (var joint in page.Result.Joints.Where(j => j.Fit is not null))
        {
            yield return new Heading(2, $"Joint {SheetPage.MarkOf(joint.Joint.Mark, joint.Joint.Id)}");
            if (joint.Fit!.ChosenByDesigner) yield return new Paragraph($"Chosen by the designer: {joint.Joint.ChoiceReason}");
            if (joint.Fit.Chosen is { } size) yield return Rules(page, size);
            yield return Families(page, joint);
        }
    }

    private static Table Rules(SheetPage page, SizeFit size) => Table.Of($"{size.Family}, {size.Size}: every rule",
    [
        new("Rule") { NamesRows = true, WidthMm = 54 }, new("Asked", Align.Right), new("Allowed", Align.Right), new("Share", Align.Right), new("Room left", Align.Right),
        new("Source") { WidthMm = 40 }, new("Step") { WidthMm = 13 },
    ], size.Rules.Select(r => (IReadOnlyList<Words>)
    [
        r.Name, page.WithUnit(r.Quantity, r.Value.Value), page.WithUnit(r.Quantity, r.Limit.Value), r.Share is { } share ? ShareText.Of(share) : "",
        page.WithUnit(r.Quantity, r.Room), ProvenanceText.Of(r.Source), SheetPage.StepOf(r.Value),
    ]));

    private static Table Families(SheetPage page, JointResult joint) => Table.Of("Families tried",
    [
        new("Family") { NamesRows = true }, new("Smallest size that fits"), new("Why not"),
    ], joint.Fit!.Families.Select(f => (IReadOnlyList<Words>)
    [
        f.Family, f.Best?.Size ?? "none", f.Rejection is { } why ? FindingText.Of(why, page.Profile, NumberStyle.Sheet) : "",
    ]));
}
