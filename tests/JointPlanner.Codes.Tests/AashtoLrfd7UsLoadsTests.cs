using JointPlanner.Codes.AashtoLrfd7Us;
using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests;

public sealed class AashtoLrfd7UsLoadsTests
{
    private const double Kip = 0.45359237 * 9.80665 * 1000, Foot = 0.3048, Inch = 0.0254, Ksi = Kip / (Inch * Inch);

    /// <summary>
    /// Regression check, own arithmetic, not published: simple span of 100 ft, one lane: truck 44 438.1, tandem 32 017.3, lane 26 666.7, so
    /// 85 769.4 kip·ft² with 33 % on the truck. E 29 000 ksi, I 80 000 in⁴, 0.70 lanes: 0.003727 rad, which opens the joint 66 in above its fixed
    /// bearing by 0.246 in.
    /// </summary>
    [Fact]
    public void End_rotation_under_HL_93_opens_the_joint_beside_the_fixed_bearing()
    {
        var result = Compute(new LiveLoad { StandsFor = FrameShare.GirderLine, Distribution = 0.70, DistributionSource = "test" });
        var (rotation, opening) = (0.70 * 85_769.4 / (29_000.0 * 80_000 / 144), result.Joints[0].Movements.First(m => m.Cause == Cause.LiveLoad).OpensBy.Value);
        Assert.Equal(0.003727, rotation, 0.5e-6);
        Assert.Equal(rotation * 66 * Inch, opening, 1e-6 * opening);
        Assert.Equal(0.246, opening / Inch, 0.0005);
        var turned = result.BearingMovements.First(b => b.Bearing == "b1" && b.Cause == Cause.LiveLoad);
        Assert.Equal(-rotation, turned.RotationLeast!.Value.Value, 1e-6 * rotation);
    }

    /// <summary>From memory, check against the licensed text: LRFD table 3.6.1.1.2-1, factors 1.20, 1.00, 0.85, 0.65 for one to four lanes.</summary>
    [Theory]
    [InlineData(1, 1.20)]
    [InlineData(2, 2.00)]
    [InlineData(3, 2.55)]
    [InlineData(4, 2.60)]
    public void Lanes_count_with_their_presence_factor(int lanes, double counting)
    {
        var model = Assert.IsType<Said<LoadModel>>(new AashtoLrfd7UsBasis().LiveLoad(new LiveLoad { StandsFor = FrameShare.WholeWidth, Lanes = lanes }, new Derivation())).Value;
        Assert.All(model.Arrangements, a => Assert.Equal(counting, a.UniformFactor.Value, 1e-9));
        Assert.All(model.Arrangements, a => Assert.Equal(counting * 1.33, a.TrainFactor.Value, 1e-9));
    }

    /// <summary>From memory, check against the licensed text: LRFD table 3.12.3-1, zone 1: 54 °F at the top, 14 °F four inches down, nil sixteen inches down; −0.30 for bare decks, −0.20 with asphalt.</summary>
    [Theory]
    [InlineData(DeckSurface.Bare, -0.30)]
    [InlineData(DeckSurface.Surfaced, -0.20)]
    public void The_gradient_is_that_of_its_zone(DeckSurface surface, double share)
    {
        var derivation = new Derivation();
        var found = Assert.IsType<Said<TemperatureDifferences>>(new AashtoLrfd7UsBasis().TemperatureDifference(Sections.Of(DeckKind.Composite, derivation, surface: surface), derivation)).Value;
        Assert.Equal([0, 4 * Inch, 16 * Inch], found.Warm.Points.Select(p => Math.Round(p.Depth.Value, 9)));
        Assert.Equal([30, 14 / 1.8, 0], found.Warm.Points.Select(p => p.Difference.Value), (a, b) => Math.Abs(a - b) < 1e-9);
        Assert.Equal([share * 30, share * 14 / 1.8, 0], found.Cool.Points.Select(p => p.Difference.Value), (a, b) => Math.Abs(a - b) < 1e-9);
    }

    [Fact]
    public void A_shallow_concrete_deck_fades_the_gradient_at_its_soffit()
    {
        var derivation = new Derivation();
        var found = Assert.IsType<Said<TemperatureDifferences>>(new AashtoLrfd7UsBasis().TemperatureDifference(Sections.Of(DeckKind.Concrete, derivation, depth: 0.3), derivation)).Value;
        Assert.Equal(0.3, found.Warm.Points[2].Depth.Value, 1e-9);
    }

    private static Result Compute(LiveLoad traffic)
    {
        var section = new CrossSection
        {
            Depth = 60 * Inch,
            BearingDepth = 60 * Inch,
            Surfacing = 6 * Inch,
            Layers = [new Layer { Id = "girder", Material = LayerMaterial.Steel, Modulus = 29_000 * Ksi, Area = 0.06, Depth = 30 * Inch, Inertia = 80_000 * Math.Pow(Inch, 4) }],
        };
        var plan = new Plan
        {
            Structure = new("T", "Test", "nowhere", "Etc/UTC", null),
            Basis = new BasisChoice { Code = "aashto-lrfd-7-us" },
            Climate = new Climate { Zone = "moderate" },
            Supports = [new Support { Id = "a1", Station = 0, Kind = SupportKind.Abutment }, new Support { Id = "a2", Station = 100 * Foot, Kind = SupportKind.Abutment }],
            Segments = [new Segment { Id = "deck", Start = 0, End = 100 * Foot, Kind = DeckKind.Steel, AxialStiffness = 1, Section = section }],
            Bearings = [Line("b1", "a1", 0, BearingKind.Fixed), Line("b2", "a2", 100 * Foot, BearingKind.Free)],
            Joints = [new Joint { Id = "j1", Near = "a1", Far = "deck", SettingTemperature = 10 }, new Joint { Id = "j2", Near = "deck", Far = "a2", SettingTemperature = 10 }],
            LiveLoad = traffic,
        };
        return Movements.Of(plan, new AashtoLrfd7UsBasis(), null);

        static BearingLine Line(string id, string on, double station, BearingKind kind) =>
            new() { Id = id, Segment = "deck", On = on, Station = station, Kind = kind, SettingTemperature = 10 };
    }
}
