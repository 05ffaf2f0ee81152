using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.AashtoLrfdCreep;

/// <summary>AASHTO LRFD 5.4.2.3 as it stood to 2004.</summary>
public sealed class To2004Model : CreepModel
{
    private static readonly double ThickestSize = Unit.InchUnit.ToSi(6);

    /// <inheritdoc/>
    public override string Id => "aashto-lrfd-creep-2004";

    /// <inheritdoc/>
    public override string Title => "AASHTO LRFD 5.4.2.3, editions to 2004";

    /// <inheritdoc/>
    public override string PublishedExamples => "Published: FHWA prestressed-girder design example, Appendix C, step C1.2 (seen): factors of strength and size";

    /// <inheritdoc/>
    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation)
    {
        if (OutOfLimits(concrete, derivation) is { } silent) return silent;
        return derivation.Once(FirstFormulas.Coefficient, derivation.Once(FirstFormulas.CreepSize, age, concrete.VolumeOverSurface(derivation)),
            derivation.Once(FirstFormulas.StrengthFactor, UsConcrete.Specified(concrete, derivation)), concrete.Humidity(derivation), loadedAt, age);
    }

    /// <inheritdoc/>
    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) =>
        UsConcrete.CreepModulus(concrete, UsConcrete.RootModulus, derivation);

    /// <inheritdoc/>
    public override Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation) =>
        UsConcrete.ElasticModulus(concrete, UsConcrete.RootModulus, age, derivation);

    /// <inheritdoc/>
    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        if (OutOfLimits(concrete, derivation) is { } silent) return silent;
        if (concrete.Concrete.Humidity < HumidityFactors.Rows[0].Humidity) return new Silent<Number>("its table of humidity begins at 40 %");
        var end = concrete.CuringEnd(derivation);
        var size = derivation.Once(FirstFormulas.ShrinkageSize, age, end, concrete.VolumeOverSurface(derivation));
        var formula = concrete.Concrete.Curing == Curing.Steam ? FirstFormulas.SteamShrinkage : FirstFormulas.MoistShrinkage;
        return derivation.Once(formula, size, HumidityFactor(concrete.Humidity(derivation), derivation), age, end);
    }

    private static Number HumidityFactor(Number humidity, Derivation derivation)
    {
        var rows = HumidityFactors.Rows;
        var above = Array.FindIndex(rows, r => r.Humidity >= humidity.Value);
        return rows[above].Humidity <= humidity.Value ? Factor(above)
            : derivation.Once(FirstFormulas.HumidityBetween, Factor(above - 1), Factor(above), humidity, Of(above - 1), Of(above));

        Number Factor(int row) => derivation.TableOnce("k_h", "factor of humidity", Quantity.Ratio, rows[row].Factor, Sources.First("table 5.4.2.3.3-1"), Row(row));
        Number Of(int row) => derivation.TableOnce("H", "humidity of the row", Quantity.Ratio, rows[row].Humidity, Sources.First("table 5.4.2.3.3-1"), Row(row));
        string Row(int row) => FormattableString.Invariant($"H = {100 * rows[row].Humidity:0} %");
    }

    private static Silent<Number>? OutOfLimits(DescribedConcrete concrete, Derivation derivation) =>
        UsConcrete.OutOfLimits(concrete.Concrete) ?? (concrete.VolumeOverSurface(derivation).Value > ThickestSize * (1 + 1e-9)
            ? new Silent<Number>("it holds for a volume over surface up to 6 in")
            : null);
}
