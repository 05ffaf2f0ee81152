using JointPlanner.Pdf.Writing;

namespace JointPlanner.Pdf.Tests.Writing;

/// <summary>Expected forms by ISO 32000-1, 7.3 and 7.9.4.</summary>
public class SyntaxTests
{
    [Theory]
    [InlineData(0, "0")]
    [InlineData(-0.0001, "0")]
    [InlineData(-12.3456, "-12.346")]
    [InlineData(1e7, "10000000")]
    [InlineData(0.5, "0.5")]
    public void Numbers_have_no_exponent_and_no_negative_zero(double value, string text) => Assert.Equal(text, Syntax.Number(value));

    [Fact]
    public void A_number_that_is_not_finite_is_refused() => Assert.Throws<InvalidOperationException>(() => Syntax.Number(double.NaN));

    [Theory]
    [InlineData("plain", "(plain)")]
    [InlineData("a(b", "<FEFF006100280062>")]
    [InlineData("Å", "<FEFF00C5>")]
    public void Text_is_plain_or_in_UTF_16(string text, string written) => Assert.Equal(written, Syntax.Text(text));

    [Fact]
    public void A_name_escapes_what_is_not_regular() => Assert.Equal("/application#2Fjson", Syntax.Name("application/json"));

    [Fact]
    public void A_date_is_in_universal_time() =>
        Assert.Equal("(D:20260302083000+00'00')", Syntax.Date(new(2026, 3, 2, 9, 30, 0, TimeSpan.FromHours(1))));
}
