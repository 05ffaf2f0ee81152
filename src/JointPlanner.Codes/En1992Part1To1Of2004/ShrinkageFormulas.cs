using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.En1992Part1To1Of2004;

/// <summary>3.1.4(6) and Annex B.2: drying and autogenous shrinkage, shortening positive.</summary>
internal static class ShrinkageFormulas
{
    private static readonly Operand Fck = new("f_ck", "characteristic cylinder strength", Quantity.Stress);
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Humidity = new("RH", "relative humidity", Quantity.Ratio);
    private static readonly Operand Size = new("h_0", "notional size", Quantity.Size);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand CuringEnd = new("t_s", "age at the end of curing", Quantity.Age);
    private static readonly Operand Cement1 = new("α_ds1", "figure of the cement", Quantity.Ratio);
    private static readonly Operand Cement2 = new("α_ds2", "figure of the cement", Quantity.Ratio);
    private static readonly Operand BetaRh = new("β_RH", "influence of humidity", Quantity.Ratio);
    private static readonly Operand SizeBelow = new("h_1", "size of the row before", Quantity.Size);
    private static readonly Operand SizeAbove = new("h_2", "size of the row after", Quantity.Size);
    private static readonly Operand FactorBelow = new("k_1", "factor of the row before", Quantity.Ratio);
    private static readonly Operand FactorAbove = new("k_2", "factor of the row after", Quantity.Ratio);
    private static readonly Operand BasicDrying = new("ε_cd,0", "basic drying shrinkage", Quantity.Strain);
    private static readonly Operand SizeFactor = new("k_h", "factor of the notional size", Quantity.Ratio);
    private static readonly Operand BetaDs = new("β_ds", "development of drying", Quantity.Ratio);
    private static readonly Operand FinalAutogenous = new("ε_ca,∞", "final autogenous shrinkage", Quantity.Strain);
    private static readonly Operand BetaAs = new("β_as", "development of autogenous shrinkage", Quantity.Ratio);
    private static readonly Operand Drying = new("ε_cd", "drying shrinkage", Quantity.Strain);
    private static readonly Operand Autogenous = new("ε_ca", "autogenous shrinkage", Quantity.Strain);

    private const double Day = 86400, Mpa = 1e6, Mm = 1e-3;

    private static readonly Expression Dried = InUnits(Positive(Age - CuringEnd, Quantity.Age), Unit.Day);

    /// <summary>β_RH.</summary>
    public static readonly Formula HumidityInfluence = new(
        "en-1992-1-1-2004.beta-rh", "β_RH", "influence of humidity on drying shrinkage", Quantity.Ratio, [Humidity], 1.55 * (1 - Power(Humidity, 3)),
        Sources.AnnexBShrinkage("(B.12)"), new(0.756, 5e-4, Sources.Jrc, 0.8));

    /// <summary>ε_cd,0.</summary>
    public static readonly Formula Basic = new(
        "en-1992-1-1-2004.basic-drying", "ε_cd,0", "basic drying shrinkage", Quantity.Strain, [Fcm, Cement1, Cement2, BetaRh],
        0.85 * ((220 + 110 * Cement1) * Exp(-1 * Cement2 * InUnits(Fcm, Unit.Megapascal) / 10)) * 1e-6 * BetaRh, Sources.AnnexBShrinkage("(B.11)"),
        new(2.53e-4, 5e-7, Sources.Jrc, 43 * Mpa, 4, 0.12, 0.7564));

    /// <summary>k_h between two rows of table 3.3.</summary>
    public static readonly Formula SizeFactorBetween = new(
        "en-1992-1-1-2004.kh", "k_h", "factor of the notional size, linear between rows", Quantity.Ratio, [FactorBelow, FactorAbove, Size, SizeBelow, SizeAbove],
        FactorBelow + (FactorAbove - FactorBelow) * (Size - SizeBelow) / (SizeAbove - SizeBelow), Sources.Quoted("3.1.4(6), table 3.3"),
        new(0.8, 1e-12, "own arithmetic: half-way between the rows for 200 and 300 mm", 0.85, 0.75, 250 * Mm, 200 * Mm, 300 * Mm));

    /// <summary>β_ds. The size counts in millimetres; taken in metres the slab would dry at once.</summary>
    public static readonly Formula DryingDevelopment = new(
        "en-1992-1-1-2004.beta-ds", "β_ds", "development of drying shrinkage with time since the end of curing", Quantity.Ratio, [Age, CuringEnd, Size],
        Dried / (Dried + 0.04 * Root(Power(InUnits(Size, Unit.Millimetre), 3))), Sources.Quoted("3.1.4(6), (3.10)"),
        new(0.0983, 5e-5, "own arithmetic with the inputs of " + Sources.Jrc, 77 * Day, Day, 7.8 / 11.6));

    /// <summary>ε_cd.</summary>
    public static readonly Formula DryingStrain = new(
        "en-1992-1-1-2004.drying", "ε_cd", "drying shrinkage", Quantity.Strain, [BetaDs, SizeFactor, BasicDrying], BetaDs * SizeFactor * BasicDrying,
        Sources.Quoted("3.1.4(6), (3.9)"), new(17.43e-6, 5e-9, "own arithmetic", 0.0983, 0.70, 2.533e-4));

    /// <summary>ε_ca(∞).</summary>
    public static readonly Formula AutogenousFinal = new(
        "en-1992-1-1-2004.final-autogenous", "ε_ca,∞", "final autogenous shrinkage", Quantity.Strain, [Fck],
        2.5 * (InUnits(Fck, Unit.Megapascal) - 10) * 1e-6, Sources.Quoted("3.1.4(6), (3.12)"), new(6.25e-5, 5e-8, Sources.Jrc, 35 * Mpa));

    /// <summary>β_as.</summary>
    public static readonly Formula AutogenousDevelopment = new(
        "en-1992-1-1-2004.beta-as", "β_as", "development of autogenous shrinkage with age", Quantity.Ratio, [Age],
        1 - Exp(-0.2 * Root(InUnits(Age, Unit.Day))), Sources.Quoted("3.1.4(6), (3.13)"), new(0.827, 5e-4, Sources.Jrc, 77 * Day));

    /// <summary>ε_ca.</summary>
    public static readonly Formula AutogenousStrain = new(
        "en-1992-1-1-2004.autogenous", "ε_ca", "autogenous shrinkage", Quantity.Strain, [BetaAs, FinalAutogenous], BetaAs * FinalAutogenous,
        Sources.Quoted("3.1.4(6), (3.11)"), new(5.17e-5, 5e-8, Sources.Jrc, 0.8271, 6.25e-5));

    /// <summary>ε_cs.</summary>
    public static readonly Formula Total = new(
        "en-1992-1-1-2004.shrinkage", "ε_cs", "shrinkage since concreting, shortening positive", Quantity.Strain, [Drying, Autogenous], Drying + Autogenous,
        Sources.Quoted("3.1.4(6), (3.8)"), new(69.11e-6, 5e-9, "own arithmetic with the inputs of " + Sources.Jrc, 17.42e-6, 51.69e-6));
}
