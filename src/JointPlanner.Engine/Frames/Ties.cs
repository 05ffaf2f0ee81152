namespace JointPlanner.Engine.Frames;

/// <summary>Which points are tied rigidly to which, and which of these groups cannot move at all.</summary>
internal sealed class Ties
{
    private readonly Dictionary<(string, double), (string, double)> parents = [];
    private readonly HashSet<(string, double)> held = [];

    public (string, double) MasterOf((string, double) point)
    {
        while (parents.TryGetValue(point, out var parent)) point = parent;
        return point;
    }

    public void Tie((string, double) a, (string, double) b)
    {
        var (one, other) = (MasterOf(a), MasterOf(b));
        if (one == other) return;
        parents[one] = other;
        if (held.Remove(one)) held.Add(other);
    }

    public void Hold((string, double) point) => held.Add(MasterOf(point));

    public bool IsHeld((string, double) point) => held.Contains(MasterOf(point));
}
