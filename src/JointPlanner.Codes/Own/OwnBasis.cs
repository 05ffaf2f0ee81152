using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Own;

/// <summary>
/// Own basis: the designer gives every number with a source note; the basis adds none. Its counting table is silent, so that each
/// entry is answered by the designer or by the owner's rule set.
/// </summary>
public sealed class OwnBasis : CodeBasis
{
    /// <inheritdoc/>
    public override string Id => "own";

    /// <inheritdoc/>
    public override string Title => "Own basis";

    /// <inheritdoc/>
    public override IReadOnlyList<SafetyFormat> SafetyFormats => [SafetyFormat.None, SafetyFormat.Factor];

    /// <inheritdoc/>
    public override Answer<TemperatureRange> UniformTemperature(DeckKind kind, Plan plan, Derivation derivation) =>
        GivenTemperatures.Of(plan, derivation) is { } range
            ? range
            : new Silent<TemperatureRange>("own basis wants the lowest and highest effective temperature given directly");

    /// <inheritdoc/>
    public override string PublishedExamples =>
        "Published: UK teaching example 'Abutment design example to BD 30', first page (seen): 47 K, 12e-6 per K, 20 m gives 11.3 mm";
}
