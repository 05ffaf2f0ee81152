using System.Globalization;

namespace JointPlanner.Drawings;

/// <summary>
/// Columns of a table that stands under an elevation as wide as itself: grid tracks between all edges, so that each column's middle is exactly under
/// what it belongs to, at any width.
/// </summary>
public sealed class LedgerGrid
{
    private readonly List<double> edges;
    private readonly Dictionary<string, (double From, double To)> places = [];

    /// <summary>Lays the columns out; each is as wide as wanted or as its nearer neighbour in its row leaves it.</summary>
    /// <param name="columns">Where things stand.</param>
    /// <param name="wantedMm">Wanted width of a column.</param>
    public LedgerGrid(ElevationColumns columns, double wantedMm)
    {
        foreach (var span in columns.Segments) places[span.Path] = (span.FromMm, span.ToMm);
        foreach (var row in (IReadOnlyList<DrawnPlace>[])[columns.Joints, columns.Supports])
        {
            var sorted = row.OrderBy(p => p.AtMm).ToList();
            for (var i = 0; i < sorted.Count; i++)
            {
                var at = sorted[i].AtMm;
                var half = Math.Min(wantedMm, Math.Min(
                    i > 0 ? at - sorted[i - 1].AtMm : double.MaxValue,
                    i + 1 < sorted.Count ? sorted[i + 1].AtMm - at : double.MaxValue)) / 2;
                half = Math.Max(0.5, Math.Min(half, Math.Min(at, columns.WidthMm - at)));
                places[sorted[i].Path] = (at - half, at + half);
            }
        }
        edges = [.. places.Values.SelectMany(p => (double[])[p.From, p.To]).Append(0).Append(columns.WidthMm).Select(Rounded).Distinct().Order()];
    }

    /// <summary>Widths of the tracks for a style: shares of the width, whose sum is the elevation's.</summary>
    public string Tracks => string.Join(' ', edges.Skip(1).Zip(edges, (to, from) => $"minmax(0,{Text(Rounded(to - from))}fr)"));

    /// <summary>Number of tracks.</summary>
    public int Count => edges.Count - 1;

    /// <summary>True where something with this path stands on the elevation.</summary>
    public bool Has(string path) => places.ContainsKey(path);

    /// <summary>First and last line of a column, counted from <paramref name="first"/> for the first track.</summary>
    public string Lines(string path, int first = 1)
    {
        var (from, to) = places[path];
        return $"{Text(edges.IndexOf(Rounded(from)) + first)} / {Text(edges.IndexOf(Rounded(to)) + first)}";
    }

    /// <summary>Middle of a column as a share of the width.</summary>
    public double Middle(string path) => (places[path].From + places[path].To) / 2 / edges[^1];

    private static double Rounded(double mm) => Math.Round(mm, 3);

    private static string Text(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
