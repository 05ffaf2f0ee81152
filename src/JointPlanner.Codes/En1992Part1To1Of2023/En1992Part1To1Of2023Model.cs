using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.En1992Part1To1Of2023;

/// <summary>Mean creep and shrinkage of EN 1992-1-1:2023, Annex B; the coefficient belongs to the modulus at 28 days. The development of the modulus is not held.</summary>
public sealed class En1992Part1To1Of2023Model : CreepModel
{
    private const double LeastStrength = 12e6, GreatestStrength = 100e6;

    /// <inheritdoc/>
    public override string Id => "en-1992-1-1-2023";

    /// <inheritdoc/>
    public override string Title => "EN 1992-1-1:2023";

    /// <inheritdoc/>
    public override double? ProportionalUpTo => 0.45;

    /// <inheritdoc/>
    public override string PublishedExamples =>
        "Published: shrinkage to the 2021 draft in an open-source finite-element library's verification file; no published example of its creep is at hand";

    /// <inheritdoc/>
    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        var (mean, size, cement) = (MeanStrength(concrete, derivation), concrete.NotionalThickness(derivation), Cements.Of(concrete.Concrete.Cement));
        var power = derivation.TableOnce("α", "power of the cement", Quantity.Ratio, cement.Power, Sources.Quoted("(B.17)"), cement.Name);
        var adjusted = derivation.Once(CreepFormulas.AdjustedAge, loadedAt, power);
        var basic = derivation.Once(CreepFormulas.BasicCreep, derivation.Once(CreepFormulas.BasicStrength, mean),
            derivation.Once(CreepFormulas.BasicDevelopment, adjusted, age, loadedAt));
        var development = derivation.Once(CreepFormulas.DryingDevelopment, age, loadedAt, derivation.Once(CreepFormulas.DryingSpread, size, mean),
            derivation.Once(CreepFormulas.DryingPower, adjusted));
        var drying = derivation.Once(CreepFormulas.DryingCreep, derivation.Once(CreepFormulas.DryingStrength, mean),
            derivation.Once(CreepFormulas.DryingHumidities, concrete.Humidity(derivation), size), derivation.Once(CreepFormulas.DryingLoadingAge, adjusted), development);
        return derivation.Once(CreepFormulas.Coefficient, basic, drying);
    }

    /// <inheritdoc/>
    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) =>
        concrete.Modulus("modulus at 28 days, given", derivation) ?? derivation.Once(ModulusFormulas.At28Days,
            derivation.TableOnce("k_E", "modulus at a mean strength of 1 MPa, quartzite aggregate", Quantity.Stress, 9.5e9, Sources.Modulus("5.1.4"), "quartzite"),
            MeanStrength(concrete, derivation));

    /// <inheritdoc/>
    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        var (mean, cement) = (MeanStrength(concrete, derivation), Cements.Of(concrete.Concrete.Cement));
        var basic = derivation.Once(ShrinkageFormulas.BasicShrinkage, derivation.Once(ShrinkageFormulas.NotionalBasic,
            derivation.TableOnce("α_bs", "figure of the cement", Quantity.Ratio, cement.Basic, Sources.Cement("α_bs"), cement.Name), mean),
            derivation.Once(ShrinkageFormulas.BasicDevelopment, age));
        var notional = derivation.Once(ShrinkageFormulas.NotionalDrying,
            derivation.TableOnce("α_ds1", "figure of the cement", Quantity.Ratio, cement.Drying1, Sources.Cement("α_ds1"), cement.Name),
            derivation.TableOnce("α_ds2", "figure of the cement", Quantity.Ratio, cement.Drying2, Sources.Cement("α_ds2"), cement.Name), mean);
        var humidity = derivation.Once(ShrinkageFormulas.HumidityInfluence, concrete.Humidity(derivation), derivation.Once(ShrinkageFormulas.EquilibriumHumidity, mean));
        var drying = derivation.Once(ShrinkageFormulas.DryingShrinkage, notional, humidity,
            derivation.Once(ShrinkageFormulas.DryingDevelopment, age, concrete.CuringEnd(derivation), concrete.NotionalThickness(derivation)));
        return derivation.Once(ShrinkageFormulas.Total, basic, drying);
    }

    private static Number MeanStrength(DescribedConcrete concrete, Derivation derivation) => derivation.Once(CreepFormulas.MeanStrength,
        concrete.Strength("f_ck", "characteristic cylinder strength at 28 days", derivation),
        derivation.TableOnce("Δf", "mean above characteristic strength", Quantity.Stress, 8e6, Sources.Modulus("mean strength"), "all classes"));

    private static Silent<Number>? OutOfLimits(DescribedConcrete concrete) => concrete.Concrete.Strength is >= LeastStrength and <= GreatestStrength
        ? null
        : new Silent<Number>("it holds for characteristic strengths from 12 to 100 MPa");
}
