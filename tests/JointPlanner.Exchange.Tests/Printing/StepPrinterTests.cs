using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Recomputation.Tests.Reading;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Exchange.Tests.Printing;

public class StepPrinterTests
{
    private static readonly Operand A = new("a", "a movement", Quantity.Movement), B = new("b", "another movement", Quantity.Movement);
    private static readonly Operand Alpha = new("α", "expansion", Quantity.Expansion), L = new("L", "length", Quantity.Length);
    private static readonly Operand Hot = new("T_hot", "hot", Quantity.Temperature), Cold = new("T_cold", "cold", Quantity.Temperature);
    private static readonly Operand Beta = new("β", "skew", Quantity.Angle), Each = new("d", "part", Quantity.Movement);
    private static readonly Operand Modulus = new("E", "modulus", Quantity.Stress), Share = new("s", "share", Quantity.Ratio);

    public static TheoryData<string> Profiles => ["metric", "us"];

    public static TheoryData<string, string> FormulasAndProfiles
    {
        get
        {
            var data = new TheoryData<string, string>();
            foreach (var formula in EveryFormula.All)
                foreach (var profile in DisplayProfile.All) data.Add(formula.Id, profile.Id);
            return data;
        }
    }

    [Theory]
    [MemberData(nameof(FormulasAndProfiles))]
    public void Every_formula_is_recomputed_from_its_printed_example(string id, string profile)
    {
        var formula = EveryFormula.Of(id);
        var text = PrintedText.Of(formula, DisplayProfile.Of(profile), formula.Example.Inputs);
        Assert.Equal(formula.Example.Inputs.Length + 1, StepBlock.All(text).Count);
        Assert.Empty(Recomputer.Complaints(text));
        Assert.DoesNotContain("do not suffice", text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_product_prints_symbols_then_values_then_the_result()
    {
        var formula = PrintedText.Make("Δ", Quantity.Movement, [Alpha, L, Hot, Cold], Alpha * L * (Hot - Cold));
        var lines = PrintedText.Of(formula, DisplayProfile.Metric, 12e-6, 42.5, 28, -18).Split('\n');
        Assert.Contains("[1] α: expansion", lines);
        Assert.Contains("     α = 12.0×10⁻⁶ /K", lines);
        Assert.Contains("     Δ = α · L · (T_hot − T_cold)", lines);
        Assert.Contains("       = 12.0×10⁻⁶ /K [1] · 42.500 m [2] · (28.0 °C [3] − (−18.0 °C [4]))", lines);
        // 12e-6 · 42.5 · 46 = 0.02346 m
        Assert.Contains("       = 23.5 mm", lines);
        Assert.Contains("     key test/result", lines);
    }

    [Fact]
    public void The_same_product_prints_in_feet_and_inches_and_degrees_Fahrenheit()
    {
        var formula = PrintedText.Make("Δ", Quantity.Movement, [Alpha, L, Hot, Cold], Alpha * L * (Hot - Cold));
        var text = PrintedText.Of(formula, DisplayProfile.Us, 6.5e-6 * 1.8, 100 * 0.3048, 40, -10);
        Assert.Contains("= 6.50×10⁻⁶ /°F [1] · 100.000 ft [2] · (104.0 °F [3] − 14.0 °F [4])", text, StringComparison.Ordinal);
        // 6.5e-6 · 1200 in · 90 °F = 0.702 in
        Assert.Contains("       = 0.702 in\n", text, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Profiles))]
    public void An_operand_shows_more_digits_where_the_result_needs_them(string profile)
    {
        // A ratio is wanted to three decimals; times a metre it must be known to four or five for the last digit of the movement.
        var ratio = PrintedText.Make("r", Quantity.Ratio, [Share], Share * Share);
        var movement = PrintedText.Make("Δ", Quantity.Movement, [Share, A], Share * A);
        var derivation = new Derivation();
        var square = derivation.Use(ratio, "", derivation.Given("s", "s", "share", Quantity.Ratio, 1.0 / 7));
        derivation.Use(movement, "", square, derivation.Given("a", "a", "movement", Quantity.Movement, 1.0));
        var text = PrintedText.Of(derivation, DisplayProfile.Of(profile));
        Assert.Contains(", carried on as ", text, StringComparison.Ordinal);
        Assert.Empty(Recomputer.Complaints(text));
    }

    [Fact]
    public void A_choice_prints_the_comparison_that_holds_and_only_the_side_that_applies()
    {
        var formula = PrintedText.Make("m", Quantity.Movement, [A, B], Choose(A, Relation.AtMost, B, A + B, A - B));
        var holds = PrintedText.Of(formula, DisplayProfile.Metric, 0.002, 0.003);
        Assert.Contains("m = if a ≤ b: a + b, otherwise a − b\n", holds, StringComparison.Ordinal);
        Assert.Contains("= since 2.0 mm [1] ≤ 3.0 mm [2]: 2.0 mm [1] + 3.0 mm [2]\n", holds, StringComparison.Ordinal);
        var fails = PrintedText.Of(formula, DisplayProfile.Metric, 0.004, 0.003);
        Assert.Contains("= since 4.0 mm [1] > 3.0 mm [2]: 4.0 mm [1] − 3.0 mm [2]\n", fails, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Profiles))]
    public void A_choice_decides_alike_from_printed_digits(string profile)
    {
        var formula = PrintedText.Make("m", Quantity.Movement, [A, B], Choose(A, Relation.Above, B, A, B - B));
        // Equal to the digits that are wanted; only the seventh decimal of a millimetre tells them apart.
        var text = PrintedText.Of(formula, DisplayProfile.Of(profile), 0.0123000004, 0.0123000003);
        Assert.Empty(Recomputer.Complaints(text));
        Assert.DoesNotContain("do not suffice", text, StringComparison.Ordinal);
        Assert.Contains(" > ", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Digits_that_do_not_suffice_are_said()
    {
        var huge = PrintedText.Make("n", Quantity.Movement, [A, B, Share], (A - B) * Power(10 + Share, 12));
        var text = PrintedText.Of(huge, DisplayProfile.Metric, 1.0 / 3, 1.0 / 3.0000000001, 0);
        Assert.Contains("printed digits do not suffice here: they give ", text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_sum_of_four_terms_stands_in_line_and_one_of_five_in_rows()
    {
        var formula = PrintedText.Make("S", Quantity.Movement, [Share, Each], Share * Total(Each));
        var four = PrintedText.Of(formula, DisplayProfile.Metric, 2, 0.001, 0.002, 0.003, 0.004);
        Assert.Contains("= 2.000 [1] · (1.0 mm [2] + 2.0 mm [3] + 3.0 mm [4] + 4.0 mm [5])\n", four, StringComparison.Ordinal);
        var five = PrintedText.Of(formula, DisplayProfile.Metric, 2, 0.001, 0.002, 0.003, 0.004, 0.005);
        Assert.Contains("= 2.000 [1] · Σ(5 terms)\n       | 1.0 mm [2]\n", five, StringComparison.Ordinal);
        Assert.Contains("       = 30.0 mm\n", five, StringComparison.Ordinal);
        Assert.Empty(Recomputer.Complaints(four));
        Assert.Empty(Recomputer.Complaints(five));
    }

    [Theory]
    [MemberData(nameof(Profiles))]
    public void Every_form_of_expression_is_recomputed(string profile)
    {
        var largest = PrintedText.Make("m", Quantity.Movement, [A, Each], Larger(A, Largest(Each)) + Smallest(Each));
        var skewed = PrintedText.Make("m", Quantity.Movement, [A, Beta], A * Cos(Beta) - (A - A * Sin(Beta)));
        var root = PrintedText.Make("m", Quantity.Movement, [A, B], Root(Power(A, 2) + Power(B, 2)) / 2);
        var positive = PrintedText.Make("m", Quantity.Movement, [A, B], Positive(A - B, Quantity.Movement));
        var inKsi = PrintedText.Make("x", Quantity.Ratio, [Modulus, Share], InUnits(Modulus, Unit.KipPerSquareInch) / (Share + 0.5) * 1e-3);
        var nested = PrintedText.Make("m", Quantity.Movement, [A, B],
            Choose(A, Relation.Below, B, Choose(A, Relation.AtLeast, B, A, B), Choose(2 * A, Relation.Above, B, A / (B / A), B)) * 2);
        var warmest = PrintedText.Make("T", Quantity.Temperature, [Hot, Cold, Each], Larger(Hot, Cold) + (Hot - Cold) * (Each / Each));
        string[] texts =
        [
            Print(largest, 0.01, 0.02, 0.0301, 0.005, 0.0111, 0.0222), Print(largest, 0.01, 0.02, 0.0301),
            Print(skewed, 0.0333, -20 * Math.PI / 180), Print(root, 0.0123, 0.0456), Print(positive, 0.01, 0.02), Print(positive, 0.02, 0.01),
            Print(inKsi, 200e9, 0.3), Print(nested, 0.01, 0.02), Print(nested, 0.02, 0.01), Print(nested, 0.002, 0.001), Print(warmest, 30.1, -12.3, 0.1),
        ];
        Assert.All(texts, t => Assert.Empty(Recomputer.Complaints(t)));

        string Print(Formula f, params double[] values) => PrintedText.Of(f, DisplayProfile.Of(profile), values);
    }

    [Theory]
    [InlineData(Rounding.Nearest, 0.0374999, "37.0 mm")]
    [InlineData(Rounding.Nearest, 0.0375, "38.0 mm")]
    [InlineData(Rounding.Up, 0.0370001, "38.0 mm")]
    [InlineData(Rounding.Down, 0.0379999, "37.0 mm")]
    [InlineData(Rounding.TowardZero, -0.0379999, "−37.0 mm")]
    public void A_rounded_value_rounds_alike_from_printed_digits(Rounding rounding, double value, string result)
    {
        var formula = PrintedText.Make("G", Quantity.Movement, [A, B], RoundTo(A, B, rounding));
        var text = PrintedText.Of(formula, DisplayProfile.Metric, value, 0.001);
        Assert.Contains($"       = {result}\n", text, StringComparison.Ordinal);
        Assert.Empty(Recomputer.Complaints(text));
    }

    [Fact]
    public void A_value_from_memory_says_so_in_words()
    {
        var derivation = new Derivation();
        derivation.Table("α", "expansion", Quantity.Expansion, 1e-5, new(Mark.Memory, "A code", "2003", "Table 1", "v1"), "steel");
        var step = new StepPrinter(derivation.Steps, DisplayProfile.Metric).Print(0);
        Assert.True(step.IsFromMemory);
        Assert.Equal("table value: A code, 2003, Table 1 (from memory, check against the licensed text); steel", step.Origin);
    }

    [Fact]
    public void A_solved_step_names_its_model_and_residual_and_a_search_its_candidates()
    {
        var derivation = new Derivation();
        var given = derivation.Given("a", "k", "stiffness", Quantity.Stiffness, 5e6);
        derivation.Solved("", "u", "movement", Quantity.Movement, 0.0123456, "deck", 1.24e-14, given);
        derivation.Search("joint/j1/size", "w", "width", Quantity.Size, 0.1, [new("small", "range of the seal"), new("large", "")], given);
        var text = PrintedText.Of(derivation, DisplayProfile.Metric);
        Assert.Contains("     solved by model deck from [1]; largest out-of-balance 1.2×10⁻¹⁴ of the largest load", text, StringComparison.Ordinal);
        Assert.Contains("     - small: rejected by range of the seal\n     - large: taken", text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_default_says_that_nobody_gave_it()
    {
        var derivation = new Derivation();
        derivation.Given("joints/j1/setting-temperature", "T", "temperature", Quantity.Temperature, 10, "mean of the climate", isDefault: true);
        var step = new StepPrinter(derivation.Steps, DisplayProfile.Metric).Print(0);
        Assert.True(step.IsDefault);
        Assert.Equal("default for joints/j1/setting-temperature: mean of the climate", step.Origin);
    }

    [Fact]
    public void On_a_sheet_long_numbers_are_grouped_and_still_read()
    {
        var k = new Operand("k", "stiffness", Quantity.Stiffness);
        var formula = PrintedText.Make("F", Quantity.Force, [k, A], k * A);
        var text = PrintedText.Of(PrintedText.DerivationOf(formula, 5e9, 0.0123), DisplayProfile.Metric, NumberStyle.Sheet);
        Assert.Contains("= 61\u2009500.0 kN", text, StringComparison.Ordinal);
        Assert.Empty(Recomputer.Complaints(text));
    }
}
