using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.AashtoLrfdCreep;

/// <summary>
/// AASHTO LRFD 5.4.2.3 from the 2005 interims on, with the development of one edition. A day of accelerated curing may count as seven for the age
/// at loading; that is not done here, which gives more creep: whoever wants it gives the equivalent age.
/// </summary>
public abstract class From2005 : CreepModel
{
    private readonly Formula development, modulus;

    private protected From2005(Formula development, Formula modulus) => (this.development, this.modulus) = (development, modulus);

    /// <inheritdoc/>
    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation)
    {
        if (UsConcrete.OutOfLimits(concrete.Concrete) is { } silent) return silent;
        var strength = UsConcrete.AtTransfer(concrete, derivation);
        return derivation.Once(SecondFormulas.Coefficient, derivation.Once(SecondFormulas.SizeFactor, concrete.VolumeOverSurface(derivation)),
            derivation.Once(SecondFormulas.CreepHumidity, concrete.Humidity(derivation)), derivation.Once(SecondFormulas.StrengthFactor, strength),
            derivation.Once(development, age, loadedAt, strength), loadedAt);
    }

    /// <inheritdoc/>
    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) => UsConcrete.CreepModulus(concrete, modulus, derivation);

    /// <inheritdoc/>
    public override Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation) =>
        UsConcrete.ElasticModulus(concrete, modulus, age, derivation);

    /// <inheritdoc/>
    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        if (UsConcrete.OutOfLimits(concrete.Concrete) is { } silent) return silent;
        var (strength, end) = (UsConcrete.AtTransfer(concrete, derivation), concrete.CuringEnd(derivation));
        var early = concrete.Concrete.Curing == Curing.Moist
            ? derivation.Once(SecondFormulas.EarlyDrying, end)
            : derivation.TableOnce("k_e", "factor of early drying", Quantity.Ratio, 1, Sources.Second("5.4.2.3.3"), "steam-cured");
        return derivation.Once(SecondFormulas.Shrinkage, derivation.Once(SecondFormulas.SizeFactor, concrete.VolumeOverSurface(derivation)),
            derivation.Once(SecondFormulas.ShrinkageHumidity, concrete.Humidity(derivation)), derivation.Once(SecondFormulas.StrengthFactor, strength),
            derivation.Once(development, age, end, strength), early);
    }
}

/// <summary>AASHTO LRFD 5.4.2.3, 2005 interims to the 7th edition of 2014.</summary>
public sealed class From2005To2014Model() : From2005(SecondFormulas.Development2005, UsConcrete.RootModulus)
{
    /// <inheritdoc/>
    public override string Id => "aashto-lrfd-creep-2005";

    /// <inheritdoc/>
    public override string Title => "AASHTO LRFD 5.4.2.3, 2005 interims to 7th edition";

    /// <inheritdoc/>
    public override string PublishedExamples => "From memory: PCI Bridge Design Manual, example 9.1a";
}

/// <summary>AASHTO LRFD 5.4.2.3, 2015 interims on.</summary>
public sealed class From2015Model() : From2005(SecondFormulas.Development2015, UsConcrete.PowerModulus)
{
    /// <inheritdoc/>
    public override string Id => "aashto-lrfd-creep-2015";

    /// <inheritdoc/>
    public override string Title => "AASHTO LRFD 5.4.2.3, 2015 interims on";

    /// <inheritdoc/>
    public override string PublishedExamples => "No published example of this edition is at hand";
}
