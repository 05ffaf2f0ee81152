using System.Text.Json.Nodes;
using Bunit;
using JointPlanner.Issuing;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Rooms.Structures;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.Web.Tests.Rooms.Structures;

/// <summary>A plan file as the way into the program: opened as typed, or refused with field, value, what is allowed and what to do.</summary>
public sealed class PlanFilePanelTests : MudTest
{
    private static readonly string SeedData = Path.Combine(AppContext.BaseDirectory, "seed-data");
    private readonly List<PlanFile> begun = [];

    public PlanFilePanelTests() => Services.AddSingleton(new PlanDesk(OwnerRuleShelf.Read(Path.Combine(SeedData, "owner-rules"))));

    [Fact]
    public void A_plan_file_is_opened_with_every_text_as_typed()
    {
        var cut = Handed(Changed(p => p["supports"]![1]!["station"] = "137 ft 9 1/2 in"));
        Assert.Contains("Sorrel Creek Crossing", cut.Find("#plan-file-says").TextContent, StringComparison.Ordinal);
        cut.Find("#plan-file-says .button").Click();
        Assert.Equal("137 ft 9 1/2 in", Assert.Single(begun).Document!.TextAt("supports/p2/station"));
    }

    [Fact]
    public void Two_thousand_and_one_supports_are_refused_with_field_and_limit()
    {
        var cut = Handed(Changed(p =>
        {
            for (var i = 0; i < 2001 - 4; i++) p["supports"]!.AsArray().Add(new JsonObject { ["id"] = $"q{i}", ["station"] = $"{200 + i} m", ["kind"] = "pier" });
        }));
        AssertRefused(cut, "supports", "supports “[ 2001 entries ]”: There are 2001 entries. Allowed: up to 2000 of them. Describe fewer, or split the structure.");
    }

    [Fact]
    public void A_file_of_50_MB_is_refused_by_its_size_and_not_read()
    {
        var cut = Handed(new string(' ', 50 * 1024 * 1024));
        AssertRefused(cut, "", "plan “50 MiB”: The file is larger than 2 MiB; nothing of it was read. Allowed: up to 2 MiB. Check that this is the right file; a plan of 200 joints takes a few hundred kB.");
    }

    [Fact]
    public void A_key_that_stands_twice_is_refused_by_name()
    {
        var cut = Handed(Demo().Replace("\"display\": \"metric\",", "\"display\": \"metric\", \"display\": \"us\",", StringComparison.Ordinal));
        AssertRefused(cut, "display", "units shown “display”: “display” stands here more than once. Allowed: each name once in its group. Take out all but one.");
    }

    [Fact]
    public void A_file_that_is_no_plan_is_refused_with_the_place_of_the_first_wrong_character()
    {
        var cut = Handed("{ \"schema\": \"joint-plan/1\", // a comment\n }");
        AssertRefused(cut, "", "plan: There is a comment at line 1, byte 29. Allowed: strict JSON, without comments and trailing commas. Correct the file at that place, or save it anew from this program.");
    }

    [Fact]
    public void A_wrong_value_is_told_and_the_plan_can_be_opened_all_the_same()
    {
        var cut = Handed(Changed(p => p["supports"]![1]!["station"] = 42));
        Assert.Contains("Pier 2: station of the support “42”", Words(cut.Find("li[data-fault='supports/p2/station']")), StringComparison.Ordinal);
        cut.Find("#plan-file-says .button").Click();
        Assert.Equal("42", Assert.Single(begun).Document!.TextAt("supports/p2/station"));
    }

    private static void AssertRefused(IRenderedComponent<PlanFilePanel> cut, string path, string told)
    {
        Assert.Contains("chosen.json cannot be opened", cut.Find("#plan-file-says .fault").TextContent, StringComparison.Ordinal);
        Assert.Equal(told, Words(cut.Find($"li[data-fault='{path}']")));
        Assert.Empty(cut.FindAll("#plan-file-says .button"));
    }

    private IRenderedComponent<PlanFilePanel> Handed(string text)
    {
        var cut = Render<PlanFilePanel>(p => p.Add(f => f.OnBegin, EventCallback.Factory.Create<PlanFile>(this, begun.Add)));
        cut.FindComponent<InputFile>().UploadFiles(InputFileContent.CreateFromText(text, "chosen.json"));
        cut.WaitForAssertion(() => Assert.NotEmpty(cut.Find("#plan-file-says").TextContent.Trim()));
        return cut;
    }

    private static string Demo() => File.ReadAllText(Path.Combine(SeedData, "structures", "sorrel-creek-crossing.json"));

    private static string Changed(Action<JsonNode> change)
    {
        var plan = JsonNode.Parse(Demo())!;
        change(plan);
        return plan.ToJsonString();
    }

    private static string Words(AngleSharp.Dom.INode node) => string.Join(' ', node.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));
}
