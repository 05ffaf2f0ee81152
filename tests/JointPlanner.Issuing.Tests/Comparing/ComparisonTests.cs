using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Comparing;

namespace JointPlanner.Issuing.Tests.Comparing;

public sealed class ComparisonTests
{
    private const string Name = "sorrel-creek-crossing";
    private static readonly Confirmation Seen = new("some-value", "Some manual", "2nd", "table 3", "Tilde Overgaard", new DateOnly(2031, 5, 4));

    [Theory]
    [MemberData(nameof(SeedData.StructureNames), MemberType = typeof(SeedData))]
    public void A_calculation_does_not_differ_from_itself(string name)
    {
        var one = Frozen.Of(SeedData.Structure(name)).Read();
        var differences = Comparison.Of(one, one);
        Assert.True(differences.SameInputs);
        Assert.True(differences.SameResults);
        Assert.Equal(0, differences.WithinRounding);
        Assert.True(differences.Compared > 50, "numbers are compared");
        Assert.StartsWith("Same: all ", DifferenceText.Summary(differences), StringComparison.Ordinal);
    }

    [Fact]
    public void A_changed_input_is_told_by_path_in_the_words_of_its_field_and_what_follows_from_it_by_key_and_direction()
    {
        var plan = SeedData.Structure(Name);
        var before = plan.TextAt("joints/j1/setting/temperature")!;
        var differences = Comparison.Of(Frozen.Of(plan).Read(), Frozen.Of(plan.With("joints/j1/setting/temperature", "21 °C")).Read());
        var input = Assert.Single(differences.Inputs);
        Assert.Equal(("joints/j1/setting/temperature", before, "21 °C"), (input.Path, input.Before, input.After));
        Assert.Equal(Exchange.Plans.PlanFields.Table.At("joints/j1/setting/temperature")!.Name, input.Name);
        // Set on a warmer day, the joint has further to open and less to close.
        var opens = differences.Results.Single(r => r.Key == "joint/j1/opens-by/uniform-temperature");
        var closes = differences.Results.Single(r => r.Key == "joint/j1/closes-by/uniform-temperature");
        Assert.StartsWith("opens more, by ", DifferenceText.Moved(opens, DisplayProfile.Metric), StringComparison.Ordinal);
        Assert.EndsWith(" mm", DifferenceText.Moved(opens, DisplayProfile.Metric), StringComparison.Ordinal);
        Assert.StartsWith("closes less, by ", DifferenceText.Moved(closes, DisplayProfile.Us), StringComparison.Ordinal);
        Assert.EndsWith(" in", DifferenceText.Moved(closes, DisplayProfile.Us), StringComparison.Ordinal);
        Assert.DoesNotContain(opens.Key, opens.Meaning, StringComparison.Ordinal);
        Assert.StartsWith("Different: ", DifferenceText.Summary(differences), StringComparison.Ordinal);
    }

    [Fact]
    public void What_was_added_and_what_was_taken_out_is_told_as_such()
    {
        var plan = SeedData.Structure(Name);
        var less = plan.Without("movements/m-j1-1");
        var (more, fewer) = (Frozen.Of(plan).Read(), Frozen.Of(less).Read());
        Assert.Contains(Comparison.Of(fewer, more).Inputs, i => i.Path.StartsWith("movements/m-j1-1/", StringComparison.Ordinal) && i.Before is null && i.After is not null);
        var back = Comparison.Of(more, fewer);
        Assert.Contains(back.Inputs, i => i.Path.StartsWith("movements/m-j1-1/", StringComparison.Ordinal) && i.Before is not null && i.After is null);
        var open = Assert.Single(back.Findings, f => f.After?.Id == "causes-not-included");
        Assert.Null(open.Before);
        Assert.Contains("live load", DifferenceText.Of(open.After!, DisplayProfile.Metric), StringComparison.Ordinal);
    }

    [Fact]
    public void A_changed_rule_of_the_owner_and_a_confirmation_are_told_apart_from_the_plan()
    {
        var plan = SeedData.Structure(Name);
        var id = plan.TextAt("basis/owner-rules")!;
        var shelf = SeedData.ShelfWith(id, text => text.Replace("\"uncertainty-factor\": 2", "\"uncertainty-factor\": 3", StringComparison.Ordinal));
        var differences = Comparison.Of(Frozen.Of(plan).Read(), Frozen.Of(plan, shelf, Seen).Read());
        Assert.Empty(differences.Inputs);
        var rule = Assert.Single(differences.OwnerRules);
        Assert.Equal(("uncertainty-factor", "uncertainty factor", "3"), (rule.Path, rule.Name, rule.After![..1]));
        var confirmation = Assert.Single(differences.Confirmations);
        Assert.Equal((Seen.ValueId, null, "Some manual, 2nd, table 3: Tilde Overgaard, 2031-05-04"), (confirmation.Name, confirmation.Before, confirmation.After));
        Assert.NotEmpty(differences.Tables);
    }

    [Fact]
    public void Another_code_edition_and_another_program_are_told_as_basis()
    {
        var one = Frozen.Of(SeedData.Structure(Name)).Read();
        var other = one with { Package = one.Package with { EngineVersion = "0.0.1", CodeRevision = one.Package.CodeRevision + 1, Units = one.Package.Units == "us" ? "metric" : "us" } };
        Assert.Equal(["correction of the code folder", "program", "units of the sheet"], Comparison.Of(other, one).Basis.Select(b => b.Name));
    }

    [Theory]
    [InlineData(1e-12)]
    [InlineData(3e-8)]
    public void What_two_machines_may_compute_apart_is_the_same_within_rounding(double share)
    {
        var frozen = Frozen.Of(SeedData.Structure(Name));
        var differences = Comparison.Of(frozen.WithValue("joint/j1/opens-by/uniform-temperature", v => v * (1 + share)).Read(), frozen.Read());
        Assert.Empty(differences.Results);
        Assert.Equal(1, differences.WithinRounding);
        Assert.StartsWith("Same within rounding: ", DifferenceText.Summary(differences), StringComparison.Ordinal);
    }

    [Fact]
    public void What_lies_beyond_that_is_a_difference()
    {
        var frozen = Frozen.Of(SeedData.Structure(Name));
        var differences = Comparison.Of(frozen.WithValue("joint/j1/opens-by/uniform-temperature", v => v * (1 + 1e-5)).Read(), frozen.Read());
        Assert.Equal("joint/j1/opens-by/uniform-temperature", Assert.Single(differences.Results).Key);
        Assert.Equal(0, differences.WithinRounding);
    }

    [Fact]
    public void One_row_of_a_setting_table_is_found()
    {
        var frozen = Frozen.Of(SeedData.Structure(Name));
        var planted = frozen.With(r => r with
        {
            Joints = [.. r.Joints.Select(j => j.Joint != "j1" ? j : j with
            {
                Tables = [.. j.Tables.Select((t, i) => i > 0 ? t : t with { Rows = [.. t.Rows.Select((row, n) => n == 1 ? row with { Set = row.Set + 0.002 } : row)] })],
            })],
        });
        var table = Assert.Single(Comparison.Of(frozen.Read(), planted.Read()).Tables);
        Assert.Equal(("j1", 1), (table.Joint, table.Differing));
        Assert.Contains("wider", DifferenceText.Of(table, DisplayProfile.Metric), StringComparison.Ordinal);
        Assert.Contains("1 of ", DifferenceText.Of(table, DisplayProfile.Us), StringComparison.Ordinal);
    }

    [Fact]
    public void A_limit_and_a_movement_still_to_come_are_compared_joint_by_joint()
    {
        var frozen = Frozen.Of(SeedData.Structure(Name));
        var planted = frozen.With(r => r with
        {
            Joints = [.. r.Joints.Select(j => j.Joint != "j1" ? j : j with
            {
                Limits = [j.Limits[0] with { Value = j.Limits[0].Value + 0.001 }, .. j.Limits.Skip(1)],
                ToCome = [j.ToCome[0] with { OpensBy = j.ToCome[0].OpensBy + 0.002 }, .. j.ToCome.Skip(1)],
            })],
        });
        var results = Comparison.Of(frozen.Read(), planted.Read()).Results;
        Assert.Equal(2, results.Length);
        Assert.Contains(results, r => r.Key.StartsWith("joint/j1/limit/", StringComparison.Ordinal) && DifferenceText.Moved(r, DisplayProfile.Metric) == "wider by 1.0 mm");
        Assert.Contains(results, r => r.Key.StartsWith("joint/j1/to-come/", StringComparison.Ordinal) && DifferenceText.Moved(r, DisplayProfile.Metric) == "opens more, by 2.0 mm");
    }

    [Fact]
    public void Results_of_another_package_are_refused()
    {
        var (one, other) = (Frozen.Of(SeedData.Structure(Name)), Frozen.Of(SeedData.Structure("plover-flats-bridge")));
        var refused = Assert.Throws<InvalidDataException>(() => StoredCalculation.Read(one.Package, other.Results));
        Assert.Contains(ContentHash.Of(one.Package), refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("joint/j1/service/racking", 0.01, 0.02, "racks more, by 10.0 mm")]
    [InlineData("bearing/b1/travel/total/hot-start", 0.01, -0.02, "further down-station, by 30.0 mm")]
    [InlineData("segment/s1/zero-movement-point", 40, 41.5, "further up-station, by 1.500 m")]
    public void Directions_are_words(string key, double before, double after, string text) => Assert.Equal(text, DifferenceText.Moved(
        new ResultDifference(key, key, key.Contains("segment", StringComparison.Ordinal) ? Quantity.Length : Quantity.Movement, before, after), DisplayProfile.Metric));

    [Fact]
    public void A_warmer_reading_differs_by_degrees_and_not_by_a_reading() => Assert.Equal("warmer by 18.0 °F", DifferenceText.Moved(
        new ResultDifference("segment/s1/temperature/max", "", Quantity.Temperature, 20, 30), DisplayProfile.Us));
}
