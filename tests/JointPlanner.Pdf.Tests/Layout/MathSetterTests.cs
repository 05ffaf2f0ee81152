using JointPlanner.Pdf.Faces;
using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Tests.Layout;

public class MathSetterTests
{
    private static readonly TextLook Look = new(10, 0);

    [Fact]
    public void A_long_sum_breaks_between_its_terms()
    {
        var terms = Enumerable.Range(1, 20).SelectMany(i => new[] { MathNode.Operator("+"), MathNode.Upright("12.5"), MathNode.Operator("·"), MathNode.Indexed("L", "1") }).Skip(1).ToList();
        var lines = Setter().Lines(new MathRow(terms), 200, Look);
        Assert.True(lines.Count > 3);
        Assert.All(lines, l => Assert.True(l.Piece.Width <= 200));
        Assert.All(lines.Skip(1), l => Assert.StartsWith(" + ", l.Text, StringComparison.Ordinal));
        Assert.Equal(new MathRow(terms).Linear, string.Concat(lines.Select(l => l.Text)));
    }

    [Fact]
    public void What_has_no_place_to_break_is_set_smaller()
    {
        var wide = new Fraction(MathNode.Upright(new string('9', 80)), MathNode.Upright("2"));
        Assert.True(Assert.Single(Setter().Lines(wide, 250, Look)).Piece.Width <= 250);
    }

    [Fact]
    public void Brackets_wider_than_the_page_open_for_a_break()
    {
        var inner = new MathRow([.. Enumerable.Range(1, 30).SelectMany(i => new[] { MathNode.Operator("+"), MathNode.Upright("1234") }).Skip(1)]);
        var lines = Setter().Lines(MathNode.Row(MathNode.Variable("k"), MathNode.Operator("·"), new Parentheses(inner)), 200, Look);
        Assert.True(lines.Count > 2);
        Assert.Equal("k · (" + inner.Linear + ")", string.Concat(lines.Select(l => l.Text)));
    }

    [Fact]
    public void A_fraction_stands_higher_and_deeper_than_its_parts()
    {
        var (one, fraction) = (Setter().Set(MathNode.Upright("1"), Look), Setter().Set(new Fraction(MathNode.Upright("1"), MathNode.Upright("2")), Look));
        Assert.True(fraction.Ascent > one.Ascent && fraction.Descent > one.Descent);
    }

    [Fact]
    public void The_power_of_an_indexed_symbol_stands_over_its_index()
    {
        var indexed = Setter().Set(MathNode.Indexed("u", "x"), Look);
        var squared = Setter().Set(new Script(MathNode.Indexed("u", "x"), null, MathNode.Upright("2")), Look);
        Assert.InRange(squared.Width - indexed.Width, 0, 1);
        Assert.True(squared.Ascent > indexed.Ascent);
    }

    private static MathSetter Setter() => new(new TextSetter(TypeSet.Standard));
}
