using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

using Shared = JointPlanner.Codes.ModelCode2010.ShrinkageFormulas;

namespace JointPlanner.Codes.En1992Part1To1Of2023;

/// <summary>Annex B.6: as the model code, but with the humidity related to the one at which the concrete neither dries nor swells. National factors are 1.</summary>
internal static class ShrinkageFormulas
{
    private const string Id = "en-1992-1-1-2023.";

    private static readonly Operand Humidity = new("RH", "relative humidity", Quantity.Ratio);
    private static readonly Operand Fcm = new("f_cm", "mean cylinder strength", Quantity.Stress);
    private static readonly Operand Equilibrium = new("RH_eq", "humidity of equilibrium", Quantity.Ratio);

    public static readonly Formula NotionalBasic = Shared.NotionalBasic.Restated(Id + "notional-basic", Sources.Shrinkage("basic shrinkage"));
    public static readonly Formula BasicDevelopment = Shared.BasicDevelopment.Restated(Id + "beta-bs", Sources.Shrinkage("basic shrinkage"));
    public static readonly Formula BasicShrinkage = Shared.BasicShrinkage.Restated(Id + "basic-shrinkage", Sources.Quoted("(B.24), national factor 1"));
    public static readonly Formula NotionalDrying = Shared.NotionalDrying.Restated(Id + "notional-drying", Sources.Shrinkage("drying shrinkage"));
    public static readonly Formula DryingDevelopment = Shared.DryingDevelopment.Restated(Id + "beta-ds", Sources.Shrinkage("drying shrinkage"));
    public static readonly Formula DryingShrinkage = Shared.DryingShrinkage.Restated(Id + "drying-shrinkage", Sources.Shrinkage("drying shrinkage, national factor 1"));
    public static readonly Formula Total = Shared.Total.Restated(Id + "shrinkage", Sources.Quoted("(B.23)"));

    /// <summary>RH_eq.</summary>
    public static readonly Formula EquilibriumHumidity = new(
        Id + "equilibrium-humidity", "RH_eq", "humidity at which the concrete neither dries nor swells", Quantity.Ratio, [Fcm],
        Smaller(0.99, 0.99 * ToThe(35 / InUnits(Fcm, Unit.Megapascal), 0.1)), Sources.Shrinkage("drying shrinkage"),
        new(0.969829, 5e-7, ModelCode2010.Sources.SecondGeneration, 43e6));

    /// <summary>β_RH.</summary>
    public static readonly Formula HumidityInfluence = new(
        Id + "beta-rh", "β_RH", "influence of humidity on drying shrinkage, negative where the concrete swells", Quantity.Ratio, [Humidity, Equilibrium],
        1.55 * (1 - Power(Humidity / Equilibrium, 3)), Sources.Shrinkage("drying shrinkage"),
        new(0.6800061, 5e-8, ModelCode2010.Sources.SecondGeneration, 0.8, 0.96982897));
}
