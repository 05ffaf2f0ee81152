using System.Globalization;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Frames;

/// <summary>
/// Against CalculiX ccx 2.20, a general finite-element program (Debian package calculix-ccx): Reference/three-span-frame.inp is what was typed
/// into it, three-span-frame.dat what it printed, seven digits. Settlements, springs, a column built in, bearings and road surface at their levels.
/// </summary>
public sealed class FrameAgainstReferenceTests
{
    private static readonly Plan Plan = Of(
        [Abutment("s1", 0), Pier("p2", 30, new ColumnStiffness(10, 1e11, 0.12, 4e8, 3e9)), Pier("p3", 70, new GivenStiffness(60e6)), Abutment("s4", 100)],
        [Deck("deck", 0, 100) with
        {
            Section = new CrossSection
            {
                Layers = [new Layer { Id = "all", Material = LayerMaterial.Steel, Modulus = 1e11, Area = 0.8, Depth = 0.7, Inertia = 0.25 }],
                Depth = 2,
                BearingDepth = 2,
            },
        }],
        [
            Pads("b1", "deck", "s1", 0, 12e6), Fixed("m2", "deck", "p2", 30) with { Kind = BearingKind.Monolithic },
            Fixed("b3", "deck", "p3", 70), Pads("b4", "deck", "s4", 100, 20e6),
        ],
        Joint("j1", "s1", "deck"), Joint("j4", "deck", "s4"));

    [Fact]
    public void Movements_and_rotations_are_those_of_a_general_finite_element_program()
    {
        var (deck, solver) = Beams.Solved(Plan);
        var load = new FrameLoad(deck.Model).Moved(3, 0.012).Moved(9, 0.005);
        Point(12, 400e3);
        Point(55, 300e3);
        // Along at road surface at 80 m, shared by the ends of its piece as the work of its force and moment.
        AtSurface(80, 250e3);
        var solved = solver.Solve(load);
        var reference = Read();

        foreach (var (node, station) in new[] { (1, 0.0), (3, 30), (5, 70), (7, 100) })
        {
            var here = deck.DeckAt("deck", station);
            // The load along stands between two points here: the axial force differs from the reference only beyond 80 m, movements do not.
            Assert.Equal(reference[node].Turning, solved.Of(here, Direction.Turning), 2e-6 * 6.4e-4);
            Assert.Equal(reference[node].Along, solved.Of(here), 2e-6 * 5.2e-3);
            Assert.Equal(reference[node].Vertical, solved.Of(here, Direction.Vertical), 2e-8);
        }
        Assert.Equal(reference[31].Along, -solved.Of(deck.Closing(Plan.Joints[0])), 2e-6 * 5.2e-3);
        Assert.Equal(reference[33].Along, solved.Of(deck.Closing(Plan.Joints[1])), 2e-6 * 5.2e-3);
        Assert.Equal(reference[21].Along, solved.Of(deck.Travel(Plan.Bearings[0])), 2e-6 * 6e-3);
        Assert.Equal(reference[42].Along, solved.Of(deck.SupportAt("p3")), 2e-6 * 5e-3);

        // The two lines that are asked are exact on a piece, so a load within it is spread by its own fixed-end forces.
        void Point(double station, double force)
        {
            var m = deck.Model.Members.First(x => !x.IsUpright && x.From.Station < station && x.To.Station > station);
            var (a, b, l) = (station - m.From.Station, m.To.Station - station, m.Length);
            load.Forces[m.From.In(Direction.Vertical)] -= force * b * b * (l + (2 * a)) / (l * l * l);
            load.Forces[m.To.In(Direction.Vertical)] -= force * a * a * (l + (2 * b)) / (l * l * l);
            load.Forces[m.From.In(Direction.Turning)] -= force * a * b * b / (l * l);
            load.Forces[m.To.In(Direction.Turning)] += force * a * a * b / (l * l);
        }

        void AtSurface(double station, double force)
        {
            var m = deck.Model.Members.First(x => !x.IsUpright && x.From.Station < station && x.To.Station > station);
            var (a, l) = (station - m.From.Station, m.Length);
            var (s, moment) = (a / l, -0.7 * force);
            load.Forces[m.From.In(Direction.Along)] += force * (1 - s);
            load.Forces[m.To.In(Direction.Along)] += force * s;
            load.Forces[m.From.In(Direction.Vertical)] += moment * 6 * ((s * s) - s) / l;
            load.Forces[m.To.In(Direction.Vertical)] -= moment * 6 * ((s * s) - s) / l;
            load.Forces[m.From.In(Direction.Turning)] += moment * (1 - (4 * s) + (3 * s * s));
            load.Forces[m.To.In(Direction.Turning)] += moment * ((3 * s * s) - (2 * s));
        }
    }

    private static Dictionary<int, (double Along, double Vertical, double Turning)> Read() =>
        File.ReadLines(Path.Combine(AppContext.BaseDirectory, "Frames", "Reference", "three-span-frame.dat"))
            .Select(line => line.Split(' ', StringSplitOptions.RemoveEmptyEntries))
            .Where(parts => parts.Length == 7)
            .ToDictionary(p => int.Parse(p[0], CultureInfo.InvariantCulture), p => (Number(p[1]), Number(p[2]), Number(p[6])));

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
}
