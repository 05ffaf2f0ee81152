using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Tests.Causes;

/// <summary>A model that can be followed in the head: creep and shrinkage grow by a thousandth of their unit each day, the modulus is 30 GPa, 20 GPa before 28 days.</summary>
internal sealed class StraightModel(string id = "straight", string title = "Straight lines") : CreepModel
{
    private const double Day = 86400;

    public override string Id => id;
    public override string Title => title;
    public override string PublishedExamples => "none, it is made for tests";
    public override double? ProportionalUpTo => 0.5;

    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation) =>
        Value(derivation, "φ", Quantity.Ratio, 1e-3 * (age.Value - loadedAt.Value) / Day);

    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) => Value(derivation, "E", Quantity.Stress, 30e9);

    public override Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation) =>
        Value(derivation, "E", Quantity.Stress, age.Value < 28 * Day ? 20e9 : 30e9);

    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation) => concrete.Concrete.Humidity > 0.9
        ? new Silent<Number>("it knows no moist air")
        : Value(derivation, "ε", Quantity.Strain, 1e-9 * age.Value / Day);

    private static Number Value(Derivation derivation, string symbol, Quantity quantity, double value) =>
        derivation.TableOnce(symbol, "made for tests", quantity, value, Provenance.Derived("made for tests"), "");
}
