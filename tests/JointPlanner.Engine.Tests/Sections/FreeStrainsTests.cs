using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Tests.Sections;

public sealed class FreeStrainsTests
{
    private readonly Derivation derivation = new();

    /// <summary>
    /// Regression check, own arithmetic, not published: slab 15 K cooler, 10 millionths per K: F 347.4 kN, κ 1.1124e-7 /mm (slab pulls its side short,
    /// so the girder hogs down: the underside lengthens), bottom fibre +20.9, slab top −147.6 millionths, end slip 0.228 mm, end shear flow 228 N/mm.
    /// </summary>
    [Fact]
    public void A_cooler_slab_shortens_the_surface_and_lengthens_the_underside()
    {
        var section = Section();
        var state = Strains(section, 10e-6).Of("slab cooler", l => l.Layer.Material == LayerMaterial.Concrete ? Difference(-15) : null);
        Assert.Equal(1.1124e-4, state.Curvature.Value, 0.0001e-4);
        Assert.Equal(-147.6e-6, state.SurfaceStrain.Value, 0.1e-6);
        Assert.Equal(20.9e-6, state.BearingStrain.Value, 0.1e-6);
        var between = new SlabAndSteel(SlabOnGirder.Plan, section, derivation).Of(state);
        Assert.Equal(347.4e3, between.Force.Value, 0.1e3);
        Assert.Equal(0.228e-3, between.EndSlip!.Value.Value, 0.0005e-3);
        Assert.Equal(228e3, between.EndShearFlow!.Value.Value, 0.5e3);
    }

    /// <summary>Regression check, own arithmetic, not published: 12 against 10 millionths per K over 30 K: F 138.9 kN, α_eff 1.063e-5, bottom +8.4 and top −59.0 millionths beyond the girder's own 360.</summary>
    [Fact]
    public void Different_coefficients_act_like_a_cooler_slab()
    {
        var layered = SlabOnGirder.Section with
        {
            Layers = [.. SlabOnGirder.Section.Layers.Select(l => l with { Expansion = l.Material == LayerMaterial.Concrete ? 10e-6 : 12e-6 })],
        };
        var section = Section(layered);
        var state = Strains(section, 12e-6).Of("warmed", _ => Difference(30));
        Assert.Equal(4.4497e-5, state.Curvature.Value, 0.0001e-5);
        Assert.Equal((360 - 59.0) * 1e-6, state.SurfaceStrain.Value, 0.1e-6);
        Assert.Equal((360 + 8.4) * 1e-6, state.BearingStrain.Value, 0.1e-6);
        Assert.Equal(138.9e3, new SlabAndSteel(SlabOnGirder.Plan, section, derivation).Of(state).Force.Value, 0.1e3);
        Assert.Equal(1.063e-5, section.EffectiveExpansion(Expansion(12e-6), derivation)!.Value.Value, 0.0005e-5);
    }

    [Fact]
    public void Stresses_of_any_profile_balance_in_themselves()
    {
        var section = Section();
        var profile = new TemperatureProfile("warm", [Point(0, 16), Point(0.15, 4), Point(0.55, 0)]);
        var state = Strains(section, 10e-6).Of(profile);
        // Σσ·A and Σσ·A·(y − ȳ) over the layers, the profile integrated in thin slices: the trapezoidal rule, independent of the program's closed form.
        var (force, moment) = (0.0, 0.0);
        foreach (var layer in section.Layers)
            for (var i = 0; i < 4000; i++)
            {
                var y = layer.Top + (layer.Height.Value * (i + 0.5) / 4000);
                var t = y < 0.15 ? 16 + ((4 - 16) * y / 0.15) : y < 0.55 ? 4 * (0.55 - y) / 0.4 : 0;
                var stress = layer.Layer.Modulus * (state.AxialStrain.Value + (state.Curvature.Value * (y - section.NeutralAxis.Value)) - (10e-6 * t));
                force += stress * layer.Layer.Area / 4000;
                moment += stress * layer.Layer.Area / 4000 * (y - section.NeutralAxis.Value);
            }
        var scale = 34e9 * 1e-5 * 16 * 0.625;
        Assert.InRange(Math.Abs(force) / scale, 0, 1e-6);
        Assert.InRange(Math.Abs(moment) / scale, 0, 1e-6);
        Assert.True(state.Curvature.Value < 0, "a warmer top hogs the deck");
    }

    [Fact]
    public void A_linear_profile_through_the_neutral_axis_bends_without_lengthening()
    {
        var section = Section();
        var (neutral, depth) = (section.NeutralAxis.Value, 1.515);
        var profile = new TemperatureProfile("linear", [Point(0, 15 * neutral / depth), Point(depth, 15 * ((neutral / depth) - 1))]);
        var state = Strains(section, 10e-6).Of(profile);
        Assert.Equal(0, state.AxialStrain.Value, 1e-15);
        Assert.Equal(-10e-6 * 15 / depth, state.Curvature.Value, 1e-12);
        Assert.All(state.Stresses, s => Assert.Equal(0, s.Stress.Value, 1e-3));
    }

    [Fact]
    public void A_layer_given_by_its_inertia_is_the_strip_of_that_inertia()
    {
        var plates = Section();
        var strips = Section(SlabOnGirder.Section with
        {
            Layers = [.. SlabOnGirder.Section.Layers.Select(l => l with { Height = null, Inertia = l.Area * l.Height!.Value * l.Height.Value / 12 })],
        });
        Assert.Equal(plates.BendingStiffness.Value, strips.BendingStiffness.Value, 1e-6 * plates.BendingStiffness.Value);
        Assert.Equal(plates.Layers.Select(l => l.Height.Value), strips.Layers.Select(l => l.Height.Value), (a, b) => Math.Abs(a - b) < 1e-12);
    }

    /// <summary>Common practice, no source: relief joints about every 50 ft keep the difference of slab and steel to about a millimetre. Own arithmetic: 2 millionths per K over 15.24 m and 30 K are 0.91 mm.</summary>
    [Fact]
    public void Between_relief_joints_slab_and_steel_differ_by_about_a_millimetre()
    {
        var plan = SlabOnGirder.Plan with
        {
            Segments = [SlabOnGirder.Plan.Segments[0] with { Section = SlabOnGirder.Section with { Layers = [.. SlabOnGirder.Section.Layers.Select(l => l with { Expansion = l.Material == LayerMaterial.Concrete ? 10e-6 : 12e-6 })] } }],
        };
        var relief = Movements.Of(plan, new PlainBasis(), null).Segments[0].Section!.ReliefMovement!.Value;
        Assert.Equal(0.91e-3, relief.Value, 0.005e-3);
    }

    private SectionProperties Section(CrossSection? section = null) =>
        SectionProperties.Of(SlabOnGirder.Plan, SlabOnGirder.Plan.Segments[0] with { Section = section ?? SlabOnGirder.Section }, derivation)!;

    private FreeStrains Strains(SectionProperties section, double expansion) => new(section, Expansion(expansion), derivation);

    private Number Expansion(double value) => derivation.Given("test", "α", "test", Quantity.Expansion, value);

    private Number Difference(double value) => derivation.Given("difference", "T", "test", Quantity.TemperatureDifference, value);

    private ProfilePoint Point(double depth, double difference) =>
        new(derivation.Given($"{depth}", "y", "test", Quantity.Size, depth), derivation.Given($"{depth}/{difference}", "T", "test", Quantity.TemperatureDifference, difference));
}
