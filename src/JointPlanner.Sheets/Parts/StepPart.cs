using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using Words = JointPlanner.Pdf.Words;

namespace JointPlanner.Sheets.Parts;

/// <summary>Every step of the calculation in order: what was given, what was read from tables, what was computed from them.</summary>
internal static class StepPart
{
    public static IEnumerable<Block> Of(SheetPage page)
    {
        yield return new Heading(1, "Steps") { Number = "8" };
        yield return new Paragraph(
            "Every step that a printed result rests on. Numbers in square brackets name the step that a value comes from. A value that later steps use with more digits than are shown as its result says so.");
        var printer = new StepPrinter(page.Result.Steps, page.Profile, NumberStyle.Sheet);
        var counted = StepsThatCount.Of(page.Result);
        var values = new List<PrintedStep>();
        foreach (var step in counted.Order().Select(printer.Print))
        {
            if (step.Formula is null && step.Candidates.IsEmpty)
            {
                values.Add(step);
                continue;
            }
            if (values.Count > 0) yield return Values(values);
            values = [];
            yield return step.Formula is null ? Search(step) : Computed(step);
        }
        if (values.Count > 0) yield return Values(values);
    }

    private static Table Values(IReadOnlyList<PrintedStep> steps) => Table.Of(null,
    [
        new("Step", Align.Right), new("Symbol"), new("What it is") { NamesRows = true }, new("Value", Align.Right), new("Where it comes from"),
    ], steps.Select(s => (IReadOnlyList<Words>)
    [
        Reference(s), FormulaBoxes.Symbol(s.Symbol), s.Meaning, LinearText.Of(s.CarriedOn ?? s.Result), s.Origin,
    ]));

    private static FormulaBlock Computed(PrintedStep step)
    {
        var lines = new List<FormulaLine>
        {
            new(FormulaBoxes.Symbol(step.Symbol), "=", FormulaBoxes.Of(step.Formula!)),
            new(null, "=", FormulaBoxes.Of(step.Substituted!)),
        };
        lines.AddRange(step.Terms.Select(t => new FormulaLine(null, "|", FormulaBoxes.Value(t, MathKind.Upright))));
        lines.Add(new FormulaLine(null, "=", Result(step)));
        return new FormulaBlock(lines)
        {
            Label = Words.Join(Words.Strong(Reference(step) + " "), step.Meaning),
            Source = step.Origin,
            Remark = step.Shortfall is { } shortfall ? $"Printed digits do not suffice here: they give {shortfall}." : Words.None,
        };
    }

    private static MathNode Result(PrintedStep step)
    {
        var result = FormulaBoxes.Value(step.Result, MathKind.Strong);
        return step.CarriedOn is { } carried
            ? MathNode.Row(result, MathNode.Upright(", carried on as "), FormulaBoxes.Value(carried, MathKind.Upright))
            : result;
    }

    private static Table Search(PrintedStep step) => Table.Of($"{Reference(step)} {step.Meaning}: {LinearText.Of(step.Result)}",
        [new("Candidate") { NamesRows = true }, new("Rejected by")],
        step.Candidates.Select(c => (IReadOnlyList<Words>)[c.Name, c.RejectedBy.Length == 0 ? Words.Strong("taken") : c.RejectedBy]));

    private static string Reference(PrintedStep step) => FormattableString.Invariant($"[{step.Number}]");
}
