using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.ModelCode1990;

/// <summary>Creep and shrinkage of the CEB-FIP Model Code 1990; the coefficient belongs to the tangent modulus at 28 days.</summary>
public sealed class ModelCode1990Model : CreepModel
{
    private const double LeastStrength = 12e6, GreatestStrength = 80e6, LeastHumidity = 0.40;

    /// <inheritdoc/>
    public override string Id => "ceb-fip-mc-1990";

    /// <inheritdoc/>
    public override string Title => "CEB-FIP Model Code 1990";

    /// <inheritdoc/>
    public override double? ProportionalUpTo => 0.4;

    /// <inheritdoc/>
    public override string PublishedExamples =>
        "From memory: the document's own table of shrinkage after seventy years; its tables of creep differ from its formulas by 4 to 8 per cent and are no check";

    /// <inheritdoc/>
    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        var (humidity, size, cement) = (concrete.Humidity(derivation), concrete.NotionalThickness(derivation), Cements.Of(concrete.Concrete.Cement));
        var power = derivation.TableOnce("α", "power of the cement", Quantity.Ratio, cement.Power, Sources.Creep("age at loading"), cement.Name);
        var notional = derivation.Once(CreepFormulas.Notional, derivation.Once(CreepFormulas.HumidityInfluence, humidity, size),
            derivation.Once(CreepFormulas.Strengths, MeanStrength(concrete, derivation)),
            derivation.Once(CreepFormulas.LoadingAge, derivation.Once(CreepFormulas.AdjustedAge, loadedAt, power)));
        var development = derivation.Once(CreepFormulas.Development, age, loadedAt, derivation.Once(CreepFormulas.Spread, humidity, size));
        return derivation.Once(CreepFormulas.Coefficient, notional, development);
    }

    /// <inheritdoc/>
    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) => Tangent(concrete, derivation);

    /// <inheritdoc/>
    public override Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        var cement = Cements.Of(concrete.Concrete.Cement);
        var figure = derivation.TableOnce("s", "figure of the cement", Quantity.Ratio, cement.Strength, Sources.Modulus("2.1.6.1"), cement.Name);
        return derivation.Once(ModulusFormulas.AtAge, derivation.Once(ModulusFormulas.StrengthDevelopment, figure, age), Tangent(concrete, derivation));
    }

    /// <inheritdoc/>
    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        if (concrete.Concrete.Humidity < LeastHumidity) return new Silent<Number>("its shrinkage holds for a relative humidity of 40 % and more");
        var cement = Cements.Of(concrete.Concrete.Cement);
        var strength = derivation.Once(ShrinkageFormulas.StrengthInfluence,
            derivation.TableOnce("β_sc", "figure of the cement", Quantity.Ratio, cement.Shrinkage, Sources.Restated("β_sc"), cement.Name), MeanStrength(concrete, derivation));
        return derivation.Once(ShrinkageFormulas.Strain, strength, derivation.Once(ShrinkageFormulas.HumidityInfluence, concrete.Humidity(derivation)),
            derivation.Once(ShrinkageFormulas.Development, age, concrete.CuringEnd(derivation), concrete.NotionalThickness(derivation)));
    }

    private static Number Tangent(DescribedConcrete concrete, Derivation derivation) =>
        concrete.Modulus("tangent modulus at 28 days, given", derivation) ?? derivation.Once(ModulusFormulas.Tangent,
            derivation.TableOnce("E_c0", "modulus at a mean strength of 10 MPa, quartzite aggregate", Quantity.Stress, 21.5e9, Sources.Modulus("2.1.4.2"), "quartzite"),
            MeanStrength(concrete, derivation));

    private static Number MeanStrength(DescribedConcrete concrete, Derivation derivation) => derivation.Once(CreepFormulas.MeanStrength,
        concrete.Strength("f_ck", "characteristic cylinder strength at 28 days", derivation),
        derivation.TableOnce("Δf", "mean above characteristic strength", Quantity.Stress, 8e6, Sources.Modulus("2.1.3.2"), "all classes"));

    private static Silent<Number>? OutOfLimits(DescribedConcrete concrete) => concrete.Concrete.Strength is >= LeastStrength and <= GreatestStrength
        ? null
        : new Silent<Number>("it holds for characteristic strengths from 12 to 80 MPa");
}
