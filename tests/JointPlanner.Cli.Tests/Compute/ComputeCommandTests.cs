using System.Text.Json.Nodes;

namespace JointPlanner.Cli.Tests.Compute;

public sealed class ComputeCommandTests : IDisposable
{
    private readonly SeedData seed = new();

    public void Dispose() => seed.Dispose();

    public static TheoryData<string> Structures =>
        [.. Directory.EnumerateFiles(Path.GetDirectoryName(SeedData.Structure("x"))!, "*.json").Select(f => Path.GetFileNameWithoutExtension(f)!).Order()];

    [Theory]
    [MemberData(nameof(Structures))]
    public void Every_demo_structure_is_computed_to_its_setting_tables(string structure)
    {
        var ran = Ran.Of("compute", SeedData.Structure(structure));
        Assert.True(ran.ExitCode is ExitCodes.Done or ExitCodes.CannotBeIssued, ran.Error);
        var joints = JsonNode.Parse(File.ReadAllText(SeedData.Structure(structure)))!["joints"]!.AsArray();
        Assert.All(joints, j => Assert.Contains($"\nJoint {j!["id"]} ", ran.Output, StringComparison.Ordinal));
        Assert.Contains("  Setting table: openings normal to the joint\n", ran.Output, StringComparison.Ordinal);
        Assert.Contains("The engineer of record, local codes and licensed practice decide.", ran.Output, StringComparison.Ordinal);
        Assert.Contains("(from memory, check against the licensed text)", ran.Output, StringComparison.Ordinal);
        Assert.Contains("Defaults used", ran.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("{0}", ran.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Units_are_those_of_the_plan_unless_others_are_asked_for()
    {
        var plan = SeedData.Structure("sorrel-creek-crossing");
        var metric = Ran.Of("compute", plan).Output;
        var us = Ran.Of("compute", plan, "--profile", "us").Output;
        Assert.Contains("138.600 m", metric, StringComparison.Ordinal);
        Assert.Contains("454.724 ft", us, StringComparison.Ordinal); // 138.6 / 0.3048
        Assert.DoesNotContain(" ft", metric, StringComparison.Ordinal);
    }

    [Fact]
    public void Steps_are_printed_when_asked_for()
    {
        var plan = SeedData.Structure("sorrel-creek-crossing");
        Assert.Contains("\nSteps\n[1] ", Ran.Of("compute", plan, "--steps").Output, StringComparison.Ordinal);
        Assert.DoesNotContain("\nSteps\n", Ran.Of("compute", plan).Output, StringComparison.Ordinal);
    }

    [Fact]
    public void The_model_is_listed_with_members_levels_and_what_acted()
    {
        var text = Ran.Of("compute", SeedData.Structure("heron-weir-bridge"), "--steps").Output;
        Assert.Contains("\nModel, as solved\n", text, StringComparison.Ordinal);
        // Bearing level 1.76 m below the top, neutral axis 0.3427 m below it: EA and EI of slab and girders.
        Assert.Contains("  link b2 holds: deck#3 along + 1417.3 mm · deck#3 turning − p2#1 along = 0", text, StringComparison.Ordinal);
        Assert.Contains("107512 MN", text, StringComparison.Ordinal);
        Assert.Contains("  acted: dead load still to come, all of it placed, numbers in steps [", text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_cause_that_is_not_included_stops_issue_and_is_named()
    {
        var plan = seed.Altered(p => p["movements"] = new JsonArray());
        var ran = Ran.Of("compute", plan);
        Assert.Equal(ExitCodes.CannotBeIssued, ran.ExitCode);
        Assert.Contains("live load", ran.Output, StringComparison.Ordinal);
        Assert.Contains("not included: give it, or zero and why", ran.Output, StringComparison.Ordinal);
        Assert.Contains("stops issue (joints/j1): Not included at joint j1: ", ran.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_is_not_there_is_named()
    {
        var ran = Ran.Of("compute", "no-such-plan.json");
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Contains("  value:   no-such-plan.json\n  wrong:   There is no such file.\n  allowed: ", ran.Error, StringComparison.Ordinal);
        Assert.Contains("  do:      ", ran.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Owners_rules_may_be_given_by_file_and_must_be_those_that_the_plan_names()
    {
        var plan = SeedData.Structure("sorrel-creek-crossing");
        Assert.NotEqual(ExitCodes.FaultyInput, Ran.Of("compute", plan, "--rules", SeedData.OwnerRules("demonstration-metric")).ExitCode);
        var other = Ran.Of("compute", plan, "--rules", SeedData.OwnerRules("demonstration-us"));
        Assert.Equal(ExitCodes.FaultyInput, other.ExitCode);
        Assert.Contains("field basis/owner-rules\n  value:   demonstration-metric\n", other.Error, StringComparison.Ordinal);
        var missing = Ran.Of("compute", seed.Altered(p => p["basis"]!["owner-rules"] = "nobodys-rules"));
        Assert.Equal(ExitCodes.FaultyInput, missing.ExitCode);
        Assert.Contains("nobodys-rules", missing.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Machines_get_results_by_key_in_SI_and_findings()
    {
        var ran = Ran.Of("compute", SeedData.Structure("sorrel-creek-crossing"), "--json");
        var document = JsonNode.Parse(ran.Output)!;
        Assert.Equal(ran.ExitCode == ExitCodes.Done, (bool)document["can-be-issued"]!);
        var opens = document["results"]!["values"]!.AsArray().Single(v => (string?)v!["key"] == "joint/j1/opens-by/uniform-temperature")!;
        Assert.InRange((double)opens["value"]!, 0.02, 0.05);
        Assert.Contains("thermal.opens-by", opens.ToJsonString(), StringComparison.Ordinal);
        Assert.NotEmpty(document["defaults"]!.AsArray());
        Assert.NotEmpty(document["findings"]!.AsArray());
        Assert.NotEmpty(document["memory-values"]!.AsArray());
        Assert.Empty(document["faults"]!.AsArray());
    }

    [Fact]
    public void Machines_get_faults_with_the_same_parts()
    {
        var ran = Ran.Of("compute", seed.Altered(p => p["segments"]![0]!["end"] = "12 furlong"), "--json");
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        var fault = JsonNode.Parse(ran.Output)!["faults"]![0]!;
        Assert.Equal("segments/deck/end", (string?)fault["field"]);
        Assert.Equal("12 furlong", (string?)fault["value"]);
        Assert.NotEqual("", (string?)fault["wrong"]);
        Assert.NotEqual("", (string?)fault["allowed"]);
        Assert.NotEqual("", (string?)fault["do"]);
    }
}
