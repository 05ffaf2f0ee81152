using System.Text;
using JointPlanner.Exchange.Packages;
using JointPlanner.Issuing.Comparing;

namespace JointPlanner.Issuing.Tests.Comparing;

/// <summary>Every demo computed from its package alone: no rule shelf, no database.</summary>
public sealed class RunAgainTests
{
    [Theory]
    [MemberData(nameof(SeedData.StructureNames), MemberType = typeof(SeedData))]
    public void Every_demo_computed_from_its_package_alone_gives_the_stored_numbers(string name)
    {
        var frozen = Frozen.Of(SeedData.Structure(name));
        var again = RunAgain.Of(frozen.Package, frozen.Results);
        Assert.True(again.IsSame, again.Summary);
        Assert.Equal(0, again.Differences!.WithinRounding);
        Assert.Empty(again.Notes);
        Assert.Empty(again.Obstacles);
    }

    [Fact]
    public void Planted_results_are_listed()
    {
        var frozen = Frozen.Of(SeedData.Structure("plover-flats-bridge"));
        var planted = frozen.WithValue("joint/j1/closes-by/uniform-temperature", v => v + 0.001);
        var again = RunAgain.Of(planted.Package, planted.Results);
        Assert.False(again.IsSame);
        Assert.Equal("joint/j1/closes-by/uniform-temperature", Assert.Single(again.Differences!.Results).Key);
    }

    [Fact]
    public void A_result_that_the_program_of_then_did_not_have_is_told_as_new_and_one_that_is_gone_as_gone()
    {
        var frozen = Frozen.Of(SeedData.Structure("plover-flats-bridge"));
        const string key = "joint/j1/closes-by/uniform-temperature";
        var older = frozen.With(r => r with { Values = [.. r.Values.Select(v => v.Key == key ? v with { Key = "joint/j1/old-word" } : v)] });
        var differences = RunAgain.Of(older.Package, older.Results).Differences!;
        Assert.Null(differences.Results.Single(r => r.Key == key).Before);
        Assert.Null(differences.Results.Single(r => r.Key == "joint/j1/old-word").After);
    }

    [Fact]
    public void An_older_program_and_an_unknown_edition_are_said()
    {
        var frozen = Frozen.Of(SeedData.Structure("plover-flats-bridge"));
        var text = Encoding.UTF8.GetString(frozen.Package);
        var older = Again(frozen, text.Replace($"\"engine\": \"{ProgramVersion.Number}\"", "\"engine\": \"0.0.1\"", StringComparison.Ordinal));
        Assert.Equal($"Computed by program version 0.0.1; this one is {ProgramVersion.Number}.", Assert.Single(older.Notes));
        Assert.True(older.IsSame);

        var id = frozen.Read().Package.CodeId;
        var unknown = Again(frozen, text.Replace($"\"{id}\"", "\"lost-edition-1\"", StringComparison.Ordinal));
        Assert.Null(unknown.Differences);
        Assert.Contains(unknown.Notes, n => n.Contains("lost-edition-1", StringComparison.Ordinal));
        Assert.StartsWith("The package cannot be computed by this program: ", unknown.Summary, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_is_no_package_is_refused_by_name()
    {
        var refused = Assert.Throws<InvalidDataException>(() => RunAgain.Of("{}"u8, "{}"u8));
        Assert.StartsWith("The calculation package cannot be read: ", refused.Message, StringComparison.Ordinal);
    }

    private static RunAgain Again(Frozen frozen, string package)
    {
        Assert.NotEqual(Encoding.UTF8.GetString(frozen.Package), package);
        var bytes = Encoding.UTF8.GetBytes(package);
        return RunAgain.Of(bytes, (frozen with { Package = bytes }).With(r => r with { Package = ContentHash.Of(bytes) }).Results);
    }
}
