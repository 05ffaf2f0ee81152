using JointPlanner.Pictures;

namespace JointPlanner.Pdf.Tests;

public class PictureBlockTests
{
    [Fact]
    public void An_element_that_the_sheet_does_not_know_is_refused_by_name()
    {
        var fault = Assert.Throws<InvalidOperationException>(() => Print(new Picture(50, 20, "t", "d", [new Surprise()])));
        Assert.Contains(nameof(Surprise), fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_picture_wider_than_the_text_is_scaled_to_it()
    {
        using var pdf = UglyToad.PdfPig.PdfDocument.Open(Print(new Picture(1700, 500, "Wide", "d", [new Label(Role.Label, new(1700, 250), "end") { SizeMm = 30, Anchor = Anchor.End }])));
        var letter = pdf.GetPage(1).Letters.Last(l => l.Value == "d" && l.PointSize > 8.3);
        Assert.Equal(30 * 72 / 25.4 / 10, letter.PointSize, 1);
        Assert.Equal(595.276 - (18 * 72 / 25.4), letter.EndBaseLine.X, 1);
    }

    [Fact]
    public void Lines_are_drawn_as_lines_in_their_weights()
    {
        using var pdf = UglyToad.PdfPig.PdfDocument.Open(Print(new Picture(100, 50, "t", "d", [new Line(Role.Deck, new(0, 0), new(100, 50), new(0.5))])));
        Assert.Contains(pdf.GetPage(1).Paths, p => p.IsStroked && Math.Abs(p.LineWidth - (0.5 * 72 / 25.4)) < 0.001);
        Assert.Empty(pdf.GetPage(1).GetImages());
    }

    private static byte[] Print(Picture picture) => PdfWriter.Write(SampleSheet.Make() with { Watermark = null, Blocks = [new PictureBlock(picture)] }).Bytes;

    private sealed record Surprise() : Element(Role.Marker);
}
