using System.Text;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

/// <summary>Wrong input in a plan file: field, value, what is allowed, what to do.</summary>
public sealed class WrongInputTests
{
    private static Fault Only(string json, string path)
    {
        var reading = TestPlans.Read(json);
        var fault = Assert.Single(reading.Faults);
        Assert.Equal(path, fault.Path);
        Assert.Equal(fault.IsWarning, reading.Plan is not null);
        Assert.NotEmpty(fault.Wrong);
        Assert.NotEmpty(fault.Allowed);
        Assert.NotEmpty(fault.Remedy);
        return fault;
    }

    private static string With(string path, string? text) => TestPlans.Document(TestPlans.Good).With(path, text).ToJson();

    private static string Without(string path) => TestPlans.Document(TestPlans.Good).Without(path).ToJson();

    [Fact]
    public void An_empty_deck_is_refused()
    {
        var reading = TestPlans.Read(TestPlans.Document(TestPlans.Least).Without("segments").Without("bearings").Without("joints").ToJson());

        var fault = Assert.Single(reading.Faults, f => f.Path == "segments");
        Assert.Equal("The deck is empty: there is no segment.", fault.Wrong);
        Assert.Equal(("Allowed: 1 or more.", "Add a deck segment."), (fault.Allowed, fault.Remedy));
        Assert.Equal(["bearings", "segments"], reading.Faults.Select(f => f.Path).Order());
    }

    [Fact]
    public void A_negative_span_is_refused_at_the_end_of_the_segment()
    {
        var fault = Only(With("segments/east/end", "59 m"), "segments/east/end");

        Assert.Equal("59 m", fault.Value);
        Assert.Equal("Segment east ends at 59 m, before it starts at 60 m: its length would be negative.", fault.Wrong);
        Assert.Equal("Allowed: a station greater than 60 m.", fault.Allowed);
    }

    [Fact]
    public void A_segment_without_length_is_refused() =>
        Assert.Contains("it has no length", Only(With("segments/east/end", "60 m"), "segments/east/end").Wrong, StringComparison.Ordinal);

    [Fact]
    public void Supports_out_of_order_are_refused_at_the_one_that_stands_behind()
    {
        var fault = Only(With("supports/p3/station", "35 m"), "supports/p3/station");

        Assert.Equal("35 m", fault.Value);
        Assert.Equal("Support p3 stands at 35 m, before support p2 at 40 m: the span between them would be negative.", fault.Wrong);
        Assert.Equal("Allowed: a station greater than 40 m.", fault.Allowed);
        Assert.Equal("Correct the station, or put the supports in station order.", fault.Remedy);
    }

    [Fact]
    public void Two_supports_at_one_station_are_refused() =>
        Assert.Contains("stand at the same station, 40 m", Only(With("supports/p3/station", "40 m"), "supports/p3/station").Wrong, StringComparison.Ordinal);

    [Fact]
    public void A_deck_held_by_sliders_alone_is_refused_and_the_sentence_says_why()
    {
        var fault = Only(With("bearings/b5/kind", "free"), "segments/east");

        Assert.Equal("Segment east is held along the deck by sliders alone (b3, b4, b5). Friction of sliders is not counted yet, so nothing says where the deck "
            + "stays and the movements at its joints have no answer.", fault.Wrong);
        Assert.Equal("Allowed: at least one fixed or elastomeric line on a support, or on a segment that is held itself.", fault.Allowed);
        Assert.Equal("Make one of its bearing lines fixed or elastomeric.", fault.Remedy);
    }

    [Fact]
    public void A_deck_held_only_to_a_deck_that_floats_is_refused_with_it()
    {
        var floating = TestPlans.Document(TestPlans.Good).With("bearings/b5/kind", "free").With("bearings/b3/kind", "fixed")
            .With("bearings/b1/kind", "free").Without("bearings/b1/pads").With("bearings/b2/kind", "free").With("bearings/b2/setting/temperature", "12 °C").With("bearings/b2/setting/deck-age", "60 d");

        var reading = TestPlans.Read(floating.ToJson());

        Assert.Equal(["segments/west", "segments/east"], reading.Faults.Select(f => f.Path));
        Assert.Equal("Segment east is held only to west, which is not held along the deck itself.", reading.Faults[1].Wrong);
    }

    [Theory]
    [InlineData("-300 °C", "temperature at setting of the joint: -300 °C is below absolute zero (-273.15 °C).", "Allowed: a temperature from -60 °C to 100 °C, in °C or °F.")]
    [InlineData("-500 °F", "temperature at setting of the joint: -500 °F is below absolute zero (-459.67 °F).", "Allowed: a temperature from -76 °F to 212 °F, in °C or °F.")]
    public void A_temperature_below_absolute_zero_is_refused(string text, string wrong, string allowed)
    {
        var fault = Only(With("joints/j1/setting/temperature", text), "joints/j1/setting/temperature");

        Assert.Equal((text, wrong, allowed), (fault.Value, fault.Wrong, fault.Allowed));
        Assert.StartsWith("Correct the temperature.", fault.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void Degrees_Fahrenheit_typed_as_Celsius_give_a_warning_that_says_so()
    {
        var fault = Only(With("joints/j1/setting/temperature", "60 °C"), "joints/j1/setting/temperature");

        Assert.True(fault.IsWarning);
        Assert.Equal("60 °C", fault.Value);
        Assert.Equal("temperature at setting of the joint: 60 °C is unusual.", fault.Wrong);
        Assert.Equal("Usual: from -30 °C to 45 °C.", fault.Allowed);
        Assert.EndsWith("Was it meant in °F? 60 °F is 15.556 °C.", fault.Remedy, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("90°")]
    [InlineData("-90 deg")]
    [InlineData("81°")]
    public void A_skew_of_90_degrees_is_refused(string text)
    {
        var fault = Only(With("joints/j1/skew", text), "joints/j1/skew");

        Assert.False(fault.IsWarning);
        Assert.Equal(text, fault.Value);
        Assert.Equal("Allowed: an angle from -80° to 80°, in ° or rad.", fault.Allowed);
    }

    [Fact]
    public void A_skew_over_45_degrees_is_a_warning() => Assert.True(Only(With("joints/j1/skew", "-50°"), "joints/j1/skew").IsWarning);

    [Fact]
    public void A_girder_span_over_500_m_is_a_warning()
    {
        var far = TestPlans.Document(TestPlans.Least).With("supports/a2/station", "501 m").With("segments/s1/end", "501 m");
        var fault = Only(far.With("segments/s1/depth", "3 m").ToJson(), "supports/a2/station");

        Assert.True(fault.IsWarning);
        Assert.Equal(("501 m", "Between supports a1 and a2 the deck spans 501 m.", "Usual for a girder deck: up to 500 m."), (fault.Value, fault.Wrong, fault.Allowed));
    }

    [Fact]
    public void Two_thousand_and_one_supports_are_refused()
    {
        var many = string.Join(",\n", Enumerable.Range(0, 2001).Select(i => $$"""{ "id": "p{{i}}", "station": "{{i}} m", "kind": "pier" }"""));
        var start = TestPlans.Least.IndexOf("\"supports\": [", StringComparison.Ordinal);
        var end = TestPlans.Least.IndexOf(']', start);

        var fault = Only($"{TestPlans.Least[..start]}\"supports\": [ {many} {TestPlans.Least[end..]}", "supports");

        Assert.Equal(("There are 2001 entries.", "Allowed: up to 2000 of them."), (fault.Wrong, fault.Allowed));
    }

    [Fact]
    public void A_bare_number_where_a_quantity_belongs_shows_what_was_probably_meant()
    {
        var fault = Only(TestPlans.Good.Replace("\"station\": \"40 m\"", "\"station\": 42.5", StringComparison.Ordinal), "supports/p2/station");
        Assert.Equal(("42.5", "station of the support: 42.5 has no unit.", "Probably meant \"42.5 m\": write it so, in quotation marks."), (fault.Value, fault.Wrong, fault.Remedy));

        var inFeet = Only(TestPlans.Good.Replace("\"display\": \"metric\"", "\"display\": \"us\"", StringComparison.Ordinal).Replace("\"station\": \"40 m\"", "\"station\": \"130\"", StringComparison.Ordinal), "supports/p2/station");
        Assert.Equal("Probably meant “130 ft”: write the unit.", inFeet.Remedy);
    }

    [Fact]
    public void A_decimal_comma_is_read_where_it_can_mean_one_thing_only()
    {
        Assert.Equal(40.5, TestPlans.Read(With("supports/p2/station", "40,5 m")).Plan!.Supports[1].Station);

        var fault = Only(With("supports/p2/station", "40,500 m"), "supports/p2/station");
        Assert.Equal(("40,500 m", "station of the support: “40,500 m” can be read in two ways.", "Write “40.500 m” or “40500 m”, without thousands separators."), (fault.Value, fault.Wrong, fault.Remedy));
    }

    [Theory]
    [InlineData("bearings/b4/on", "p33", "reference.unknown", "Did you mean “p3”?")]
    [InlineData("joints/j2/far", "eats", "reference.unknown", "Did you mean “east”?")]
    [InlineData("movements/m1/joint", "j9", "reference.unknown", "Did you mean “j1”?")]
    [InlineData("joints/j2/far", "west", "joints.one-body", "Name the body ahead.")]
    [InlineData("joints/j2/far", "p3", "joints.pier", "Name the deck segment that ends there.")]
    [InlineData("joints/j2/far", "a4", "joints.apart", "Name the two bodies that meet at this joint")]
    [InlineData("bearings/b4/station", "140 m", "bearings.beyond-segment", "Correct the bearing's station")]
    [InlineData("bearings/b4/station", "80 m", "bearings.off-support", "Correct the station, or name what it stands on.")]
    [InlineData("bearings/b3/station", null, "bearings.no-station", "Give the station of the bearing line.")]
    [InlineData("bearings/b3/on", "east", "bearings.on-itself", "Name what is below it.")]
    [InlineData("bearings/b1/setting/temperature", null, "bearings.no-setting", "repeat the joint's temperature")]
    [InlineData("bearings/b1/setting/deck-age", null, "bearings.no-deck-age", "Give the age, for instance 60 d.")]
    [InlineData("joints/j2/setting/near-deck-age", null, "joints.no-deck-age", "Give the age, for instance 90 d.")]
    [InlineData("joints/j1/setting/far-deck-age", "20 d", "joints.before-least-age", "Correct one of the two ages.")]
    [InlineData("segments/east/start", "59 m", "segments.overlap", "put the segments in station order")]
    [InlineData("segments/west/creep/development/#2/age", "28 d", "development.ages", "Put the points in order of age")]
    [InlineData("segments/west/shrinkage/development/#2/share", "0.05", "development.falls", "Correct the share")]
    [InlineData("climate/shade-max", "-20 °C", "climate.out-of-order", "change them round")]
    [InlineData("climate/effective-min", null, "climate.half-a-pair", "Give the lowest one too.")]
    [InlineData("supports/p2/stiffness", "rigid", "supports.two-stiffnesses", "Take one of them out.")]
    [InlineData("basis/answers/#2/factor", "1.2", "answers.no-answer", "Give one of the two.")]
    [InlineData("movements/m2/cause", "uniform-temperature", "movements.computed", "Take the movement out")]
    [InlineData("movements/m1/cause", "creep", "movements.computed", "Take the movement out")]
    [InlineData("movements/m2/joint", "j1", "", "")]
    [InlineData("setting-table/to", "-10 °C", "setting-table.no-rows", "Correct one of the two temperatures.")]
    [InlineData("setting-table/step", "0.1 K", "setting-table.too-long", "Choose a larger step")]
    [InlineData("structure/time-zone", "Europe/Pairs", "structure.time-zone", "Did you mean “Europe/Paris”?")]
    [InlineData("joints/j1/choice/family", "strip-sael", "field.unknown-word", "Did you mean “strip-seal”?")]
    [InlineData("joints/j1/choice/reason", null, "field.missing", "Give it.")]
    [InlineData("supports/p2/kind", "peir", "field.unknown-word", "Did you mean “pier”?")]
    [InlineData("movements/m1/opens-by", "-1.5 mm", "field.range", "Correct the value or its unit.")]
    [InlineData("bearings/b1/pads/count", "0", "field.range", "Correct the number.")]
    [InlineData("bearings/b1/pads/count", "two", "field.not-whole", "Correct it.")]
    [InlineData("joints/j1/setting/temperature", "285 K", "quantity.kelvin-reading", "Write the reading in °C or °F.")]
    [InlineData("supports/p3/stiffness", "stiff", "quantity.not-a-number", "Write a stiffness as “12 MN/m”.")]
    public void Each_wrong_field_is_named_with_what_to_do(string path, string? text, string id, string remedy)
    {
        var reading = TestPlans.Read(With(path, text));
        if (id.Length == 0)
        {
            Assert.Empty(reading.Faults);
            return;
        }
        var fault = Assert.Single(reading.Faults);

        Assert.Equal((id, path, text ?? ""), (fault.Id, fault.Path, fault.Value));
        Assert.Contains(remedy, fault.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void Two_joints_at_one_face_and_a_joint_turned_round_are_refused()
    {
        var (document, path) = TestPlans.Document(TestPlans.Good).WithItem("joints", "j");
        document = document.With($"{path}/near", "a1").With($"{path}/far", "west").With($"{path}/setting/temperature", "12 °C").With($"{path}/setting/far-deck-age", "90 d");
        Assert.Equal("Joints j1 and j3 both lie at the lower end of segment west.", Only(document.ToJson(), "joints/j3/far").Wrong);

        var turned = TestPlans.Document(TestPlans.Good).With("joints/j2/near", "east").With("joints/j2/far", "west").With("joints/j2/setting/near-deck-age", null).With("joints/j2/setting/far-deck-age", "90 d");
        Assert.Equal("Make west the near body and east the far one.", Only(turned.ToJson(), "joints/j2/near").Remedy);
    }

    [Fact]
    public void Pads_belong_to_elastomeric_lines_and_to_no_other()
    {
        Assert.Equal("bearings.no-pads", Only(Without("bearings/b1/pads"), "bearings/b1/pads").Id);
        Assert.Equal("bearings.pads-unused", Only(With("bearings/b1/kind", "free"), "bearings/b1/pads").Id);
    }

    [Fact]
    public void A_movement_given_twice_is_refused()
    {
        var twice = TestPlans.Document(TestPlans.Good).With("movements/m2/joint", "j1").With("movements/m2/cause", "live-load");

        Assert.Equal("Movements m1 and m2 both give live-load at joint j1.", Only(twice.ToJson(), "movements/m2/cause").Wrong);
    }

    [Fact]
    public void A_steel_deck_without_bearing_setting_takes_the_joints_and_says_so()
    {
        var reading = TestPlans.Read(TestPlans.Good);

        Assert.Null(reading.Plan!.Bearings[3].SettingTemperature);
        Assert.Equal("nothing is given: taken as tied at zero shear when the joint was set (steel deck)", reading.Plan.DefaultReason("bearings/b4/setting/temperature"));
    }

    [Fact]
    public void Every_fault_of_a_plan_is_told_at_once()
    {
        var wrong = TestPlans.Document(TestPlans.Good).With("supports/p2/station", "40").With("joints/j1/skew", "90°").With("segments/west/kind", "concret").With("movements/m1/joint", "j7")
            .With("climate/shade-max", "-20 °C");

        Assert.Equal(["supports/p2/station", "segments/west/kind", "joints/j1/skew", "movements/m1/joint", "climate/shade-max"], TestPlans.Read(wrong.ToJson()).Faults.Select(f => f.Path));
    }
}
