using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Tests;

/// <summary>A basis that takes the plan's effective temperatures and is silent on everything else.</summary>
internal sealed class PlainBasis : CodeBasis
{
    public override string Id => "plain";

    public override string Title => "Plain basis of tests";

    public override Answer<TemperatureRange> UniformTemperature(DeckKind kind, Plan plan, Derivation derivation) => new TemperatureRange(
        derivation.Given("climate/effective-min", "T_min", "lowest", Quantity.Temperature, plan.Climate.EffectiveMin!.Value),
        derivation.Given("climate/effective-max", "T_max", "highest", Quantity.Temperature, plan.Climate.EffectiveMax!.Value));
}
