namespace JointPlanner.Engine.Frames;

/// <summary>Displacements of an axial model under one load, and how well they balance.</summary>
/// <param name="Model">The model.</param>
/// <param name="Displacements">By unknown, m (or m per unit strain), positive up-station.</param>
/// <param name="Residual">Largest out-of-balance relative to the largest load term.</param>
/// <param name="RefinementChange">Largest change by one step of iterative refinement, relative to the largest displacement.</param>
public sealed record AxialSolution(AxialModel Model, double[] Displacements, double Residual, double RefinementChange)
{
    /// <summary>Displacement of a node, positive up-station.</summary>
    public double Of(Node node) => node.Unknown < 0 ? 0 : Displacements[node.Unknown];
}

/// <summary>Solves an axial model for imposed strains: one factorisation, any number of strain states.</summary>
public sealed class AxialSolver
{
    /// <summary>Below this pivot ratio the model is a mechanism.</summary>
    public const double MechanismRatio = 1e-12;

    private readonly AxialModel model;
    private readonly SkylineMatrix stiffness;
    private readonly SkylineFactor factor;

    /// <summary>Assembles and factorises.</summary>
    /// <exception cref="MechanismException">Part of the model can move without resistance.</exception>
    public AxialSolver(AxialModel model)
    {
        this.model = model;
        stiffness = new SkylineMatrix(Tops(model));
        foreach (var m in model.Members) Assemble(m.From, m.To, m.AxialStiffness / m.Length);
        foreach (var s in model.Springs) Assemble(s.From, s.To, s.Stiffness);
        factor = stiffness.Factor();
        if (model.Unknowns > 0 && factor.PivotRatio < MechanismRatio)
            throw new MechanismException(model.Nodes.First(n => n.Unknown == factor.WeakestRow));
    }

    /// <summary>Smallest pivot relative to its diagonal entry.</summary>
    public double PivotRatio => factor.PivotRatio;

    /// <summary>Displacements when each segment is given a free strain, lengthening positive.</summary>
    /// <param name="strainOf">Free strain of a segment.</param>
    public AxialSolution Strained(Func<string, double> strainOf)
    {
        var load = new double[model.Unknowns];
        foreach (var m in model.Members)
        {
            var force = m.AxialStiffness * strainOf(m.Segment);
            if (m.From.Unknown >= 0) load[m.From.Unknown] -= force;
            if (m.To.Unknown >= 0) load[m.To.Unknown] += force;
        }
        var largest = model.Members.Select(m => Math.Abs(m.AxialStiffness * strainOf(m.Segment))).DefaultIfEmpty(0).Max();
        var first = factor.Solve(load);
        var correction = factor.Solve(Difference(load, stiffness.Times(first)));
        var refined = first.Zip(correction, (u, c) => u + c).ToArray();
        var left = Difference(load, stiffness.Times(refined));
        return new AxialSolution(model, refined, Ratio(left, largest), Ratio(correction, LargestOf(refined)));
    }

    /// <summary>Axial force in a member, tension positive, N.</summary>
    public static double ForceIn(Member member, AxialSolution solution, double freeStrain) =>
        member.AxialStiffness * (((solution.Of(member.To) - solution.Of(member.From)) / member.Length) - freeStrain);

    private void Assemble(Node from, Node? to, double k)
    {
        var (i, j) = (from.Unknown, to?.Unknown ?? -1);
        if (i == j) return;
        if (i >= 0) stiffness.Add(i, i, k);
        if (j >= 0) stiffness.Add(j, j, k);
        if (i >= 0 && j >= 0) stiffness.Add(i, j, -k);
    }

    private static int[] Tops(AxialModel model)
    {
        var tops = Enumerable.Range(0, model.Unknowns).ToArray();
        var pairs = model.Members.Select(m => (m.From.Unknown, m.To.Unknown))
            .Concat(model.Springs.Where(s => s.To is not null).Select(s => (s.From.Unknown, s.To!.Unknown)));
        foreach (var (a, b) in pairs)
        {
            if (a < 0 || b < 0) continue;
            var (low, high) = (Math.Min(a, b), Math.Max(a, b));
            tops[high] = Math.Min(tops[high], low);
        }
        return tops;
    }

    private static double[] Difference(double[] a, double[] b) => [.. a.Zip(b, (x, y) => x - y)];
    private static double LargestOf(double[] values) => values.Select(Math.Abs).DefaultIfEmpty(0).Max();
    private static double Ratio(double[] values, double scale) => scale == 0 ? 0 : LargestOf(values) / scale;
}

/// <summary>Part of the deck can move along its axis without resistance.</summary>
public sealed class MechanismException(Node node) : Exception($"The deck can move along its axis at {node.Name} without resistance.")
{
    /// <summary>A node that can move.</summary>
    public Node Node { get; } = node;
}
