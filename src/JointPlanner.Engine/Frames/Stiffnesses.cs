namespace JointPlanner.Engine.Frames;

/// <summary>Stiffness of one member or spring by the freedoms that it touches.</summary>
/// <param name="Freedoms">Freedoms.</param>
/// <param name="Matrix">Stiffness by these freedoms, row by row.</param>
internal sealed record Stiffnesses(int[] Freedoms, double[,] Matrix)
{
    public static IEnumerable<Stiffnesses> Of(Member m)
    {
        if (!m.IsUpright)
            yield return new([m.From.In(Direction.Along), m.To.In(Direction.Along)], Pair(m.AxialStiffness / m.Length));
        if (m.BendingStiffness == 0) yield break;
        // Deflection and slope of the axis at both ends. A pier deflects along the deck, and its slope is the turning reversed.
        var (across, sign) = m.IsUpright ? (Direction.Along, -1.0) : (Direction.Vertical, 1.0);
        yield return new([m.From.In(across), m.From.In(Direction.Turning), m.To.In(across), m.To.In(Direction.Turning)], Beam(m.BendingStiffness, m.Length, sign));
    }

    public static Stiffnesses Of(Spring s)
    {
        if (s.Direction == Direction.Turning) return new([s.From.In(Direction.Turning)], new[,] { { s.Stiffness } });
        var terms = Response.Along(s.From, s.FromHeight);
        if (s.To is { } to) terms -= Response.Along(to, s.ToHeight);
        var matrix = new double[terms.Freedoms.Length, terms.Freedoms.Length];
        for (var i = 0; i < terms.Freedoms.Length; i++)
            for (var j = 0; j < terms.Freedoms.Length; j++)
                matrix[i, j] = s.Stiffness * terms.Freedoms[i].Factor * terms.Freedoms[j].Factor;
        return new([.. terms.Freedoms.Select(t => t.Freedom)], matrix);
    }

    private static double[,] Pair(double k) => new[,] { { k, -k }, { -k, k } };

    private static double[,] Beam(double ei, double l, double sign)
    {
        var (a, b, c, d) = (12 * ei / (l * l * l), sign * 6 * ei / (l * l), 4 * ei / l, 2 * ei / l);
        return new[,] { { a, b, -a, b }, { b, c, -b, d }, { -a, -b, a, -b }, { b, d, -b, c } };
    }
}
