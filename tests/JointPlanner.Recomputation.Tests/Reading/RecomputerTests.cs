namespace JointPlanner.Recomputation.Tests.Reading;

/// <summary>Proof that recomputing can fail: a text worked by hand holds, and each alteration of it is found.</summary>
public class RecomputerTests
{
    private const string Sound = """
        Some heading

        [1] α: coefficient of thermal expansion
             α = 12.0×10⁻⁶ /K
             given at segments/main/expansion
        [2] L: expansion length
             L = 42.500 m
        [3] T_max: highest temperature
             T_max = 28.0 °C
        [4] T_min: lowest temperature
             T_min = −18.0 °C
        [5] Δ: movement
             Δ = α · L · (T_max − T_min)
               = 12.0×10⁻⁶ /K [1] · 42.500 m [2] · (28.0 °C [3] − (−18.0 °C [4]))
               = 23.5 mm, carried on as 23.46 mm
             key joint/j1/movement
        [6] γ: factor
             γ = 1.200
        [7] D: movement that counts
             D = if Δ ≤ L: γ · Δ, otherwise L
               = since 23.46 mm [5] ≤ 42.500 m [2]: 1.200 [6] · 23.46 mm [5]
               = 28.2 mm
        [8] G: gap to be made
             G = round(Σ(D), s, up)
               = round(Σ(5 terms), 5.0 mm [9], up)
        """;

    private static readonly string Whole = Sound[..Sound.IndexOf("[8]", StringComparison.Ordinal)] + """
        [9] s: step
             s = 5.0 mm
        [10] G: gap to be made
             G = round(Σ(D), s, up)
               = round(Σ(5 terms), 5.0 mm [9], up)
               | 28.2 mm [7]
               | 28.2 mm [7]
               | 28.2 mm [7]
               | 23.46 mm [5]
               | 5.0 mm [9]
               = 115.0 mm
        [11] k: what is left
             k = √(G² / s²) − cos(0) / 2
               = √((115.0 mm [10])² / (5.0 mm [9])²) − cos(60.00°) · 2
               = 22.000
        [12] p: what grows with any power
             p = γ^0.5 · exp(−γ) / ln(γ)
               = (1.200 [6])^0.5 · exp(−1 · 1.200 [6]) / ln(1.200 [6])
               = 1.810
        """;

    [Fact]
    public void A_sound_text_holds() => Assert.Empty(Recomputer.Complaints(Whole));

    [Theory]
    [InlineData("= 23.5 mm, carried", "= 23.7 mm, carried", "carried on")]
    [InlineData("carried on as 23.46 mm", "carried on as 23.54 mm", "used as")]
    [InlineData("= 28.2 mm", "= 28.4 mm", "the line gives 281.52 units of the last digit")]
    [InlineData("1.200 [6] · 23.46", "1.300 [6] · 23.46", "[6] is used as 1.300, but stands as 1.200")]
    [InlineData("12.0×10⁻⁶ /K [1] ·", "12.0×10⁻⁶ /K [99] ·", "[99] stands nowhere before")]
    [InlineData("12.0×10⁻⁶ /K [1] ·", "12.0×10⁻⁶ /°F [1] ·", "used as")]
    [InlineData("[6] γ: factor\n", "[66] γ: factor\n", "[6] stands nowhere before")]
    [InlineData("[5] ≤ 42.500 m", "[5] > 42.500 m", "does not hold")]
    [InlineData(" − (−18.0 °C [4])", " − 18.0 °C [4]", "used as 18.0 °C")]
    [InlineData("5 terms", "6 terms", "6 terms are told, 5 stand in rows")]
    [InlineData("       | 23.46 mm [5]\n", "", "5 terms are told, 4 stand in rows")]
    [InlineData(", up)\n       | ", ", down)\n       | ", "the line gives")]
    [InlineData("= 22.000\n", "= 22.000 mm\n", "the result is 22.000 mm")]
    [InlineData("cos(60.00°)", "cos(60.00)", "the line gives")]
    [InlineData("√((115.0 mm [10])²", "√((115.0 mm [10])³", "no square root")]
    [InlineData("(115.0 mm [10])²", "(115.0 mm [10])", "no square root")]
    [InlineData(" · 2\n", " ÷ 2\n", "cannot read")]
    [InlineData("(1.200 [6])^0.5", "(1.200 [6])^0.6", "the line gives")]
    [InlineData("(1.200 [6])^0.5", "(5.0 mm [9])^0.5", "is no plain number")]
    [InlineData("exp(−1 ·", "exp(−2 ·", "the line gives")]
    [InlineData("ln(1.200 [6])", "ln(5.0 mm [9])", "is no plain number")]
    [InlineData("[9] s: step", "[1] s: step", "stands twice")]
    public void Each_alteration_is_found(string sound, string altered, string complaint)
    {
        var text = (Whole + "\n").Replace("\r\n", "\n", StringComparison.Ordinal);
        Assert.Contains(sound, text, StringComparison.Ordinal);
        var complaints = Recomputer.Complaints(text.Replace(sound, altered, StringComparison.Ordinal));
        Assert.Contains(complaints, c => c.Contains(complaint, StringComparison.Ordinal));
    }

    [Fact]
    public void A_carried_value_that_the_rounding_of_its_operands_cannot_explain_is_found()
    {
        // 23.46 mm follows exactly from the operands; the last digit of 42.500 m and the like cannot move it to 23.4999.
        var text = Whole.Replace("carried on as 23.46 mm", "carried on as 23.40 mm", StringComparison.Ordinal)
            .Replace("42.500 m", "42.50000 m", StringComparison.Ordinal).Replace("12.0×", "12.00000×", StringComparison.Ordinal)
            .Replace("28.0 °C", "28.00000 °C", StringComparison.Ordinal).Replace("−18.0 °C", "−18.00000 °C", StringComparison.Ordinal);
        Assert.Contains(Recomputer.Complaints(text), c => c.Contains("does not explain", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("1.000 in", 0.0254)]
    [InlineData("100.000 ft", 30.48)]
    [InlineData("18.0 °F", 10)]
    [InlineData("1.000 kip/in", 175126.835)] // NIST SP 811, appendix B.8: lbf/in to N/m 1.751268 E+02
    [InlineData("15.00°", 0.2617993877991494)]
    [InlineData("61\u2009500.0 kN", 61500000)]
    [InlineData("−1.5×10⁻⁷ mm/kN", -1.5e-13)]
    public void Printed_values_are_read_with_their_units(string text, double amount) =>
        Assert.Equal(1, PrintedValue.Whole(text).Amount / amount, 1e-8);
}
