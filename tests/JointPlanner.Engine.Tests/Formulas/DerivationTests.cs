using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Tests.Formulas;

public class DerivationTests
{
    private static readonly Operand A = new("a", "one", Quantity.Ratio), B = new("b", "other", Quantity.Ratio);
    private static readonly Formula Quotient = new(
        "test.quotient", "q", "quotient", Quantity.Ratio, [A, B], A / B, Provenance.Derived("test"), new(0.5, 1e-12, "own arithmetic", 1, 2));

    [Fact]
    public void A_given_value_asked_for_twice_is_listed_once()
    {
        var derivation = new Derivation();
        var first = derivation.Given("x", "x", "x", Quantity.Ratio, 2);
        Assert.Equal(first, derivation.Given("x", "x", "x", Quantity.Ratio, 2));
        Assert.Single(derivation.Steps);
    }

    [Fact]
    public void A_use_refers_to_the_steps_of_its_operands()
    {
        var derivation = new Derivation();
        var (one, two) = (derivation.Given("x", "x", "x", Quantity.Ratio, 1), derivation.Given("y", "y", "y", Quantity.Ratio, 2));
        var result = derivation.Use(Quotient, "key", one, two);
        Assert.Equal(0.5, result.Value);
        Assert.Equal([0, 1], derivation.Steps[result.Step].Origin.Operands);
        Assert.Equal("key", derivation.Steps[result.Step].Key);
    }

    [Fact]
    public void Without_steps_the_same_bits_come_out()
    {
        var (kept, bare) = (new Derivation(), new Derivation(keepsSteps: false));
        Assert.Equal(Run(kept), Run(bare));
        Assert.Empty(bare.Steps);

        static double Run(Derivation d) =>
            d.Use(Quotient, "", d.Given("x", "x", "x", Quantity.Ratio, 1), d.Given("y", "y", "y", Quantity.Ratio, 3)).Value;
    }

    [Fact]
    public void A_result_that_is_not_finite_names_the_step_and_is_not_listed()
    {
        var derivation = new Derivation();
        var (one, zero) = (derivation.Given("x", "x", "x", Quantity.Ratio, 1), derivation.Given("y", "y", "y", Quantity.Ratio, 0));
        var failure = Assert.Throws<NotFiniteException>(() => derivation.Use(Quotient, "", one, zero));
        Assert.Contains("quotient", failure.Message, StringComparison.Ordinal);
        Assert.Equal(2, derivation.Steps.Count);
    }
}
