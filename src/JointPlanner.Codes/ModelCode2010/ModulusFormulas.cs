using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.ModelCode2010;

/// <summary>Moduli.</summary>
internal static class ModulusFormulas
{
    private static readonly Operand Reference = new("E_c0", "modulus at a mean strength of 10 MPa", Quantity.Stress);
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Cement = new("s", "figure of the cement", Quantity.Ratio);
    private static readonly Operand Age = new("t", "age", Quantity.Age);
    private static readonly Operand BetaCc = new("β_cc", "strength at that age over that at 28 days", Quantity.Ratio);
    private static readonly Operand At28 = new("E_ci", "tangent modulus at 28 days", Quantity.Stress);

    private const double Day = 86400, Gpa = 1e9, Mpa = 1e6;

    /// <summary>E_ci, quartzite aggregate.</summary>
    public static readonly Formula Tangent = new(
        "fib-mc-2010.eci", "E_ci", "tangent modulus at 28 days, to which the creep coefficient belongs", Quantity.Stress, [Reference, Fcm],
        Reference * ToThe(InUnits(Fcm, Unit.Megapascal) / 10, 1.0 / 3), Sources.Modulus("modulus"), new(34.96 * Gpa, 0.005 * Gpa, "own arithmetic", 21.5 * Gpa, 43 * Mpa));

    /// <summary>β_cc.</summary>
    public static readonly Formula StrengthDevelopment = new(
        "fib-mc-2010.beta-cc", "β_cc", "strength at that age over that at 28 days", Quantity.Ratio, [Cement, Age],
        Exp(Cement * (1 - Root(28 / InUnits(Age, Unit.Day)))), Sources.Modulus("development of strength"), new(0.7788, 5e-5, "own arithmetic", 0.25, 7 * Day));

    /// <summary>E_ci(t).</summary>
    public static readonly Formula AtAge = new(
        "fib-mc-2010.eci-at-age", "E_ci(t)", "tangent modulus at that age", Quantity.Stress, [BetaCc, At28], Root(BetaCc) * At28,
        Sources.Modulus("development of the modulus"), new(30.85 * Gpa, 0.005 * Gpa, "own arithmetic", 0.7788, 34.96 * Gpa));
}
