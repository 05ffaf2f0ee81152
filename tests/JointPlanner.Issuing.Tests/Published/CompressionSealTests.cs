using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Issuing.Tests.Published;

/// <summary>
/// From memory, check against the licensed text: WSDOT BDM 9.1.3, compression seal of a 200 ft box girder, 15° skew. The printed figures
/// round intermediate values, so they are met to 0.02 in.
/// </summary>
public sealed class CompressionSealTests
{
    private const double Rounding = 0.02;

    private readonly JointResult joint = Result(SeedData.Shelf).Joints.Single();

    [Fact]
    public void Temperature_shrinkage_and_their_sum_along_the_deck()
    {
        var temperature = joint.Movements.Single(m => m.Cause == Cause.UniformTemperature);
        var shrinkage = joint.Movements.Single(m => m.Cause == Cause.Shrinkage);
        Assert.Equal(0.72, Inches(temperature.OpensBy) + Inches(temperature.ClosesBy), Rounding);
        Assert.Equal(0.19, Inches(shrinkage.OpensBy), Rounding);
        Assert.Equal(0.91, Inches(temperature.OpensBy) + Inches(temperature.ClosesBy) + Inches(shrinkage.OpensBy), Rounding);
    }

    [Fact]
    public void Normal_movement_and_racking_of_the_skewed_joint()
    {
        var total = joint.Movements.Sum(m => Inches(m.OpensBy) + Inches(m.ClosesBy));
        Assert.Equal(0.88, total * joint.Demand.CosSkew.Value, Rounding);
        Assert.Equal(0.24, Inches(joint.Fit!.Chosen!.Rules.Single(r => r.Name.StartsWith("racking", StringComparison.Ordinal)).Value), Rounding);
    }

    [Fact]
    public void A_three_inch_seal_is_the_smallest_that_fits() => Assert.Equal("3 in", joint.Fit!.Chosen!.Size);

    [Theory]
    [InlineData(40, 1.97)]
    [InlineData(64, 1.80)]
    [InlineData(80, 1.69)]
    public void The_gap_table_at_three_temperatures(double fahrenheit, double gap)
    {
        var row = joint.Table!.Rows.Single(r => Math.Abs(Unit.Fahrenheit.FromSi(r.Temperature) - fahrenheit) < 1e-6);
        Assert.Equal(gap, Inches(row.Set!.Value), Rounding);
    }

    [Fact]
    public void One_working_range_changed_in_the_rule_set_changes_the_size()
    {
        var narrower = SeedData.ShelfWith("wsdot-compression-seal", t => t.Replace("\"greatest-width-share\": 0.85", "\"greatest-width-share\": 0.75", StringComparison.Ordinal));
        var changed = Result(narrower).Joints.Single();
        Assert.NotEqual(joint.Fit!.Chosen!.Size, changed.Fit!.Chosen!.Size);
        Assert.Equal("4.5 in", changed.Fit.Chosen.Size);
    }

    [Fact]
    public void One_counting_entry_changed_in_the_rule_set_changes_the_window()
    {
        var factored = SeedData.ShelfWith("wsdot-compression-seal", t => t.Replace(
            "\"cause\": \"uniform-temperature\", \"column\": \"seal-range\", \"factor\": 1.0", "\"cause\": \"uniform-temperature\", \"column\": \"seal-range\", \"factor\": 1.2", StringComparison.Ordinal));
        var (before, after) = (joint.Table!.Design.Window!, Result(factored).Joints.Single().Table!.Design.Window!);
        Assert.True(after.Least.Value > before.Least.Value);
        Assert.True(after.Greatest.Value < before.Greatest.Value);
    }

    private static Result Result(OwnerRuleShelf shelf)
    {
        var calculation = Calculation.Of(SeedData.Published("compression-seal-200-ft"), shelf);
        Assert.Empty(calculation.Faults.Where(f => !f.IsWarning));
        return calculation.Result!;
    }

    private static double Inches(Number number) => Unit.InchUnit.FromSi(number.Value);
}
