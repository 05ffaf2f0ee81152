namespace JointPlanner.Engine.Frames;

/// <summary>
/// Which freedoms are unknowns and how the others follow them and the given movements of the ground. Every link makes one freedom follow;
/// nothing is stiffened for it.
/// </summary>
internal sealed class Freedoms
{
    private readonly Dictionary<int, Combination> following = [];
    private readonly Combination[] resolved;

    public Freedoms(FrameModel model)
    {
        foreach (var link in model.Links) Follow(link);
        var unknowns = new int[model.Freedoms];
        for (var f = 0; f < model.Freedoms; f++) unknowns[f] = following.ContainsKey(f) ? -1 : Count++;
        Owners = [.. Enumerable.Range(0, model.Freedoms).Where(f => unknowns[f] >= 0)];
        resolved = [.. Enumerable.Range(0, model.Freedoms).Select(f => Resolve(f).Renamed(unknowns))];
    }

    /// <summary>Number of unknowns.</summary>
    public int Count { get; }

    /// <summary>Freedom of every unknown.</summary>
    public int[] Owners { get; }

    /// <summary>Given movements that the model cannot follow, because other rigid conditions hold the same point.</summary>
    public List<int> NotFollowed { get; } = [];

    /// <summary>A freedom by unknowns and given movements.</summary>
    public Combination this[int freedom] => resolved[freedom];

    private void Follow(Link link)
    {
        var sum = new Combination();
        foreach (var (freedom, factor) in link.Terms) sum.Add(Resolve(freedom), factor);
        foreach (var (given, share) in link.Given) sum.AddGiven(given, -share);
        var pivot = link.Terms.Select(t => t.Freedom).Concat(sum.Terms.Keys).FirstOrDefault(f => Math.Abs(sum.Terms.GetValueOrDefault(f)) > 1e-12, -1);
        if (pivot < 0)
        {
            NotFollowed.AddRange(sum.Given.Where(g => g.Value != 0).Select(g => g.Key));
            return;
        }
        following[pivot] = sum.SolvedFor(pivot);
    }

    private Combination Resolve(int freedom)
    {
        if (!following.TryGetValue(freedom, out var known)) return Combination.Of(freedom);
        if (known.Terms.Keys.All(f => !following.ContainsKey(f))) return known;
        var all = new Combination();
        foreach (var (f, factor) in known.Terms) all.Add(Resolve(f), factor);
        foreach (var (g, share) in known.Given) all.AddGiven(g, share);
        return following[freedom] = all;
    }
}

/// <summary>A sum of factors times freedoms (or unknowns) and shares of given movements.</summary>
internal sealed class Combination
{
    public SortedDictionary<int, double> Terms { get; } = [];

    public SortedDictionary<int, double> Given { get; } = [];

    public static Combination Of(int freedom) => new() { Terms = { [freedom] = 1 } };

    public void Add(Combination other, double factor)
    {
        foreach (var (f, c) in other.Terms) Add(Terms, f, factor * c);
        foreach (var (g, c) in other.Given) Add(Given, g, factor * c);
    }

    public void AddGiven(int given, double share) => Add(Given, given, share);

    public Combination SolvedFor(int pivot)
    {
        var (solved, by) = (new Combination(), -1 / Terms[pivot]);
        foreach (var (f, c) in Terms)
            if (f != pivot)
                solved.Terms[f] = c * by;
        foreach (var (g, c) in Given) solved.Given[g] = c * by;
        return solved;
    }

    public Combination Renamed(int[] names)
    {
        var renamed = new Combination();
        foreach (var (f, c) in Terms) renamed.Terms[names[f]] = c;
        foreach (var (g, c) in Given) renamed.Given[g] = c;
        return renamed;
    }

    private static void Add(SortedDictionary<int, double> terms, int key, double value)
    {
        var sum = terms.GetValueOrDefault(key) + value;
        if (sum == 0) terms.Remove(key);
        else terms[key] = sum;
    }
}
