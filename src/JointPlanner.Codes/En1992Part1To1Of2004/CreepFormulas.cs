using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.En1992Part1To1Of2004;

/// <summary>Annex B.1: creep coefficient.</summary>
internal static class CreepFormulas
{
    private static readonly Operand Fck = new("f_ck", "characteristic cylinder strength", Quantity.Stress);
    private static readonly Operand Margin = new("Δf", "mean above characteristic strength", Quantity.Stress);
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Humidity = new("RH", "relative humidity", Quantity.Ratio);
    private static readonly Operand Size = new("h_0", "notional size", Quantity.Size);
    private static readonly Operand Alpha1 = new("α_1", "influence of strength", Quantity.Ratio);
    private static readonly Operand Alpha2 = new("α_2", "influence of strength", Quantity.Ratio);
    private static readonly Operand Alpha3 = new("α_3", "influence of strength", Quantity.Ratio);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand Loaded = new("t_0", "age at loading", Quantity.Age);
    private static readonly Operand Adjusted = new("t_0,adj", "age at loading adjusted for the cement, in days", Quantity.Ratio);
    private static readonly Operand CementPower = new("α", "power of the cement", Quantity.Ratio);
    private static readonly Operand PhiRh = new("φ_RH", "influence of humidity and size", Quantity.Ratio);
    private static readonly Operand BetaF = new("β_fcm", "influence of strength", Quantity.Ratio);
    private static readonly Operand BetaT0 = new("β_t0", "influence of the age at loading", Quantity.Ratio);
    private static readonly Operand BetaH = new("β_H", "in days", Quantity.Ratio);
    private static readonly Operand Phi0 = new("φ_0", "notional creep coefficient", Quantity.Ratio);
    private static readonly Operand BetaC = new("β_c", "development", Quantity.Ratio);

    private static readonly Expression Strength = InUnits(Fcm, Unit.Megapascal), Thickness = InUnits(Size, Unit.Millimetre);
    private static readonly Expression Under = Positive(Age - Loaded, Quantity.Age);
    private static readonly Expression Drying = (1 - Humidity) / (0.1 * ToThe(Thickness, 1.0 / 3));

    private const double Day = 86400, Mpa = 1e6;

    /// <summary>Mean strength.</summary>
    public static readonly Formula MeanStrength = new(
        "en-1992-1-1-2004.mean-strength", "f_cm", "mean cylinder strength at 28 days", Quantity.Stress, [Fck, Margin], Fck + Margin,
        Sources.AnnexBCreep("below (B.4)"), new(43 * Mpa, 1, Sources.Jrc, 35 * Mpa, 8 * Mpa));

    /// <summary>α_1.</summary>
    public static readonly Formula StrengthInfluence1 = Influence("en-1992-1-1-2004.alpha-1", "α_1", 0.7, 0.87);

    /// <summary>α_2.</summary>
    public static readonly Formula StrengthInfluence2 = Influence("en-1992-1-1-2004.alpha-2", "α_2", 0.2, 0.96);

    /// <summary>α_3.</summary>
    public static readonly Formula StrengthInfluence3 = Influence("en-1992-1-1-2004.alpha-3", "α_3", 0.5, 0.90);

    /// <summary>φ_RH.</summary>
    public static readonly Formula HumidityInfluence = new(
        "en-1992-1-1-2004.phi-rh", "φ_RH", "influence of humidity and size on creep", Quantity.Ratio, [Fcm, Humidity, Size, Alpha1, Alpha2],
        Choose(Strength, Relation.AtMost, 35, 1 + Drying, (1 + Drying * Alpha1) * Alpha2), Sources.AnnexBCreep("(B.3a) and (B.3b)"),
        new(1.15, 0.005, Sources.Jrc, 43 * Mpa, 0.8, 7.8 / 11.6, 0.8658, 0.9597));

    /// <summary>β(f_cm).</summary>
    public static readonly Formula Strengths = new(
        "en-1992-1-1-2004.beta-fcm", "β_fcm", "influence of strength on creep", Quantity.Ratio, [Fcm], 16.8 / Root(Strength), Sources.AnnexBCreep("(B.4)"),
        new(2.56, 0.005, Sources.Jrc, 43 * Mpa));

    /// <summary>Age at loading adjusted for the cement.</summary>
    public static readonly Formula AdjustedAge = new(
        "en-1992-1-1-2004.adjusted-age", "t_0,adj", "age at loading adjusted for the cement, in days, at least half a day", Quantity.Ratio, [Loaded, CementPower],
        Larger(InUnits(Loaded, Unit.Day) * ToThe(9 / (2 + ToThe(InUnits(Loaded, Unit.Day), 1.2)) + 1, CementPower), 0.5), Sources.AnnexBCreep("(B.9)"),
        new(12.109, 0.0005, "own arithmetic: 7 d with the rapid cement", 7 * Day, 1));

    /// <summary>β(t_0).</summary>
    public static readonly Formula LoadingAge = new(
        "en-1992-1-1-2004.beta-t0", "β_t0", "influence of the age at loading on creep", Quantity.Ratio, [Adjusted],
        1 / (0.1 + ToThe(Adjusted, 0.2)), Sources.AnnexBCreep("(B.5)"), new(0.44, 0.005, Sources.Jrc, 50));

    /// <summary>φ_0.</summary>
    public static readonly Formula Notional = new(
        "en-1992-1-1-2004.phi-0", "φ_0", "notional creep coefficient", Quantity.Ratio, [PhiRh, BetaF, BetaT0], PhiRh * BetaF * BetaT0, Sources.AnnexBCreep("(B.2)"),
        new(1.29, 0.005, Sources.Jrc, 1.1493, 2.5620, 0.4373));

    /// <summary>β_H.</summary>
    public static readonly Formula Spread = new(
        "en-1992-1-1-2004.beta-h", "β_H", "days that spread the development over time, from humidity and size", Quantity.Ratio, [Fcm, Humidity, Size, Alpha3],
        Choose(Strength, Relation.AtMost, 35, Smaller(Spreading() + 250, 1500), Smaller(Spreading() + 250 * Alpha3, 1500 * Alpha3)),
        Sources.AnnexBCreep("(B.8a) and (B.8b)"), new(1353.3, 0.5, "own arithmetic: limit 1500·0.9022", 43 * Mpa, 0.8, 7.8 / 11.6, 0.9022));

    /// <summary>β_c.</summary>
    public static readonly Formula Development = new(
        "en-1992-1-1-2004.beta-c", "β_c", "development of creep with time under load", Quantity.Ratio, [Age, Loaded, BetaH],
        ToThe(InUnits(Under, Unit.Day) / (BetaH + InUnits(Under, Unit.Day)), 0.3), Sources.AnnexBCreep("(B.7)"),
        new(0.83255, 1e-4, "own arithmetic", 1022 * Day, 22 * Day, 842));

    /// <summary>φ.</summary>
    public static readonly Formula Coefficient = new(
        "en-1992-1-1-2004.phi", "φ", "creep coefficient", Quantity.Ratio, [Phi0, BetaC], Phi0 * BetaC, Sources.AnnexBCreep("(B.1)"),
        new(1.2872, 1e-4, "own arithmetic", 1.2877, 0.9996));

    private static Expression Spreading() => 1.5 * (1 + Power(0.012 * InUnits(Humidity, Unit.Percent), 18)) * Thickness;

    private static Formula Influence(string id, string symbol, double power, double printed) => new(
        id, symbol, "influence of strength on creep", Quantity.Ratio, [Fcm], ToThe(35 / Strength, power), Sources.AnnexBCreep("(B.8c)"),
        new(printed, 0.005, Sources.Jrc, 43 * Mpa));
}
