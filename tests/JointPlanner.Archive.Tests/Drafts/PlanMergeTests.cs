using System.Text.Json.Nodes;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;

namespace JointPlanner.Archive.Tests.Drafts;

public class PlanMergeTests
{
    private const string Base = """
        {
          "schema": "joint-plan/1",
          "name": "Tarn Street",
          "climate": { "low": "-25 °C", "high": "38 °C" },
          "segments": [ { "id": "s1", "length": "40.0 m" }, { "id": "s2", "length": "35 m" } ],
          "steps": [ 1, 2, 3 ]
        }
        """;

    [Fact]
    public void Changes_in_different_places_are_both_taken()
    {
        var merged = Merge(("40.0 m", "41 m"), ("38 °C", "40 °C"));
        Assert.Empty(merged.Clashes);
        var plan = Read(merged);
        Assert.Equal("41 m", (string?)plan["segments"]![0]!["length"]);
        Assert.Equal("40 °C", (string?)plan["climate"]!["high"]);
    }

    [Fact]
    public void A_place_changed_differently_by_both_is_a_clash_that_shows_all_three()
    {
        var merged = Merge(("40.0 m", "41 m"), ("40.0 m", "42 m"));
        Assert.Equal(new Clash("segments/s1/length", "\"40.0 m\"", "\"41 m\"", "\"42 m\""), Assert.Single(merged.Clashes));
        Assert.Equal("42 m", (string?)Read(merged)["segments"]![0]!["length"]);
    }

    [Theory]
    [InlineData(Take.Mine, "41 m")]
    [InlineData(Take.Theirs, "42 m")]
    public void A_choice_decides_its_clash_and_no_other(Take take, string length)
    {
        var mine = Base.Replace("40.0 m", "41 m", StringComparison.Ordinal).Replace("Tarn Street", "Tarn St", StringComparison.Ordinal);
        var theirs = Base.Replace("40.0 m", "42 m", StringComparison.Ordinal).Replace("Tarn Street", "Tarn Road", StringComparison.Ordinal);
        var merged = PlanMerge.Merge(Base, mine, theirs, new Dictionary<string, Take> { ["segments/s1/length"] = take });
        Assert.Equal("name", Assert.Single(merged.Clashes).Path);
        Assert.Equal(length, (string?)Read(merged)["segments"]![0]!["length"]);
    }

    [Fact]
    public void The_same_change_by_both_is_no_clash()
    {
        Assert.Empty(Merge(("40.0 m", "41 m"), ("40.0 m", "41 m")).Clashes);
    }

    [Fact]
    public void Values_are_compared_and_kept_as_typed()
    {
        var retyped = Merge(("40.0 m", "40 m"), ("38 °C", "40 °C"));
        Assert.Equal("40 m", (string?)Read(retyped)["segments"]![0]!["length"]);

        var number = PlanMerge.Merge("""{"a":1.0,"b":1}""", """{"a":1.00,"b":1}""", """{"a":1.0,"b":2e0}""");
        Assert.Empty(number.Clashes);
        Assert.Contains("1.00", number.Text, StringComparison.Ordinal);
        Assert.Contains("2e0", number.Text, StringComparison.Ordinal);
        Assert.Contains("°C", retyped.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Where_one_side_changed_nothing_the_others_text_stays_byte_for_byte()
    {
        var changed = Base.Replace("40.0 m", "41 m", StringComparison.Ordinal).Replace("\"name\": ", "\"name\":      ", StringComparison.Ordinal);
        Assert.Equal(changed, PlanMerge.Merge(Base, changed, Base).Text);
        Assert.Equal(changed, PlanMerge.Merge(Base, Base, changed).Text);
    }

    [Fact]
    public void Things_are_matched_by_id_where_ever_they_stand()
    {
        const string Before = """{"joints":[{"id":"j1","mark":"A"},{"id":"j2","mark":"B"}]}""";
        const string Mine = """{"joints":[{"id":"j0","mark":"new"},{"id":"j1","mark":"A"},{"id":"j2","mark":"B, mine"}]}""";
        const string Theirs = """{"joints":[{"id":"j1","mark":"A, theirs"},{"id":"j2","mark":"B"},{"id":"j3","mark":"newer"}]}""";
        var merged = PlanMerge.Merge(Before, Mine, Theirs);
        Assert.Empty(merged.Clashes);
        Assert.Equal(
            """{"joints":[{"id":"j0","mark":"new"},{"id":"j1","mark":"A, theirs"},{"id":"j2","mark":"B, mine"},{"id":"j3","mark":"newer"}]}""",
            Compact(merged));
    }

    [Fact]
    public void A_thing_that_one_removed_goes_unless_the_other_changed_it()
    {
        const string Before = """{"joints":[{"id":"j1","mark":"A"},{"id":"j2","mark":"B"}],"name":"x"}""";
        const string Removed = """{"joints":[{"id":"j1","mark":"A"}],"name":"x"}""";
        var untouched = PlanMerge.Merge(Before, Removed, Before.Replace("\"x\"", "\"y\"", StringComparison.Ordinal));
        Assert.Equal("""{"joints":[{"id":"j1","mark":"A"}],"name":"y"}""", Compact(untouched));

        var changed = PlanMerge.Merge(Before, Removed, Before.Replace("\"B\"", "\"C\"", StringComparison.Ordinal));
        var clash = Assert.Single(changed.Clashes);
        Assert.Equal("joints/j2", clash.Path);
        Assert.Null(clash.Mine);
        Assert.Equal("""{"id":"j2","mark":"C"}""", clash.Theirs);
    }

    [Fact]
    public void The_same_id_added_by_both_is_merged_member_by_member()
    {
        const string Before = """{"joints":[]}""";
        const string Mine = """{"joints":[{"id":"j1","mark":"A","skew":"15°"}]}""";
        const string Theirs = """{"joints":[{"id":"j1","mark":"B","width":"9 m"}]}""";
        var merged = PlanMerge.Merge(Before, Mine, Theirs);
        Assert.Equal("joints/j1/mark", Assert.Single(merged.Clashes).Path);
        Assert.Equal("15°", (string?)Read(merged)["joints"]![0]!["skew"]);
        Assert.Equal("9 m", (string?)Read(merged)["joints"]![0]!["width"]);
    }

    [Fact]
    public void An_order_changed_by_one_is_taken_and_changed_differently_by_both_is_a_clash()
    {
        const string Before = """{"s":[{"id":"a"},{"id":"b"},{"id":"c"}],"n":1}""";
        const string Mine = """{"s":[{"id":"c"},{"id":"a"},{"id":"b"}],"n":1}""";
        var one = PlanMerge.Merge(Before, Mine, Before.Replace("\"n\":1", "\"n\":2", StringComparison.Ordinal));
        Assert.Equal("""{"s":[{"id":"c"},{"id":"a"},{"id":"b"}],"n":2}""", Compact(one));

        const string Theirs = """{"s":[{"id":"b"},{"id":"a"},{"id":"c"}],"n":1}""";
        var both = PlanMerge.Merge(Before, Mine, Theirs);
        Assert.Equal("s/(order)", Assert.Single(both.Clashes).Path);
        var chosen = PlanMerge.Merge(Before, Mine, Theirs, new Dictionary<string, Take> { ["s/(order)"] = Take.Mine });
        Assert.Empty(chosen.Clashes);
        Assert.Equal(Mine, Compact(chosen));
    }

    [Theory]
    [InlineData("[1,2,3]", "[1,2,3,4]", "[9,2,3]", "[9,2,3,4]")]
    [InlineData("[1,2,3]", "[1,2]", "[9,2,3]", "[9,2]")]
    [InlineData("[[1],[2]]", "[[1],[3]]", "[[0],[2]]", "[[0],[3]]")]
    public void Lists_without_ids_are_merged_by_index(string before, string mine, string theirs, string merged)
    {
        var result = PlanMerge.Merge($$"""{"l":{{before}}}""", $$"""{"l":{{mine}}}""", $$"""{"l":{{theirs}}}""");
        Assert.Empty(result.Clashes);
        Assert.Equal($$"""{"l":{{merged}}}""", Compact(result));
    }

    [Theory]
    [InlineData("[1,2,3]", "[2,3]", "[1,2,7]", "l/2")]
    [InlineData("[1]", "[5]", "[6]", "l/0")]
    [InlineData("[1]", "[1,5]", "[1,6]", "l/1")]
    [InlineData("[1]", "{}", "[2]", "l")]
    public void Lists_without_ids_clash_rather_than_guess(string before, string mine, string theirs, string path)
    {
        var result = PlanMerge.Merge($$"""{"l":{{before}}}""", $$"""{"l":{{mine}}}""", $$"""{"l":{{theirs}}}""");
        Assert.Contains(result.Clashes, clash => clash.Path == path);
    }

    [Fact]
    public void A_member_set_to_null_is_not_a_member_removed()
    {
        var merged = PlanMerge.Merge("""{"a":1,"b":1,"c":1}""", """{"a":null,"b":1,"c":1}""", """{"a":1,"c":2}""");
        Assert.Empty(merged.Clashes);
        Assert.Equal("""{"a":null,"c":2}""", Compact(merged));
    }

    [Fact]
    public void Names_that_hold_a_stroke_keep_their_paths_apart()
    {
        var merged = PlanMerge.Merge("""{"a/b":1,"a":{"b":1}}""", """{"a/b":2,"a":{"b":2}}""", """{"a/b":3,"a":{"b":3}}""");
        Assert.Equal(["a~1b", "a/b"], merged.Clashes.Select(clash => clash.Path));
    }

    /// <summary>Law of a three-way merge: who changed is mirrored, not decided, by exchanging the two sides.</summary>
    [Fact]
    public void Exchanging_the_sides_gives_the_same_clashes_with_the_sides_exchanged()
    {
        var mine = Base.Replace("40.0 m", "41 m", StringComparison.Ordinal).Replace("Tarn", "Torn", StringComparison.Ordinal);
        var theirs = Base.Replace("40.0 m", "42 m", StringComparison.Ordinal).Replace("35 m", "36 m", StringComparison.Ordinal);
        var one = PlanMerge.Merge(Base, mine, theirs);
        var other = PlanMerge.Merge(Base, theirs, mine);
        Assert.NotEmpty(one.Clashes);
        Assert.Equal(one.Clashes, other.Clashes.Select(clash => clash with { Mine = clash.Theirs, Theirs = clash.Mine }));
    }

    [Theory]
    [InlineData("[]")]
    [InlineData("{")]
    [InlineData("""{"a":1,"a":2}""")]
    public void What_is_no_json_object_without_duplicates_is_refused(string text)
    {
        var refusal = Assert.Throws<ActRefused>(() => PlanMerge.Merge("{}", text, "{}"));
        Assert.Equal(RefusalReason.PlanUnreadable, refusal.Reason);
    }

    private static MergedPlan Merge((string From, string To) mine, (string From, string To) theirs) => PlanMerge.Merge(
        Base, Base.Replace(mine.From, mine.To, StringComparison.Ordinal), Base.Replace(theirs.From, theirs.To, StringComparison.Ordinal));

    private static JsonNode Read(MergedPlan merged) => JsonNode.Parse(merged.Text)!;

    private static string Compact(MergedPlan merged) => Read(merged).ToJsonString(new() { Encoder = System.Text.Encodings.Web.JavaScriptEncoder.UnsafeRelaxedJsonEscaping });
}
