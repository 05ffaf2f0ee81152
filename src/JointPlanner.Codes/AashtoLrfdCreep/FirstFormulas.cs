using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.AashtoLrfdCreep;

/// <summary>The text to 2004, 5.4.2.3.2 and 5.4.2.3.3: inches, ksi, days, per cent.</summary>
internal static class FirstFormulas
{
    private static readonly Operand Fc = new("f'_c", "specified strength", Quantity.Stress);
    private static readonly Operand Size = new("V/S", "volume over surface", Quantity.Size);
    private static readonly Operand Humidity = new("H", "relative humidity", Quantity.Ratio);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand Loaded = new("t_i", "age at loading", Quantity.Age);
    private static readonly Operand CuringEnd = new("t_s", "age at the end of curing", Quantity.Age);
    private static readonly Operand Kf = new("k_f", "factor of strength", Quantity.Ratio);
    private static readonly Operand Kc = new("k_c", "factor of size for creep", Quantity.Ratio);
    private static readonly Operand Ks = new("k_s", "factor of size for shrinkage", Quantity.Ratio);
    private static readonly Operand Kh = new("k_h", "factor of humidity", Quantity.Ratio);
    private static readonly Operand HumidityBelow = new("H_1", "humidity of the row before", Quantity.Ratio);
    private static readonly Operand HumidityAbove = new("H_2", "humidity of the row after", Quantity.Ratio);
    private static readonly Operand FactorBelow = new("k_1", "factor of the row before", Quantity.Ratio);
    private static readonly Operand FactorAbove = new("k_2", "factor of the row after", Quantity.Ratio);

    private const double Day = 86400, Inch = 0.0254;
    private const string Own = "own arithmetic";
    private static readonly double Ksi = Unit.KipPerSquareInch.Factor;

    private static readonly Expression Inches = InUnits(Size, Unit.InchUnit), Percents = InUnits(Humidity, Unit.Percent), Days = InUnits(Age, Unit.Day);
    private static readonly Expression Under = InUnits(Positive(Age - Loaded, Quantity.Age), Unit.Day), Dried = InUnits(Positive(Age - CuringEnd, Quantity.Age), Unit.Day);

    /// <summary>k_f.</summary>
    public static readonly Formula StrengthFactor = new(
        "aashto-lrfd-creep-2004.kf", "k_f", "factor of strength for creep", Quantity.Ratio, [Fc], 1 / (0.67 + InUnits(Fc, Unit.KipPerSquareInch) / 9),
        Sources.First("5.4.2.3.2"), new(0.748, 0.0005, Sources.Fhwa, 6 * Ksi));

    /// <summary>k_c; the first quotient of the text is written out, so that it holds from the first hour.</summary>
    public static readonly Formula CreepSize = new(
        "aashto-lrfd-creep-2004.kc", "k_c", "factor of size for creep", Quantity.Ratio, [Age, Size],
        (45 + Days) / (26 * Exp(0.36 * Inches) + Days) * ((1.80 + 1.77 * Exp(-0.54 * Inches)) / 2.587), Sources.First("5.4.2.3.2"),
        new(0.759, 0.0005, Sources.Fhwa + ", for a long time", 1e9 * Day, 13020 / 2955.38 * Inch));

    /// <summary>ψ.</summary>
    public static readonly Formula Coefficient = new(
        "aashto-lrfd-creep-2004.psi", "ψ", "creep coefficient", Quantity.Ratio, [Kc, Kf, Humidity, Loaded, Age],
        3.5 * Kc * Kf * (1.58 - Percents / 120) * ToThe(InUnits(Loaded, Unit.Day), -0.118) * (ToThe(Under, 0.6) / (10 + ToThe(Under, 0.6))), Sources.First("5.4.2.3.2"),
        new(1.981, 0.0006, "own arithmetic, for a long time", 0.7592, 0.7481, 0.70, Day, 1e12 * Day));

    /// <summary>k_s.</summary>
    public static readonly Formula ShrinkageSize = new(
        "aashto-lrfd-creep-2004.ks", "k_s", "factor of size for shrinkage", Quantity.Ratio, [Age, CuringEnd, Size],
        (45 + Dried) / (26 * Exp(0.36 * Inches) + Dried) * ((1064 - 94 * Inches) / 923), Sources.First("5.4.2.3.3"),
        new(0.7041, 1e-4, "own arithmetic, for a long time", 1e9 * Day, 0, 13020 / 2955.38 * Inch));

    /// <summary>k_h between two rows.</summary>
    public static readonly Formula HumidityBetween = new(
        "aashto-lrfd-creep-2004.kh", "k_h", "factor of humidity for shrinkage, linear between rows", Quantity.Ratio,
        [FactorBelow, FactorAbove, Humidity, HumidityBelow, HumidityAbove],
        FactorBelow + (FactorAbove - FactorBelow) * (Humidity - HumidityBelow) / (HumidityAbove - HumidityBelow), Sources.First("table 5.4.2.3.3-1"),
        new(0.93, 1e-9, Own, 1.00, 0.86, 0.75, 0.70, 0.80));

    /// <summary>Shrinkage of concrete kept moist.</summary>
    public static readonly Formula MoistShrinkage = Shrinkage("moist-shrinkage", 35, 0.51e-3);

    /// <summary>Shrinkage of steam-cured concrete.</summary>
    public static readonly Formula SteamShrinkage = Shrinkage("steam-shrinkage", 55, 0.56e-3);

    private static Formula Shrinkage(string id, double days, double strain) => new(
        "aashto-lrfd-creep-2004." + id, "ε_sh", "shrinkage since the end of curing, shortening positive", Quantity.Strain, [Ks, Kh, Age, CuringEnd],
        Ks * Kh * (Dried / (days + Dried)) * strain, Sources.First("5.4.2.3.3"), new(strain / 2, 1e-12, "own arithmetic: half of it over", 1, 1, days * Day, 0));
}
