using JointPlanner.Recomputation.Tests.Reading;
using JointPlanner.Recomputation.Tests.Sheets;

namespace JointPlanner.Recomputation.Tests;

/// <summary>Every step on the sheet of every demo plan and published example, in both profiles, computed again from the PDF's own text.</summary>
public class EverySheetTests
{
    [Theory]
    [MemberData(nameof(EveryPlanTests.PlansAndProfiles), MemberType = typeof(EveryPlanTests))]
    public void Every_step_on_the_sheet_is_recomputed_from_the_text_of_the_PDF(string plan, string profile)
    {
        var sheet = TaggedSheet.Read(SheetFile.Of(plan, profile));
        var steps = SheetSteps.Of(sheet);
        Assert.True(steps.Count(s => s.Calculation is not null) >= 10, "a sheet has formulas to recompute");
        Assert.Empty(Recomputer.Complaints(steps));
        Assert.DoesNotContain(steps, s => s.SaysItFallsShort);
        Assert.Contains(steps, s => s.Result.Text.EndsWith(profile == "us" ? " in" : " mm", StringComparison.Ordinal));
        Assert.DoesNotContain(steps, s => s.Result.Text.EndsWith(profile == "us" ? " mm" : " in", StringComparison.Ordinal));
        Assert.Empty(SheetSteps.DrawnOtherwise(sheet));
    }

    [Fact]
    public void A_sheet_that_left_an_operand_out_or_printed_another_result_would_be_found()
    {
        var steps = SheetSteps.Of(TaggedSheet.Read(SheetFile.Of("published/uk-20-m.json", "metric")));
        var last = steps.Last(s => s.Calculation is not null && s.Rows.Count == 0 && s.Calculation.Contains(" [", StringComparison.Ordinal));
        var at = last.Calculation!.IndexOf('[', StringComparison.Ordinal);
        var operand = int.Parse(last.Calculation[(at + 1)..last.Calculation.IndexOf(']', at)], System.Globalization.CultureInfo.InvariantCulture);
        Assert.Contains(Recomputer.Complaints([.. steps.Where(s => s.Number != operand)]), c => c.Contains($"[{operand}] stands nowhere before", StringComparison.Ordinal));

        var other = last.Result with { Amount = last.Result.Amount + (3 * last.Result.LastDigit) };
        Assert.NotEmpty(Recomputer.Complaints([.. steps.Select(s => s.Number == last.Number ? s with { Result = other, CarriedOn = other } : s)]));
    }
}
