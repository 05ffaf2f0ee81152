using System.Globalization;

namespace JointPlanner.Recomputation.Tests.Reading;

/// <summary>Computes every step of a printed calculation again, from nothing but its text.</summary>
public static class Recomputer
{
    /// <summary>What is wrong with the text, a sentence each; empty when all of it holds.</summary>
    public static IReadOnlyList<string> Complaints(string text) => Complaints(StepBlock.All(text));

    /// <summary>The same for steps that were read already.</summary>
    public static IReadOnlyList<string> Complaints(IReadOnlyList<StepBlock> steps)
    {
        var complaints = new List<string>();
        var known = new Dictionary<int, StepBlock>();
        foreach (var step in steps)
        {
            if (step.Calculation is not null) complaints.AddRange(Check(step, known).Select(c => $"step {step.Number} ({step.Heading}): {c}"));
            if (Math.Abs(step.CarriedOn.Amount - step.Result.Amount) > (0.5 + 1e-6) * step.Result.LastDigit)
                complaints.Add($"step {step.Number}: {step.CarriedOn.Text} is carried on, but the result is {step.Result.Text}");
            if (!known.TryAdd(step.Number, step)) complaints.Add($"step {step.Number} stands twice");
        }
        return complaints;
    }

    private static List<string> Check(StepBlock step, Dictionary<int, StepBlock> known)
    {
        var missing = new List<string>();
        var used = new Dictionary<int, PrintedValue>();
        Amount computed;
        try
        {
            computed = Calculator.Compute(step.Calculation!, step.Rows, (number, value) =>
            {
                if (!known.TryGetValue(number, out var source)) missing.Add($"[{number}] stands nowhere before");
                else if (source.CarriedOn.Text != value.Text) missing.Add($"[{number}] is used as {value.Text}, but stands as {source.CarriedOn.Text}");
                used[number] = value;
                return value.Amount;
            });
        }
        catch (FormatException unreadable)
        {
            return [unreadable.Message];
        }
        if (missing.Count > 0) return missing;
        if (computed.Powers != step.Result.Powers) return [$"the line gives {computed.Powers}, the result is {step.Result.Text}"];
        var off = Math.Abs(computed.Value - step.Result.Amount);
        if (!(off <= (1 + 1e-6) * step.Result.LastDigit) && !step.SaysItFallsShort)
            return [$"the line gives {Shown(computed.Value / step.Result.LastDigit)} units of the last digit, printed is {step.Result.Text}"];
        var room = RoundingOfOperands(step, used, computed.Value) + (0.5 * step.CarriedOn.LastDigit);
        return Math.Abs(computed.Value - step.CarriedOn.Amount) <= (1.01 * room) + (1e-9 * Math.Abs(computed.Value))
            ? []
            : [$"{step.CarriedOn.Text} is carried on, which the rounding of the operands does not explain"];
    }

    /// <summary>How far the result may move when each operand moves by half its last digit, to first order.</summary>
    private static double RoundingOfOperands(StepBlock step, Dictionary<int, PrintedValue> used, double computed) =>
        used.Sum(operand => new[] { -0.5, 0.5 }.Max(half =>
            Math.Abs(Calculator.Compute(step.Calculation!, step.Rows,
                (number, value) => value.Amount + (number == operand.Key ? half * value.LastDigit : 0), checksDecisions: false).Value - computed)));

    private static string Shown(double value) => value.ToString("G6", CultureInfo.InvariantCulture);
}
