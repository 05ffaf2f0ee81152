using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.AashtoLrfdCreep;

/// <summary>Strengths and moduli that the three texts share, in ksi. The creep coefficient belongs to the modulus at transfer.</summary>
internal static class UsConcrete
{
    private static readonly Operand Fc = new("f'_c", "specified strength", Quantity.Stress);
    private static readonly Operand Reference = new("E_1", "modulus at a strength of 1 ksi", Quantity.Stress);
    private static readonly Operand Share = new("k", "share of the specified strength", Quantity.Ratio);

    private static readonly double Ksi = Unit.KipPerSquareInch.Factor;

    /// <summary>Strength at transfer where none is given.</summary>
    public static readonly Formula TransferStrength = new(
        "aashto-lrfd-creep.transfer-strength", "f'_ci", "strength at transfer, not given: a share of the specified strength", Quantity.Stress, [Share, Fc], Share * Fc,
        Sources.Modulus("5.4.2.3.2"), new(4.8 * Ksi, 1, "own arithmetic", 0.8, 6 * Ksi));

    /// <summary>Modulus by the square root of the strength.</summary>
    public static readonly Formula RootModulus = new(
        "aashto-lrfd-creep.root-modulus", "E_c", "modulus for a strength, normal-weight concrete", Quantity.Stress, [Reference, Fc],
        Reference * Root(InUnits(Fc, Unit.KipPerSquareInch)), Sources.Modulus("5.4.2.4, to 2014"), new(3640 * Ksi, 1, "own arithmetic", 1820 * Ksi, 4 * Ksi));

    /// <summary>Modulus by a power of the strength.</summary>
    public static readonly Formula PowerModulus = new(
        "aashto-lrfd-creep.power-modulus", "E_c", "modulus for a strength, normal-weight concrete", Quantity.Stress, [Reference, Fc],
        Reference * ToThe(InUnits(Fc, Unit.KipPerSquareInch), 0.33), Sources.Modulus("C5.4.2.4, 2015 interims on"), new(3950.2 * Ksi, 0.5 * Ksi, "own arithmetic", 2500 * Ksi, 4 * Ksi));

    /// <summary>Specified strength, Pa.</summary>
    public static Number Specified(DescribedConcrete concrete, Derivation derivation) => concrete.Strength("f'_c", "specified strength at 28 days", derivation);

    /// <summary>Strength at transfer, Pa.</summary>
    public static Number AtTransfer(DescribedConcrete concrete, Derivation derivation) =>
        concrete.TransferStrength("f'_ci", "strength at transfer", derivation) ?? derivation.Once(TransferStrength,
            derivation.TableOnce("k", "share of the specified strength", Quantity.Ratio, 0.80, Sources.Modulus("5.4.2.3.2"), "strength at transfer unknown"), Specified(concrete, derivation));

    /// <summary>Modulus that the creep coefficient belongs to, Pa.</summary>
    public static Number CreepModulus(DescribedConcrete concrete, Formula modulus, Derivation derivation) =>
        concrete.Modulus("modulus at transfer, given", derivation) ?? Of(modulus, AtTransfer(concrete, derivation), derivation);

    /// <summary>Modulus for the elastic strain of a stress: with the specified strength from 28 days on, with that at transfer before.</summary>
    public static Number ElasticModulus(DescribedConcrete concrete, Formula modulus, Number age, Derivation derivation) =>
        Of(modulus, age.Value >= Unit.Day.ToSi(28) ? Specified(concrete, derivation) : AtTransfer(concrete, derivation), derivation);

    /// <summary>Silence beyond the strengths that the text covers.</summary>
    public static Silent<Number>? OutOfLimits(Concrete concrete) => concrete.Strength <= 15 * Ksi
        ? null
        : new Silent<Number>("it holds for specified strengths up to 15 ksi");

    private static Number Of(Formula modulus, Number strength, Derivation derivation) => derivation.Once(modulus,
        derivation.TableOnce("E_1", "modulus at a strength of 1 ksi, normal-weight concrete", Quantity.Stress, (modulus == RootModulus ? 1820 : 2500) * Ksi, modulus.Source, "normal weight"),
        strength);
}
