using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Tests;

public sealed class CalculationTests
{
    [Theory]
    [MemberData(nameof(SeedData.StructureNames), MemberType = typeof(SeedData))]
    public void Every_demo_structure_computes_without_faults_and_only_memory_values_stand_before_issue(string name)
    {
        var calculation = Calculation.Of(SeedData.Structure(name), SeedData.Shelf);
        Assert.Empty(calculation.Faults.Where(f => !f.IsWarning).Select(f => $"{f.Path}: {f.Wrong}"));
        Assert.Empty(calculation.Result!.Findings.Where(f => f.Severity >= Severity.BlocksIssue).Select(f => f.Template));
        Assert.All(calculation.Result.Joints, j => Assert.NotNull(j.Table?.Design.Set));
        Assert.NotEmpty(calculation.Result.MemoryValues);
        Assert.InRange(calculation.Result.Model!.Residual, 0, 1e-9);
        Assert.All(calculation.Result.HandChecks, c => Assert.True(c.Agrees, c.What));
    }

    [Theory]
    [MemberData(nameof(SeedData.StructureNames), MemberType = typeof(SeedData))]
    public void A_package_alone_gives_the_same_results_bit_for_bit(string name)
    {
        var calculation = Calculation.Of(SeedData.Structure(name), SeedData.Shelf);
        var bytes = calculation.Package([]).ToUtf8();
        var again = Calculation.Of(PackageReader.Read(bytes).Package!);
        Assert.Equal(Results(calculation, bytes), Results(again, bytes));
    }

    [Theory]
    [MemberData(nameof(SeedData.StructureNames), MemberType = typeof(SeedData))]
    public void Switching_the_display_changes_no_movement(string name)
    {
        var document = SeedData.Structure(name);
        var other = document.With("display", document.TextAt("display") == "us" ? "metric" : "us");
        var (a, b) = (Calculation.Of(document, SeedData.Shelf).Result!, Calculation.Of(other, SeedData.Shelf).Result!);
        Assert.Equal(
            a.Joints.SelectMany(j => j.Movements).Select(m => (m.OpensBy.Value, m.ClosesBy.Value)),
            b.Joints.SelectMany(j => j.Movements).Select(m => (m.OpensBy.Value, m.ClosesBy.Value)));
        Assert.Equal(document.ToUtf8(), other.With("display", document.TextAt("display")!).ToUtf8());
    }

    [Theory]
    [MemberData(nameof(SeedData.StructureNames), MemberType = typeof(SeedData))]
    public void Every_row_of_every_setting_table_explains_its_own_numbers_bit_for_bit(string name)
    {
        var result = Calculation.Of(SeedData.Structure(name), SeedData.Shelf).Result!;
        var (kept, explained) = (result.Steps.Count, 0);
        foreach (var table in result.Joints.Select(j => j.Table!))
            foreach (var row in table.Rows.Where(r => r.Set is not null))
            {
                var derivation = Derivation.Continuing(result.Steps);
                var again = table.Explained(row, derivation);
                (Number? Shown, Number? Explained)[] pairs =
                [
                    (row.Set, again.Set), (row.Minus, again.Minus), (row.Plus, again.Plus), (row.Window?.Least, again.Window?.Least),
                    (row.Window?.Greatest, again.Window?.Greatest), (row.Along?.Set, again.Along?.Set),
                ];
                Assert.All(pairs, pair =>
                {
                    Assert.Equal(pair.Shown?.Value, pair.Explained?.Value);
                    Assert.Equal(pair.Explained?.Value, pair.Explained is { } number ? derivation.Steps[number.Step].Value : null);
                });
                explained++;
            }
        Assert.True(explained > 5, $"{explained} rows");
        Assert.Equal(kept, result.Steps.Count);
    }

    [Fact]
    public void A_cause_that_nobody_gave_is_named_and_stops_the_issue()
    {
        var document = SeedData.Structure("sorrel-creek-crossing").Without("movements/m-j1-1");
        var open = Calculation.Of(document, SeedData.Shelf).Result!.Findings.Single(f => f.Severity == Severity.BlocksIssue);
        Assert.Equal("causes-not-included", open.Id);
        Assert.Contains("live load", open.Template, StringComparison.Ordinal);
    }

    [Fact]
    public void A_single_figure_held_from_memory_stands_before_issue_even_where_the_rest_of_its_rule_set_was_seen()
    {
        const string Noted = """
            "notes": { "greatest-racking-share": { "source": { "mark": "memory", "document": "a manual", "edition": "", "place": "9.9", "value-id": "test/racking" } } },
            "size-series": {
            """;
        var shelf = SeedData.ShelfWith("wsdot-compression-seal", t => t.Replace("\"size-series\": {", Noted, StringComparison.Ordinal));
        Assert.DoesNotContain(MemoryIds(SeedData.Shelf), id => id == "test/racking");
        Assert.Contains(MemoryIds(shelf), id => id == "test/racking");

        static IEnumerable<string> MemoryIds(OwnerRuleShelf rules) =>
            Calculation.Of(SeedData.Published("compression-seal-200-ft"), rules).Result!.MemoryValues.Select(v => v.ValueId);
    }

    [Fact]
    public void A_plan_whose_basis_is_silent_on_temperatures_cannot_be_frozen()
    {
        var document = SeedData.Structure("sorrel-creek-crossing").With("basis/code", "own").Without("basis/profile").Without("basis/setting-doubt").Without("basis/safety");
        var calculation = Calculation.Of(document, SeedData.Shelf);
        Assert.Contains(calculation.Obstacles, o => o.Contains("effective temperature", StringComparison.Ordinal));
        Assert.Throws<InvalidOperationException>(() => FrozenCalculation.Of(calculation, [], new SheetTitle { Revision = "A", Date = DateTimeOffset.UnixEpoch }));
    }

    private static byte[] Results(Calculation calculation, byte[] package) =>
        ResultsFile.ToUtf8(calculation.Stored(ContentHash.Of(package)));
}
