using System.Text.Json.Nodes;
using JointPlanner.Exchange.Packages;
using JointPlanner.Pdf.Reading;

namespace JointPlanner.Cli.Tests.Comparing;

public sealed class RunAgainCommandTests : IDisposable
{
    private const string Key = "joint/j1/closes-by/uniform-temperature";
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-again-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public void A_sheet_run_again_gives_its_own_numbers()
    {
        var ran = Ran.Of("run-again", Sheet());
        Assert.Equal(ExitCodes.Done, ran.ExitCode);
        Assert.Matches(@"\nSame: all \d+ numbers are the same, bit for bit\.\n", ran.Output);
        Assert.Empty(ran.Error);
    }

    [Fact]
    public void A_package_and_the_results_beside_it_do_as_well()
    {
        Unpack(Sheet());
        Assert.Equal(ExitCodes.Done, Ran.Of("run-again", At("calculation.json")).ExitCode);
    }

    [Fact]
    public void A_planted_number_is_listed_with_its_key_units_and_direction()
    {
        Unpack(Sheet());
        var results = ResultsFile.Read(File.ReadAllBytes(At("results.json"))).Results!;
        File.WriteAllBytes(At("planted.json"), ResultsFile.ToUtf8(results with { Values = [.. results.Values.Select(v => v.Key == Key ? v with { Value = v.Value - 0.0254 } : v)] }));
        var ran = Ran.Of("run-again", At("calculation.json"), "--results", At("planted.json"), "--profile", "us");
        Assert.Equal(ExitCodes.CannotBeIssued, ran.ExitCode);
        Assert.Matches($@"  {Key} +\S+ in +\S+ in  closes more, by 1\.000 in\n", ran.Output);

        var json = JsonNode.Parse(Ran.Of("run-again", At("calculation.json"), "--results", At("planted.json"), "--json").Output)!;
        Assert.False((bool)json["same"]!);
        Assert.Equal(Key, (string)Assert.Single(json["differences"]!.AsArray())!["key"]!);
    }

    [Fact]
    public void What_is_no_sheet_and_what_is_missing_is_told_by_name()
    {
        File.WriteAllText(At("note.pdf"), "%PDF-1.7 hello");
        File.WriteAllText(At("note.json"), "{}");
        var (pdf, alone, nothing) = (Ran.Of("run-again", At("note.pdf")), Ran.Of("run-again", At("note.json")), Ran.Of("run-again", At("none.json")));
        Assert.All([pdf, alone, nothing], r => Assert.Equal(ExitCodes.FaultyInput, r.ExitCode));
        Assert.Contains("note.pdf", pdf.Error, StringComparison.Ordinal);
        Assert.Contains("Give the results that belong to the package", alone.Error, StringComparison.Ordinal);
        Assert.Contains("there is no such file", nothing.Error, StringComparison.Ordinal);
    }

    private string At(string name) => Path.Combine(folder, name);

    private string Sheet()
    {
        var ran = Ran.Of("sheet", SeedData.Structure("plover-flats-bridge"), "--date", "2026-05-31", "--out", At("sheet.pdf"));
        Assert.True(ran.ExitCode == ExitCodes.Done, ran.Error);
        return At("sheet.pdf");
    }

    private void Unpack(string sheet)
    {
        foreach (var attached in Attachments.Read(File.ReadAllBytes(sheet))) File.WriteAllBytes(At(Path.GetFileName(attached.Name)), attached.Bytes);
    }
}
