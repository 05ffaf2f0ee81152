using System.Text.Json;
using CsCheck;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Tests.Plans;
using Json.Schema;
using OurSchema = JointPlanner.Exchange.Documents.JsonSchema;

namespace JointPlanner.Exchange.Tests.Documents;

/// <summary>The generated JSON Schema, judged by an independent validator.</summary>
public sealed class JsonSchemaTests
{
    private const string Rewrite = "JOINTPLANNER_WRITE_SCHEMAS";

    private static readonly Json.Schema.JsonSchema PlanSchema = Json.Schema.JsonSchema.FromText(System.Text.Encoding.UTF8.GetString(OfPlans()));

    private static byte[] OfPlans() => OurSchema.Of(PlanFields.Table, "Joint Planner plan, joint-plan/1");

    private static byte[] OfRules() => OurSchema.Of(OwnerRuleFields.Table, "Joint Planner owner's rule set, owner-rules/1");

    private static bool Accepts(Json.Schema.JsonSchema schema, byte[] json)
    {
        using var document = JsonDocument.Parse(json);
        return schema.Evaluate(document.RootElement).IsValid;
    }

    [Fact]
    public void The_schema_files_in_the_seed_data_are_those_of_the_field_tables()
    {
        foreach (var (name, bytes) in new[] { ("joint-plan-1.schema.json", OfPlans()), ("owner-rules-1.schema.json", OfRules()) })
        {
            var path = Path.Combine(SeedData.Folder, name);
            if (Environment.GetEnvironmentVariable(Rewrite) == "1") File.WriteAllBytes(path, bytes);
            Assert.True(File.ReadAllBytes(path).AsSpan().SequenceEqual(bytes), $"{name} is out of date: run the tests once with {Rewrite}=1.");
        }
    }

    [Fact]
    public void Seed_plans_and_rule_sets_keep_their_schema()
    {
        var rules = Json.Schema.JsonSchema.FromText(System.Text.Encoding.UTF8.GetString(OfRules()));

        Assert.All(SeedData.Plans(), p => Assert.True(Accepts(PlanSchema, File.ReadAllBytes(p)), p));
        Assert.All(SeedData.OwnerRules(), p => Assert.True(Accepts(rules, File.ReadAllBytes(p)), p));
    }

    [Fact]
    public void Generated_plans_keep_the_schema() =>
        PlanGenerator.Plans.Sample(document =>
        {
            Assert.Empty(new PlanReader().Read(document).Faults.Where(f => !f.IsWarning).Select(f => $"{f.Path}: {f.Wrong}"));
            Assert.True(Accepts(PlanSchema, document.ToUtf8()), document.ToJson());
        }, iter: 200, seed: "0N0XIzNsQ0O7", threads: 1);

    [Fact]
    public void What_the_schema_refuses_the_reader_refuses_too()
    {
        var (refused, kept) = (0, 0);
        var fields = TestPlans.Document(TestPlans.Good).Texts().Select(t => t.Key).Where(p => !p.EndsWith("/id", StringComparison.Ordinal)).ToArray();
        string?[] texts = [null, "12", "12 m", "0.5", "-3 °C", "12 MN/m", "abutment", "P 1", "false", "28 d", "1e9", "", "100 %", "9 in", "5'", "rigid", "zz"];
        Gen.Select(Gen.OneOf(fields), Gen.OneOf(texts)).Sample((path, text) =>
        {
            var document = TestPlans.Document(TestPlans.Good).With(path, text);
            if (Accepts(PlanSchema, document.ToUtf8()))
            {
                Interlocked.Increment(ref kept);
                return;
            }
            Interlocked.Increment(ref refused);
            Assert.True(new PlanReader().Read(document).HasErrors, $"{path} = {text}");
        }, iter: 1500, seed: "0N0XIzNsQ0O8", threads: 1);
        Assert.True(refused > 300 && kept > 300, $"{refused} refused, {kept} kept");
    }
}
