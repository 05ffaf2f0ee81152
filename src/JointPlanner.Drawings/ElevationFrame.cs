using JointPlanner.Engine.Plans;
using JointPlanner.Pictures;

namespace JointPlanner.Drawings;

/// <summary>The scales of an elevation and the paper that they lead to.</summary>
/// <param name="View">From stations and heights (deck surface at 0, down negative) to paper.</param>
/// <param name="WidthMm">Width of the paper.</param>
/// <param name="HeightMm">Height of the paper.</param>
/// <param name="Foot">Height of the deepest foot, m, negative.</param>
internal sealed record ElevationFrame(View View, double WidthMm, double HeightMm, double Foot)
{
    // A width beyond which no column is bought by a larger scale: some sixty screens.
    private const double WidestMm = 20_000;
    private static readonly double[] Exaggerations = [0.25, 0.5, 1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];

    internal static ElevationFrame Of(Plan plan, ElevationPaper paper)
    {
        var stations = Stations(plan);
        var (first, last) = (stations[0], stations[^1]);
        var length = Math.Max(last - first, 1);
        var margin = Math.Max(paper.ColumnMm / 2, paper.LetterMm * 2.2) + 2;
        var scale = (paper.WidthMm - (2 * margin)) / length;
        if (paper.ColumnMm > 0) scale = Math.Max(scale, Math.Min(paper.ColumnMm / LeastGap(plan, length), (WidestMm - (2 * margin)) / length));
        var foot = plan.Supports.Select(s => Heights.Foot(plan, s)).DefaultIfEmpty(-10).Min();
        var fitting = Exaggerations.LastOrDefault(e => -foot * scale * e <= paper.HeightMm, Exaggerations[0]);
        var above = paper.LetterMm * 3.4;
        var below = paper.LetterMm * 4.6;
        var view = new View { Origin = new(first, 0), PaperOrigin = new(margin, above), XScale = scale, Exaggeration = fitting };
        return new ElevationFrame(view, (2 * margin) + (length * scale), above + (-foot * view.ZScale) + below, foot);
    }

    private static List<double> Stations(Plan plan)
    {
        List<double> stations = [.. plan.Supports.Select(s => s.Station), .. plan.Segments.SelectMany(s => (double[])[s.Start, s.End])];
        stations.Sort();
        return stations.Count > 0 ? stations : [0, 1];
    }

    // Supports stand in one row of columns and joints in another; only neighbours in a row need room between them.
    private static double LeastGap(Plan plan, double length)
    {
        var least = length;
        foreach (var row in (List<double>[])[[.. plan.Supports.Select(s => s.Station)], [.. plan.Joints.Select(j => Heights.Station(plan, j))]])
        {
            row.Sort();
            for (var i = 1; i < row.Count; i++)
                if (row[i] - row[i - 1] > length * 1e-6) least = Math.Min(least, row[i] - row[i - 1]);
        }
        return least;
    }
}
