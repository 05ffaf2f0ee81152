using CsCheck;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Frames;

/// <summary>What must hold of every deck that bends, whatever its numbers: mirrors, superposition, equilibrium, work. Fixed seeds.</summary>
public sealed class FramePropertyTests
{
    private sealed record Bridge(double[] Spans, double[] Pads, int FixedAt, double Column, double Bending, double Drop, double[] Loads);

    private static readonly Gen<Bridge> Bridges =
        from count in Gen.Int[1, 6]
        from spans in Gen.Double[12, 80].Array[count]
        from pads in Gen.Double[0.5e6, 30e6].Array[count + 1]
        from at in Gen.Int[0, count]
        from column in Gen.Double[4, 25]
        from bending in Gen.Double[1e9, 1e11]
        from drop in Gen.Double[0.3, 3]
        from loads in Gen.Double[-1, 1].Array[4]
        select new Bridge(spans, pads, at, column, bending, drop, loads);

    [Fact]
    public void Turning_the_stationing_round_changes_no_joint() => Bridges.Sample(b =>
    {
        var turned = b with { Spans = [.. b.Spans.Reverse()], Pads = [.. b.Pads.Reverse()], FixedAt = b.Spans.Length - b.FixedAt };
        var (one, other) = (Movements.Of(Build(b), new PlainBasis(), null), Movements.Of(Build(turned), new PlainBasis(), null));
        var scale = one.Joints.SelectMany(j => j.Movements).Max(m => Math.Max(m.OpensBy.Value, m.ClosesBy.Value));
        foreach (var (near, far) in new[] { ("j1", "j2"), ("j2", "j1") })
            foreach (var moved in one.Joints.First(j => j.Joint.Id == near).Movements)
            {
                var mirrored = other.Joints.First(j => j.Joint.Id == far).Movements.First(m => m.Cause == moved.Cause);
                Assert.Equal(moved.OpensBy.Value, mirrored.OpensBy.Value, 1e-9 * scale);
                Assert.Equal(moved.ClosesBy.Value, mirrored.ClosesBy.Value, 1e-9 * scale);
            }
    }, seed: "0000000000011", iter: 300);

    [Fact]
    public void Causes_superpose() => Bridges.Sample(b =>
    {
        var (deck, solver) = Beams.Solved(Build(b));
        FrameLoad Load(int i, double factor) => i switch
        {
            0 => new FrameLoad(deck.Model).Strained("deck", 1e-4 * factor, 2e-4 * factor),
            1 => new FrameLoad(deck.Model).Uniform("deck", 2e4 * factor, 0, b.Spans.Sum()),
            2 => new FrameLoad(deck.Model).Moved(0, 0.01 * factor).Moved(4, 0.004 * factor),
            _ => new FrameLoad(deck.Model).Along("deck", 5e3 * factor, 1),
        };
        var all = new FrameLoad(deck.Model);
        var sum = new double[deck.Model.Freedoms];
        for (var i = 0; i < 4; i++)
        {
            var one = Load(i, b.Loads[i]);
            for (var f = 0; f < all.Forces.Length; f++) all.Forces[f] += one.Forces[f];
            for (var g = 0; g < all.Ground.Length; g++) all.Ground[g] += one.Ground[g];
            sum = [.. sum.Zip(solver.Solve(one).Displacements, (x, y) => x + y)];
        }
        var together = solver.Solve(all);
        var scale = sum.Max(Math.Abs);
        for (var f = 0; f < sum.Length; f++) Assert.Equal(sum[f], together.Displacements[f], 1e-9 * scale);
        Assert.InRange(together.Residual, 0, 1e-10);
    }, seed: "0000000000012", iter: 500);

    [Fact]
    public void Work_of_the_loads_is_twice_the_strain_energy_and_springs_balance_what_pushes_along() => Bridges.Sample(b =>
    {
        var (deck, solver) = Beams.Solved(Build(b));
        var load = new FrameLoad(deck.Model).Uniform("deck", 2e4, 0, b.Spans.Sum()).Along("deck", 5e3, 1);
        var solved = solver.Solve(load);
        var work = load.Forces.Zip(solved.Displacements, (f, u) => f * u).Sum();
        Assert.True(work > 0);
        Assert.Equal(work, 2 * Energy(deck.Model, solved), 1e-9 * work);
        // What pushes along: 5 kN/m over the whole length; what holds: pads, and the support of the fixed line.
        var held = deck.Model.Springs.Where(s => s.To is null).Sum(s => s.Stiffness * solved.Of(s.From))
            + deck.Model.Springs.Where(s => s.To is { } to && deck.Model.Springs.All(g => g.From != to)).Sum(s => s.Stiffness * solved.Of(Response.Along(s.From, s.FromHeight) - Response.Along(s.To!, s.ToHeight)));
        Assert.Equal(5e3 * b.Spans.Sum(), held, 1e-8 * 5e3 * b.Spans.Sum());
    }, seed: "0000000000013", iter: 500);

    [Fact]
    public void An_influence_line_is_what_a_load_there_does() => Bridges.Sample(b =>
    {
        var plan = Build(b);
        var (deck, solver) = Beams.Solved(plan);
        var closing = deck.Closing(plan.Joints[0]);
        var line = InfluenceLine.Of(closing, solver, deck);
        foreach (var node in deck.Model.Nodes.Where(n => n.Body == "deck"))
        {
            var load = new FrameLoad(deck.Model);
            load.Forces[node.In(Direction.Vertical)] = -1;
            Assert.Equal(solver.Solve(load).Of(closing), line.At(node.Station), 1e-9 * line.Pieces.Max(p => Math.Abs(p.C1)) + 1e-20);
        }
        // A load over everything is the sum of both areas.
        var whole = solver.Solve(new FrameLoad(deck.Model).Uniform("deck", 1, 0, b.Spans.Sum())).Of(closing);
        var (above, below) = line.Areas();
        Assert.Equal(whole, above + below, 1e-9 * (above - below));
    }, seed: "0000000000014", iter: 300);

    private static double Energy(FrameModel model, FrameSolution u)
    {
        var energy = model.Springs.Sum(s => s.Stiffness / 2 * Math.Pow(u.Of(Response.Along(s.From, s.FromHeight) - (s.To is { } to ? Response.Along(to, s.ToHeight) : Response.None)), 2));
        foreach (var m in model.Members)
        {
            energy += m.AxialStiffness / m.Length / 2 * Math.Pow(u.Of(m.To) - u.Of(m.From), 2);
            // ∫EI·κ²/2 of the cubic between the ends.
            var (w, a, c, l) = (u.Of(m.To, Direction.Vertical) - u.Of(m.From, Direction.Vertical), u.Of(m.From, Direction.Turning), u.Of(m.To, Direction.Turning), m.Length);
            var (k1, k2) = (((6 * w / l) - (4 * a) - (2 * c)) / l, ((-6 * w / l) + (2 * a) + (4 * c)) / l);
            energy += m.BendingStiffness * l / 6 * ((k1 * k1) + (k1 * k2) + (k2 * k2));
        }
        return energy;
    }

    /// <summary>One deck, pads everywhere but at one line that is fixed on a column, all causes acting.</summary>
    private static Plan Build(Bridge b)
    {
        var stations = new double[b.Spans.Length + 1];
        for (var i = 0; i < b.Spans.Length; i++) stations[i + 1] = stations[i] + b.Spans[i];
        var (last, length) = (b.Spans.Length, stations[^1]);
        var supports = stations.Select((x, i) => (i == 0 || i == last ? Abutment($"s{i}", x) : Pier($"s{i}", x)) with
        {
            Stiffness = i == b.FixedAt ? new ColumnStiffness(b.Column, 30e9, 0.8, 1e9, 5e9) : null,
        }).ToArray();
        var section = Beams.Section(b.Bending, depth: 2 * b.Drop, surfacing: 0.1);
        return Of(supports, [Deck("deck", 0, length) with
            {
                Section = section,
                Gradient = new Gradient { Warm = [new(0, 10), new(b.Drop, 0)], Cool = [new(0, -4), new(b.Drop, 0)], Source = "test" },
                DeadLoad = new(15e3, "test"), Braking = new(400e3, "test"),
            }],
            [.. stations.Select((x, i) => i == b.FixedAt ? Fixed($"b{i}", "deck", $"s{i}", x) : Pads($"b{i}", "deck", $"s{i}", x, b.Pads[i]))],
            Joint("j1", "s0", "deck"), Joint("j2", "deck", $"s{last}")) with
        {
            LiveLoad = new LiveLoad
            {
                StandsFor = FrameShare.WholeWidth,
                Lanes = 1,
                Own = new OwnLoads([new OwnTrain("t", [new OwnAxle(100e3, 0, null), new OwnAxle(150e3, 4, 9)])], 9e3, 1, "test"),
            },
        };
    }
}
