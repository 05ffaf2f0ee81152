using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Issuing.Tests.Published;

/// <summary>Published: UK teaching example "Abutment design example to BD 30", first page (seen): 20 m deck, effective −11 and 36 °C, 12e-6 per K.</summary>
public sealed class BeamsAndSlabTests
{
    private readonly Engine.Result result = Calculation.Of(SeedData.Published("uk-20-m"), SeedData.Shelf).Result!;

    [Fact]
    public void The_whole_movement_is_11_3_mm()
    {
        var temperature = result.Joints.Single().Movements.Single(m => m.Cause == Cause.UniformTemperature);
        Assert.Equal(11.3, Unit.Millimetre.FromSi(temperature.OpensBy.Value + temperature.ClosesBy.Value), 0.05);
    }

    [Fact]
    public void One_way_at_the_ultimate_state_it_is_8_mm()
    {
        var temperature = result.Joints.Single().Movements.Single(m => m.Cause == Cause.UniformTemperature);
        var factor = Assert.IsType<Counted>(result.Counting[Cause.UniformTemperature, Column.GapStrength]).Factor;
        Assert.Equal(8, Unit.Millimetre.FromSi(temperature.ClosesBy.Value * factor), 0.5);
    }
}
