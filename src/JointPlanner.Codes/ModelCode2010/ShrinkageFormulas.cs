using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.ModelCode2010;

/// <summary>Basic and drying shrinkage, shortening positive.</summary>
internal static class ShrinkageFormulas
{
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Humidity = new("RH", "relative humidity", Quantity.Ratio);
    private static readonly Operand Size = new("h_0", "notional size", Quantity.Size);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand CuringEnd = new("t_s", "age at the end of curing", Quantity.Age);
    private static readonly Operand BasicCement = new("α_bs", "figure of the cement", Quantity.Ratio);
    private static readonly Operand Cement1 = new("α_ds1", "figure of the cement", Quantity.Ratio);
    private static readonly Operand Cement2 = new("α_ds2", "figure of the cement", Quantity.Ratio);
    private static readonly Operand Limit = new("RH_sw", "humidity from which the concrete swells", Quantity.Ratio);
    private static readonly Operand BasicNotional = new("ε_cbs,0", "notional basic shrinkage", Quantity.Strain);
    private static readonly Operand BetaBs = new("β_bs", "development of basic shrinkage", Quantity.Ratio);
    private static readonly Operand DryingNotional = new("ε_cds,0", "notional drying shrinkage", Quantity.Strain);
    private static readonly Operand BetaRh = new("β_RH", "influence of humidity", Quantity.Ratio);
    private static readonly Operand BetaDs = new("β_ds", "development of drying shrinkage", Quantity.Ratio);
    private static readonly Operand Basic = new("ε_cbs", "basic shrinkage", Quantity.Strain);
    private static readonly Operand Drying = new("ε_cds", "drying shrinkage", Quantity.Strain);

    private const double Day = 86400, Mpa = 1e6;
    private const string Check = Sources.SecondGeneration;

    private static readonly Expression Strength = InUnits(Fcm, Unit.Megapascal), Dried = InUnits(Positive(Age - CuringEnd, Quantity.Age), Unit.Day);

    /// <summary>Notional basic shrinkage.</summary>
    public static readonly Formula NotionalBasic = new(
        "fib-mc-2010.notional-basic", "ε_cbs,0", "notional basic shrinkage", Quantity.Strain, [BasicCement, Fcm],
        BasicCement * ToThe(0.1 * Strength / (6 + 0.1 * Strength), 2.5) * 1e-6, Sources.Shrinkage("basic shrinkage"), new(7.88272e-5, 5e-11, Check, 700, 43 * Mpa));

    /// <summary>β_bs.</summary>
    public static readonly Formula BasicDevelopment = new(
        "fib-mc-2010.beta-bs", "β_bs", "development of basic shrinkage with age", Quantity.Ratio, [Age], 1 - Exp(-0.2 * Root(InUnits(Age, Unit.Day))),
        Sources.Shrinkage("basic shrinkage"), new(0.8270915, 5e-8, Check, 77 * Day));

    /// <summary>ε_cbs.</summary>
    public static readonly Formula BasicShrinkage = new(
        "fib-mc-2010.basic-shrinkage", "ε_cbs", "basic shrinkage", Quantity.Strain, [BasicNotional, BetaBs], BasicNotional * BetaBs,
        Sources.Shrinkage("basic shrinkage"), new(6.51973e-5, 5e-11, Check, 7.88272e-5, 0.8270915));

    /// <summary>Notional drying shrinkage.</summary>
    public static readonly Formula NotionalDrying = new(
        "fib-mc-2010.notional-drying", "ε_cds,0", "notional drying shrinkage", Quantity.Strain, [Cement1, Cement2, Fcm],
        (220 + 110 * Cement1) * Exp(-1 * Cement2 * Strength) * 1e-6, Sources.Shrinkage("drying shrinkage"), new(3.939562e-4, 5e-11, Check, 4, 0.012, 43 * Mpa));

    /// <summary>Humidity from which the concrete swells.</summary>
    public static readonly Formula SwellingHumidity = new(
        "fib-mc-2010.swelling-humidity", "RH_sw", "humidity from which the concrete swells", Quantity.Ratio, [Fcm], Smaller(0.99 * ToThe(35 / Strength, 0.1), 0.99),
        Sources.Shrinkage("drying shrinkage"), new(0.969829, 5e-7, Check, 43 * Mpa));

    /// <summary>β_RH.</summary>
    public static readonly Formula HumidityInfluence = new(
        "fib-mc-2010.beta-rh", "β_RH", "influence of humidity on drying shrinkage, negative where the concrete swells", Quantity.Ratio, [Humidity, Limit],
        Choose(Humidity, Relation.Below, Limit, 1.55 * (1 - Power(Humidity, 3)), -0.25), Sources.Shrinkage("drying shrinkage"), new(0.7564, 1e-9, "own arithmetic", 0.8, 0.97));

    /// <summary>β_ds.</summary>
    public static readonly Formula DryingDevelopment = new(
        "fib-mc-2010.beta-ds", "β_ds", "development of drying shrinkage with time since the end of curing", Quantity.Ratio, [Age, CuringEnd, Size],
        Root(Dried / (0.035 * Power(InUnits(Size, Unit.Millimetre), 2) + Dried)), Sources.Shrinkage("drying shrinkage"),
        new(0.0691347, 5e-8, Check, 77 * Day, Day, 7.8 / 11.6));

    /// <summary>ε_cds.</summary>
    public static readonly Formula DryingShrinkage = new(
        "fib-mc-2010.drying-shrinkage", "ε_cds", "drying shrinkage", Quantity.Strain, [DryingNotional, BetaRh, BetaDs], DryingNotional * BetaRh * BetaDs,
        Sources.Shrinkage("drying shrinkage"), new(1.852067e-5, 5e-11, Check, 3.939562e-4, 0.6800061, 0.0691347));

    /// <summary>ε_cs.</summary>
    public static readonly Formula Total = new(
        "fib-mc-2010.shrinkage", "ε_cs", "shrinkage since concreting, shortening positive", Quantity.Strain, [Basic, Drying], Basic + Drying,
        Sources.Shrinkage("sum"), new(8.371798e-5, 5e-11, Check, 6.51973e-5, 1.852067e-5));
}
