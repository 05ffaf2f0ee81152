using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.En1992Part1To1Of2023;

/// <summary>Modulus.</summary>
internal static class ModulusFormulas
{
    private static readonly Operand Reference = new("k_E", "modulus at a mean strength of 1 MPa", Quantity.Stress);
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);

    /// <summary>Modulus at 28 days, quartzite aggregate.</summary>
    public static readonly Formula At28Days = new(
        "en-1992-1-1-2023.ecm", "E_c,28", "modulus at 28 days, to which the creep coefficient belongs", Quantity.Stress, [Reference, Fcm],
        Reference * ToThe(InUnits(Fcm, Unit.Megapascal), 1.0 / 3), Sources.Modulus("5.1.4"), new(33.28e9, 0.005e9, "own arithmetic", 9.5e9, 43e6));
}
