using System.Globalization;
using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Pdf;

namespace JointPlanner.Sheets.Parts;

/// <summary>The solved model, enough to type it into any frame program, and the elementary checks beside what it gave.</summary>
internal static class ModelPart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        if (page.Result.Model is not { } listing) yield break;
        yield return new Heading(1, "Model and hand checks") { Number = "7" };
        yield return new Paragraph(
            $"Axial members along the deck with springs to supports and ground. Largest out-of-balance {Small(listing.Residual)} of the largest load; " +
            $"smallest pivot {Small(listing.PivotRatio)} of its diagonal; one refinement step changed displacements by {Small(listing.RefinementChange)}.");
        yield return HandChecks(page);
        yield return Members(page, listing);
        if (listing.Model.Springs.Length > 0) yield return Springs(page, listing);
    }

    private static Table HandChecks(SheetPage page) => Table.Of("Solved lengths beside their elementary checks",
    [
        new("What") { NamesRows = true }, new("Solved", Align.Right), new("By hand", Align.Right), new("Band ±", Align.Right), new("Agrees"), new("Why they may differ"),
    ], page.Result.HandChecks.Select(c => (IReadOnlyList<Words>)
    [
        c.What, page.WithUnit(Quantity.Length, c.Solved.Value), c.ByHand is { } hand ? page.WithUnit(Quantity.Length, hand.Value) : "none",
        page.WithUnit(Quantity.Length, c.Band), c.ByHand is null ? "" : c.Agrees ? "yes" : "no", c.Reason,
    ]));

    private static Table Members(SheetPage page, ModelListing listing) => Table.Of("Members (points that move as one share a number; − does not move)",
    [
        new("From") { NamesRows = true }, new("Station", Align.Right), new("Unknown", Align.Right), new("To"), new("Station", Align.Right), new("Unknown", Align.Right),
        new("Length", Align.Right), new("EA", Align.Right),
    ], listing.Model.Members.Select(m => (IReadOnlyList<Words>)
    [
        m.From.Name, page.WithUnit(Quantity.Length, m.From.Station), Unknown(m.From.Unknown), m.To.Name, page.WithUnit(Quantity.Length, m.To.Station), Unknown(m.To.Unknown),
        page.WithUnit(Quantity.Length, m.Length), page.WithUnit(Quantity.AxialStiffness, m.AxialStiffness),
    ]));

    private static Table Springs(SheetPage page, ModelListing listing) => Table.Of("Springs along the deck",
    [
        new("Spring") { NamesRows = true }, new("From"), new("To"), new("Stiffness", Align.Right),
    ], listing.Model.Springs.Select(s => (IReadOnlyList<Words>)
    [
        s.Name, s.From.Name, s.To?.Name ?? "ground", page.WithUnit(Quantity.Stiffness, s.Stiffness),
    ]));

    private static string Unknown(int unknown) => unknown < 0 ? "−" : unknown.ToString(CultureInfo.InvariantCulture);

    private static string Small(double value) => value == 0 ? "0" : value.ToString("0.0e-0", CultureInfo.InvariantCulture).Replace('-', '−');
}
