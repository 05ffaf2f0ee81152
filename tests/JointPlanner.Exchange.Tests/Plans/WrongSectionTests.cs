using System.Text.Json.Nodes;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

/// <summary>Sections, temperature differences and traffic: wrong input names the field, and what is right is read as it stands.</summary>
public sealed class WrongSectionTests
{
    private static JsonNode Heron() => JsonNode.Parse(File.ReadAllText(Path.Combine(SeedData.Folder, "structures", "heron-weir-bridge.json")))!;

    private static Plan Read(JsonNode plan) => TestPlans.Read(plan.ToJsonString()).Plan ?? throw new InvalidOperationException("The plan has faults.");

    private static Fault Only(Action<JsonNode> change)
    {
        var plan = Heron();
        change(plan);
        var fault = Assert.Single(TestPlans.Read(plan.ToJsonString()).Faults, f => !f.IsWarning);
        Assert.NotEmpty(fault.Wrong);
        Assert.NotEmpty(fault.Allowed);
        Assert.NotEmpty(fault.Remedy);
        return fault;
    }

    private static JsonNode Deck(JsonNode plan) => plan["segments"]![0]!;

    private static JsonNode Slab(JsonNode plan) => Deck(plan)["section"]!["layers"]![0]!;

    [Fact]
    public void A_section_is_read_in_si_with_its_layers_by_id()
    {
        var section = Assert.Single(Read(Heron()).Segments).Section!;
        Assert.Equal(["slab", "top-flanges", "webs", "bottom-flanges"], section.Layers.Select(l => l.Id));
        Assert.Equal((34e9, 2.5, 0.125, 0.25), (section.Layers[0].Modulus, section.Layers[0].Area, section.Layers[0].Depth, section.Layers[0].Height));
        Assert.Equal((1.715, 1.76, 0.09, 2e9), (section.Depth, section.BearingDepth, section.Surfacing, section.Connection));
        Assert.Equal(15.24, section.ReliefSpacing, 1e-12);
    }

    [Fact]
    public void What_acts_is_read_in_si()
    {
        var plan = Read(Heron());
        Assert.Equal(22e3, plan.Segments[0].DeadLoad!.Value);
        Assert.Equal(555e3, plan.Segments[0].Braking!.Force);
        Assert.Equal(new SubstructureMovement(0.008, -0.003, 0.0005, plan.Supports[0].Movement!.Source), plan.Supports[0].Movement);
        Assert.Equal((FrameShare.WholeWidth, 8.0), (plan.LiveLoad!.StandsFor, plan.LiveLoad.Carriageway));
    }

    [Fact]
    public void Both_a_section_and_an_axial_stiffness_are_refused() =>
        Assert.Equal("segments/deck/axial-stiffness", Only(p => Deck(p)["axial-stiffness"] = "100 GN").Path);

    [Fact]
    public void A_layer_has_a_height_or_an_inertia() =>
        Assert.Equal("segments/deck/section/layers/slab/height", Only(p => Slab(p)["inertia"] = "0.01 m4").Path);

    [Fact]
    public void A_layer_below_the_soffit_is_refused_with_its_lower_edge()
    {
        var fault = Only(p => Slab(p)["depth"] = "1700 mm");
        Assert.Equal("segments/deck/section/layers/slab/depth", fault.Path);
        Assert.Contains("1825", fault.Wrong, StringComparison.Ordinal);
    }

    [Fact]
    public void A_profile_for_one_way_alone_is_refused() => Assert.Equal("segments/deck/gradient/cool", Only(p => Deck(p)["gradient"] = JsonNode.Parse(
        """{ "warm": [ { "depth": "0 mm", "difference": "10 K" }, { "depth": "400 mm", "difference": "0 K" } ], "source": "test" }""")).Path);

    [Fact]
    public void Profile_points_stand_in_order_of_depth() => Assert.Equal("segments/deck/gradient/warm/#2/depth", Only(p => Deck(p)["gradient"] = JsonNode.Parse(
        """{ "warm": [ { "depth": "400 mm", "difference": "10 K" }, { "depth": "0 mm", "difference": "0 K" } ], "cool": [ { "depth": "0 mm", "difference": "-3 K" }, { "depth": "400 mm", "difference": "0 K" } ], "source": "test" }""")).Path);

    [Fact]
    public void A_girder_line_needs_its_distribution_factor() => Assert.Equal("live-load/distribution", Only(p => p["live-load"]!["stands-for"] = "girder-line").Path);

    [Fact]
    public void Own_loads_on_the_whole_width_need_the_number_of_lanes() =>
        Assert.Equal("live-load/lanes", Only(p => p["live-load"]!["own"] = JsonNode.Parse("""{ "uniform": "9 kN/m", "source": "test" }""")).Path);

    [Fact]
    public void Axles_behind_the_first_need_their_spacing() => Assert.Equal("live-load/own/trains/t/axles/#2/spacing", Only(p =>
    {
        p["live-load"]!["lanes"] = 2;
        p["live-load"]!["own"] = JsonNode.Parse("""{ "trains": [ { "id": "t", "axles": [ { "force": "100 kN" }, { "force": "150 kN" } ] } ], "source": "test" }""");
    }).Path);

    [Fact]
    public void A_column_is_built_in_only_where_its_dimensions_are_known() => Assert.Equal("bearings/b2/kind", Only(p =>
    {
        p["supports"]![1]!.AsObject().Remove("column");
        p["supports"]![1]!["stiffness"] = "40 MN/m";
        p["bearings"]![1]!["kind"] = "monolithic";
    }).Path);

    [Fact]
    public void A_computed_cause_may_not_be_given_too() => Assert.Equal("movements/m-x/cause", Only(p => p["movements"]!.AsArray().Add(JsonNode.Parse(
        """{ "id": "m-x", "joint": "j1", "cause": "braking", "opens-by": "1 mm", "closes-by": "1 mm", "source": "test" }"""))).Path);
}
