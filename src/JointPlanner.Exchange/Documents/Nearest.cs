namespace JointPlanner.Exchange.Documents;

/// <summary>The word somebody probably meant.</summary>
public static class Nearest
{
    /// <summary>The candidate with the fewest letters to change (two changed round count as one, a capital for a small one as half); null where none is near.</summary>
    public static string? Of(string typed, IEnumerable<string> candidates)
    {
        if (typed.Length > 100) return null;
        var best = candidates.Distinct(StringComparer.Ordinal)
            .Select(c => (Word: c, Cost: Distance(typed, c)))
            .OrderBy(c => c.Cost).ThenBy(c => c.Word, StringComparer.Ordinal)
            .FirstOrDefault();
        return best.Word is not null && best.Cost <= Math.Max(1, Math.Max(typed.Length, best.Word.Length) * 0.45) ? best.Word : null;
    }

    private static double Distance(string a, string b)
    {
        var (before, previous) = (Array.Empty<double>(), Enumerable.Range(0, b.Length + 1).Select(i => (double)i).ToArray());
        for (var i = 1; i <= a.Length; i++)
        {
            var current = new double[b.Length + 1];
            current[0] = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var change = a[i - 1] == b[j - 1] ? 0 : char.ToUpperInvariant(a[i - 1]) == char.ToUpperInvariant(b[j - 1]) ? 0.5 : 1;
                current[j] = Math.Min(previous[j - 1] + change, Math.Min(previous[j], current[j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1]) current[j] = Math.Min(current[j], before[j - 2] + 1);
            }
            (before, previous) = (previous, current);
        }
        return previous[^1];
    }
}
