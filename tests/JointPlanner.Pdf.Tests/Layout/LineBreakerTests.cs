using JointPlanner.Pdf.Faces;
using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Tests.Layout;

public class LineBreakerTests
{
    private const string Prose = "The deck is fixed at pier P1, so the joint at abutment A2 sees the greater movement of the two; see calculation-package/1.";

    [Theory]
    [InlineData(40)]
    [InlineData(90)]
    [InlineData(233)]
    public void No_line_is_wider_than_asked_and_no_letter_is_lost(double width)
    {
        var (lines, text) = Break(Prose, width);
        Assert.All(lines, l => Assert.True(l.Width <= width + 1e-6));
        Assert.Equal(Prose.Replace(" ", "", StringComparison.Ordinal), string.Concat(text).Replace(" ", "", StringComparison.Ordinal));
    }

    [Fact]
    public void A_number_is_not_cut_because_its_column_came_out_a_hair_narrower_than_the_number()
    {
        var width = new TextSetter(TypeSet.Standard).Width("1.200", TextLook.Body);
        Assert.Equal(["1.200"], Break("1.200", width - 1e-12).Text);
        Assert.Equal(2, Break("1.200", width - 0.1).Text.Count);
    }

    [Fact]
    public void A_hash_wider_than_its_column_is_cut_and_stays_whole()
    {
        var hash = new string('a', 10) + new string('b', 54);
        var (lines, text) = Break(hash, 100);
        Assert.True(lines.Count > 2);
        Assert.Equal(hash, string.Concat(text));
    }

    [Fact]
    public void A_no_break_space_and_a_thin_space_hold_number_and_unit_together()
    {
        var (_, text) = Break("it measures 64\u2009000\u00A0mm", new TextSetter(TypeSet.Standard).Width("it measures 64\u2009000", TextLook.Body) + 1);
        Assert.Equal(["it measures", "64\u2009000\u00A0mm"], text);
    }

    [Fact]
    public void A_line_feed_ends_a_line() => Assert.Equal(["one", "two", "three"], Break("one\ntwo\r\nthree", 500).Text);

    [Fact]
    public void No_words_make_one_empty_line() => Assert.Equal(0, Assert.Single(Break("", 100).Lines).Width);

    private static (List<Piece> Lines, List<string> Text) Break(Words words, double width)
    {
        var lines = new TextSetter(TypeSet.Standard).Lines(words, width, TextLook.Body);
        List<string> text = [];
        foreach (var line in lines)
        {
            var canvas = new PageCanvas(0);
            line.Paint(canvas, 0, 0);
            text.Add(string.Concat(canvas.Steps.OfType<TextStep>().Select(s => s.Text)));
        }
        return (lines, text);
    }
}
