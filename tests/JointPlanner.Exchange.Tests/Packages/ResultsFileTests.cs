using System.Globalization;
using System.Text;
using System.Text.Json.Nodes;
using JointPlanner.Codes;
using JointPlanner.Engine;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tests.Packages;

public sealed class ResultsFileTests
{
    private static readonly string Hash = ContentHash.Of("a package"u8);

    private static StoredResults Stored(string file) => ResultsFile.Of(Computed(file), "0.1.0", Hash, null, []);

    private static Result Computed(string file) => Movements.Of(Plan(file), Catalogue.Find(Plan(file).Basis.Code)!, Owner(file), Catalogue.CreepModels);

    private static Owner Owner(string file) =>
        new(OwnerRulesReader.Read(File.ReadAllBytes(Path.Combine(SeedData.Folder, "owner-rules", Plan(file).Basis.OwnerRules + ".json"))).Rules!, 0.001);

    private static Engine.Plans.Plan Plan(string file) =>
        new PlanReader().Read(File.ReadAllBytes(SeedData.Plans().Single(p => Path.GetFileNameWithoutExtension(p) == file))).Plan!;

    [Fact]
    public void Every_result_is_stored_with_the_bits_it_was_computed_to()
    {
        var result = Computed("tarn-moss-viaduct");

        var (stored, fault) = ResultsFile.Read(ResultsFile.ToUtf8(ResultsFile.Of(result, "0.1.0", Hash, null, [])));

        Assert.Null(fault);
        Assert.Equal(("results/1", "0.1.0", Hash), (stored!.Schema, stored.Engine, stored.Package));
        var byKey = result.ByKey();
        Assert.NotEmpty(byKey);
        Assert.Equal(byKey.Count, stored.Values.Length);
        Assert.All(stored.Values, v => Assert.Equal((byKey[v.Key].Value, byKey[v.Key].Quantity.Id), (v.Value, v.Quantity)));
        Assert.Equal(result.Findings.Select(f => (f.Id, f.Path, f.Template)), stored.Findings.Select(f => (f.Id, f.Path, f.Sentence)));
    }

    [Fact]
    public void A_setting_table_is_stored_row_by_row_with_what_governs_it()
    {
        var result = Computed("sorrel-creek-crossing");
        var stored = ResultsFile.Read(ResultsFile.ToUtf8(ResultsFile.Of(result, "0.1.0", Hash, null, []))).Results!;

        Assert.Equal(result.Joints.Length, stored.Joints.Length);
        foreach (var (joint, kept) in result.Joints.Zip(stored.Joints))
        {
            Assert.Equal((joint.Joint.Id, joint.Fit!.Chosen!.Family, joint.Fit.Chosen.Size), (kept.Joint, kept.Family, kept.Size));
            var table = Assert.Single(kept.Tables);
            Assert.Equal((joint.Table!.Rate.Value, joint.Table.Min.Value, joint.Table.Max.Value), (table.Rate, table.Min, table.Max));
            Assert.Equal(
                joint.Table.Rows.Select(r => (r.Temperature, r.DeckAge, r.Set?.Value, r.Minus?.Value, r.Plus?.Value, r.Window?.Least.Value, r.Window?.GreatestBy.Name, r.Refusal?.Id)),
                table.Rows.Select(r => (r.Temperature, r.DeckAge, r.Set, r.Minus, r.Plus, r.Least, r.GreatestBy, r.Refusal?.Id)));
            Assert.Contains(table.Rows, r => r.Set is not null);
            Assert.NotEmpty(kept.Limits);
        }
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("ar-SA")]
    public void Results_are_the_same_bytes_in_every_culture(string culture)
    {
        var stored = Stored("sorrel-creek-crossing");
        var (expected, before) = (ResultsFile.ToUtf8(stored), CultureInfo.CurrentCulture);
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.Equal(expected, ResultsFile.ToUtf8(stored));
            Assert.Equal(expected, ResultsFile.ToUtf8(ResultsFile.Read(expected).Results!));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Theory]
    [InlineData("kestrel-lane-overbridge", "us")]
    [InlineData("sorrel-creek-crossing", "metric")]
    public void Each_method_of_measuring_has_a_table_in_fine_steps(string file, string units)
    {
        var (result, owner, step) = (Computed(file), Owner(file), DisplayProfile.Of(units).DayStep);
        var days = SettingDays.Of(result, owner, step);
        var day = new StoredDay(units, owner.Rules.UseWithin, [], [new StoredPoint("slab", "deck slab", 0.55)]);
        var (stored, fault) = ResultsFile.Read(ResultsFile.ToUtf8(ResultsFile.Of(result, "0.1.0", Hash, day, days)));

        Assert.Null(fault);
        Assert.Equal((units, 90 * 86400.0, new StoredPoint("slab", "deck slab", 0.55)), (stored!.Day!.Units, stored.Day.UseWithin, stored.Day.Points[0]));
        Assert.Equal(SettingDays.RowCount(result, owner, step), stored.Joints.Sum(j => j.Tables.Skip(1).Sum(t => t.Rows.Length)));
        foreach (var joint in stored.Joints)
        {
            Assert.Equal(["", .. owner.Rules.MeasuringMethods.Select(m => m.Id)], joint.Tables.Select(t => t.Method));
            foreach (var table in joint.Tables.Skip(1))
            {
                Assert.Equal((table.Min, table.Max), (table.Rows[0].Temperature, table.Rows[^1].Temperature));
                var steps = table.Rows.Zip(table.Rows.Skip(1)).Where(p => p.First.DeckAge == p.Second.DeckAge).Select(p => p.Second.Temperature - p.First.Temperature);
                Assert.All(steps, s => Assert.InRange(s, 1e-9, step + 1e-9));
                Assert.Equal(joint.Skew != 0, table.Rows.Any(r => r.Along is not null));
            }
            // A rougher thermometer leaves less tolerance, never more.
            foreach (var (fine, rough) in joint.Tables[1].Rows.Zip(joint.Tables[^1].Rows))
                Assert.True(rough.Set is null || (rough.Reserve > fine.Reserve && rough.Minus <= fine.Minus + 1e-9 && rough.Plus <= fine.Plus + 1e-9));
        }
    }

    [Theory]
    [InlineData("tarn-moss-viaduct")]
    [InlineData("kestrel-lane-overbridge")]
    [InlineData("plover-flats-bridge")]
    public void The_movement_to_come_carries_each_end_of_each_window_to_its_limit(string file)
    {
        var (result, owner) = (Computed(file), Owner(file));
        var stored = ResultsFile.Of(result, "0.1.0", Hash, null, SettingDays.Of(result, owner, 1));
        var compared = 0;
        foreach (var joint in stored.Joints)
            foreach (var row in joint.Tables[1].Rows.Where(r => r.Least is not null))
            {
                // Own arithmetic: the window's lower end less all closing still to come stands on a lower limit, or is one that holds on the day.
                var onLimit = joint.Limits.Where(l => l.Bound == "lower").Select(l => Normal(joint, l) + (l.JudgedBy is null ? 0 : Closes(joint, l.JudgedBy, row)));
                Assert.Equal(row.Least!.Value, onLimit.Max(), 1e-9);
                compared++;
            }
        Assert.True(compared > 50, $"{compared} rows");
    }

    private static double Normal(StoredJoint joint, StoredLimit limit) => limit.Measure == "normal" ? limit.Value : limit.Value * Math.Cos(joint.Skew);

    private static double Closes(StoredJoint joint, string column, StoredRow row)
    {
        var movement = joint.ToCome.Single(m => m.JudgedBy == column && m.DeckAge == row.DeckAge);
        return movement.ClosesBy + movement.Swings.Sum(s => s.Rate > 0 ? s.Rate * Math.Max(0, s.Max - row.Temperature) : -s.Rate * Math.Max(0, row.Temperature - s.Min));
    }

    [Fact]
    public void Planted_numbers_are_what_is_read()
    {
        var json = JsonNode.Parse(ResultsFile.ToUtf8(Stored("sorrel-creek-crossing")))!;
        json["joints"]![0]!["tables"]![0]!["rows"]![0]!["set"] = 0.0123456789;

        var stored = ResultsFile.Read(Encoding.UTF8.GetBytes(json.ToJsonString())).Results!;

        Assert.Equal(0.0123456789, stored.Joints[0].Tables[0].Rows[0].Set);
    }

    [Theory]
    [InlineData("{}", "form.json")]
    [InlineData("not JSON", "form.json")]
    [InlineData("""{ "schema": "results/2", "engine": "", "package": "", "values": [], "joints": [], "findings": [] }""", "schema.other")]
    [InlineData("""{ "schema": "results/1", "schema": "results/1", "engine": "", "package": "", "values": [], "joints": [], "findings": [] }""", "form.json")]
    [InlineData("""{ "schema": "results/1", "engine": "", "package": "", "values": [], "joints": [], "findings": [], "more": 1 }""", "form.json")]
    [InlineData("""{ "schema": "results/1", "engine": "", "package": "", "values": [ { "key": "k", "quantity": "length", "value": NaN, "formula": "f" } ], "joints": [], "findings": [] }""", "form.json")]
    public void What_is_not_a_results_file_is_refused(string json, string id)
    {
        var (results, fault) = ResultsFile.Read(Encoding.UTF8.GetBytes(json));

        Assert.Null(results);
        Assert.Equal(id, fault!.Id);
        Assert.NotEmpty(fault.Remedy);
    }
}
