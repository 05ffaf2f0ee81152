using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.En1992Part1To1Of2004;

/// <summary>3.1.2 to 3.1.4: moduli.</summary>
internal static class ModulusFormulas
{
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Reference = new("E_0", "modulus at a mean strength of 10 MPa", Quantity.Stress);
    private static readonly Operand Secant = new("E_cm", "secant modulus", Quantity.Stress);
    private static readonly Operand Tangent = new("E_c", "tangent modulus at 28 days", Quantity.Stress);
    private static readonly Operand Cement = new("s", "figure of the cement", Quantity.Ratio);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand BetaCc = new("β_cc", "strength at that age over that at 28 days", Quantity.Ratio);

    private const double Day = 86400, Gpa = 1e9, Mpa = 1e6;

    /// <summary>E_cm, quartzite aggregate.</summary>
    public static readonly Formula SecantModulus = new(
        "en-1992-1-1-2004.ecm", "E_cm", "secant modulus, quartzite aggregate", Quantity.Stress, [Reference, Fcm],
        Reference * ToThe(InUnits(Fcm, Unit.Megapascal) / 10, 0.3), Sources.Modulus("table 3.1"), new(34.077 * Gpa, 0.0005 * Gpa, "own arithmetic", 22 * Gpa, 43 * Mpa));

    /// <summary>E_c, to which the creep coefficient belongs.</summary>
    public static readonly Formula TangentModulus = new(
        "en-1992-1-1-2004.ec", "E_c", "tangent modulus, to which the creep coefficient belongs", Quantity.Stress, [Secant], 1.05 * Secant,
        Sources.Modulus("3.1.4(2)"), new(35.781 * Gpa, 0.0005 * Gpa, "own arithmetic", 34.077 * Gpa));

    /// <summary>β_cc.</summary>
    public static readonly Formula StrengthDevelopment = new(
        "en-1992-1-1-2004.beta-cc", "β_cc", "strength at that age over that at 28 days", Quantity.Ratio, [Cement, Age],
        Exp(Cement * (1 - Root(28 / InUnits(Age, Unit.Day)))), Sources.Quoted("3.1.2(6)"), new(0.7788, 5e-5, "own arithmetic: e to the power of minus a quarter", 0.25, 7 * Day));

    /// <summary>E_c(t).</summary>
    public static readonly Formula AtAge = new(
        "en-1992-1-1-2004.ec-at-age", "E_c(t)", "tangent modulus at that age", Quantity.Stress, [BetaCc, Tangent], ToThe(BetaCc, 0.3) * Tangent,
        Sources.Quoted("3.1.3(3), (3.5)"), new(33.196 * Gpa, 0.005 * Gpa, "own arithmetic", 0.7788, 35.781 * Gpa));
}
