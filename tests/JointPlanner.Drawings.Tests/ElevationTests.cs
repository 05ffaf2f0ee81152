using System.Globalization;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using JointPlanner.Pictures.Svg;

namespace JointPlanner.Drawings.Tests;

public sealed class ElevationTests
{
    private static readonly double[] Stations = [0, 30, 75, 100];

    private static string Metres(double m) => string.Create(CultureInfo.InvariantCulture, $"{m:0.##} m");

    private static Elevation Draw(ElevationPaper paper, params double[] stations) =>
        Elevation.Of(new ElevationRequest { Plan = DemoDeck.Of(stations), Length = Metres, Paper = paper });

    private static XElement Svg(Elevation elevation) => XElement.Parse(SvgWriter.Write(elevation.Picture));

    private static double Number(XElement element, string name) => double.Parse(element.Attribute(name)!.Value, CultureInfo.InvariantCulture);

    private static XElement Thing(XElement svg, string path) => svg.Descendants().Single(e => e.Attribute("data-path")?.Value == path);

    public static TheoryData<string> Papers => ["screen", "phone", "sheet"];

    private static ElevationPaper Paper(string name) =>
        name switch { "screen" => ElevationPaper.Screen, "phone" => ElevationPaper.Phone, _ => ElevationPaper.Sheet };

    [Theory]
    [MemberData(nameof(Papers))]
    public void Spans_are_as_wide_as_they_are_long(string paper)
    {
        var at = Draw(Paper(paper), Stations).Columns.Supports.Select(s => s.AtMm).ToList();
        var scale = (at[3] - at[0]) / 100;
        for (var i = 1; i < 4; i++) Assert.Equal((Stations[i] - Stations[i - 1]) * scale, at[i] - at[i - 1], 0.005 * (at[i] - at[i - 1]));
    }

    [Theory]
    [MemberData(nameof(Papers))]
    public void The_printed_exaggeration_is_the_drawn_one(string paper)
    {
        var svg = Svg(Draw(Paper(paper), Stations));
        var deck = Thing(svg, "segments/s1").Elements().First(e => e.Name.LocalName == "rect");
        // s1 is 52.5 m long and 2 m deep.
        var drawn = (Number(deck, "height") / 2) / (Number(deck, "width") / 52.5);
        var printed = svg.Descendants().Where(e => e.Name.LocalName == "text").Select(e => e.Value).Single(t => t.StartsWith("Heights", StringComparison.Ordinal));
        var match = Regex.Match(printed, @"Heights drawn ([\d.]+) times");
        var said = match.Success ? double.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture) : 1;
        Assert.Equal(said, drawn, 0.005 * said);
    }

    [Fact]
    public void A_columns_place_is_where_the_support_is_drawn()
    {
        var elevation = Draw(ElevationPaper.Screen, Stations);
        var svg = Svg(elevation);
        foreach (var support in elevation.Columns.Supports.Where(s => s.Path is "supports/p1" or "supports/p2"))
        {
            var shaft = Thing(svg, support.Path).Elements().First(e => e.Name.LocalName == "rect");
            Assert.Equal(support.AtMm, Number(shaft, "x") + (Number(shaft, "width") / 2), 0.01);
        }
    }

    [Fact]
    public void Everything_drawn_lies_on_the_paper()
    {
        var elevation = Draw(ElevationPaper.Screen, Stations);
        foreach (var rect in Svg(elevation).Descendants().Where(e => e.Name.LocalName == "rect"))
        {
            Assert.InRange(Number(rect, "x"), 0, elevation.Picture.WidthMm);
            Assert.InRange(Number(rect, "y") + Number(rect, "height"), 0, elevation.Picture.HeightMm);
        }
    }

    [Fact]
    public void Supports_close_together_widen_the_paper_until_their_columns_fit()
    {
        var columns = Draw(ElevationPaper.Screen, 0, 5, 75, 100).Columns;
        Assert.True(columns.WidthMm > ElevationPaper.Screen.WidthMm);
        Assert.True(columns.Supports[1].AtMm - columns.Supports[0].AtMm >= ElevationPaper.Screen.ColumnMm - 0.01);
    }

    [Fact]
    public void A_name_with_markup_stays_text()
    {
        var plan = DemoDeck.Of(Stations);
        plan = plan with { Structure = plan.Structure with { Name = "</title><script>x</script>" } };
        var svg = SvgWriter.Write(Elevation.Of(new ElevationRequest { Plan = plan, Length = Metres, Paper = ElevationPaper.Screen }).Picture);
        Assert.DoesNotContain("<script", svg, StringComparison.Ordinal);
    }
}
