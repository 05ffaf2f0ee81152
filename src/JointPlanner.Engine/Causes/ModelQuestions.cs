using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Causes;

/// <summary>A model of creep and shrinkage asked about one segment's concrete; where it is silent the calculation says so and stops there.</summary>
/// <param name="model">The model.</param>
/// <param name="concrete">The concrete.</param>
/// <param name="segment">Id of the segment.</param>
internal sealed class ModelQuestions(CreepModel model, DescribedConcrete concrete, string segment)
{
    public Number CreepCoefficient(Number age, Number loadedAt, Derivation derivation) =>
        Required(model.CreepCoefficient(concrete, age, loadedAt, derivation), "a creep coefficient");

    public Number CreepModulus(Number loadedAt, Derivation derivation) => Required(model.CreepModulus(concrete, loadedAt, derivation), "the modulus for creep");

    public Number ElasticModulus(Number age, Derivation derivation) => Required(model.ElasticModulus(concrete, age, derivation), "the modulus of a later stress");

    public Number Shrinkage(Number age, Derivation derivation) => Required(model.Shrinkage(concrete, age, derivation), "a shrinkage strain");

    private Number Required(Answer<Number> answer, string what) => answer switch
    {
        Said<Number> said => said.Value,
        Silent<Number> silent => throw new SilentBasisException(new Finding(
            "creep-model-silent", Severity.Error, $"segments/{segment}/concrete", $"{model.Title} does not give {what}: {silent.Why}.")),
        _ => throw new InvalidOperationException("An answer is said or silent."),
    };
}
