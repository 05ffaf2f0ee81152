using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Tests.Formulas;

public class DimensionsTests
{
    private static readonly Operand Length = new("L", "length", Quantity.Length), Force = new("F", "force", Quantity.Force);
    private static readonly Operand Reading = new("T", "reading", Quantity.Temperature), Other = new("T_0", "other reading", Quantity.Temperature);
    private static readonly Operand Difference = new("ΔT", "difference", Quantity.TemperatureDifference), Angle = new("β", "angle", Quantity.Angle);

    [Fact]
    public void Unlike_things_cannot_be_added_taken_away_or_compared()
    {
        Assert.Throws<ArgumentException>(() => Length + Force);
        Assert.Throws<ArgumentException>(() => Length - Force);
        Assert.Throws<ArgumentException>(() => Larger(Length, Force));
        Assert.Throws<ArgumentException>(() => Choose(Length, Relation.Below, Force, Length, Length));
        Assert.Throws<ArgumentException>(() => Choose(Length, Relation.Below, Length, Length, Force));
        Assert.Throws<ArgumentException>(() => RoundTo(Length, Force, Rounding.Up));
    }

    [Fact]
    public void Products_quotients_powers_and_roots_carry_their_dimension()
    {
        Assert.Equal(new Dimension(2, 1, -2), (Length * Force).Dimension);
        Assert.Equal(new Dimension(0, 1, -2), (Force / Length).Dimension);
        Assert.Equal(new Dimension(3), Power(Length, 3).Dimension);
        Assert.Equal(new Dimension(1), Root(Length * Length).Dimension);
        Assert.Throws<ArgumentException>(() => Root(Length));
    }

    [Fact]
    public void Only_plain_numbers_are_raised_to_any_power_or_have_a_logarithm()
    {
        Assert.Equal(Dimension.None, ToThe(Angle, 0.3).Dimension);
        Assert.Throws<ArgumentException>(() => ToThe(Length, 0.3));
        Assert.Throws<ArgumentException>(() => ToThe(Angle, Length));
        Assert.Throws<ArgumentException>(() => Ln(Length));
        Assert.Throws<ArgumentException>(() => Exp(Force));
    }

    [Fact]
    public void Only_an_angle_has_a_cosine()
    {
        Assert.Equal(Dimension.None, Cos(Angle).Dimension);
        Assert.Throws<ArgumentException>(() => Sin(Length));
    }

    [Fact]
    public void Two_readings_give_a_difference_and_a_reading_with_a_difference_a_reading()
    {
        Assert.False((Reading - Other).IsReading);
        Assert.True((Reading + Difference).IsReading);
        Assert.True((Reading - Difference).IsReading);
        Assert.True(Larger(Reading, Other).IsReading);
    }

    [Fact]
    public void Readings_cannot_be_added_multiplied_divided_or_taken_from_a_difference()
    {
        Assert.Throws<ArgumentException>(() => Reading + Other);
        Assert.Throws<ArgumentException>(() => Reading * Length);
        Assert.Throws<ArgumentException>(() => Length / Reading);
        Assert.Throws<ArgumentException>(() => Difference - Reading);
        Assert.Throws<ArgumentException>(() => Larger(Reading, Difference));
    }

    [Fact]
    public void A_formula_whose_expression_is_of_another_kind_cannot_be_made()
    {
        Assert.Throws<ArgumentException>(() => Make(Quantity.Force, Length * Length));
        Assert.Throws<ArgumentException>(() => Make(Quantity.TemperatureDifference, Reading + Difference));
        Assert.Equal(4, Make(Quantity.Area, Length * Length).Compute(2, 0, 0));

        static Formula Make(Quantity quantity, Expression body) =>
            new("test.made", "x", "made for a test", quantity, [Length, Reading, Difference], body, Provenance.Derived("test"), new(0, 0, "none"));
    }

    [Fact]
    public void A_value_is_counted_in_a_unit_that_measures_it()
    {
        Assert.Equal(Dimension.None, InUnits(Force, Unit.Kip).Dimension);
        Assert.Throws<ArgumentException>(() => InUnits(Force, Unit.Foot));
    }
}
