using JointPlanner.Codes.En1991Part1To5;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests;

public sealed class En1991Part1To5LoadsTests
{
    /// <summary>Published: EN 1991-2:2003 table 4.2 and lanes of table 4.1, as restated by an open-source finite-element library and a public extract (seen).</summary>
    [Theory]
    [InlineData(5.0, 300e3, (9e3 * 3) + (2.5e3 * 2))]
    [InlineData(5.6, 500e3, (9e3 + 2.5e3) * 2.8)]
    [InlineData(8.0, 500e3, (9e3 * 3) + (2.5e3 * 5))]
    [InlineData(9.0, 600e3, (9e3 * 3) + (2.5e3 * 6))]
    [InlineData(13.0, 600e3, (9e3 * 3) + (2.5e3 * 10))]
    public void Load_model_1_makes_lanes_of_the_carriageway(double width, double axle, double uniform)
    {
        var model = Model(new LiveLoad { StandsFor = FrameShare.WholeWidth, Carriageway = width });
        var arrangement = Assert.Single(model.Arrangements);
        Assert.Equal(axle, arrangement.Trains[0].Axles[0].Force.Value, 1e-6);
        Assert.Equal(uniform, arrangement.Uniform.Value, 1e-6);
        Assert.Equal(1, arrangement.TrainFactor.Value);
        // From memory, check against the licensed text: EN 1991-2 4.1 and 4.3.2(4).
        Assert.Equal(200, model.LongestDeck);
        Assert.Equal(1.2, arrangement.Trains[0].Axles[1].Spacing);
    }

    [Fact]
    public void A_girder_line_takes_its_share_of_the_first_lane()
    {
        var arrangement = Assert.Single(Model(new LiveLoad { StandsFor = FrameShare.GirderLine, Distribution = 0.6, DistributionSource = "test" }).Arrangements);
        Assert.Equal(300e3, arrangement.Trains[0].Axles[0].Force.Value, 1e-6);
        Assert.Equal(27e3, arrangement.Uniform.Value, 1e-6);
        Assert.Equal(0.6, arrangement.TrainFactor.Value);
        Assert.Equal(0.6, arrangement.UniformFactor.Value);
    }

    /// <summary>
    /// Published: EN 1991-1-5:2003 tables 6.1 and 6.2, as restated by an open-source finite-element library (seen). Linear difference from top to
    /// soffit, K, positive when warmer above.
    /// </summary>
    [Theory]
    [InlineData(DeckKind.Steel, 0.05, DeckSurface.Surfaced, 18, -13)]
    [InlineData(DeckKind.Composite, 0.05, DeckSurface.Surfaced, 15, -18)]
    [InlineData(DeckKind.Concrete, 0.05, DeckSurface.Surfaced, 15, -8)]
    [InlineData(DeckKind.Steel, 0.1, DeckSurface.Surfaced, 18 * 0.7, -13 * 1.2)]
    [InlineData(DeckKind.Steel, 0.075, DeckSurface.Surfaced, 18 * 0.85, -13 * 1.1)]
    [InlineData(DeckKind.Concrete, 0.2, DeckSurface.Surfaced, 15 * 0.5, -8)]
    [InlineData(DeckKind.Composite, 0, DeckSurface.Bare, 15 * 0.9, -18)]
    [InlineData(DeckKind.Concrete, 0, DeckSurface.Waterproofed, 15 * 1.5, -8)]
    public void The_linear_difference_is_that_of_the_tables(DeckKind kind, double surfacing, DeckSurface surface, double warm, double cool)
    {
        var derivation = new Derivation();
        var section = Sections.Of(kind, derivation, surfacing: surfacing, surface: surface);
        var found = Assert.IsType<Said<TemperatureDifferences>>(new En1991Part1To5Basis().TemperatureDifference(section, derivation)).Value;
        foreach (var (profile, expected) in new[] { (found.Warm, warm), (found.Cool, cool) })
        {
            Assert.Equal(expected, profile.Points[0].Difference.Value - profile.Points[1].Difference.Value, 1e-9);
            // Nil at the neutral axis, 0.8 m down.
            Assert.Equal(0, (profile.Points[0].Difference.Value * 1.2) + (profile.Points[1].Difference.Value * 0.8), 1e-9);
        }
    }

    /// <summary>From memory, check against the licensed text: EN 1991-1-5 6.1.5 counts the larger of ΔT_M + 0.35·ΔT_N and 0.75·ΔT_M + ΔT_N; both in full are never less.</summary>
    [Theory]
    [InlineData(0, 5)]
    [InlineData(20, 1)]
    [InlineData(4, 4)]
    public void Difference_and_uniform_part_count_together_for_no_less_than_either_combination(double uniform, double difference)
    {
        var counting = new En1991Part1To5Basis().Counting(SafetyFormat.Degrees);
        var counted = (Assert.IsType<Counted>(counting[Cause.UniformTemperature, Column.GapService]).Factor * uniform)
            + (Assert.IsType<Counted>(counting[Cause.TemperatureDifference, Column.GapService]).Factor * difference);
        Assert.True(counted >= Math.Max(difference + (0.35 * uniform), (0.75 * difference) + uniform));
    }

    private static LoadModel Model(LiveLoad traffic) => Assert.IsType<Said<LoadModel>>(new En1991Part1To5Basis().LiveLoad(traffic, new Derivation())).Value;
}
