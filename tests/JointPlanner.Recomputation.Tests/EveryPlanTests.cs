using JointPlanner.Recomputation.Tests.Reading;

namespace JointPlanner.Recomputation.Tests;

/// <summary>Every step of every demo plan and published example, in both profiles, computed again from what the program prints.</summary>
public class EveryPlanTests
{
    public static TheoryData<string, string> PlansAndProfiles
    {
        get
        {
            var data = new TheoryData<string, string>();
            foreach (var (plan, profile) in PlanFiles.InBothProfiles) data.Add(plan, profile);
            return data;
        }
    }

    [Theory]
    [MemberData(nameof(PlansAndProfiles))]
    public void Every_step_is_recomputed_from_the_printed_text(string plan, string profile)
    {
        var text = ComputedText.Of(plan, profile);
        var steps = StepBlock.All(text);
        Assert.True(steps.Count(s => s.Calculation is not null) >= 10, "a plan has formulas to recompute");
        Assert.Empty(Recomputer.Complaints(text));
        Assert.DoesNotContain(steps, s => s.SaysItFallsShort);
        Assert.Contains(profile == "us" ? " in\n" : " mm\n", text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_program_that_printed_another_result_would_be_found()
    {
        var text = ComputedText.Of("structures/sorrel-creek-crossing.json", "metric");
        var step = StepBlock.All(text).Last(s => s.Calculation is not null && s.Rows.Count == 0 && s.Result.Amount != 0);
        var printed = $"       = {step.Result.Text}";
        Assert.Contains(printed, text, StringComparison.Ordinal);
        var at = text.LastIndexOf(printed, StringComparison.Ordinal);
        var altered = text[..at] + "       = 9" + step.Result.Text.TrimStart('−') + text[(at + printed.Length)..];
        Assert.NotEmpty(Recomputer.Complaints(altered));
    }
}
