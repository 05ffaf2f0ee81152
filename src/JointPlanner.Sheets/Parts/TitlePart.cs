using JointPlanner.Drawings;
using JointPlanner.Engine.Formulas;
using JointPlanner.Pdf;

namespace JointPlanner.Sheets.Parts;

/// <summary>First page: what it is, whose, the elevation, the boxes for signatures.</summary>
internal static class TitlePart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        var (facts, structure) = (page.Facts, page.Plan.Structure);
        yield return new TitleBlock("Movements of joints and bearings", $"{structure.Number} {structure.Name}");
        yield return new KeyValues(
        [
            new("Place", structure.Place), new("Revision", facts.Revision),
            new("Owner", facts.Organisation), new("Date", facts.Date.ToString("yyyy-MM-dd HH:mm zzz", System.Globalization.CultureInfo.InvariantCulture)),
            new("Designer", facts.Designer), new("Checker", facts.Checker),
            new("Code", facts.Basis), new("Code folder", facts.BasisId),
            new("Owner's rules", facts.OwnerRules), new("Units", page.Profile.Name),
        ])
        { TwoAcross = true };
        yield return new KeyValues(
        [
            new("Package SHA-256", SheetFacts.Digest(facts.Package)), new("Results SHA-256", SheetFacts.Digest(facts.Results)),
        ]);
        yield return ElevationOf(page);
        foreach (var caution in Cautions(page)) yield return caution;
        yield return new SignatureFields(
        [
            new SignatureField("designer", "Designer") { Person = NullIfEmpty(facts.Designer) },
            new SignatureField("checker", "Checker") { Person = NullIfEmpty(facts.Checker) },
        ]);
    }

    private static PictureBlock ElevationOf(SheetPage page)
    {
        var elevation = Elevation.Of(new ElevationRequest
        {
            Plan = page.Plan,
            Length = x => page.WithUnit(Quantity.Length, x),
            Paper = ElevationPaper.Sheet with { WidthMm = page.Paper.TextWidthMm },
            ZeroMovementPoints = page.Result.Segments.Where(s => s.ZeroMovementPoint is not null)
                .ToDictionary(s => s.Segment.Id, s => s.ZeroMovementPoint!.Value.Value),
        });
        return new PictureBlock(elevation.Picture, $"Elevation. {elevation.View.ScaleSentence}");
    }

    private static IEnumerable<Block> Cautions(SheetPage page)
    {
        yield return new Note("Caution",
            "These numbers assist a licensed engineer. Local codes, the engineer of record and licensed practice decide. " +
            "On the day: traffic control, work at height, pinch points while the deck moves; never loosen restraints of a loaded bearing from these numbers alone.")
        { Caution = true };
        var unconfirmed = page.Result.MemoryValues.Count(v => !page.Facts.IsConfirmed(v));
        if (unconfirmed > 0)
            yield return new Note("From memory",
                FormattableString.Invariant($"{unconfirmed} values are held from memory and not confirmed by the owner; they are listed with the assumptions. This print may not be issued."))
            { Caution = true };
        var open = page.Result.Findings.Count(f => f.Severity >= Severity.BlocksIssue);
        if (open > 0)
            yield return new Note("Open", FormattableString.Invariant($"{open} findings stop the issue of this calculation; they are listed with the assumptions.")) { Caution = true };
    }

    private static string? NullIfEmpty(string text) => text.Length == 0 ? null : text;
}
