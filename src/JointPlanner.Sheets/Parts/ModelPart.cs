using System.Globalization;
using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Pdf;
using Said = JointPlanner.Exchange.Printing.Words;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>The solved model, enough to type it into any frame program, and the elementary checks beside what it gave.</summary>
internal static class ModelPart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        if (page.Result.Model is not { } listing) yield break;
        yield return new Heading(1, "Model and hand checks") { Number = "7" };
        yield return new Paragraph(
            $"Plane frame along the neutral axes: points of decks whose section is described move along, vertically and by turning, others only along the deck. Bearings " +
            $"and supports act at their own levels through rigid links. Largest out-of-balance {Small(listing.Residual)} of the largest term; " +
            $"smallest pivot {Small(listing.PivotRatio)} of its diagonal; one refinement step changed displacements by {Small(listing.RefinementChange)}.");
        foreach (var block in SectionPart.Of(page)) yield return block;
        yield return HandChecks(page);
        yield return Members(page, listing);
        if (listing.Model.Springs.Length > 0) yield return Springs(page, listing);
        if (listing.Model.Links.Length > 0) yield return Links(page, listing);
        if (!listing.States.IsEmpty) yield return States(listing);
    }

    private static Table HandChecks(SheetPage page) => Table.Of("Solved lengths beside their elementary checks",
    [
        new("What") { NamesRows = true }, new("Solved", Align.Right), new("By hand", Align.Right), new("Band ±", Align.Right), new("Agrees"), new("Why they may differ"),
    ], page.Result.HandChecks.Select(c => (IReadOnlyList<Words>)
    [
        c.What, page.WithUnit(c.Quantity, c.Solved.Value), c.ByHand is { } hand ? page.WithUnit(c.Quantity, hand.Value) : "none",
        page.WithUnit(c.Quantity, c.Band), c.ByHand is null ? "" : c.Agrees ? "yes" : "no", c.Reason,
    ]));

    private static Table Members(SheetPage page, ModelListing listing) => Table.Of("Members; EI only where the piece bends, EA only where it changes its length",
    [
        new("From") { NamesRows = true }, new("Station", Align.Right), new("To"), new("Station", Align.Right), new("Length", Align.Right), new("EA", Align.Right), new("EI", Align.Right),
    ], listing.Model.Members.Select(m => (IReadOnlyList<Words>)
    [
        m.From.Name, page.WithUnit(Quantity.Length, m.From.Station), m.To.Name, page.WithUnit(Quantity.Length, m.To.Station), page.WithUnit(Quantity.Length, m.Length),
        m.AxialStiffness > 0 ? page.WithUnit(Quantity.AxialStiffness, m.AxialStiffness) : "", m.BendingStiffness > 0 ? page.WithUnit(Quantity.BendingStiffness, m.BendingStiffness) : "",
    ]));

    private static Table Springs(SheetPage page, ModelListing listing) => Table.Of("Springs; heights above the neutral axis of the deck",
    [
        new("Spring") { NamesRows = true }, new("Way"), new("From"), new("Height", Align.Right), new("To"), new("Height", Align.Right), new("Stiffness", Align.Right),
    ], listing.Model.Springs.Select(s => (IReadOnlyList<Words>)
    [
        s.Name, Said.Of(s.Direction), s.From.Name, page.WithUnit(Quantity.Size, s.FromHeight), s.To?.Name ?? "ground", s.To is null ? "" : page.WithUnit(Quantity.Size, s.ToHeight),
        page.WithUnit(s.Direction == Direction.Turning ? Quantity.RotationalStiffness : Quantity.Stiffness, s.Stiffness),
    ]));

    private static Table Links(SheetPage page, ModelListing listing) => Table.Of("Rigid links: each sum is nothing unless the ground is moved; factors of turning are levels",
    [
        new("Link") { NamesRows = true }, new("Condition"),
    ], listing.Model.Links.Select(l => (IReadOnlyList<Words>)[l.Name, string.Join(" ", l.Terms.Select((t, i) => Term(page, listing, t, i == 0)))]));

    private static Table States(ModelListing listing) => Table.Of(
        "What acted on it, beside a unit strain of each segment and a unit of each movement under traffic",
    [
        new("Cause") { NamesRows = true }, new("State"), new("Numbers in steps"),
    ], listing.States.Select(s => (IReadOnlyList<Words>)[Said.Of(s.Cause), s.State, string.Join(" ", s.Numbers.Select(SheetPage.StepOf))]));

    private static string Term(SheetPage page, ModelListing listing, (int Freedom, double Factor) term, bool isFirst)
    {
        var (node, direction) = listing.Model.OwnerOf(term.Freedom);
        var size = Math.Abs(term.Factor);
        var factor = direction == Direction.Turning && size != 1 ? page.WithUnit(Quantity.Size, size) + " · " : "";
        var sign = term.Factor < 0 ? "− " : isFirst ? "" : "+ ";
        return $"{sign}{factor}{node.Name} {Said.Of(direction)}";
    }

    private static string Small(double value) => value == 0 ? "0" : value.ToString("0.0e-0", CultureInfo.InvariantCulture).Replace('-', '−');
}
