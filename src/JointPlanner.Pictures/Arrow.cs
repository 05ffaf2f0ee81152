namespace JointPlanner.Pictures;

/// <summary>A line with a filled head at its end: a movement, a reaction, a pointer.</summary>
/// <param name="Role">What it stands for.</param>
/// <param name="From">The tail.</param>
/// <param name="To">The tip.</param>
/// <param name="Stroke">Weight and dash of the shaft.</param>
public sealed record Arrow(Role Role, PaperPoint From, PaperPoint To, Stroke Stroke) : Composite(Role)
{
    /// <summary>Length of the head in millimetres.</summary>
    public double HeadMm { get; init; } = 1.8;

    /// <summary>Whether the tail has a head too.</summary>
    public bool BothEnds { get; init; }

    /// <inheritdoc/>
    public override IReadOnlyList<Element> Parts
    {
        get
        {
            var length = From.DistanceTo(To);
            if (length == 0) return [];
            var (right, down) = ((To.X - From.X) / length, (To.Y - From.Y) / length);
            // The shaft stops inside the head: a heavy line would else blunt the tip.
            var back = Math.Min(HeadMm * 0.8, length / 2);
            var tail = BothEnds ? From.Moved(right * back, down * back) : From;
            List<Element> parts = [new Line(Role, tail, To.Moved(-right * back, -down * back), Stroke), Head(Role, To, right, down, HeadMm)];
            if (BothEnds) parts.Add(Head(Role, From, -right, -down, HeadMm));
            return parts;
        }
    }

    /// <summary>A filled head with its tip at a point.</summary>
    /// <param name="role">What it stands for.</param>
    /// <param name="tip">The tip.</param>
    /// <param name="right">Direction in which it points, to the right; with <paramref name="down"/> of length one.</param>
    /// <param name="down">Direction in which it points, downwards.</param>
    /// <param name="lengthMm">Length of the head.</param>
    internal static Polygon Head(Role role, PaperPoint tip, double right, double down, double lengthMm)
    {
        var half = lengthMm * 0.19;
        var root = tip.Moved(-right * lengthMm, -down * lengthMm);
        return new(role, [tip, root.Moved(-down * half, right * half), root.Moved(down * half, -right * half)], Stroke.None, Fill.Ink);
    }
}
