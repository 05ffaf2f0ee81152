using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.ModelCode2010;

/// <summary>Creep and shrinkage of the fib Model Code 2010; the coefficient belongs to the tangent modulus at 28 days.</summary>
public sealed class ModelCode2010Model : CreepModel
{
    private const double LeastStrength = 12e6, GreatestStrength = 120e6, LeastHumidity = 0.40;

    /// <inheritdoc/>
    public override string Id => "fib-mc-2010";

    /// <inheritdoc/>
    public override string Title => "fib Model Code 2010";

    /// <inheritdoc/>
    public override double? ProportionalUpTo => 0.4;

    /// <inheritdoc/>
    public override string PublishedExamples =>
        "No complete published example of this document is at hand; the shrinkage formulas that it shares with the second generation of EN 1992-1-1 give that code's published check";

    /// <inheritdoc/>
    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        var (mean, size, cement) = (MeanStrength(concrete, derivation), concrete.NotionalThickness(derivation), Cements.Of(concrete.Concrete.Cement));
        var power = derivation.TableOnce("α", "power of the cement", Quantity.Ratio, cement.Power, Sources.QuotedCement("5.1.9.4.3"), cement.Name);
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
    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) => Tangent(concrete, derivation);

    /// <inheritdoc/>
    public override Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        var cement = Cements.Of(concrete.Concrete.Cement);
        var figure = derivation.TableOnce("s", "figure of the cement", Quantity.Ratio, cement.Strength, Sources.Modulus("development of strength"), cement.Name);
        return derivation.Once(ModulusFormulas.AtAge, derivation.Once(ModulusFormulas.StrengthDevelopment, figure, age), Tangent(concrete, derivation));
    }

    /// <inheritdoc/>
    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        if (concrete.Concrete.Humidity < LeastHumidity) return new Silent<Number>("its shrinkage holds for a relative humidity of 40 % and more");
        var (mean, cement) = (MeanStrength(concrete, derivation), Cements.Of(concrete.Concrete.Cement));
        var basic = derivation.Once(ShrinkageFormulas.BasicShrinkage, derivation.Once(ShrinkageFormulas.NotionalBasic,
            derivation.TableOnce("α_bs", "figure of the cement", Quantity.Ratio, cement.Basic, Sources.QuotedCement("5.1.9.4.4"), cement.Name), mean),
            derivation.Once(ShrinkageFormulas.BasicDevelopment, age));
        var notional = derivation.Once(ShrinkageFormulas.NotionalDrying,
            derivation.TableOnce("α_ds1", "figure of the cement", Quantity.Ratio, cement.Drying1, Sources.Shrinkage("drying shrinkage"), cement.Name),
            derivation.TableOnce("α_ds2", "figure of the cement", Quantity.Ratio, cement.Drying2, Sources.Shrinkage("drying shrinkage"), cement.Name), mean);
        var humidity = derivation.Once(ShrinkageFormulas.HumidityInfluence, concrete.Humidity(derivation), derivation.Once(ShrinkageFormulas.SwellingHumidity, mean));
        var drying = derivation.Once(ShrinkageFormulas.DryingShrinkage, notional, humidity,
            derivation.Once(ShrinkageFormulas.DryingDevelopment, age, concrete.CuringEnd(derivation), concrete.NotionalThickness(derivation)));
        return derivation.Once(ShrinkageFormulas.Total, basic, drying);
    }

    private static Number Tangent(DescribedConcrete concrete, Derivation derivation) =>
        concrete.Modulus("tangent modulus at 28 days, given", derivation) ?? derivation.Once(ModulusFormulas.Tangent,
            derivation.TableOnce("E_c0", "modulus at a mean strength of 10 MPa, quartzite aggregate", Quantity.Stress, 21.5e9, Sources.Modulus("modulus"), "quartzite"),
            MeanStrength(concrete, derivation));

    private static Number MeanStrength(DescribedConcrete concrete, Derivation derivation) => derivation.Once(CreepFormulas.MeanStrength,
        concrete.Strength("f_ck", "characteristic cylinder strength at 28 days", derivation),
        derivation.TableOnce("Δf", "mean above characteristic strength", Quantity.Stress, 8e6, Sources.Modulus("mean strength"), "all classes"));

    private static Silent<Number>? OutOfLimits(DescribedConcrete concrete) => concrete.Concrete.Strength is >= LeastStrength and <= GreatestStrength
        ? null
        : new Silent<Number>("it holds for characteristic strengths from 12 to 120 MPa");
}
