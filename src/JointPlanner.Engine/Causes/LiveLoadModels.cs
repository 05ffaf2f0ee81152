using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>Which loads traffic puts on the deck: the designer's own, or those of the basis.</summary>
internal static class LiveLoadModels
{
    /// <summary>The load model; null where the plan says nothing of traffic.</summary>
    /// <exception cref="SilentBasisException">The basis has none for this deck.</exception>
    public static LoadModel? Of(Plan plan, CodeBasis basis, Derivation derivation)
    {
        if (plan.LiveLoad is not { } traffic) return null;
        if (traffic.Own is { } own) return OwnLoadModel.Of(traffic, own, derivation);
        var deck = plan.Segments[^1].End - plan.Segments[0].Start;
        return basis.LiveLoad(traffic, derivation) switch
        {
            Said<LoadModel> { Value: { LongestDeck: { } longest } model } when deck > longest => throw new SilentBasisException(new Finding(
                "basis-silent", Severity.Error, "live-load", $"{model.Name} holds for loaded lengths up to {{0}}; this deck is {{1}} long. Give own loads per length with their source.",
                [(Quantity.Length, longest), (Quantity.Length, deck)])),
            Said<LoadModel> said => said.Value,
            Silent<LoadModel> silent => throw new SilentBasisException(new Finding(
                "basis-silent", Severity.Error, "live-load", $"{basis.Title} does not give traffic loads: {silent.Why}. Give own loads with their source, or what is missing.")),
            _ => throw new InvalidOperationException("An answer is said or silent."),
        };
    }
}
