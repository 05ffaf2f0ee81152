namespace JointPlanner.Pdf.Layout;

/// <summary>Shares the width of the text among a table's columns.</summary>
internal static class ColumnWidths
{
    /// <summary>The widths, padding included.</summary>
    /// <param name="fixedWidths">Width that the document asks for; null to fit the content.</param>
    /// <param name="least">Width of each column's widest unbreakable part.</param>
    /// <param name="natural">Width at which nothing of each column would break.</param>
    /// <param name="room">Width of the text.</param>
    /// <param name="fill">Whether the columns take the whole room.</param>
    public static double[] Share(IReadOnlyList<double?> fixedWidths, IReadOnlyList<double> least, IReadOnlyList<double> natural, double room, bool fill)
    {
        var count = natural.Count;
        // Even a long unbroken word leaves its neighbours some room; it is cut where it must be.
        var cap = room / count;
        var low = new double[count];
        var high = new double[count];
        for (var i = 0; i < count; i++)
        {
            low[i] = fixedWidths[i] ?? Math.Min(least[i], Math.Max(cap, least[i] * 0.4));
            high[i] = fixedWidths[i] ?? Math.Max(natural[i], low[i]);
        }
        var (lowSum, highSum) = (low.Sum(), high.Sum());
        if (lowSum >= room) return [.. low.Select(w => w * room / lowSum)];
        if (highSum > room)
        {
            var share = (room - lowSum) / (highSum - lowSum);
            return [.. low.Select((w, i) => w + ((high[i] - w) * share))];
        }
        if (!fill) return high;
        var free = Enumerable.Range(0, count).Where(i => fixedWidths[i] is null).ToList();
        if (free.Count == 0) return high;
        // What is left over goes to all free columns, more to the wide ones.
        var freeSum = free.Sum(i => high[i]);
        foreach (var i in free) high[i] += (room - highSum) * high[i] / freeSum;
        return high;
    }
}
