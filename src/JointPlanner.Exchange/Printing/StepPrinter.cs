using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>
/// Prints the steps of one calculation in one reader's units. Give it the whole list even where only some steps are wanted: digits
/// follow from every later use.
/// </summary>
public sealed class StepPrinter
{
    private readonly IReadOnlyList<Step> steps;
    private readonly DisplayProfile profile;
    private readonly NumberStyle style;
    private readonly CarriedDigits digits;

    /// <summary>Prepares the digits of every step.</summary>
    /// <param name="steps">All steps of the calculation, each at its own index.</param>
    /// <param name="profile">Units and digits.</param>
    /// <param name="style">Where the text stands.</param>
    public StepPrinter(IReadOnlyList<Step> steps, DisplayProfile profile, NumberStyle style = NumberStyle.Screen) =>
        (this.steps, this.profile, this.style, digits) = (steps, profile, style, new CarriedDigits(steps, profile));

    /// <summary>Every step in order.</summary>
    public IEnumerable<PrintedStep> All => Enumerable.Range(0, steps.Count).Select(Print);

    /// <summary>The step at this index of the calculation.</summary>
    public PrintedStep Print(int index)
    {
        var step = steps[index];
        var printed = new PrintedStep
        {
            Number = NumberOf(index),
            Symbol = step.Symbol,
            Meaning = step.Meaning,
            Key = step.Key,
            Result = Mark(NumberText.Print(step.Value, profile[step.Quantity], 0, style).Text, step, null),
            Origin = "",
        };
        return step.Origin switch
        {
            GivenOrigin g => InFull(printed, index) with { Origin = Words(g), IsDefault = g.IsDefault },
            TableOrigin t => InFull(printed, index) with
            {
                Origin = $"table value: {ProvenanceText.Of(t.Source)}{(t.Row.Length > 0 ? $"; {t.Row}" : "")}",
                IsFromMemory = t.Source.Mark == Engine.Formulas.Mark.Memory,
            },
            SolvedOrigin s => InFull(printed, index) with { Origin = Words(s) },
            SearchOrigin s => InFull(printed, index) with { Origin = $"chosen from the candidates{From(s)}", Candidates = [.. s.Candidates] },
            FormulaOrigin f => Computed(printed, step, f),
            _ => throw new ArgumentException($"No rule to print {step.Origin.GetType().Name}."),
        };
    }

    private PrintedStep InFull(PrintedStep printed, int index) => printed with { Result = Mark(digits.Carried(index, style).Text, steps[index], null) };

    private PrintedStep Computed(PrintedStep printed, Step step, FormulaOrigin origin)
    {
        var formula = origin.Formula;
        var values = origin.From.Select(i => Mark(digits.Carried(i, style).Text, steps[i], NumberOf(i))).ToImmutableArray();
        var last = formula.Operands.Count - 1;
        return printed with
        {
            Formula = FormulaNotation.Symbolic(formula, profile),
            Substituted = FormulaNotation.Substituted(formula, profile, values, [.. origin.From.Select(i => steps[i].Value)]),
            Terms = formula.Repeats && values.Length - last > FormulaNotation.MostTermsInLine ? values[last..] : [],
            CarriedOn = digits.IsRaised(step.Index) ? Mark(digits.Carried(step.Index, style).Text, step, null) : null,
            Origin = $"formula {formula.Id}: {ProvenanceText.Of(formula.Source)}",
            IsFromMemory = formula.Source.Mark == Engine.Formulas.Mark.Memory,
            Shortfall = digits.Suffices(step.Index) ? null : Recomputed(step),
        };
    }

    private string Recomputed(Step step)
    {
        var value = digits.FromPrinted(step.Index);
        return double.IsFinite(value) ? NumberText.WithUnit(value, step.Quantity, profile, style) : "no value";
    }

    private ValueMark Mark(string number, Step step, int? reference) => new(number, profile[step.Quantity].Unit.Name, reference);

    private static int NumberOf(int index) => index + 1;

    private static string From(Origin origin) => origin.Operands.Count == 0
        ? ""
        : " from " + string.Join(" ", origin.Operands.Distinct().Select(i => FormattableString.Invariant($"[{NumberOf(i)}]")));

    private static string Words(GivenOrigin given) => (given.IsDefault, given.Source.Length > 0) switch
    {
        (true, true) => $"default for {given.Path}: {given.Source}",
        (true, false) => $"default for {given.Path}",
        (false, true) => $"given at {given.Path}: {given.Source}",
        (false, false) => $"given at {given.Path}",
    };

    private static string Words(SolvedOrigin solved) => FormattableString.Invariant(
        $"solved by model {solved.Model}{From(solved)}; largest out-of-balance {NumberText.Print(solved.Residual, Residual, 0).Text} of the largest load");

    private static readonly DisplayUnit Residual = new(Unit.One, Digits.Significant(2));
}
