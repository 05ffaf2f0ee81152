using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tests.Printing;

/// <summary>Makes short calculations and prints them.</summary>
internal static class PrintedText
{
    public static readonly Provenance Ours = Provenance.Derived("made for a test");

    /// <summary>Givens for the values, the formula once, printed.</summary>
    public static string Of(Formula formula, DisplayProfile profile, params double[] values) => Of(DerivationOf(formula, values), profile);

    public static string Of(Derivation derivation, DisplayProfile profile, NumberStyle style = NumberStyle.Screen) =>
        string.Join('\n', new StepPrinter(derivation.Steps, profile, style).All.SelectMany(StepText.Lines));

    public static Derivation DerivationOf(Formula formula, params double[] values)
    {
        var derivation = new Derivation();
        var operands = values.Select((v, i) =>
        {
            var operand = formula.Operands[Math.Min(i, formula.Operands.Count - 1)];
            return derivation.Given($"test/{i}", operand.Symbol, operand.Meaning, operand.Quantity, v);
        }).ToArray();
        derivation.Use(formula, "test/result", operands);
        return derivation;
    }

    public static Formula Make(string symbol, Quantity quantity, Operand[] operands, Expression body) =>
        new($"test.{symbol}", symbol, "made for a test", quantity, operands, body, Ours, new(0, 0, "none"));
}
