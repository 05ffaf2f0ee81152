namespace JointPlanner.Engine.Frames;

/// <summary>Solves a frame: one factorisation, any number of loads.</summary>
public sealed class FrameSolver
{
    /// <summary>Below this pivot ratio the model is a mechanism.</summary>
    public const double MechanismRatio = 1e-12;

    private readonly FrameModel model;
    private readonly Freedoms freedoms;
    private readonly Stiffnesses[] parts;
    private readonly SkylineMatrix stiffness;
    private readonly SkylineFactor factor;
    private readonly bool[] isTurning;

    /// <summary>Assembles and factorises.</summary>
    /// <exception cref="MechanismException">Part of the model can move without resistance.</exception>
    public FrameSolver(FrameModel model)
    {
        this.model = model;
        freedoms = new Freedoms(model);
        parts = [.. model.Members.SelectMany(Stiffnesses.Of), .. model.Springs.Select(Stiffnesses.Of)];
        stiffness = new SkylineMatrix(Tops());
        foreach (var part in parts) Assemble(part);
        factor = stiffness.Factor();
        var owners = freedoms.Owners.Select(model.OwnerOf).ToArray();
        isTurning = [.. owners.Select(o => o.Direction == Direction.Turning)];
        if (freedoms.Count > 0 && factor.PivotRatio < MechanismRatio) throw new MechanismException(owners[factor.WeakestRow].Node, owners[factor.WeakestRow].Direction);
    }

    /// <summary>Smallest pivot relative to its diagonal entry.</summary>
    public double PivotRatio => factor.PivotRatio;

    /// <summary>Number of unknowns.</summary>
    public int Unknowns => freedoms.Count;

    /// <summary>Given movements of the ground that the model cannot follow, because rigid conditions contradict them.</summary>
    public IReadOnlyList<int> NotFollowed => freedoms.NotFollowed;

    /// <summary>Displacements when each segment is given a free strain, lengthening positive.</summary>
    /// <param name="strainOf">Free strain of a segment.</param>
    public FrameSolution Strained(Func<string, double> strainOf)
    {
        var load = new FrameLoad(model);
        foreach (var body in model.Members.Where(m => !m.IsUpright).Select(m => m.Body).Distinct()) load.Strained(body, strainOf(body));
        return Solve(load);
    }

    /// <summary>Displacements under a load.</summary>
    public FrameSolution Solve(FrameLoad load)
    {
        var right = RightSide(load);
        var first = factor.Solve(right);
        var correction = factor.Solve(Difference(right, stiffness.Times(first)));
        var refined = first.Zip(correction, (u, c) => u + c).ToArray();
        var left = Difference(right, stiffness.Times(refined));
        var terms = stiffness.SizesOfTerms(refined).Zip(right, (t, b) => t + Math.Abs(b)).ToArray();
        var all = Enumerable.Range(0, model.Freedoms).Select(f => Value(freedoms[f], refined, load.Ground)).ToArray();
        return new FrameSolution(model, all, load.Ground, Largest(left, terms), Largest(correction, refined));
    }

    private double[] RightSide(FrameLoad load)
    {
        var right = new double[freedoms.Count];
        for (var f = 0; f < model.Freedoms; f++)
            if (load.Forces[f] != 0)
                foreach (var (unknown, c) in freedoms[f].Terms) right[unknown] += c * load.Forces[f];
        if (load.Ground.All(g => g == 0)) return right;
        foreach (var part in parts)
        {
            var moved = part.Freedoms.Select(f => freedoms[f].Given.Sum(g => g.Value * load.Ground[g.Key])).ToArray();
            if (moved.All(m => m == 0)) continue;
            for (var i = 0; i < moved.Length; i++)
            {
                var force = 0.0;
                for (var j = 0; j < moved.Length; j++) force += part.Matrix[i, j] * moved[j];
                foreach (var (unknown, c) in freedoms[part.Freedoms[i]].Terms) right[unknown] -= c * force;
            }
        }
        foreach (var spring in model.Springs)
        {
            var moved = spring.Ground.Sum(g => g.Share * load.Ground[g.Given]);
            if (moved == 0) continue;
            foreach (var (unknown, c) in freedoms[spring.From.In(spring.Direction)].Terms) right[unknown] += c * spring.Stiffness * moved;
        }
        return right;
    }

    private void Assemble(Stiffnesses part)
    {
        for (var i = 0; i < part.Freedoms.Length; i++)
            for (var j = 0; j < part.Freedoms.Length; j++)
                foreach (var (row, a) in freedoms[part.Freedoms[i]].Terms)
                    foreach (var (column, b) in freedoms[part.Freedoms[j]].Terms)
                        if (row <= column)
                            stiffness.Add(row, column, a * b * part.Matrix[i, j]);
    }

    private int[] Tops()
    {
        var tops = Enumerable.Range(0, freedoms.Count).ToArray();
        foreach (var part in parts)
        {
            var unknowns = part.Freedoms.SelectMany(f => freedoms[f].Terms.Keys).ToArray();
            if (unknowns.Length == 0) continue;
            var low = unknowns.Min();
            foreach (var unknown in unknowns) tops[unknown] = Math.Min(tops[unknown], low);
        }
        return tops;
    }

    private static double Value(Combination c, double[] unknowns, double[] ground) =>
        c.Terms.Sum(t => t.Value * unknowns[t.Key]) + c.Given.Sum(g => g.Value * ground[g.Key]);

    private static double[] Difference(double[] a, double[] b) => [.. a.Zip(b, (x, y) => x - y)];

    /// <summary>Largest value relative to the largest term of its kind; movements and rotations each among themselves.</summary>
    private double Largest(double[] values, double[] terms) => Math.Max(Ratio(values, terms, false), Ratio(values, terms, true));

    private double Ratio(double[] values, double[] terms, bool turning)
    {
        var (value, term) = (0.0, 0.0);
        for (var i = 0; i < values.Length; i++)
            if (isTurning[i] == turning)
                (value, term) = (Math.Max(value, Math.Abs(values[i])), Math.Max(term, Math.Abs(terms[i])));
        return term == 0 ? 0 : value / term;
    }
}

/// <summary>Part of the structure can move without resistance.</summary>
public sealed class MechanismException(Node node, Direction direction)
    : Exception($"{node.Name} can move without resistance ({direction}).")
{
    /// <summary>A point that can move.</summary>
    public Node Node { get; } = node;

    /// <summary>How it can move.</summary>
    public Direction Direction { get; } = direction;
}
