using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Issuing.Tests.Published;

/// <summary>
/// Inputs published: Colorado DOT Bridge Design Manual, Appendix A Example 5, Jan 2018 (seen). Results: regression check, own arithmetic,
/// not published: 1.20 on temperature only.
/// </summary>
public sealed class StripSealTests
{
    private static readonly PlanDocument Plan = SeedData.Published("strip-seal-300-ft");

    [Theory]
    [InlineData(-10, 1.961, 3.662)]
    [InlineData(0, 1.840, 3.540)]
    [InlineData(20, 1.596, 3.296)]
    [InlineData(40, 1.500, 3.053)]
    [InlineData(60, 1.500, 2.809)]
    [InlineData(80, 1.500, 2.566)]
    [InlineData(100, 1.500, 2.322)]
    [InlineData(110, 1.500, 2.200)]
    public void The_window_by_the_owners_rules(double fahrenheit, double least, double greatest)
    {
        var window = Row(Of(Plan), fahrenheit).Window!;
        Assert.Equal(least, Unit.InchUnit.FromSi(window.Least.Value), 0.0006);
        Assert.Equal(greatest, Unit.InchUnit.FromSi(window.Greatest.Value), 0.0006);
    }

    [Theory]
    [InlineData(-30)]
    [InlineData(-20)]
    [InlineData(120)]
    public void Beyond_the_range_the_row_says_do_not_set(double fahrenheit)
    {
        var row = Row(Of(Plan), fahrenheit);
        Assert.Null(row.Set);
        Assert.StartsWith("Do not set", row.Refusal!.Template, StringComparison.Ordinal);
    }

    [Fact]
    public void The_installation_limit_governs_the_least_opening_above_about_28_degrees()
    {
        var joint = Of(Plan);
        Assert.True(Row(joint, 30).Window!.LeastBy.IsAtInstallation);
        Assert.False(Row(joint, 20).Window!.LeastBy.IsAtInstallation);
    }

    [Fact]
    public void With_the_plain_code_the_travel_limit_governs_the_cold_end()
    {
        var joint = Of(Plan.With("basis/code", "aashto-lrfd-7-us"));
        var window = Row(joint, 60).Window!;
        Assert.Equal(2.568, Unit.InchUnit.FromSi(window.Greatest.Value), 0.0006);
        Assert.Contains("direction of travel", window.GreatestBy.Name, StringComparison.Ordinal);
    }

    private static JointResult Of(PlanDocument plan)
    {
        var calculation = Calculation.Of(plan, SeedData.Shelf);
        Assert.Empty(calculation.Faults.Where(f => !f.IsWarning));
        return calculation.Result!.Joints.Single();
    }

    private static Engine.Fitting.Setting.SettingRow Row(JointResult joint, double fahrenheit) =>
        joint.Table!.Rows.Single(r => Math.Abs(Unit.Fahrenheit.FromSi(r.Temperature) - fahrenheit) < 1e-6);
}
