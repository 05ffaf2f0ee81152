using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes;

/// <summary>Effective temperatures that the designer gives directly, with the warming allowance on the maximum.</summary>
internal static class GivenTemperatures
{
    private static readonly Operand Max = new("T_e,max", "highest effective temperature given", Quantity.Temperature);
    private static readonly Operand Warming = new("ΔT_w", "warming allowance, on the maximum only", Quantity.TemperatureDifference);

    /// <summary>Highest temperature with the warming allowance.</summary>
    public static readonly Formula Warmed = new(
        "temperature.with-warming", "T_max", "highest temperature with the warming allowance", Quantity.Temperature, [Max, Warming],
        Max + Warming, Provenance.Derived("a warming climate raises the maximum; it never raises the minimum"), new(38, 0.5, "own arithmetic", 36, 2));

    /// <summary>The range; null where either end is missing.</summary>
    public static TemperatureRange? Of(Plan plan, Derivation derivation)
    {
        if (plan.Climate is not { EffectiveMin: { } min, EffectiveMax: { } max } climate) return null;
        return new TemperatureRange(
            derivation.Given("climate/effective-min", "T_min", "lowest effective temperature, given", Quantity.Temperature, min, climate.Source),
            WithWarming(derivation.Given("climate/effective-max", "T_max", "highest effective temperature, given", Quantity.Temperature, max, climate.Source), plan, derivation));
    }

    /// <summary>A maximum with the plan's warming allowance, where there is one.</summary>
    public static Number WithWarming(Number max, Plan plan, Derivation derivation) => plan.Climate.Warming == 0
        ? max
        : derivation.Use(Warmed, "", max, derivation.Given(
            "climate/warming", "ΔT_w", Warming.Meaning, Quantity.TemperatureDifference, plan.Climate.Warming, plan.Climate.Source));
}
