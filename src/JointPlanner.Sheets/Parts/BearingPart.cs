using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Said = JointPlanner.Exchange.Printing.Words;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>Travel of the bearings and forces of the lines that hold the deck.</summary>
internal static class BearingPart
{
    private static readonly string[] States = ["hot, start", "cold, start", "hot, end", "cold, end"];

    public static IEnumerable<Block> Of(SheetPage page)
    {
        yield return new Heading(1, "Bearings") { Number = "5" };
        yield return new Paragraph(
            "Travel of the superstructure relative to what is below, positive up-station, from each line's own setting state, without factors: at the start of its life and after all shortening.");
        yield return Table.Of(null,
        [
            new("Line") { NamesRows = true }, new("Kind"),
            .. States.Select(h => new Column($"{h}, {page.Unit(Quantity.Movement)}", Align.Decimal)), new("Steps"),
        ], page.Result.Bearings.Select(b =>
        {
            var line = page.Plan.Bearings.First(x => x.Id == b.Bearing);
            return (IReadOnlyList<Words>)
            [
                SheetPage.MarkOf(line.Mark, line.Id), Said.Of(line.Kind),
                .. new[] { b.HotAtStart, b.ColdAtStart, b.HotAtEnd, b.ColdAtEnd }.Select(n => (Words)page.Number(Quantity.Movement, n.Value)),
                $"{SheetPage.StepOf(b.HotAtEnd)} {SheetPage.StepOf(b.ColdAtEnd)}",
            ];
        }));
        if (!page.Result.BearingMovements.IsEmpty) yield return OtherCauses(page);
        if (page.Result.Restraints.IsEmpty) yield break;
        yield return Table.Of("Forces of lines that hold back the deck, on the deck, positive up-station",
        [
            new("Line") { NamesRows = true }, new("Kind"), new("Hottest", Align.Right), new("Coldest, shortened", Align.Right), new("Steps"),
        ], page.Result.Restraints.Select(r =>
        {
            var line = page.Plan.Bearings.First(x => x.Id == r.Bearing);
            return (IReadOnlyList<Words>)
            [
                SheetPage.MarkOf(line.Mark, line.Id), Said.Of(line.Kind), page.WithUnit(Quantity.Force, r.Hot.Value), page.WithUnit(Quantity.Force, r.Cold.Value),
                $"{SheetPage.StepOf(r.Hot)} {SheetPage.StepOf(r.Cold)}",
            ];
        }));
    }

    private static Table OtherCauses(SheetPage page) => Table.Of("Travel up-station and rotation of the deck, rising up-station positive, by causes that the frame computes, without factors",
    [
        new("Line") { NamesRows = true }, new("Cause"), new("Travel, most", Align.Right), new("Travel, least", Align.Right), new("Rotation, most", Align.Right),
        new("Rotation, least", Align.Right), new("Steps"),
    ], page.Result.BearingMovements.Select(b => (IReadOnlyList<Words>)
    [
        SheetPage.MarkOf(page.Plan.Bearings.First(x => x.Id == b.Bearing).Mark, b.Bearing), Said.Of(b.Cause),
        page.WithUnit(Quantity.Movement, b.TravelMost.Value), page.WithUnit(Quantity.Movement, b.TravelLeast.Value),
        b.RotationMost is { } most ? page.WithUnit(Quantity.Rotation, most.Value) : "", b.RotationLeast is { } least ? page.WithUnit(Quantity.Rotation, least.Value) : "",
        $"{SheetPage.StepOf(b.TravelMost)} {SheetPage.StepOf(b.TravelLeast)}",
    ]));
}
