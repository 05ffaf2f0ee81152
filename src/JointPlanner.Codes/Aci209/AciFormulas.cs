using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.Aci209;

/// <summary>ACI 209: inches, days, per cent.</summary>
internal static class AciFormulas
{
    private static readonly Operand Fc = new("f'_c", "specified strength", Quantity.Stress);
    private static readonly Operand A = new("a", "figure of the curing", Quantity.Ratio);
    private static readonly Operand B = new("β", "figure of the curing", Quantity.Ratio);
    private static readonly Operand FcAtAge = new("f'_c(t)", "strength at an age", Quantity.Stress);
    private static readonly Operand Reference = new("E_1", "modulus at a strength of 1 psi", Quantity.Stress);
    private static readonly Operand Size = new("V/S", "volume over surface", Quantity.Size);
    private static readonly Operand Humidity = new("λ", "relative humidity", Quantity.Ratio);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand Loaded = new("t_la", "age at loading", Quantity.Age);
    private static readonly Operand CuringEnd = new("t_s", "age at the end of curing", Quantity.Age);
    private static readonly Operand GammaLa = new("γ_la", "factor of the age at loading", Quantity.Ratio);
    private static readonly Operand GammaRh = new("γ_λ", "factor of humidity", Quantity.Ratio);
    private static readonly Operand GammaVs = new("γ_vs", "factor of size", Quantity.Ratio);
    private static readonly Operand HalfTime = new("f", "days by which half of the shrinkage is over", Quantity.Ratio);

    private const double Day = 86400, Inch = 0.0254;
    private const string Own = "own arithmetic";
    private static readonly double Psi = Unit.PoundPerSquareInch.Factor;

    private static readonly Expression Inches = InUnits(Size, Unit.InchUnit), Percents = InUnits(Humidity, Unit.Percent);
    private static readonly Expression Under = InUnits(Positive(Age - Loaded, Quantity.Age), Unit.Day), Dried = InUnits(Positive(Age - CuringEnd, Quantity.Age), Unit.Day);

    /// <summary>Where a formula or figure comes from.</summary>
    public static Provenance Source(string place) => new(Mark.Memory, "ACI 209R", "1992", place, "aci-209r-92/all");

    /// <summary>γ_la, kept moist.</summary>
    public static readonly Formula MoistLoadingAge = new(
        "aci-209r-92.gamma-la-moist", "γ_la", "factor of the age at loading, kept moist", Quantity.Ratio, [Loaded], 1.25 * ToThe(InUnits(Loaded, Unit.Day), -0.118),
        Source("2.5.1"), new(0.9935, 5e-5, Own, 7 * Day));

    /// <summary>γ_la, steam-cured.</summary>
    public static readonly Formula SteamLoadingAge = new(
        "aci-209r-92.gamma-la-steam", "γ_la", "factor of the age at loading, steam-cured", Quantity.Ratio, [Loaded], 1.13 * ToThe(InUnits(Loaded, Unit.Day), -0.094),
        Source("2.5.1"), new(1.13, 1e-9, Own, Day));

    /// <summary>γ_λ for creep.</summary>
    public static readonly Formula CreepHumidity = new(
        "aci-209r-92.gamma-rh-creep", "γ_λ", "factor of humidity for creep", Quantity.Ratio, [Humidity], 1.27 - 0.0067 * Percents, Source("2.5.4"), new(1.002, 1e-9, Own, 0.40));

    /// <summary>γ_λ for shrinkage.</summary>
    public static readonly Formula ShrinkageHumidity = new(
        "aci-209r-92.gamma-rh-shrinkage", "γ_λ", "factor of humidity for shrinkage", Quantity.Ratio, [Humidity],
        Choose(Percents, Relation.AtMost, 80, 1.40 - 0.010 * Percents, 3.00 - 0.030 * Percents), Source("2.5.4"), new(0.70, 1e-9, Own, 0.70));

    /// <summary>γ_vs for creep.</summary>
    public static readonly Formula CreepSize = new(
        "aci-209r-92.gamma-vs-creep", "γ_vs", "factor of size for creep", Quantity.Ratio, [Size], 2.0 / 3 * (1 + 1.13 * Exp(-0.54 * Inches)), Source("2.5.5"),
        new(1.0018, 5e-5, Own, 1.5 * Inch));

    /// <summary>γ_vs for shrinkage.</summary>
    public static readonly Formula ShrinkageSize = new(
        "aci-209r-92.gamma-vs-shrinkage", "γ_vs", "factor of size for shrinkage", Quantity.Ratio, [Size], 1.2 * Exp(-0.12 * Inches), Source("2.5.5"),
        new(1.0023, 5e-4, Own, 1.5 * Inch));

    /// <summary>ν_t.</summary>
    public static readonly Formula Coefficient = new(
        "aci-209r-92.nu", "ν_t", "creep coefficient", Quantity.Ratio, [Age, Loaded, GammaLa, GammaRh, GammaVs],
        ToThe(Under, 0.6) / (10 + ToThe(Under, 0.6)) * (2.35 * GammaLa * GammaRh * GammaVs), Source("2.4"), new(2.35, 1e-3, "own arithmetic, for a long time", 1e12 * Day, 0, 1, 1, 1));

    /// <summary>ε_sh.</summary>
    public static readonly Formula Shrinkage = new(
        "aci-209r-92.shrinkage", "ε_sh", "shrinkage since the end of curing, shortening positive", Quantity.Strain, [Age, CuringEnd, HalfTime, GammaRh, GammaVs],
        Dried / (HalfTime + Dried) * (780 * GammaRh * GammaVs) * 1e-6, Source("2.4"), new(390e-6, 1e-12, "own arithmetic: half of it over", 42 * Day, 7 * Day, 35, 1, 1));

    /// <summary>Strength at an age.</summary>
    public static readonly Formula StrengthAtAge = new(
        "aci-209r-92.strength-at-age", "f'_c(t)", "strength at an age", Quantity.Stress, [Age, A, B, Fc],
        InUnits(Age, Unit.Day) / (A + B * InUnits(Age, Unit.Day)) * Fc, Source("2.2.1"), new(0.9922 * 4000 * Psi, 2000, Own, 28 * Day, 4.0, 0.865, 4000 * Psi));

    /// <summary>Modulus.</summary>
    public static readonly Formula Modulus = new(
        "aci-209r-92.modulus", "E_c", "modulus when the stress is put on, to which the creep coefficient belongs", Quantity.Stress, [Reference, FcAtAge],
        Reference * Root(InUnits(FcAtAge, Unit.PoundPerSquareInch)), Source("2.2.2"), new(3605e3 * Psi, 1e3 * Psi, Own, 57000 * Psi, 4000 * Psi));
}
