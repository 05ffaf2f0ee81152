using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.ModelCode1990;

/// <summary>Shrinkage, shortening positive (the document writes it negative).</summary>
internal static class ShrinkageFormulas
{
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Humidity = new("RH", "relative humidity", Quantity.Ratio);
    private static readonly Operand Size = new("h", "notional size", Quantity.Size);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand CuringEnd = new("t_s", "age at the end of curing", Quantity.Age);
    private static readonly Operand Cement = new("β_sc", "figure of the cement", Quantity.Ratio);
    private static readonly Operand Strength = new("ε_s", "influence of strength", Quantity.Strain);
    private static readonly Operand BetaRh = new("β_RH", "influence of humidity", Quantity.Ratio);
    private static readonly Operand BetaS = new("β_s", "development", Quantity.Ratio);

    private const double Day = 86400, Mpa = 1e6;
    private const string Own = "own arithmetic";

    private static readonly Expression Dried = InUnits(Positive(Age - CuringEnd, Quantity.Age), Unit.Day);

    /// <summary>ε_s(f_cm).</summary>
    public static readonly Formula StrengthInfluence = new(
        "ceb-fip-mc-1990.eps-s", "ε_s", "influence of strength and cement on shrinkage", Quantity.Strain, [Cement, Fcm],
        (160 + Cement * (90 - InUnits(Fcm, Unit.Megapascal))) * 1e-6, Sources.Restated("ε_s"), new(420e-6, 1e-12, Own, 5, 38 * Mpa));

    /// <summary>β_RH. From 99 % on the concrete swells.</summary>
    public static readonly Formula HumidityInfluence = new(
        "ceb-fip-mc-1990.beta-rh", "β_RH", "influence of humidity on shrinkage, negative where the concrete swells", Quantity.Ratio, [Humidity],
        Choose(Humidity, Relation.Below, 0.99, 1.55 * (1 - Power(Humidity, 3)), -0.25), Sources.Restated("β_RH; the value from 99 % on from memory"), new(1.35625, 1e-9, Own, 0.5));

    /// <summary>β_s.</summary>
    public static readonly Formula Development = new(
        "ceb-fip-mc-1990.beta-s", "β_s", "development of shrinkage with time since the end of curing", Quantity.Ratio, [Age, CuringEnd, Size],
        Root(Dried / (350 * Power(InUnits(Size, Unit.Millimetre) / 100, 2) + Dried)), Sources.Shrinkage("development"),
        new(0.995, 0.0005, "own arithmetic: a hundred years, 100 mm", 36500 * Day, 0, 0.1));

    /// <summary>ε_cs.</summary>
    public static readonly Formula Strain = new(
        "ceb-fip-mc-1990.shrinkage", "ε_cs", "shrinkage since concreting, shortening positive", Quantity.Strain, [Strength, BetaRh, BetaS], Strength * BetaRh * BetaS,
        Sources.Restated("ε_cs"), new(0.569e-3, 0.0005e-3, "own arithmetic", 420e-6, 1.35625, 0.99885));
}
