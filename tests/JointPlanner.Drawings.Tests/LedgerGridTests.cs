using System.Globalization;
using System.Text.RegularExpressions;

namespace JointPlanner.Drawings.Tests;

public sealed class LedgerGridTests
{
    private static readonly ElevationColumns Columns = Elevation.Of(new ElevationRequest
    {
        Plan = DemoDeck.Of(0, 30, 75, 100),
        Length = m => m.ToString(CultureInfo.InvariantCulture),
        Paper = ElevationPaper.Screen,
    }).Columns;

    [Fact]
    public void A_columns_middle_is_under_its_support_at_any_width()
    {
        var grid = new LedgerGrid(Columns, 52);
        var tracks = Regex.Matches(grid.Tracks, @"([\d.]+)fr").Select(m => double.Parse(m.Groups[1].Value, CultureInfo.InvariantCulture)).ToList();
        foreach (var width in (int[])[390, 1280, 1920])
        {
            foreach (var place in Columns.Supports.Concat(Columns.Joints))
            {
                var lines = grid.Lines(place.Path).Split(" / ").Select(l => int.Parse(l, CultureInfo.InvariantCulture)).ToList();
                var middle = (tracks.Take(lines[0] - 1).Sum() + tracks.Take(lines[1] - 1).Sum()) / 2 / tracks.Sum() * width;
                Assert.Equal(place.AtMm / Columns.WidthMm * width, middle, 0.5);
            }
        }
    }

    [Fact]
    public void A_segments_column_runs_from_face_to_face()
    {
        var grid = new LedgerGrid(Columns, 52);
        var joint = Columns.Joints.Single(j => j.Path == "joints/j2");
        var first = Columns.Segments[0];
        Assert.Equal(joint.AtMm, first.ToMm, 0.01);
        Assert.Equal((first.FromMm + first.ToMm) / 2 / Columns.WidthMm, grid.Middle(first.Path), 0.001);
    }

    [Fact]
    public void Neighbours_in_one_row_never_overlap()
    {
        var grid = new LedgerGrid(Columns, 500);
        var lines = Columns.Supports.Select(s => grid.Lines(s.Path).Split(" / ").Select(l => int.Parse(l, CultureInfo.InvariantCulture)).ToList()).ToList();
        for (var i = 1; i < lines.Count; i++) Assert.True(lines[i - 1][1] <= lines[i][0]);
    }
}
