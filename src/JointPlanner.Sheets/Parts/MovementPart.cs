using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Said = JointPlanner.Exchange.Printing.Words;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>Every movement of every joint from its setting state, cause by cause, and how each counts.</summary>
internal static class MovementPart
{
    private static readonly Engine.Bases.Column[] Shown = [Engine.Bases.Column.GapService, Engine.Bases.Column.GapStrength, Engine.Bases.Column.SealRange, Engine.Bases.Column.Racking];

    public static IEnumerable<Block> Of(SheetPage page)
    {
        yield return new Heading(1, "Movements of the joints") { Number = "3" };
        yield return new Paragraph("From each joint's own setting state, along the deck axis and without factors; factors multiply the movement from setting.");
        yield return Temperatures(page);
        foreach (var joint in page.Result.Joints)
        {
            yield return new Heading(2, $"Joint {SheetPage.MarkOf(joint.Joint.Mark, joint.Joint.Id)}");
            yield return new Paragraph(Lengths(page, joint));
            yield return Causes(page, joint);
        }
    }

    private static Table Temperatures(SheetPage page) => Table.Of("Effective temperatures",
    [
        new("Segment") { NamesRows = true }, new("Deck"), new("Lowest", Align.Right), new("Highest", Align.Right), new("α", Align.Right), new("Zero-movement point", Align.Right),
    ], page.Result.Segments.Select(s => (IReadOnlyList<Words>)
    [
        SheetPage.MarkOf(s.Segment.Mark, s.Segment.Id), Said.Of(s.Segment.Kind),
        page.WithUnit(Quantity.Temperature, s.Temperature.Min.Value), page.WithUnit(Quantity.Temperature, s.Temperature.Max.Value),
        page.WithUnit(Quantity.Expansion, s.Temperature.Expansion.Value),
        s.ZeroMovementPoint is { } zero ? page.WithUnit(Quantity.Length, zero.Value) : "moves everywhere",
    ]));

    private static string Lengths(SheetPage page, JointResult joint) => joint.ExpansionLengths.IsEmpty
        ? "No strain of the deck moves this joint."
        : "Expansion length for uniform temperature, creep and shrinkage, both faces: " + string.Join(", ", joint.ExpansionLengths.Select(l =>
            $"{page.WithUnit(Quantity.Length, l.Length.Value)} for {SheetPage.MarkOf(l.Segment.Mark, l.Segment.Id)} {SheetPage.StepOf(l.Length)}")) + ".";

    private static Table Causes(SheetPage page, JointResult joint) => Table.Of(null,
    [
        new("Cause") { NamesRows = true },
        new($"Opens by, {page.Unit(Quantity.Movement)}", Align.Decimal), new($"Closes by, {page.Unit(Quantity.Movement)}", Align.Decimal),
        .. Shown.Select(c => new Pdf.Column(Said.Of(c), Align.Right)), new("Steps") { WidthMm = 24 },
    ], joint.Movements.Select(m => (IReadOnlyList<Words>)
    [
        Said.Of(m.Cause), page.Number(Quantity.Movement, m.OpensBy.Value), page.Number(Quantity.Movement, m.ClosesBy.Value),
        .. Shown.Select(c => (Words)Entry(page, m, c)), $"{SheetPage.StepOf(m.OpensBy)} {SheetPage.StepOf(m.ClosesBy)}",
    ]));

    private static string Entry(SheetPage page, CauseMovement movement, Engine.Bases.Column column) => page.Result.Counting[movement.Cause, column] switch
    {
        Counted counted => "× " + page.Number(Quantity.Ratio, counted.Factor),
        NotCounted => "not counted",
        _ => "silent",
    };
}
