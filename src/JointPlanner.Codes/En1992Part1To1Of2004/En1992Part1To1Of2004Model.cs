using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.En1992Part1To1Of2004;

/// <summary>Creep and shrinkage of EN 1992-1-1:2004, 3.1.4 and Annex B; the coefficient belongs to the tangent modulus.</summary>
public sealed class En1992Part1To1Of2004Model : CreepModel
{
    private const double LeastStrength = 12e6, GreatestStrength = 90e6;

    /// <inheritdoc/>
    public override string Id => "en-1992-1-1-2004";

    /// <inheritdoc/>
    public override string Title => "EN 1992-1-1:2004";

    /// <inheritdoc/>
    public override double? ProportionalUpTo => 0.45;

    /// <inheritdoc/>
    public override string PublishedExamples =>
        "Published: JRC, Bridge design to Eurocodes – Worked examples, 2012, creep of a composite deck's slab, as quoted in an open-source finite-element library; unit-test values of an open-source structural-concrete library";

    /// <inheritdoc/>
    public override Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        var (mean, size) = (MeanStrength(concrete, derivation), concrete.NotionalThickness(derivation));
        var humidity = concrete.Humidity(derivation);
        var rh = derivation.Once(CreepFormulas.HumidityInfluence, mean, humidity, size,
            derivation.Once(CreepFormulas.StrengthInfluence1, mean), derivation.Once(CreepFormulas.StrengthInfluence2, mean));
        var cement = Cements.Of(concrete.Concrete.Cement);
        var power = derivation.TableOnce("α", "power of the cement", Quantity.Ratio, cement.Power, Sources.Quoted("Annex B.1, (B.9)"), cement.Name);
        var adjusted = derivation.Once(CreepFormulas.AdjustedAge, loadedAt, power);
        var notional = derivation.Once(CreepFormulas.Notional, rh, derivation.Once(CreepFormulas.Strengths, mean), derivation.Once(CreepFormulas.LoadingAge, adjusted));
        var spread = derivation.Once(CreepFormulas.Spread, mean, humidity, size, derivation.Once(CreepFormulas.StrengthInfluence3, mean));
        return derivation.Once(CreepFormulas.Coefficient, notional, derivation.Once(CreepFormulas.Development, age, loadedAt, spread));
    }

    /// <inheritdoc/>
    public override Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation) => Tangent(concrete, derivation);

    /// <inheritdoc/>
    public override Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        var cement = Cements.Of(concrete.Concrete.Cement);
        var figure = derivation.TableOnce("s", "figure of the cement", Quantity.Ratio, cement.Strength,
            new Provenance(Mark.Seen, "a finite-element library's material manual", "", "restates s of EN 1992-1-1:2004, 3.1.2(6)"), cement.Name);
        return derivation.Once(ModulusFormulas.AtAge, derivation.Once(ModulusFormulas.StrengthDevelopment, figure, age), Tangent(concrete, derivation));
    }

    /// <inheritdoc/>
    public override Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation)
    {
        if (OutOfLimits(concrete) is { } silent) return silent;
        var (mean, size, cement) = (MeanStrength(concrete, derivation), concrete.NotionalThickness(derivation), Cements.Of(concrete.Concrete.Cement));
        var quoted = Sources.Quoted("Annex B.2");
        var basic = derivation.Once(ShrinkageFormulas.Basic, mean,
            derivation.TableOnce("α_ds1", "figure of the cement", Quantity.Ratio, cement.Drying1, quoted, cement.Name),
            derivation.TableOnce("α_ds2", "figure of the cement", Quantity.Ratio, cement.Drying2, quoted, cement.Name),
            derivation.Once(ShrinkageFormulas.HumidityInfluence, concrete.Humidity(derivation)));
        var drying = derivation.Once(ShrinkageFormulas.DryingStrain,
            derivation.Once(ShrinkageFormulas.DryingDevelopment, age, concrete.CuringEnd(derivation), size), SizeFactor(size, derivation), basic);
        var final = derivation.Once(ShrinkageFormulas.AutogenousFinal, Characteristic(concrete, derivation));
        var autogenous = derivation.Once(ShrinkageFormulas.AutogenousStrain, derivation.Once(ShrinkageFormulas.AutogenousDevelopment, age), final);
        return derivation.Once(ShrinkageFormulas.Total, drying, autogenous);
    }

    private static Number SizeFactor(Number size, Derivation derivation)
    {
        var rows = SizeFactors.Rows;
        var above = Array.FindIndex(rows, r => Unit.Millimetre.ToSi(r.Size) >= size.Value);
        if (above <= 0) return Factor(above < 0 ? rows.Length - 1 : 0);
        return derivation.Once(ShrinkageFormulas.SizeFactorBetween, Factor(above - 1), Factor(above), size, SizeOf(above - 1), SizeOf(above));

        Number Factor(int row) => derivation.TableOnce("k_h", "factor of the notional size", Quantity.Ratio, rows[row].Factor, Table(), Row(row));
        Number SizeOf(int row) => derivation.TableOnce("h_0", "notional size of the row", Quantity.Size, Unit.Millimetre.ToSi(rows[row].Size), Table(), Row(row));
        string Row(int row) => FormattableString.Invariant($"h_0 = {rows[row].Size} mm{(row == rows.Length - 1 ? " and more" : row == 0 ? " and less" : "")}");
        Provenance Table() => Sources.Quoted("3.1.4(6), table 3.3");
    }

    private static Number Tangent(DescribedConcrete concrete, Derivation derivation)
    {
        if (concrete.Modulus("tangent modulus at 28 days, given", derivation) is { } given) return given;
        var reference = derivation.TableOnce("E_0", "modulus at a mean strength of 10 MPa, quartzite aggregate", Quantity.Stress, 22e9, Sources.Modulus("table 3.1"), "quartzite");
        return derivation.Once(ModulusFormulas.TangentModulus, derivation.Once(ModulusFormulas.SecantModulus, reference, MeanStrength(concrete, derivation)));
    }

    private static Number Characteristic(DescribedConcrete concrete, Derivation derivation) =>
        concrete.Strength("f_ck", "characteristic cylinder strength at 28 days", derivation);

    private static Number MeanStrength(DescribedConcrete concrete, Derivation derivation) => derivation.Once(CreepFormulas.MeanStrength,
        Characteristic(concrete, derivation),
        derivation.TableOnce("Δf", "mean above characteristic strength", Quantity.Stress, 8e6, Sources.AnnexBCreep("below (B.4)"), "all classes"));

    private static Silent<Number>? OutOfLimits(DescribedConcrete concrete) => concrete.Concrete.Strength is >= LeastStrength and <= GreatestStrength
        ? null
        : new Silent<Number>("it holds for characteristic strengths from 12 to 90 MPa");
}
