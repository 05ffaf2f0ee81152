using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.AashtoLrfdCreep;

/// <summary>The texts from the 2005 interims on, 5.4.2.3.2 and 5.4.2.3.3: inches, ksi, days, per cent. They differ in the development alone.</summary>
internal static class SecondFormulas
{
    private static readonly Operand Fci = new("f'_ci", "strength at transfer", Quantity.Stress);
    private static readonly Operand Size = new("V/S", "volume over surface", Quantity.Size);
    private static readonly Operand Humidity = new("H", "relative humidity", Quantity.Ratio);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand From = new("t_1", "age from which it develops", Quantity.Age);
    private static readonly Operand Loaded = new("t_i", "age at loading", Quantity.Age);
    private static readonly Operand CuringEnd = new("t_s", "age at the end of curing", Quantity.Age);
    private static readonly Operand Ks = new("k_s", "factor of size", Quantity.Ratio);
    private static readonly Operand Khc = new("k_hc", "factor of humidity for creep", Quantity.Ratio);
    private static readonly Operand Khs = new("k_hs", "factor of humidity for shrinkage", Quantity.Ratio);
    private static readonly Operand Kf = new("k_f", "factor of strength", Quantity.Ratio);
    private static readonly Operand Ktd = new("k_td", "development", Quantity.Ratio);
    private static readonly Operand Early = new("k_e", "factor of early drying", Quantity.Ratio);

    private const double Day = 86400, Inch = 0.0254;
    private static readonly double Ksi = Unit.KipPerSquareInch.Factor;

    private static readonly Expression Strength = InUnits(Fci, Unit.KipPerSquareInch), Passed = InUnits(Positive(Age - From, Quantity.Age), Unit.Day);

    /// <summary>k_vs, later k_s.</summary>
    public static readonly Formula SizeFactor = new(
        "aashto-lrfd-creep-2005.ks", "k_s", "factor of size", Quantity.Ratio, [Size], Larger(1.45 - 0.13 * InUnits(Size, Unit.InchUnit), 1.0),
        Sources.Second("5.4.2.3.2"), new(1.06, 0.005, Sources.Pci, 3 * Inch));

    /// <summary>k_hc.</summary>
    public static readonly Formula CreepHumidity = new(
        "aashto-lrfd-creep-2005.khc", "k_hc", "factor of humidity for creep", Quantity.Ratio, [Humidity], 1.56 - 0.008 * InUnits(Humidity, Unit.Percent),
        Sources.Second("5.4.2.3.2"), new(1.0, 1e-12, "own arithmetic", 0.70));

    /// <summary>k_hs.</summary>
    public static readonly Formula ShrinkageHumidity = new(
        "aashto-lrfd-creep-2005.khs", "k_hs", "factor of humidity for shrinkage", Quantity.Ratio, [Humidity], 2.00 - 0.014 * InUnits(Humidity, Unit.Percent),
        Sources.Second("5.4.2.3.3"), new(1.02, 1e-12, "own arithmetic", 0.70));

    /// <summary>k_f.</summary>
    public static readonly Formula StrengthFactor = new(
        "aashto-lrfd-creep-2005.kf", "k_f", "factor of strength", Quantity.Ratio, [Fci], 5 / (1 + Strength), Sources.Second("5.4.2.3.2"),
        new(0.735, 0.0005, Sources.Pci, 5.8 * Ksi));

    /// <summary>k_td to 2014.</summary>
    public static readonly Formula Development2005 = new(
        "aashto-lrfd-creep-2005.ktd", "k_td", "development", Quantity.Ratio, [Age, From, Fci], Passed / (61 - 4 * Strength + Passed), Sources.Second("5.4.2.3.2"),
        new(0.702, 0.0005, Sources.Pci, 90 * Day, Day, 5.8 * Ksi));

    /// <summary>k_td from the 2015 interims on.</summary>
    public static readonly Formula Development2015 = new(
        "aashto-lrfd-creep-2015.ktd", "k_td", "development", Quantity.Ratio, [Age, From, Fci], Passed / (12 * (100 - 4 * Strength) / (Strength + 20) + Passed),
        Sources.Third("5.4.2.3.2"), new(0.7136, 5e-5, "own arithmetic", 90 * Day, Day, 5.8 * Ksi));

    /// <summary>ψ.</summary>
    public static readonly Formula Coefficient = new(
        "aashto-lrfd-creep-2005.psi", "ψ", "creep coefficient", Quantity.Ratio, [Ks, Khc, Kf, Ktd, Loaded],
        1.9 * Ks * Khc * Kf * Ktd * ToThe(InUnits(Loaded, Unit.Day), -0.118), Sources.Second("5.4.2.3.2"), new(1.04, 0.005, Sources.Pci, 1.06, 1.0, 0.7353, 0.7019, Day));

    /// <summary>Factor of early drying, concrete kept moist.</summary>
    public static readonly Formula EarlyDrying = new(
        "aashto-lrfd-creep-2005.early-drying", "k_e", "factor of drying before five days of curing", Quantity.Ratio, [CuringEnd],
        Choose(InUnits(CuringEnd, Unit.Day), Relation.Below, 5, 1.20, 1.00), Sources.Second("5.4.2.3.3"), new(1.2, 1e-12, "own arithmetic", 3 * Day));

    /// <summary>ε_sh.</summary>
    public static readonly Formula Shrinkage = new(
        "aashto-lrfd-creep-2005.shrinkage", "ε_sh", "shrinkage since the end of curing, shortening positive", Quantity.Strain, [Ks, Khs, Kf, Ktd, Early],
        Ks * Khs * Kf * Ktd * Early * 0.48e-3, Sources.Second("5.4.2.3.3"), new(2.68e-4, 0.005e-4, Sources.Pci, 1.06, 1.02, 0.7353, 0.7019, 1));
}
