using System.Text;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

/// <summary>Wrong form of a plan file, before any field is looked at: size, doubles, unknown names, characters, depth.</summary>
public sealed class WrongFormTests
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
    public void A_file_of_50_MB_is_refused_and_not_read_to_its_end()
    {
        using var file = new Endless(50_000_000);
        var reading = new PlanReader().Read(file);

        var fault = Assert.Single(reading.Faults);
        Assert.Equal(("form.too-large", "The file is larger than 2 MiB.", "Allowed: up to 2 MiB."), (fault.Id, fault.Wrong, fault.Allowed));
        Assert.InRange(file.Given, 2 * 1024 * 1024, 3 * 1024 * 1024);
    }

    [Fact]
    public void A_field_that_stands_twice_is_refused()
    {
        var fault = Only(TestPlans.Good.Replace("\"station\": \"40 m\"", "\"station\": \"40 m\", \"station\": \"41 m\"", StringComparison.Ordinal), "supports/p2/station");

        Assert.Equal(("“station” stands here more than once.", "Take out all but one."), (fault.Wrong, fault.Remedy));
    }

    [Fact]
    public void An_id_that_stands_twice_is_refused_at_the_second()
    {
        var fault = Only(TestPlans.Good.Replace("\"id\": \"m2\"", "\"id\": \"m1\"", StringComparison.Ordinal), "movements/#2/id");
        Assert.Equal(("m1", "Another given movement has the id “m1” already."), (fault.Value, fault.Wrong));

        Assert.Equal("A support has the id “p2” already.", Assert.Single(TestPlans.Read(TestPlans.Good.Replace("\"east\"", "\"p2\"", StringComparison.Ordinal)).Faults, f => f.Id == "id.repeated").Wrong);
    }

    [Fact]
    public void An_unknown_field_is_refused_with_the_nearest_one_and_said_once()
    {
        var fault = Only(TestPlans.Good.Replace("\"station\": \"40 m\"", "\"staton\": \"40 m\"", StringComparison.Ordinal), "supports/p2/staton");

        Assert.Equal("Did you mean “station”? Rename it, or take it out.", fault.Remedy);
    }

    [Theory]
    [InlineData("// a comment\n", "There is a comment at line 1, byte 1.")]
    [InlineData("/* a comment */", "There is a comment at line 1, byte 1.")]
    [InlineData("", "The file is empty.")]
    [InlineData("[]", "The file does not hold a JSON object.")]
    [InlineData("{ \"schema\": \"joint-plan/1\", }", "There is a trailing comma at line 1, byte 29.")]
    [InlineData("{ \"schema\": NaN }", "The file is not valid JSON at line 1, byte 13.")]
    [InlineData("{ 'schema': 1 }", "The file is not valid JSON at line 1, byte 3.")]
    public void A_text_that_is_not_strict_JSON_is_refused_with_its_place(string json, string wrong)
    {
        var fault = Only(json, "");

        Assert.Equal(wrong, fault.Wrong);
    }

    [Fact]
    public void Bytes_that_are_not_UTF_8_are_refused()
    {
        var fault = Assert.Single(new PlanReader().Read([.. Encoding.UTF8.GetBytes("{ \"schema\": \""), 0xC3, 0x28, .. Encoding.UTF8.GetBytes("\" }")]).Faults);

        Assert.Equal("The file is not UTF-8 text.", fault.Wrong);
    }

    [Fact]
    public void Groups_deeper_than_twelve_and_more_than_20_000_items_are_refused()
    {
        Assert.Equal("form.too-deep", Only($"{{ \"a\": {string.Concat(Enumerable.Repeat("[", 12))}{string.Concat(Enumerable.Repeat("]", 12))} }}", "").Id);
        Assert.Equal("form.json", Only($"{{ \"a\": {string.Concat(Enumerable.Repeat("[", 100_000))}", "").Id.Replace("form.too-deep", "form.json", StringComparison.Ordinal));
        Assert.Equal("form.too-many-items", Only($"{{ \"a\": [ {string.Join(",", Enumerable.Repeat("1", 20_001))} ] }}", "").Id);
    }

    [Theory]
    [InlineData("\"joint-plan/2\"", "This file was written by a newer version of this program (joint-plan/2).")]
    [InlineData("\"owner-rules/1\"", "“owner-rules/1” is not a schema that can be read here.")]
    [InlineData("\"joint-plan/1.5\"", "“joint-plan/1.5” is not a schema that can be read here.")]
    [InlineData("1", "Nothing says what this file is.")]
    public void A_newer_major_or_another_schema_is_refused_and_nothing_else_judged(string schema, string wrong) =>
        Assert.Equal(wrong, Only($"{{ \"schema\": {schema}, \"unknown\": 1 }}", "schema").Wrong);

    [Theory]
    [InlineData("bell\u0007")]
    [InlineData("two\nlines")]
    [InlineData("turned \u202E round")]
    [InlineData("isolated \u2066 text")]
    public void Control_and_direction_characters_in_a_name_are_refused(string name)
    {
        var fault = Only(With("structure/name", name), "structure/name");

        Assert.Equal("text.characters", fault.Id);
        Assert.Contains("[U+", fault.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void Half_a_character_pair_is_refused() =>
        Assert.Equal("text.characters", Only(TestPlans.Good.Replace("\"Test bridge\"", "\"Test \\uD83D bridge\"", StringComparison.Ordinal), "structure/name").Id);

    [Fact]
    public void Names_over_200_and_notes_over_4000_characters_are_refused()
    {
        Assert.Equal("text.too-long", Only(With("structure/name", new string('n', 201)), "structure/name").Id);
        Assert.Equal("text.too-long", Only(With("climate/source", new string('n', 4001)), "climate/source").Id);
        Assert.Empty(TestPlans.Read(TestPlans.Document(With("structure/name", new string('n', 200))).With("climate/source", new string('n', 4000)).ToJson()).Faults);
    }

    private sealed class Endless(long length) : MemoryStream
    {
        public long Given { get; private set; }

        public override int Read(byte[] buffer, int offset, int count)
        {
            var given = (int)Math.Min(count, length - Given);
            Array.Fill(buffer, (byte)' ', offset, given);
            Given += given;
            return given;
        }
    }
}
