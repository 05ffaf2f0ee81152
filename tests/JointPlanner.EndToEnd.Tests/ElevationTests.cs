using System.Globalization;
using System.Text.Json;
using System.Text.RegularExpressions;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>The elevation in the browser, measured: lengths true to each other, heights exaggerated by what is printed.</summary>
public sealed partial class ElevationTests(RunningSite site) : IClassFixture<RunningSite>
{
    // Middle of each support's name, and of each span between them as drawn; the stations as typed stand in the ledger.
    private const string Supports = """
        () => [...document.querySelectorAll('[data-column^="supports/"]')].map(column => {
          const path = column.dataset.column;
          const name = document.querySelector(`.ledger-picture [data-path="${path}"] text`).getBoundingClientRect();
          return { at: name.left + name.width / 2, station: document.querySelector(`input[data-path="${path}/station"]`).value };
        })
        """;

    [Theory]
    [InlineData("Tarn Moss Viaduct", 1280)]
    [InlineData("Tarn Moss Viaduct", 1900)]
    [InlineData("Plover Flats Bridge", 1440)]
    public async Task Spans_are_drawn_in_proportion(string structure, int width)
    {
        var visitor = await site.Visit("designer", width);
        await visitor.Open(structure);
        var drawn = (await visitor.Page.EvaluateAsync<JsonElement>(Supports)).EnumerateArray()
            .Select(s => (At: s.GetProperty("at").GetDouble(), Station: Number(s.GetProperty("station").GetString()!))).ToList();
        Assert.True(drawn.Count >= 4);
        var whole = (drawn[^1].At - drawn[0].At) / (drawn[^1].Station - drawn[0].Station);
        foreach (var (near, far) in drawn.Zip(drawn.Skip(1)))
            Assert.Equal(1, (far.At - near.At) / (far.Station - near.Station) / whole, 0.005);
    }

    // Height as typed and lowest drawn point of each pier; the deck is level, so differences of both are true to each other.
    private const string Piers = """
        () => [...document.querySelectorAll('[data-column^="supports/p"]')].map(column => {
          const path = column.dataset.column;
          const shapes = [...document.querySelectorAll(`.ledger-picture [data-path="${path}"] :is(path, line, rect, polyline, polygon)`)];
          return { low: Math.max(...shapes.map(s => s.getBoundingClientRect().bottom)), height: document.querySelector(`input[data-path="${path}/height"]`).value };
        })
        """;

    [Fact]
    public async Task The_printed_exaggeration_of_heights_is_the_measured_one()
    {
        var visitor = await site.Visit("designer");
        await visitor.Open("Tarn Moss Viaduct");
        var sentence = await visitor.Page.Locator(".ledger-picture").TextContentAsync() ?? "";
        var isOne = sentence.Contains("Heights and lengths to one scale", StringComparison.Ordinal);
        var printed = isOne ? 1 : double.Parse(Printed.Match(sentence).Groups[1].Value, CultureInfo.InvariantCulture);
        var supports = (await visitor.Page.EvaluateAsync<JsonElement>(Supports)).EnumerateArray()
            .Select(s => (At: s.GetProperty("at").GetDouble(), Station: Number(s.GetProperty("station").GetString()!))).ToList();
        var along = (supports[^1].At - supports[0].At) / (supports[^1].Station - supports[0].Station);
        var piers = (await visitor.Page.EvaluateAsync<JsonElement>(Piers)).EnumerateArray()
            .Select(p => (Low: p.GetProperty("low").GetDouble(), Height: Number(p.GetProperty("height").GetString()!))).OrderBy(p => p.Height).ToList();
        Assert.True(piers.Count >= 4);
        var upright = (piers[^1].Low - piers[0].Low) / (piers[^1].Height - piers[0].Height);
        Assert.Equal(printed, upright / along, 0.02 * printed);
    }

    [GeneratedRegex(@"Heights drawn ([\d.]+) times as large as lengths")]
    private static partial Regex Printed { get; }

    private static double Number(string station)
    {
        var match = OneLength.Match(station);
        Assert.True(match.Success, station);
        return double.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture);
    }

    [GeneratedRegex(@"^([\d.]+) (?:m|ft)$")]
    private static partial Regex OneLength { get; }
}
