using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.ModelCode2010;

/// <summary>Creep coefficient as the sum of basic and drying creep; it belongs to the modulus at 28 days. Basic creep never ends.</summary>
internal static class CreepFormulas
{
    private static readonly Operand Fck = new("f_ck", "characteristic cylinder strength", Quantity.Stress);
    private static readonly Operand Margin = new("Δf", "mean above characteristic strength", Quantity.Stress);
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Humidity = new("RH", "relative humidity", Quantity.Ratio);
    private static readonly Operand Size = new("h_0", "notional size", Quantity.Size);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand Loaded = new("t_0", "age at loading", Quantity.Age);
    private static readonly Operand CementPower = new("α", "power of the cement", Quantity.Ratio);
    private static readonly Operand Adjusted = new("t_0,adj", "age at loading adjusted for the cement, in days", Quantity.Ratio);
    private static readonly Operand BasicStrengths = new("β_bc,fcm", "influence of strength on basic creep", Quantity.Ratio);
    private static readonly Operand BasicTime = new("β_bc,t", "development of basic creep", Quantity.Ratio);
    private static readonly Operand DryingStrengths = new("β_dc,fcm", "influence of strength on drying creep", Quantity.Ratio);
    private static readonly Operand DryingHumidity = new("β_dc,RH", "influence of humidity and size on drying creep", Quantity.Ratio);
    private static readonly Operand DryingAge = new("β_dc,t0", "influence of the age at loading on drying creep", Quantity.Ratio);
    private static readonly Operand Gamma = new("γ", "power of the development", Quantity.Ratio);
    private static readonly Operand BetaH = new("β_h", "in days", Quantity.Ratio);
    private static readonly Operand DryingTime = new("β_dc,t", "development of drying creep", Quantity.Ratio);
    private static readonly Operand Basic = new("φ_bc", "basic creep coefficient", Quantity.Ratio);
    private static readonly Operand Drying = new("φ_dc", "drying creep coefficient", Quantity.Ratio);

    private const double Day = 86400, Mpa = 1e6;
    private const string Own = "own arithmetic";

    private static readonly Expression Strength = InUnits(Fcm, Unit.Megapascal), Thickness = InUnits(Size, Unit.Millimetre), Days = InUnits(Loaded, Unit.Day);
    private static readonly Expression Under = InUnits(Positive(Age - Loaded, Quantity.Age), Unit.Day);

    /// <summary>Mean strength.</summary>
    public static readonly Formula MeanStrength = new(
        "fib-mc-2010.mean-strength", "f_cm", "mean cylinder strength at 28 days", Quantity.Stress, [Fck, Margin], Fck + Margin,
        Sources.Modulus("mean strength"), new(43 * Mpa, 1, Own, 35 * Mpa, 8 * Mpa));

    /// <summary>Age at loading adjusted for the cement.</summary>
    public static readonly Formula AdjustedAge = new(
        "fib-mc-2010.adjusted-age", "t_0,adj", "age at loading adjusted for the cement, in days, at least half a day", Quantity.Ratio, [Loaded, CementPower],
        Larger(Days * ToThe(9 / (2 + ToThe(Days, 1.2)) + 1, CementPower), 0.5), Sources.Creep("age at loading"), new(12.109, 0.0005, Own, 7 * Day, 1));

    /// <summary>β_bc,fcm.</summary>
    public static readonly Formula BasicStrength = new(
        "fib-mc-2010.beta-bc-fcm", "β_bc,fcm", "influence of strength on basic creep", Quantity.Ratio, [Fcm], 1.8 / ToThe(Strength, 0.7),
        Sources.Creep("basic creep"), new(0.12938, 1e-4, Own, 43 * Mpa));

    /// <summary>β_bc,t.</summary>
    public static readonly Formula BasicDevelopment = new(
        "fib-mc-2010.beta-bc-t", "β_bc,t", "development of basic creep with time under load", Quantity.Ratio, [Adjusted, Age, Loaded],
        Ln(Power(30 / Adjusted + 0.035, 2) * Under + 1), Sources.Creep("basic creep"), new(10.0133, 1e-3, Own, 28, 18262 * Day, 28 * Day));

    /// <summary>φ_bc.</summary>
    public static readonly Formula BasicCreep = new(
        "fib-mc-2010.basic-creep", "φ_bc", "basic creep coefficient", Quantity.Ratio, [BasicStrengths, BasicTime], BasicStrengths * BasicTime,
        Sources.Creep("basic creep"), new(1.2955, 5e-4, Own, 0.12938, 10.0133));

    /// <summary>β_dc,fcm.</summary>
    public static readonly Formula DryingStrength = new(
        "fib-mc-2010.beta-dc-fcm", "β_dc,fcm", "influence of strength on drying creep", Quantity.Ratio, [Fcm], 412 / ToThe(Strength, 1.4),
        Sources.Creep("drying creep"), new(2.1284, 1e-3, Own, 43 * Mpa));

    /// <summary>β_dc,RH.</summary>
    public static readonly Formula DryingHumidities = new(
        "fib-mc-2010.beta-dc-rh", "β_dc,RH", "influence of humidity and size on drying creep", Quantity.Ratio, [Humidity, Size],
        (1 - Humidity) / ToThe(0.1 * Thickness / 100, 1.0 / 3), Sources.Creep("drying creep"), new(0.22829, 1e-4, Own, 0.8, 7.8 / 11.6));

    /// <summary>β_dc,t0.</summary>
    public static readonly Formula DryingLoadingAge = new(
        "fib-mc-2010.beta-dc-t0", "β_dc,t0", "influence of the age at loading on drying creep", Quantity.Ratio, [Adjusted], 1 / (0.1 + ToThe(Adjusted, 0.2)),
        Sources.Creep("drying creep"), new(0.48845, 1e-4, Own, 28));

    /// <summary>γ.</summary>
    public static readonly Formula DryingPower = new(
        "fib-mc-2010.gamma", "γ", "power of the development of drying creep", Quantity.Ratio, [Adjusted], 1 / (2.3 + 3.5 / Root(Adjusted)),
        Sources.Creep("drying creep"), new(0.33768, 1e-4, Own, 28));

    /// <summary>β_h.</summary>
    public static readonly Formula DryingSpread = new(
        "fib-mc-2010.beta-h", "β_h", "days that spread drying creep over time, from size and strength", Quantity.Ratio, [Size, Fcm],
        Smaller(1.5 * Thickness + 250 * Root(35 / Strength), 1500 * Root(35 / Strength)), Sources.Creep("drying creep"),
        new(1234.16, 0.05, Own, 7.8 / 11.6, 43 * Mpa));

    /// <summary>β_dc,t.</summary>
    public static readonly Formula DryingDevelopment = new(
        "fib-mc-2010.beta-dc-t", "β_dc,t", "development of drying creep with time under load", Quantity.Ratio, [Age, Loaded, BetaH, Gamma],
        ToThe(Under / (BetaH + Under), Gamma), Sources.Creep("drying creep"), new(0.5, 1e-12, "own arithmetic: half-way with power one", 1028 * Day, 28 * Day, 1000, 1));

    /// <summary>φ_dc.</summary>
    public static readonly Formula DryingCreep = new(
        "fib-mc-2010.drying-creep", "φ_dc", "drying creep coefficient", Quantity.Ratio, [DryingStrengths, DryingHumidity, DryingAge, DryingTime],
        DryingStrengths * DryingHumidity * DryingAge * DryingTime, Sources.Creep("drying creep"), new(0.2321, 5e-4, Own, 2.1284, 0.22829, 0.48845, 0.978));

    /// <summary>φ.</summary>
    public static readonly Formula Coefficient = new(
        "fib-mc-2010.phi", "φ", "creep coefficient, basic and drying creep", Quantity.Ratio, [Basic, Drying], Basic + Drying, Sources.Creep("sum"),
        new(1.527, 1e-9, Own, 1.295, 0.232));
}
