using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Aci209;

/// <summary>ACI 209R-92; the coefficient belongs to the modulus at loading. Slump, fines, cement content and air are taken as standard.</summary>
public sealed class Aci209Model : CreepModel
{
    private const double LeastHumidity = 0.40;
    private static readonly double GreatestStrength = Unit.KipPerSquareInch.ToSi(12);

    /// <inheritdoc/>
    public override string Id => "aci-209r-92";

    /// <inheritdoc/>
    public override string Title => "ACI 209R-92";

    /// <inheritdoc/>
    public override string PublishedExamples => "No published example is at hand; all of it is held from memory";

    /// <inheritdoc/>
    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation)
    {
        if (OutOfLimits(concrete.Concrete) is { } silent) return silent;
        var loading = concrete.Concrete.Curing == Curing.Steam ? AciFormulas.SteamLoadingAge : AciFormulas.MoistLoadingAge;
        return derivation.Once(AciFormulas.Coefficient, age, loadedAt, derivation.Once(loading, loadedAt),
            derivation.Once(AciFormulas.CreepHumidity, concrete.Humidity(derivation)), derivation.Once(AciFormulas.CreepSize, concrete.VolumeOverSurface(derivation)));
    }

    /// <inheritdoc/>
    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) =>
        concrete.Modulus("modulus when the stress is put on, given", derivation) ?? At(concrete, loadedAt, derivation);

    /// <inheritdoc/>
    public override Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation) => At(concrete, age, derivation);

    /// <inheritdoc/>
    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        if (OutOfLimits(concrete.Concrete) is { } silent) return silent;
        var isSteam = concrete.Concrete.Curing == Curing.Steam;
        var half = derivation.TableOnce("f", "days by which half of the shrinkage is over", Quantity.Ratio, isSteam ? 55 : 35, AciFormulas.Source("2.4"), Row(isSteam));
        return derivation.Once(AciFormulas.Shrinkage, age, concrete.CuringEnd(derivation), half,
            derivation.Once(AciFormulas.ShrinkageHumidity, concrete.Humidity(derivation)), derivation.Once(AciFormulas.ShrinkageSize, concrete.VolumeOverSurface(derivation)));
    }

    private static Number At(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        var isSteam = concrete.Concrete.Curing == Curing.Steam;
        var strength = derivation.Once(AciFormulas.StrengthAtAge, age,
            derivation.TableOnce("a", "figure of the curing", Quantity.Ratio, isSteam ? 1.0 : 4.0, AciFormulas.Source("2.2.1"), Row(isSteam)),
            derivation.TableOnce("β", "figure of the curing", Quantity.Ratio, isSteam ? 0.95 : 0.85, AciFormulas.Source("2.2.1"), Row(isSteam)),
            concrete.Strength("f'_c", "specified strength at 28 days", derivation));
        var reference = derivation.TableOnce("E_1", "modulus at a strength of 1 psi, normal-weight concrete", Quantity.Stress,
            Unit.PoundPerSquareInch.ToSi(57_000), AciFormulas.Source("2.2.2"), "normal weight");
        return derivation.Once(AciFormulas.Modulus, reference, strength);
    }

    private static string Row(bool isSteam) => isSteam ? "steam-cured, ordinary cement" : "kept moist, ordinary cement";

    private static Silent<Number>? OutOfLimits(Concrete concrete) =>
        concrete.Strength > GreatestStrength ? new Silent<Number>("it is taken to hold for specified strengths up to 12 ksi (our own limit)")
        : concrete.Humidity < LeastHumidity ? new Silent<Number>("it holds for a relative humidity of 40 % and more")
        : null;
}
