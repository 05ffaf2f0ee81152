using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Sections;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>Cross-sections: layers, stiffness, and what acts between slab and steel.</summary>
internal static class SectionPart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        foreach (var segment in page.Result.Segments.Where(s => s.Section is not null))
        {
            var (section, mark) = (segment.Section!, SheetPage.MarkOf(segment.Segment.Mark, segment.Segment.Id));
            yield return new Heading(2, $"Section of {mark}");
            yield return Layers(page, section);
            yield return new Paragraph(Sentence(page, section));
            if (!section.Interactions.IsEmpty) yield return SlabAndSteel(page, section);
        }
    }

    private static Table Layers(SheetPage page, SectionResult section) => Table.Of("Layers, depths below the top of the section",
    [
        new("Layer") { NamesRows = true }, new("E", Align.Right), new("A", Align.Right), new("Depth", Align.Right), new("Strip height", Align.Right), new("EA", Align.Right),
    ], section.Properties.Layers.Select(l => (IReadOnlyList<Words>)
    [
        l.Layer.Id, page.WithUnit(Quantity.Stress, l.Layer.Modulus), page.WithUnit(Quantity.Area, l.Layer.Area), page.WithUnit(Quantity.Size, l.Depth.Value),
        page.WithUnit(Quantity.Size, l.Height.Value), page.WithUnit(Quantity.AxialStiffness, l.AxialStiffness.Value),
    ]));

    private static string Sentence(SheetPage page, SectionResult section)
    {
        var p = section.Properties;
        var text = $"EA {page.WithUnit(Quantity.AxialStiffness, p.AxialStiffness.Value)} {SheetPage.StepOf(p.AxialStiffness)}, EI {page.WithUnit(Quantity.BendingStiffness, p.BendingStiffness.Value)} " +
            $"{SheetPage.StepOf(p.BendingStiffness)}, neutral axis {page.WithUnit(Quantity.Size, p.NeutralAxis.Value)} below the top {SheetPage.StepOf(p.NeutralAxis)}; bearing level " +
            $"{page.WithUnit(Quantity.Size, p.BearingDrop)} below it, road surface {page.WithUnit(Quantity.Size, p.SurfaceHeight)} above it.";
        if (section.EffectiveExpansion is { } alpha) text += $" Best estimate of α of the whole: {page.WithUnit(Quantity.Expansion, alpha.Value)} {SheetPage.StepOf(alpha)}.";
        if (section.ReliefMovement is { } relief)
            text += $" Where the slab does not act with its steel, both move {page.WithUnit(Quantity.Movement, Math.Abs(relief.Value))} against each other over " +
                $"{page.WithUnit(Quantity.Length, p.Section.ReliefSpacing)} between relief joints, from mean temperature to either extreme {SheetPage.StepOf(relief)}.";
        return text;
    }

    private static Table SlabAndSteel(SheetPage page, SectionResult section) => Table.Of("Between slab and steel",
    [
        new("State") { NamesRows = true }, new("Strain at neutral axis", Align.Right), new("Curvature", Align.Right), new("Force of the slab", Align.Right),
        new("End slip", Align.Right), new("End shear flow", Align.Right), new("Steps"),
    ], section.Interactions.Select(i => (IReadOnlyList<Words>)
    [
        i.State.Name, page.WithUnit(Quantity.Strain, i.State.AxialStrain.Value), page.WithUnit(Quantity.Curvature, i.State.Curvature.Value), page.WithUnit(Quantity.Force, i.Force.Value),
        i.EndSlip is { } slip ? page.WithUnit(Quantity.Movement, slip.Value) : "connection not given",
        i.EndShearFlow is { } flow ? page.WithUnit(Quantity.LineLoad, flow.Value) : "connection not given", SheetPage.StepOf(i.Force),
    ]));
}
