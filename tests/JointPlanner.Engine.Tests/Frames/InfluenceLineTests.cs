using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;

namespace JointPlanner.Engine.Tests.Frames;

/// <summary>
/// Rotation of continuous beams at their first support, load per unit and EI = 1, clockwise positive. Textbook results of elementary beam
/// theory (three-moment equation), exact to the printed digits.
/// </summary>
public sealed class InfluenceLineTests
{
    public static TheoryData<double[], int, double[]> Continuous => new()
    {
        { [1], 0, [0, .0285, .048, .0595, .064, .0625, .056, .0455, .032, .0165, 0] },
        { [1, 1], 0, [0, .024375, .04, .048125, .05, .046875, .04, .030625, .02, .009375, 0] },
        { [1, 1], 1, [0, -.007125, -.012, -.014875, -.016, -.015625, -.014, -.011375, -.008, -.004125, 0] },
        { [1, 1, 1], 0, [0, .0241, .0394667, .0473667, .0490667, .0458333, .0389333, .0296333, .0192, .0089, 0] },
        { [1, 1, 1], 1, [0, -.0065, -.0106667, -.0128333, -.0133333, -.0125, -.0106667, -.0081667, -.0053333, -.0025, 0] },
        { [1, 1, 1], 2, [0, .0019, .0032, .0039667, .0042667, .0041667, .0037333, .0030333, .0021333, .0011, 0] },
        { [30, 40, 30], 0, [0, 22.185, 36.48, 43.995, 45.84, 43.125, 36.96, 28.455, 18.72, 8.865, 0] },
        { [30, 40, 30], 1, [0, -8.88, -14.506667, -17.36, -17.92, -16.666667, -14.08, -10.64, -6.826667, -3.12, 0] },
        { [30, 40, 30], 2, [0, 1.71, 2.88, 3.57, 3.84, 3.75, 3.36, 2.73, 1.92, .99, 0] },
    };

    [Theory]
    [MemberData(nameof(Continuous))]
    public void Ordinates_of_continuous_beams_are_those_of_the_three_moment_equation(double[] spans, int span, double[] ordinates)
    {
        var line = LineOfFirstRotation(spans);
        var start = spans.Take(span).Sum();
        for (var i = 0; i < ordinates.Length; i++)
            Assert.Equal(ordinates[i] / Bending, line.At(start + (spans[span] * i / 10)), 0.51e-7 * Math.Max(1, spans[0] * spans[0]) / Bending);
    }

    public static TheoryData<double[], double[]> Areas => new()
    {
        { [1], [1 / 24.0] },
        { [1, 1], [1 / 32.0, -1 / 96.0] },
        { [1, 1, 1], [11 / 360.0, -1 / 120.0, 1 / 360.0] },
        { [30, 40, 30], [862.5, -4000 / 9.0, 75] },
        { [1, 1, 1, 1], [41 / 1344.0, -11 / 1344.0, 1 / 448.0, -1 / 1344.0] },
    };

    [Theory]
    [MemberData(nameof(Areas))]
    public void Uniform_loads_count_on_adverse_spans_alone(double[] spans, double[] areas)
    {
        var (positive, negative) = LineOfFirstRotation(spans).Areas();
        Assert.Equal(areas.Where(a => a > 0).Sum() / Bending, positive, 1e-9 * areas[0] / Bending);
        Assert.Equal(areas.Where(a => a < 0).Sum() / Bending, negative, 1e-9 * areas[0] / Bending);
    }

    [Fact]
    public void The_peak_over_a_simple_span_lies_where_the_slope_vanishes()
    {
        // y = b(L² − b²)/6 with b = L − x is largest at b = L/√3, that is 0.4226 of the span.
        var most = LineOfFirstRotation([1]).Worst([(1.0, 0.0)], positive: true);
        Assert.Equal(1 - (1 / Math.Sqrt(3)), most.Position, 1e-9);
        Assert.Equal(1 / (9 * Math.Sqrt(3)) / Bending, most.Value, 1e-12 / Bending);
    }

    [Fact]
    public void Two_axles_stand_where_their_sum_is_largest_and_in_the_worse_order()
    {
        var line = LineOfFirstRotation([30, 40, 30]);
        (double, double)[] axles = [(1, 0), (4, 3)];
        var best = Math.Max(Scan(axles), Scan([(4, 0), (1, 3)]));
        var found = Math.Max(line.Worst(axles, true).Value, line.Worst(Turned(axles), true).Value);
        Assert.InRange(found, best, best * (1 + 1e-4));

        double Scan((double Force, double Behind)[] train) => Enumerable.Range(0, 10001).Max(i => train.Sum(a => a.Force * line.At((i * 0.0106) - a.Behind)));
    }

    private const double Bending = 1e9;

    private static (double, double)[] Turned((double Force, double Behind)[] axles) => [.. axles.Select(a => (a.Force, axles.Max(x => x.Behind) - a.Behind)).Reverse()];

    private static InfluenceLine LineOfFirstRotation(double[] spans)
    {
        var (deck, solver) = Beams.Solved(Beams.Continuous(Bending, spans));
        // Clockwise, that is a deck that falls up-station, counts as positive.
        return InfluenceLine.Of(-1 * Response.Of(deck.DeckAt("deck", 0), Direction.Turning), solver, deck);
    }
}
