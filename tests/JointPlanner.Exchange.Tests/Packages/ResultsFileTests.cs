using System.Globalization;
using System.Text;
using System.Text.Json.Nodes;
using JointPlanner.Codes;
using JointPlanner.Engine;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Packages;

public sealed class ResultsFileTests
{
    private static readonly string Hash = ContentHash.Of("a package"u8);

    private static Result Computed(string file)
    {
        var plan = new PlanReader().Read(File.ReadAllBytes(SeedData.Plans().Single(p => Path.GetFileNameWithoutExtension(p) == file))).Plan!;
        var rules = OwnerRulesReader.Read(File.ReadAllBytes(Path.Combine(SeedData.Folder, "owner-rules", plan.Basis.OwnerRules + ".json"))).Rules!;
        return Movements.Of(plan, Catalogue.Find(plan.Basis.Code)!, new Owner(rules, 0.001));
    }

    [Fact]
    public void Every_result_is_stored_with_the_bits_it_was_computed_to()
    {
        var result = Computed("tarn-moss-viaduct");

        var (stored, fault) = ResultsFile.Read(ResultsFile.ToUtf8(ResultsFile.Of(result, "0.1.0", Hash)));

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
        var stored = ResultsFile.Read(ResultsFile.ToUtf8(ResultsFile.Of(result, "0.1.0", Hash))).Results!;

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
        var stored = ResultsFile.Of(Computed("sorrel-creek-crossing"), "0.1.0", Hash);
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

    [Fact]
    public void Planted_numbers_are_what_is_read()
    {
        var json = JsonNode.Parse(ResultsFile.ToUtf8(ResultsFile.Of(Computed("sorrel-creek-crossing"), "0.1.0", Hash)))!;
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
