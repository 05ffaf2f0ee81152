using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;
using JointPlanner.Pdf;

namespace JointPlanner.Sheets.Tests;

/// <summary>What a sheet must say, read from its document as text.</summary>
public sealed class CalculationSheetTests
{
    private static readonly string Seed = Find();

    public static TheoryData<string> Structures =>
        [.. Directory.GetFiles(Path.Combine(Seed, "structures"), "*.json").Select(f => Path.GetFileNameWithoutExtension(f)!)];

    [Theory]
    [MemberData(nameof(Structures))]
    public void A_sheet_carries_both_hashes_the_caution_every_joint_and_every_value_from_memory(string name)
    {
        var calculation = Calculate(name);
        var result = calculation.Result!;
        var text = Text(calculation, out var facts);
        Assert.Contains(SheetFacts.Digest(facts.Package), text, StringComparison.Ordinal);
        Assert.Contains(SheetFacts.Digest(facts.Results), text, StringComparison.Ordinal);
        Assert.Contains("the engineer of record and licensed practice decide", text, StringComparison.Ordinal);
        Assert.Contains("may not be issued", text, StringComparison.Ordinal);
        Assert.All(result.Joints, j => Assert.Contains($"Joint {j.Joint.Mark}", text, StringComparison.Ordinal));
        Assert.All(result.MemoryValues, v => Assert.Contains(v.ValueId, text, StringComparison.Ordinal));
        Assert.All(result.Plan.Defaults, d => Assert.Contains(d.Key, text, StringComparison.Ordinal));
    }

    [Fact]
    public void A_step_that_no_printed_result_rests_on_is_not_printed_and_each_operand_of_a_printed_step_is()
    {
        var calculation = Calculate("sorrel-creek-crossing");
        var printed = Parts.StepsThatCount.Of(calculation.Result!);
        Assert.InRange(printed.Count, 50, calculation.Result!.Steps.Count - 1);
        Assert.All(printed, i => Assert.All(calculation.Result.Steps[i].Origin.Operands, o => Assert.Contains(o, printed)));
    }

    [Fact]
    public void A_sheet_says_how_the_temperature_is_measured_on_the_day_and_how_long_it_may_be_used()
    {
        var text = Text(Calculate("sorrel-creek-crossing"), out _);
        Assert.Contains("Σ w·T / Σ w over deck slab (w = 0.550), girder webs, shaded side (w = 0.450)", text, StringComparison.Ordinal);
        Assert.Contains("later than 90 d after its issue", text, StringComparison.Ordinal);
        Assert.Contains("contact thermometer, shaded faces", text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_print_for_demonstration_says_so_on_every_page()
    {
        var facts = Facts(Calculate("plover-flats-bridge")) with { IsDemonstration = true };
        Assert.Equal("PRELIMINARY, DEMONSTRATION, not for construction", facts.Watermark);
    }

    private static Calculation Calculate(string name) => Calculation.Of(
        PlanDocument.Parse(File.ReadAllBytes(Path.Combine(Seed, "structures", name + ".json"))).Document!, OwnerRuleShelf.Read(Path.Combine(Seed, "owner-rules")));

    private static string Text(Calculation calculation, out SheetFacts facts)
    {
        facts = Facts(calculation);
        return DocumentText.Of(CalculationSheet.Of(calculation.Result!, facts, calculation.Profile, PaperSize.A4));
    }

    private static SheetFacts Facts(Calculation calculation) => new()
    {
        Revision = "A",
        Date = DateTimeOffset.UnixEpoch,
        Basis = calculation.Basis!.Title,
        BasisId = calculation.Basis.Id,
        Program = "test",
        Package = calculation.Package([]).ToUtf8(),
        Results = "{}"u8.ToArray(),
        Day = calculation.Day,
        IsPreliminary = true,
    };

    private static string Find()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln"))) return Path.Combine(folder.FullName, "seed-data");
        throw new DirectoryNotFoundException("No folder above the tests holds JointPlanner.sln.");
    }
}
