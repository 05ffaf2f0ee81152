using System.Text.Json.Nodes;

namespace JointPlanner.Cli.Tests.Compute;

/// <summary>Every wrong input is answered on the command line with field, value, what is allowed and what to do.</summary>
public sealed class WrongInputTests : IDisposable
{
    private readonly SeedData seed = new();

    public void Dispose() => seed.Dispose();

    public static TheoryData<string, string, string> Faults => new()
    {
        { "an empty deck", "segments", "" },
        { "a segment of negative length", "segments/deck/end", "-5 m" },
        { "supports out of order", "supports/p3/station", "30 m" },
        { "a deck that nothing holds", "segments/deck", "" },
        { "below absolute zero", "climate/shade-min", "-300 °C" },
        { "a skew of 90°", "joints/j1/skew", "90°" },
        { "a bare number where a quantity belongs", "supports/p2/station", "42" },
        { "a comma that may group or divide", "supports/p2/station", "1,234 m" },
        { "too many supports", "supports", "" },
    };

    public static TheoryData<string, string, string> Warnings => new()
    {
        { "degrees Fahrenheit typed as Celsius", "climate/shade-max", "60 °C" },
        { "a girder span over 500 m", "", "" },
    };

    [Theory]
    [MemberData(nameof(Faults))]
    public void A_fault_is_told_with_field_value_what_is_allowed_and_what_to_do(string what, string field, string value)
    {
        var ran = Ran.Of("compute", seed.Altered(Change(what)));
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Equal("", ran.Output);
        AssertTold("fault", ran.Error, field, value);
    }

    [Theory]
    [MemberData(nameof(Warnings))]
    public void A_doubtful_value_is_warned_of_and_computed(string what, string field, string value)
    {
        var ran = Ran.Of("compute", seed.Altered(Change(what)));
        Assert.True(ran.ExitCode is ExitCodes.Done or ExitCodes.CannotBeIssued, ran.Error);
        Assert.NotEqual("", ran.Output);
        AssertTold("warning", ran.Error, field, value);
    }

    [Fact]
    public void A_key_that_stands_twice_is_told()
    {
        var text = File.ReadAllText(SeedData.Structure("sorrel-creek-crossing")).Replace(
            "\"display\": \"metric\",", "\"display\": \"metric\", \"display\": \"us\",", StringComparison.Ordinal);
        var ran = Ran.Of("compute", seed.Written(text));
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        AssertTold("fault", ran.Error, "display", "");
    }

    [Fact]
    public void A_file_of_50_MB_is_refused_by_its_size()
    {
        var ran = Ran.Of("compute", seed.Written(new string(' ', 50 * 1024 * 1024)));
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        AssertTold("fault", ran.Error, "", "");
        Assert.Contains("2 MiB", ran.Error, StringComparison.Ordinal);
    }

    private static void AssertTold(string kind, string text, string field, string value)
    {
        var told = text.Split(kind + " in ").Skip(1).FirstOrDefault(t => t.Split('\n')[0].Contains($"field {field}", StringComparison.Ordinal));
        Assert.True(told is not null, $"no {kind} at '{field}' in: {text}");
        if (value.Length > 0) Assert.Contains($"  value:   {value}", told, StringComparison.Ordinal);
        Assert.Matches("  wrong:   \\S.*\n  allowed: \\S.*\n  do:      \\S", told);
    }

    private static Action<JsonNode> Change(string what) => what switch
    {
        "an empty deck" => p => p["segments"] = new JsonArray(),
        "a segment of negative length" => p => p["segments"]![0]!["end"] = "-5 m",
        "supports out of order" => p => p["supports"]![2]!["station"] = "30 m",
        "a deck that nothing holds" => p =>
        {
            foreach (var bearing in p["bearings"]!.AsArray())
            {
                bearing!["kind"] = "free";
                bearing.AsObject().Remove("pads");
            }
        }
        ,
        "below absolute zero" => p => p["climate"]!["shade-min"] = "-300 °C",
        "degrees Fahrenheit typed as Celsius" => p => p["climate"]!["shade-max"] = "60 °C",
        "a skew of 90°" => p => p["joints"]![0]!["skew"] = "90°",
        "a girder span over 500 m" => p =>
        {
            p["supports"]![2]!["station"] = "643 m";
            p["supports"]![3]!["station"] = "680 m";
            p["segments"]![0]!["end"] = "680.6 m";
        }
        ,
        "a bare number where a quantity belongs" => p => p["supports"]![1]!["station"] = 42,
        "a comma that may group or divide" => p => p["supports"]![1]!["station"] = "1,234 m",
        "too many supports" => p =>
        {
            for (var i = 0; i < 2001; i++)
                p["supports"]!.AsArray().Add(new JsonObject { ["id"] = $"q{i}", ["station"] = $"{200 + i} m", ["kind"] = "pier" });
        }
        ,
        _ => throw new ArgumentOutOfRangeException(nameof(what)),
    };
}
