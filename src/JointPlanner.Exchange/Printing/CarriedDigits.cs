using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>
/// How many digits each step of a calculation must show beyond those its kind of quantity wants, so that every later step can be
/// recomputed from the printed text: the error that the rounding of its operands makes stays below half its own last digit, and its
/// choices decide as they did. A step has one printed value, wherever it is used.
/// </summary>
internal sealed class CarriedDigits
{
    /// <summary>No value is printed with more digits than this beyond those wanted.</summary>
    public const int Most = 8;

    /// <summary>Given values and values of tables are printed in full where so many more digits do it.</summary>
    private const int MostToBeExact = 4;

    private readonly IReadOnlyList<Step> steps;
    private readonly DisplayProfile profile;
    private readonly int[] more;
    private readonly HashSet<int> insufficient = [];

    public CarriedDigits(IReadOnlyList<Step> steps, DisplayProfile profile)
    {
        (this.steps, this.profile) = (steps, profile);
        more = [.. steps.Select(s => s.Origin is FormulaOrigin ? 0 : NumberText.DigitsToBeExact(s.Value, profile[s.Quantity], MostToBeExact))];
        // Digits raised for one use change the printed operands of another, so the list is walked until nothing changes.
        bool raised;
        do
        {
            raised = false;
            insufficient.Clear();
            foreach (var step in steps)
                if (step.Origin is FormulaOrigin origin) raised |= Raise(step, origin);
        }
        while (raised);
    }

    /// <summary>The step's value as later steps use it.</summary>
    public PrintedNumber Carried(int step, NumberStyle style = NumberStyle.Screen) =>
        NumberText.Print(steps[step].Value, profile[steps[step].Quantity], more[step], style);

    /// <summary>True when the step shows more digits than its kind of quantity wants.</summary>
    public bool IsRaised(int step) => more[step] > 0;

    /// <summary>False when even the most digits do not let a reader recompute the step.</summary>
    public bool Suffices(int step) => !insufficient.Contains(step);

    /// <summary>What a reader computes for the step from its printed operands, SI; may be infinite.</summary>
    public double FromPrinted(int step) =>
        steps[step].Origin is FormulaOrigin o ? o.Formula.Compute([.. o.From.Select(i => Carried(i).Value)]) : steps[step].Value;

    private bool Raise(Step step, FormulaOrigin origin)
    {
        var exact = origin.From.Select(i => steps[i].Value).ToArray();
        var half = NumberText.Print(step.Value, profile[step.Quantity], 0).LastDigit / 2;
        var raised = false;
        while (!IsRecomputed(step, origin, exact, half))
        {
            if (WorstOperand(step, origin, exact) is not { } worst)
            {
                insufficient.Add(step.Index);
                return raised;
            }
            foreach (var i in worst) more[i]++;
            raised = true;
        }
        return raised;
    }

    private bool IsRecomputed(Step step, FormulaOrigin origin, double[] exact, double half)
    {
        var printed = origin.From.Select(i => Carried(i).Value).ToArray();
        return Math.Abs(origin.Formula.Compute(printed) - step.Value) < half && DecidesAlike(origin.Formula, origin.Formula.Body, exact, printed);
    }

    /// <summary>The operand whose rounding alone moves the result most; all of them where none alone moves it; null where none can be raised.</summary>
    private int[]? WorstOperand(Step step, FormulaOrigin origin, double[] exact)
    {
        var candidates = Enumerable.Range(0, exact.Length)
            .Where(k => more[origin.From[k]] < Most && !Carried(origin.From[k]).Value.Equals(exact[k]))
            .Select(k => (Step: origin.From[k], Error: ErrorOf(k)))
            .ToArray();
        if (candidates.Length == 0) return null;
        var worst = candidates.MaxBy(c => c.Error);
        return worst.Error > 0 ? [worst.Step] : [.. candidates.Select(c => c.Step).Distinct()];

        double ErrorOf(int k)
        {
            var values = (double[])exact.Clone();
            values[k] = Carried(origin.From[k]).Value;
            var error = Math.Abs(origin.Formula.Compute(values) - step.Value);
            return double.IsNaN(error) ? double.PositiveInfinity : error;
        }
    }

    /// <summary>Walks the sides that apply; what stands on the other side of a choice is neither computed nor printed.</summary>
    private static bool DecidesAlike(Formula formula, Expression e, double[] exact, double[] printed) => e switch
    {
        Choice c => formula.Holds(c, exact) == formula.Holds(c, printed)
            && DecidesAlike(formula, c.Left, exact, printed) && DecidesAlike(formula, c.Right, exact, printed)
            && DecidesAlike(formula, formula.Holds(c, exact) ? c.Then : c.Otherwise, exact, printed),
        Binary b => DecidesAlike(formula, b.Left, exact, printed) && DecidesAlike(formula, b.Right, exact, printed),
        Powered p => DecidesAlike(formula, p.Base, exact, printed),
        RaisedTo p => DecidesAlike(formula, p.Base, exact, printed) && DecidesAlike(formula, p.Exponent, exact, printed),
        Function f => DecidesAlike(formula, f.Argument, exact, printed),
        Extreme x => DecidesAlike(formula, x.Left, exact, printed) && DecidesAlike(formula, x.Right, exact, printed),
        Rounded r => DecidesAlike(formula, r.Value, exact, printed) && DecidesAlike(formula, r.Step, exact, printed),
        Measured m => DecidesAlike(formula, m.Value, exact, printed),
        _ => true,
    };
}
