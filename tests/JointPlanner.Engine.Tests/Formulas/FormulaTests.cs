using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Tests.Formulas;

public class FormulaTests
{
    private static readonly Operand A = new("a", "one", Quantity.Ratio), B = new("b", "other", Quantity.Ratio), Each = new("e", "each", Quantity.Ratio);
    private static readonly Choice Pick = (Choice)Choose(A, Relation.AtMost, B, 1 / A, 1 / (B - B));

    [Fact]
    public void Only_the_side_of_a_choice_that_applies_is_computed()
    {
        var formula = Make([A, B], Pick);
        Assert.Equal(0.5, formula.Compute(2, 3));
        Assert.Equal(double.PositiveInfinity, formula.Compute(4, 3));
    }

    [Theory]
    [InlineData(Relation.AtMost, true, true, false)]
    [InlineData(Relation.Below, true, false, false)]
    [InlineData(Relation.AtLeast, false, true, true)]
    [InlineData(Relation.Above, false, false, true)]
    public void A_comparison_tells_below_equal_and_above_apart(Relation relation, bool below, bool equal, bool above)
    {
        var choice = (Choice)Choose(A, relation, B, 1, 2);
        var formula = Make([A, B], choice);
        Assert.Equal([below, equal, above], new[] { formula.Holds(choice, 1, 2), formula.Holds(choice, 2, 2), formula.Holds(choice, 3, 2) });
        Assert.Equal(below ? 1 : 2, formula.Compute(1, 2));
    }

    [Fact]
    public void A_formula_takes_as_many_values_as_it_has_operands()
    {
        Assert.Throws<ArgumentException>(() => Make([A, B], A + B).Compute(1));
        Assert.Throws<ArgumentException>(() => Make([A, B], A + B).Compute(1, 2, 3));
    }

    [Fact]
    public void The_last_operand_of_a_sum_or_extreme_may_be_given_any_number_of_times()
    {
        Assert.Equal(2 * (1 + 5 + 3), Make([A, Each], A * Total(Each)).Compute(2, 1, 5, 3));
        Assert.Equal(5, Make([A, Each], Largest(Each)).Compute(2, 1, 5, 3));
        Assert.Equal(1, Make([A, Each], Smallest(Each)).Compute(2, 1, 5, 3));
        Assert.Throws<ArgumentException>(() => Make([A, Each], A * Total(Each)).Compute(2));
    }

    [Fact]
    public void A_value_above_zero_stays_and_one_below_becomes_nothing()
    {
        var formula = Make([A], Positive(A, Quantity.Ratio));
        Assert.Equal(3, formula.Compute(3));
        Assert.Equal(0, formula.Compute(-3));
    }

    [Fact]
    public void A_value_counts_so_many_units()
    {
        var stress = new Operand("f", "stress", Quantity.Stress);
        // 1 ksi = 6.894757 MPa, NIST SP 811 appendix B.8.
        Assert.Equal(1, Make([stress], InUnits(stress, Unit.KipPerSquareInch)).Compute(6.894757e6), 6);
    }

    [Fact]
    public void Any_power_the_exponential_and_the_logarithm_are_those_of_mathematics()
    {
        Assert.Equal(3, Make([A, B], ToThe(A, B)).Compute(27, 1.0 / 3), 1e-12);
        Assert.Equal(0.5, Make([A], ToThe(A, -0.5)).Compute(4), 1e-12);
        Assert.Equal(Math.E, Make([A], Exp(A)).Compute(1), 1e-12);
        Assert.Equal(1, Make([A], Ln(A)).Compute(Math.E), 1e-12);
    }

    [Fact]
    public void A_formula_restated_keeps_its_expression_under_its_own_id_and_source()
    {
        var restated = Make([A, B], A / B).Restated("test.restated", Provenance.By("another document"));
        Assert.Equal((0.5, "test.restated", "another document"), (restated.Compute(1, 2), restated.Id, restated.Source.Document));
    }

    [Fact]
    public void An_operand_that_is_not_listed_is_found_at_the_first_use() =>
        Assert.Throws<ArgumentException>(() => Make([A], A + B).Compute(1));

    private static Formula Make(Operand[] operands, Expression body) =>
        new("test.made", "x", "made for a test", Quantity.Ratio, operands, body, Provenance.Derived("test"), new(0, 0, "none"));
}
