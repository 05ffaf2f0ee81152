using System.Globalization;
using System.Text;
using System.Text.Json.Nodes;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

public sealed class PlanDocumentTests
{
    [Fact]
    public void A_text_stays_as_it_was_typed_through_reading_and_writing()
    {
        const string typed = "12'-6 1/2\"";
        var document = TestPlans.Document(TestPlans.Good).With("supports/p2/station", typed).With("structure/name", "  Brücke \\ <&> 橋 ");

        var again = TestPlans.Document(document.ToJson());

        Assert.Equal(typed, again.TextAt("supports/p2/station"));
        Assert.Equal("  Brücke \\ <&> 橋 ", again.TextAt("structure/name"));
        Assert.Equal("0.55 m4", again.TextAt("supports/p2/column/inertia"));
        Assert.Contains(typed.Replace("\"", "\\\"", StringComparison.Ordinal), again.ToJson(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("en-US")]
    [InlineData("de-DE")]
    [InlineData("fr-FR")]
    [InlineData("tr-TR")]
    [InlineData("ar-SA")]
    public void Reading_back_and_writing_again_gives_the_same_bytes_in_every_culture(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            foreach (var bytes in SeedData.Plans().Select(File.ReadAllBytes).Append(Encoding.UTF8.GetBytes(TestPlans.Good)))
            {
                var once = PlanDocument.Parse(bytes).Document!.ToUtf8();
                Assert.Equal(once, PlanDocument.Parse(once).Document!.ToUtf8());
                Assert.DoesNotContain((byte)'\r', once);
                Assert.Equal((byte)'\n', once[^1]);
                Assert.NotNull(new PlanReader().Read(once).Plan);
            }
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Fields_are_written_in_one_order_whatever_the_order_they_came_in()
    {
        const string turned = """{ "display": "us", "structure": { "place": "c", "name": "b", "number": "a" }, "schema": "joint-plan/1" }""";

        Assert.Equal("""
            {
              "schema": "joint-plan/1",
              "structure": {
                "number": "a",
                "name": "b",
                "place": "c"
              },
              "display": "us"
            }

            """, TestPlans.Document(turned).ToJson());
    }

    [Fact]
    public void Numbers_are_written_with_the_fewest_digits_that_read_back_the_same()
    {
        var json = TestPlans.Document(TestPlans.Good.Replace("\"factor\": 1.35", "\"factor\": 1.3500", StringComparison.Ordinal)
            .Replace("\"strain\": 0.0003", "\"strain\": 3.0e-04", StringComparison.Ordinal)).ToJson();

        Assert.Contains("\"factor\": 1.35,", json, StringComparison.Ordinal);
        Assert.Contains("\"strain\": 0.0003,", json, StringComparison.Ordinal);
    }

    [Fact]
    public void A_field_is_set_and_taken_out_by_its_path_and_an_empty_group_goes_with_it()
    {
        var document = TestPlans.Document(TestPlans.Least).With("bearings/b2/setting/temperature", "12 °C");
        Assert.Equal("12 °C", document.TextAt("bearings/b2/setting/temperature"));
        Assert.True(document.Has("bearings/b2/setting"));

        var without = document.With("bearings/b2/setting/temperature", "");
        Assert.False(without.Has("bearings/b2/setting"));
        Assert.Equal(TestPlans.Document(TestPlans.Least).ToJson(), without.ToJson());
    }

    [Fact]
    public void A_plain_number_typed_with_a_comma_becomes_a_number_and_what_is_none_stays_as_typed()
    {
        var document = TestPlans.Document(TestPlans.Good).With("basis/answers/#1/factor", "1,2");
        Assert.Contains("\"factor\": 1.2,", document.ToJson(), StringComparison.Ordinal);

        var wrong = document.With("basis/answers/#1/factor", "one");
        Assert.Equal("one", wrong.TextAt("basis/answers/#1/factor"));
        Assert.Equal("field.not-a-number", Assert.Single(new PlanReader().Read(wrong).Faults).Id);
    }

    [Fact]
    public void A_new_item_gets_an_id_that_nothing_in_the_plan_has_or_had()
    {
        var start = TestPlans.Document(TestPlans.Good);
        var (document, path) = start.WithItem("supports", "p", at: 2);
        Assert.Equal("supports/p4", path);
        Assert.Equal(["a1", "p2", "p4", "p3", "a4"], document.Items("supports"));

        var (_, again) = document.Without(path).WithItem("supports", "p", reserved: ["p7"]);
        Assert.Equal("supports/p8", again);

        var (ages, age) = start.WithItem("setting-table/ages", "");
        Assert.Equal("setting-table/ages/#3", age);
        Assert.Equal("500 d", ages.With(age, "500 d").TextAt("setting-table/ages/#3"));
        var (answers, answer) = TestPlans.Document(TestPlans.Least).WithItem("basis/answers", "");
        Assert.Equal("wind", answers.With($"{answer}/cause", "wind").TextAt("basis/answers/#1/cause"));
    }

    [Fact]
    public void Every_text_is_listed_once_with_a_path_that_leads_back_to_it()
    {
        var document = TestPlans.Document(TestPlans.Good);
        var texts = document.Texts().ToArray();

        Assert.Equal(texts.Length, texts.Select(t => t.Key).Distinct().Count());
        Assert.All(texts, t => Assert.Equal(t.Value, document.TextAt(t.Key)));
        Assert.Contains(KeyValuePair.Create("segments/west/creep/development/#2/age", "1000 d"), texts);
        Assert.Equal(Leaves(JsonNode.Parse(TestPlans.Good)), texts.Length);
    }

    private static int Leaves(JsonNode? node) => node switch
    {
        JsonObject map => map.Sum(e => Leaves(e.Value)),
        JsonArray list => list.Sum(Leaves),
        _ => 1,
    };

    [Fact]
    public void A_path_that_is_no_field_is_refused()
    {
        var document = TestPlans.Document(TestPlans.Good);

        Assert.Throws<ArgumentException>(() => document.With("supports/p2/staton", "1 m"));
        Assert.Throws<ArgumentException>(() => document.With("supports/p9/station", "1 m"));
        Assert.Throws<ArgumentException>(() => document.With("supports", "1 m"));
        Assert.Throws<ArgumentException>(() => document.WithItem("structure", "x"));
    }

    [Fact]
    public void An_unknown_field_is_kept_until_a_person_takes_it_out()
    {
        var document = TestPlans.Document(TestPlans.Good.Replace("\"display\"", "\"dispaly\"", StringComparison.Ordinal));

        Assert.Contains("\"dispaly\": \"metric\"", document.ToJson(), StringComparison.Ordinal);
        Assert.Empty(new PlanReader().Read(document.Without("dispaly")).Faults);
    }
}
