using System.Globalization;
using System.Xml.Linq;
using JointPlanner.Pictures.Svg;

namespace JointPlanner.Pictures.Tests.Svg;

public class SvgWriterTests
{
    private const string Hostile = "</script><svg onload=alert(1)>\"'&\u202E";
    private static readonly XNamespace Ns = "http://www.w3.org/2000/svg";

    private static Picture Everything(string words = "Pier 2") => new PictureBuilder(120, 50, View.Fit(new(-10, 110, -20, 20), new(5, 5, 110, 40)))
        .Line(Role.Axis, new(-10, 0), new(110, 0), new(0.18, Dash.Chain))
        .Polyline(Role.Curve, [new(0, 0), new(50, -3.25), new(100, 0)], Stroke.Heavy)
        .Polygon(Role.Ground, [new(0, -10), new(100, -10), new(50, -18)], Stroke.None, Fill.Tint)
        .Box(Role.Deck, new(0, 100, 0, 2), Stroke.Medium, Fill.Paper)
        .Hatch(Role.Hatch, [new(0, -10), new(10, -10), new(10, -20), new(0, -20)])
        .Dimension(new(0, 0), new(100, 0), words, 8)
        .Arrow(Role.Joint, new(100, 1), -9, 0, Stroke.Medium)
        .Thing(Role.Support, "supports/" + words, words, b => b.Circle(Role.Bearing, new(50, -1), 1.2, Stroke.Thin, Fill.Ink))
        .Label(Role.Label, new(50, -12), words, weight: Weight.Semibold)
        .Add(new Label(Role.Label, new(3, 40), words) { AngleDegrees = -90, Anchor = Anchor.End, Level = Level.Middle })
        .Build(words, "About " + words);

    [Fact]
    public void Words_from_people_stay_words_wherever_they_stand()
    {
        var svg = XDocument.Parse(SvgWriter.Write(Everything(Hostile), new() { Pressable = true }));
        var names = svg.Descendants().Select(e => e.Name.LocalName).Distinct().Order();
        Assert.Equal(["circle", "desc", "g", "line", "polygon", "polyline", "rect", "svg", "text", "title"], names);
        Assert.DoesNotContain(svg.Descendants().Attributes(), a => a.Name.LocalName.StartsWith("on", StringComparison.Ordinal) || a.Name.LocalName is "style" or "id" or "href");
        Assert.All(svg.Descendants(Ns + "text"), t => Assert.Contains("</script><svg onload=alert(1)>\"'&[U+202E]", t.Value, StringComparison.Ordinal));
        Assert.DoesNotContain('\u202E', svg.ToString());
    }

    [Fact]
    public void No_colour_is_written()
    {
        var allowed = new[] { "none", "transparent", "currentColor", "var(--picture-paper, Canvas)" };
        var svg = XDocument.Parse(SvgWriter.Write(Everything()));
        var colours = svg.Descendants().Attributes().Where(a => a.Name.LocalName is "fill" or "stroke").Select(a => a.Value).Distinct().ToList();
        Assert.NotEmpty(colours);
        Assert.Subset(allowed.ToHashSet(), colours.ToHashSet());
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("ar-SA")]
    [InlineData("fa-IR")]
    [InlineData("en-US")]
    public void The_text_is_the_same_in_every_culture(string culture)
    {
        var was = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;
        var expected = SvgWriter.Write(Everything());
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.Equal(expected, SvgWriter.Write(Everything()));
        }
        finally
        {
            CultureInfo.CurrentCulture = was;
        }
    }

    [Fact]
    public void A_picture_to_look_at_is_one_image_with_title_and_description()
    {
        var svg = XDocument.Parse(SvgWriter.Write(Everything())).Root!;
        Assert.Equal("img", svg.Attribute("role")!.Value);
        Assert.Equal("Pier 2", svg.Element(Ns + "title")!.Value);
        Assert.Equal("About Pier 2", svg.Element(Ns + "desc")!.Value);
        Assert.Equal("0 0 120 50", svg.Attribute("viewBox")!.Value);
        Assert.Null(svg.Attribute("width"));
        Assert.DoesNotContain(svg.Descendants(), e => e.Attribute("tabindex") is not null || e.Attribute("role") is not null);
        Assert.Equal("supports/Pier 2", Assert.Single(svg.Descendants().Attributes("data-path")).Value);
    }

    [Fact]
    public void In_a_pressable_picture_each_thing_with_a_path_is_a_named_button()
    {
        var svg = XDocument.Parse(SvgWriter.Write(Everything(), new() { Pressable = true })).Root!;
        Assert.Equal("group", svg.Attribute("role")!.Value);
        var button = Assert.Single(svg.Descendants(), e => e.Attribute("role")?.Value == "button");
        Assert.Equal(("0", "Pier 2"), (button.Attribute("tabindex")!.Value, button.Attribute("aria-label")!.Value));
    }

    [Fact]
    public void A_saved_picture_has_its_true_size() =>
        Assert.Equal("120mm", XDocument.Parse(SvgWriter.Write(Everything(), new() { TrueSize = true })).Root!.Attribute("width")!.Value);

    [Fact]
    public void An_unknown_element_is_refused_by_name()
    {
        var picture = new Picture(10, 10, "t", "d", [new Surprise()]);
        var fault = Assert.Throws<InvalidOperationException>(() => SvgWriter.Write(picture));
        Assert.Contains(nameof(Surprise), fault.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.NegativeInfinity)]
    public void A_coordinate_that_is_no_number_is_refused(double x)
    {
        var picture = new Picture(10, 10, "t", "d", [new Line(Role.Deck, new(x, 0), new(1, 1), Stroke.Thin)]);
        Assert.Throws<InvalidOperationException>(() => SvgWriter.Write(picture));
    }

    [Fact]
    public void A_number_that_rounds_to_nothing_has_no_sign()
    {
        var svg = SvgWriter.Write(new(10, 10, "t", "d", [new Line(Role.Deck, new(-0.0001, 0), new(1, 1), Stroke.Thin)]));
        Assert.Contains("x1=\"0\"", svg, StringComparison.Ordinal);
    }

    private sealed record Surprise() : Element(Role.Marker);
}
