using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Exchange.Tables;

namespace JointPlanner.Exchange.Tests.Tables;

/// <summary>Form of the file: RFC 4180 (2005), 2: lines end with CRLF, a field with comma, quote or line break is quoted, a quote in it is doubled.</summary>
public sealed class ExportTableTests
{
    [Fact]
    public void Numbers_are_written_as_numbers_with_their_unit_in_the_head() =>
        Assert.Equal("joint,opens by (mm),at (°C)\r\nJ1,-5.2,12.0\r\nJ2,,-8.0\r\n",
            Table(DisplayProfile.Metric).Row("J1", new Number(3, -0.0052), 12.0).Row("J2", null, -8.0).ToCsv());

    [Fact]
    public void Another_profile_writes_its_own_units() =>
        Assert.Equal("joint,opens by (in),at (°F)\r\nJ1,1.000,50.0\r\n", Table(DisplayProfile.Us).Row("J1", 0.0254, 10.0).ToCsv());

    [Theory]
    [InlineData("=1+1", "'=1+1")]
    [InlineData("+41", "'+41")]
    [InlineData("-cmd", "'-cmd")]
    [InlineData("−5 mm", "'−5 mm")]
    [InlineData("@x", "'@x")]
    [InlineData("\tx", "'\tx")]
    [InlineData("a=b", "a=b")]
    public void A_text_that_begins_like_a_formula_gets_an_apostrophe(string text, string written) =>
        Assert.Equal($"t\r\n{written}\r\n", new ExportTable(DisplayProfile.Metric).Text("t").Row(text).ToCsv());

    [Fact]
    public void A_comma_a_quote_and_a_line_break_stay_inside_their_cell() =>
        Assert.Equal("t,u\r\n\"a, \"\"b\"\"\",\"c\r\nd\"\r\n", new ExportTable(DisplayProfile.Metric).Text("t").Text("u").Row("a, \"b\"", "c\r\nd").ToCsv());

    [Fact]
    public void Pasting_has_one_cell_a_tab_and_one_row_a_line() =>
        Assert.Equal("joint\topens by (mm)\tat (°C)\nJ 1 x\t5.2\t12.0\n", Table(DisplayProfile.Metric).Row("J\t1\nx", 0.0052, 12.0).ToTabs());

    [Fact]
    public void A_row_of_another_length_is_refused() => Assert.Throws<ArgumentException>(() => Table(DisplayProfile.Metric).Row("J1"));

    private static ExportTable Table(DisplayProfile profile) =>
        new ExportTable(profile).Text("joint").Numbers("opens by", Quantity.Movement).Numbers("at", Quantity.Temperature);
}
