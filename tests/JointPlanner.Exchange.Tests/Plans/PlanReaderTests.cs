using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;
using Column = JointPlanner.Engine.Bases.Column;

namespace JointPlanner.Exchange.Tests.Plans;

public sealed class PlanReaderTests
{
    public static TheoryData<string> SeedPlans => [.. SeedData.Plans().Select(Path.GetFileName).OfType<string>()];

    [Theory]
    [MemberData(nameof(SeedPlans))]
    public void A_plan_of_the_seed_data_reads_without_a_fault(string file)
    {
        var reading = new PlanReader().Read(File.ReadAllBytes(SeedData.Plans().Single(p => Path.GetFileName(p) == file)));

        Assert.Empty(reading.Faults.Select(f => $"{f.Path}: {f.Wrong} {f.Allowed} {f.Remedy}"));
        Assert.NotNull(reading.Plan);
    }

    [Fact]
    public void Every_field_of_a_plan_reaches_the_plan()
    {
        var reading = TestPlans.Read(TestPlans.Good);
        Assert.Empty(reading.Faults.Select(f => $"{f.Path}: {f.Wrong}"));
        var plan = reading.Plan!;

        Assert.Equal(new Structure("T-1", "Test bridge", "nowhere", "Europe/Paris", 85), plan.Structure);
        Assert.Equal(("some-code", "some-profile", "some-rules"), (plan.Basis.Code, plan.Basis.Profile, plan.Basis.OwnerRules));
        Assert.Equal((SettingDoubt.Unspecified, SafetyFormat.Factor), (plan.Basis.Doubt!.Value, plan.Basis.Safety!.Value));
        Assert.Equal([new(Cause.LiveLoad, Column.GapService, 1.35, "designer"), new(Cause.Wind, Column.Racking, null, "sheltered")], plan.Basis.Answers);
        Assert.Equal(new Climate { Source = "invented", Zone = "moderate", ShadeMax = 38, ShadeMin = -16, EffectiveMax = 42, EffectiveMin = -11, Warming = 1.5 }, plan.Climate);
        Assert.Equal(
            [
                new() { Id = "a1", Mark = "Abutment 1", Station = 0, Kind = SupportKind.Abutment, Height = 5 },
                new() { Id = "p2", Mark = "Pier 2", Station = 40, Kind = SupportKind.Pier, Height = 9, Stiffness = new ColumnStiffness(9, 31e9, 0.55, 900e6, 9e9) },
                new() { Id = "p3", Mark = "Pier 3", Station = 90, Kind = SupportKind.Pier, Height = 12, Stiffness = new GivenStiffness(40e6) },
                new() { Id = "a4", Mark = "Abutment 4", Station = 130, Kind = SupportKind.Abutment, Height = 4 },
            ], plan.Supports);
        var west = plan.Segments[0];
        Assert.Equal(("west", "West deck", -0.5, 60.0, DeckKind.Concrete, 2.0), (west.Id, west.Mark, west.Start, west.End, west.Kind, west.Depth));
        Assert.Equal((210e9, 10e-6), (west.AxialStiffness, west.Expansion!.Value));
        Assert.Equal(220e-6, west.Creep!.Strain, 1e-18);
        Assert.Equal("sheet 21", west.Creep.Source);
        Assert.Equal([new(28 * 86400.0, 0.2), new(1000 * 86400.0, 0.8)], west.Creep.Development);
        Assert.Equal((0.0003, "sheet 22", 0.9), (west.Shrinkage!.Strain, west.Shrinkage.Source, west.Shrinkage.Development[1].Share));
        Assert.Null(plan.Segments[1].Creep);
        Assert.Equal(
            new BearingLine
            {
                Id = "b1",
                Mark = "B1",
                Segment = "west",
                On = "a1",
                Station = 0,
                Kind = BearingKind.Elastomeric,
                Pads = new Pads(4, 0.9e6, 0.16, 0.06),
                SettingTemperature = 12,
                SettingAge = 60 * 86400.0,
            }, plan.Bearings[0]);
        Assert.Equal(("west", 60.0, BearingKind.Free), (plan.Bearings[2].On, plan.Bearings[2].Station, plan.Bearings[2].Kind));
        var joint = plan.Joints[0];
        Assert.Equal(("j1", "J1", "a1", "west", Math.PI / 12), (joint.Id, joint.Mark, joint.Near, joint.Far, joint.Skew), Near);
        Assert.Equal((12.0, 1.5, 0.002, 0.003), (joint.SettingTemperature, joint.TemperatureUncertainty, joint.MeasureUncertainty, joint.RemainingUncertainty));
        Assert.Equal((null, 90 * 86400.0, 28 * 86400.0), (joint.NearAge, joint.FarAge!.Value, joint.LeastAge!.Value));
        Assert.Equal(("strip-seal", "80 mm", "the owner's wish"), (joint.ChosenFamily, joint.ChosenSize, joint.ChoiceReason));
        Assert.Equal(new GivenMovement("m1", "j1", Cause.LiveLoad, 0.0015, 0.0025, "sheet 12"), plan.GivenMovements[0]);
        Assert.Equal((-10.0, 40.0, 2.5), (plan.SettingTable.From!.Value, plan.SettingTable.To!.Value, plan.SettingTable.Step));
        Assert.Equal([90 * 86400.0, 365.25 * 86400], plan.SettingTable.Ages);
    }

    private static bool Near((string, string, string, string, double) a, (string, string, string, string, double) b) =>
        a.Item1 == b.Item1 && a.Item2 == b.Item2 && a.Item3 == b.Item3 && a.Item4 == b.Item4 && Math.Abs(a.Item5 - b.Item5) < 1e-15;

    [Fact]
    public void The_least_plan_computes_with_stated_defaults_and_each_has_its_reason()
    {
        var reading = TestPlans.Read(TestPlans.Least);
        Assert.Empty(reading.Faults);
        var plan = reading.Plan!;

        var defaults = reading.Defaults.ToDictionary(d => d.Path, d => d.Text);
        Assert.Equal(
            [
                "bearings/b1/setting/temperature", "bearings/b1/station", "bearings/b2/setting/temperature", "bearings/b2/station", "climate/warming", "display",
                "joints/j1/setting/measure-uncertainty", "joints/j1/setting/remaining-uncertainty", "joints/j1/setting/temperature-uncertainty", "joints/j1/skew",
                "segments/s1/axial-stiffness", "segments/s1/depth", "setting-day/methods", "setting-day/points", "setting-table/step", "structure/time-zone", "supports/a1/stiffness", "supports/a2/stiffness",
            ], defaults.Keys.Order(StringComparer.Ordinal));
        Assert.Equal(("1 m", "100 GN", "20 m", "2 K"), (defaults["segments/s1/depth"], defaults["segments/s1/axial-stiffness"], defaults["bearings/b2/station"], defaults["joints/j1/setting/temperature-uncertainty"]));
        Assert.All(reading.Defaults, d => Assert.NotEmpty(d.Reason));
        Assert.Equal(reading.Defaults.Select(d => d.Path), plan.Defaults.Keys);
        Assert.Contains("from memory", plan.DefaultReason("segments/s1/axial-stiffness"), StringComparison.Ordinal);
        Assert.Equal((1.0, 100e9, 20.0, 2.0, 0.001), (plan.Segments[0].Depth, plan.Segments[0].AxialStiffness, plan.Bearings[1].Station, plan.Joints[0].TemperatureUncertainty, plan.Joints[0].MeasureUncertainty));
        Assert.Null(plan.Supports[0].Stiffness);
    }

    [Fact]
    public void Words_that_the_code_edition_does_not_know_are_refused_with_the_nearest()
    {
        var basis = new KnownBasis();
        var reader = new PlanReader(new KnownWords { Bases = [basis], OwnerRules = ["rules-a"] });
        var document = TestPlans.Document(TestPlans.Least).With("basis/code", "test-code");
        Assert.Empty(reader.Read(document).Faults);

        Assert.Equal("Did you mean “test-code”?", Assert.Single(reader.Read(document.With("basis/code", "test-cod")).Faults).Remedy);
        Assert.Equal("Did you mean “north”?", Assert.Single(reader.Read(document.With("basis/profile", "nord")).Faults).Remedy);
        Assert.Equal("Did you mean “cold”?", Assert.Single(reader.Read(document.With("climate/zone", "colt")).Faults).Remedy);
        Assert.Equal("Did you mean “rules-a”?", Assert.Single(reader.Read(document.With("basis/owner-rules", "rules-b")).Faults).Remedy);
        Assert.Equal("Allowed: none.", Assert.Single(reader.Read(document.With("basis/setting-doubt", "specified")).Faults).Allowed);
        Assert.Equal("basis/safety", Assert.Single(reader.Read(document.With("basis/safety", "degrees")).Faults).Path);
    }

    private sealed class KnownBasis : CodeBasis
    {
        public override string Id => "test-code";
        public override string Title => "Test code";
        public override IReadOnlyList<string> Profiles => ["north", "south"];
        public override IReadOnlyList<string> ClimateZones => ["moderate", "cold"];
    }
}
