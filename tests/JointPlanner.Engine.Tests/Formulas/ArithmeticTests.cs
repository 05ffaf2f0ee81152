using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Tests.Formulas;

public class ArithmeticTests
{
    [Theory]
    [InlineData(2.5, Rounding.Nearest, 3)]
    [InlineData(-2.5, Rounding.Nearest, -3)]
    [InlineData(2.4, Rounding.Nearest, 2)]
    [InlineData(2.1, Rounding.Up, 3)]
    [InlineData(-2.1, Rounding.Up, -2)]
    [InlineData(2.9, Rounding.Down, 2)]
    [InlineData(-2.1, Rounding.Down, -3)]
    [InlineData(2.9, Rounding.TowardZero, 2)]
    [InlineData(-2.9, Rounding.TowardZero, -2)]
    [InlineData(3.0000000001, Rounding.Up, 3)]
    [InlineData(2.9999999999, Rounding.Down, 3)]
    [InlineData(3.00000001, Rounding.Up, 4)]
    public void A_value_is_rounded_to_whole_steps(double steps, Rounding rounding, double whole)
    {
        Assert.Equal(whole, Arithmetic.RoundTo(steps, 1, rounding), 12);
        Assert.Equal(whole * 0.0015875, Arithmetic.RoundTo(steps * 0.0015875, 0.0015875, rounding), 12);
    }

    [Fact]
    public void Whole_powers_may_be_negative()
    {
        Assert.Equal(8, Arithmetic.Power(2, 3));
        Assert.Equal(0.25, Arithmetic.Power(2, -2));
        Assert.Equal(1, Arithmetic.Power(2, 0));
    }
}
