using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>What the calculation rests on that nobody computed: defaults, values from memory, findings.</summary>
internal static class AssumptionPart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        yield return new Heading(1, "Assumptions, findings, limits of validity") { Number = "6" };
        yield return Table.Of("Findings", [new("Weight"), new("Where"), new("What")],
            page.Result.Findings.OrderByDescending(f => f.Severity).Select(f => (IReadOnlyList<Words>)
                [FindingText.Of(f.Severity), f.Path, FindingText.Of(f, page.Profile, NumberStyle.Sheet)]));
        if (!page.Result.MemoryValues.IsEmpty)
            yield return Table.Of("Values held from memory", [new("Value") { NamesRows = true }, new("Document and place"), new("Confirmed")],
                page.Result.MemoryValues.Select(v => (IReadOnlyList<Words>)
                    [v.ValueId, ProvenanceText.Of(v), page.Facts.Confirmed.GetValueOrDefault(v.ValueId, "no")]));
        if (page.Plan.Defaults.Count > 0)
            yield return Table.Of("Defaults that stand in where nobody gave a value", [new("Field") { NamesRows = true }, new("Reason")],
                page.Plan.Defaults.Select(d => (IReadOnlyList<Words>)[d.Key, d.Value]));
    }
}
