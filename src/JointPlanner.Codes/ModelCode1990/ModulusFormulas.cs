using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.ModelCode1990;

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

    /// <summary>E_ci; within a thousandth of 1.05 times the secant modulus of the prestandard.</summary>
    public static readonly Formula Tangent = new(
        "ceb-fip-mc-1990.eci", "E_ci", "tangent modulus at 28 days, to which the creep coefficient belongs", Quantity.Stress, [Reference, Fcm],
        Reference * ToThe(InUnits(Fcm, Unit.Megapascal) / 10, 1.0 / 3), Sources.Modulus("2.1.4.2"), new(34.96 * Gpa, 0.005 * Gpa, "own arithmetic", 21.5 * Gpa, 43 * Mpa));

    /// <summary>β_cc.</summary>
    public static readonly Formula StrengthDevelopment = new(
        "ceb-fip-mc-1990.beta-cc", "β_cc", "strength at that age over that at 28 days", Quantity.Ratio, [Cement, Age],
        Exp(Cement * (1 - Root(28 / InUnits(Age, Unit.Day)))), Sources.Modulus("2.1.6.1"), new(0.7788, 5e-5, "own arithmetic", 0.25, 7 * Day));

    /// <summary>E_ci(t).</summary>
    public static readonly Formula AtAge = new(
        "ceb-fip-mc-1990.eci-at-age", "E_ci(t)", "tangent modulus at that age", Quantity.Stress, [BetaCc, At28], Root(BetaCc) * At28,
        Sources.Modulus("2.1.6.3"), new(30.85 * Gpa, 0.005 * Gpa, "own arithmetic", 0.7788, 34.96 * Gpa));
}
