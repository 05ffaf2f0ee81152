using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.ModelCode1990;

/// <summary>Creep coefficient; it belongs to the tangent modulus at 28 days.</summary>
internal static class CreepFormulas
{
    private static readonly Operand Fck = new("f_ck", "characteristic cylinder strength", Quantity.Stress);
    private static readonly Operand Margin = new("Δf", "mean above characteristic strength", Quantity.Stress);
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Humidity = new("RH", "relative humidity", Quantity.Ratio);
    private static readonly Operand Size = new("h", "notional size", Quantity.Size);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand Loaded = new("t_0", "age at loading", Quantity.Age);
    private static readonly Operand CementPower = new("α", "power of the cement", Quantity.Ratio);
    private static readonly Operand Adjusted = new("t_0,adj", "age at loading adjusted for the cement, in days", Quantity.Ratio);
    private static readonly Operand PhiRh = new("φ_RH", "influence of humidity and size", Quantity.Ratio);
    private static readonly Operand BetaF = new("β_fcm", "influence of strength", Quantity.Ratio);
    private static readonly Operand BetaT0 = new("β_t0", "influence of the age at loading", Quantity.Ratio);
    private static readonly Operand BetaH = new("β_H", "in days", Quantity.Ratio);
    private static readonly Operand Phi0 = new("φ_0", "notional creep coefficient", Quantity.Ratio);
    private static readonly Operand BetaC = new("β_c", "development", Quantity.Ratio);

    private const double Day = 86400, Mpa = 1e6;
    private const string Own = "own arithmetic";

    private static readonly Expression Thickness = InUnits(Size, Unit.Millimetre) / 100, Days = InUnits(Loaded, Unit.Day);
    private static readonly Expression Under = InUnits(Positive(Age - Loaded, Quantity.Age), Unit.Day);

    /// <summary>Mean strength.</summary>
    public static readonly Formula MeanStrength = new(
        "ceb-fip-mc-1990.mean-strength", "f_cm", "mean cylinder strength at 28 days", Quantity.Stress, [Fck, Margin], Fck + Margin,
        Sources.Modulus("2.1.3.2"), new(38 * Mpa, 1, Own, 30 * Mpa, 8 * Mpa));

    /// <summary>φ_RH.</summary>
    public static readonly Formula HumidityInfluence = new(
        "ceb-fip-mc-1990.phi-rh", "φ_RH", "influence of humidity and size on creep", Quantity.Ratio, [Humidity, Size],
        1 + (1 - Humidity) / (0.46 * ToThe(Thickness, 1.0 / 3)), Sources.Creep("influence of humidity"), new(2.08696, 1e-5, Own, 0.5, 0.1));

    /// <summary>β(f_cm).</summary>
    public static readonly Formula Strengths = new(
        "ceb-fip-mc-1990.beta-fcm", "β_fcm", "influence of strength on creep", Quantity.Ratio, [Fcm], 5.3 / Root(InUnits(Fcm, Unit.Megapascal) / 10),
        Sources.Creep("influence of strength"), new(2.65, 1e-9, Own, 40 * Mpa));

    /// <summary>Age at loading adjusted for the cement.</summary>
    public static readonly Formula AdjustedAge = new(
        "ceb-fip-mc-1990.adjusted-age", "t_0,adj", "age at loading adjusted for the cement, in days, at least half a day", Quantity.Ratio, [Loaded, CementPower],
        Larger(Days * ToThe(9 / (2 + ToThe(Days, 1.2)) + 1, CementPower), 0.5), Sources.Creep("age at loading"), new(12.109, 0.0005, Own, 7 * Day, 1));

    /// <summary>β(t_0).</summary>
    public static readonly Formula LoadingAge = new(
        "ceb-fip-mc-1990.beta-t0", "β_t0", "influence of the age at loading on creep", Quantity.Ratio, [Adjusted], 1 / (0.1 + ToThe(Adjusted, 0.2)),
        Sources.Creep("influence of the age at loading"), new(0.48845, 1e-4, Own, 28));

    /// <summary>φ_0.</summary>
    public static readonly Formula Notional = new(
        "ceb-fip-mc-1990.phi-0", "φ_0", "notional creep coefficient", Quantity.Ratio, [PhiRh, BetaF, BetaT0], PhiRh * BetaF * BetaT0,
        Sources.Creep("notional coefficient"), new(2.0, 1e-12, Own, 1, 4, 0.5));

    /// <summary>β_H.</summary>
    public static readonly Formula Spread = new(
        "ceb-fip-mc-1990.beta-h", "β_H", "days that spread the development over time, from humidity and size", Quantity.Ratio, [Humidity, Size],
        Smaller(150 * (1 + Power(1.2 * Humidity, 18)) * Thickness + 250, 1500), Sources.Creep("development"), new(400.015, 1e-3, Own, 0.5, 0.1));

    /// <summary>β_c.</summary>
    public static readonly Formula Development = new(
        "ceb-fip-mc-1990.beta-c", "β_c", "development of creep with time under load", Quantity.Ratio, [Age, Loaded, BetaH],
        ToThe(Under / (BetaH + Under), 0.3), Sources.Creep("development"), new(0.81225, 1e-4, "own arithmetic: one half to the power of 0.3", 428 * Day, 28 * Day, 400));

    /// <summary>φ.</summary>
    public static readonly Formula Coefficient = new(
        "ceb-fip-mc-1990.phi", "φ", "creep coefficient", Quantity.Ratio, [Phi0, BetaC], Phi0 * BetaC, Sources.Creep("creep coefficient"), new(1.0, 1e-12, Own, 2, 0.5));
}
