using JointPlanner.Engine.Formulas;
using Shared = JointPlanner.Codes.ModelCode2010.CreepFormulas;

namespace JointPlanner.Codes.En1992Part1To1Of2023;

/// <summary>Annex B.5: the expressions that the model code prints too, under this edition's own equations.</summary>
internal static class CreepFormulas
{
    private const string Id = "en-1992-1-1-2023.";

    public static readonly Formula MeanStrength = Shared.MeanStrength.Restated(Id + "mean-strength", Sources.Modulus("mean strength"));
    public static readonly Formula AdjustedAge = Shared.AdjustedAge.Restated(Id + "adjusted-age", Sources.Quoted("(B.17)"));
    public static readonly Formula BasicStrength = Shared.BasicStrength.Restated(Id + "beta-bc-fcm", Sources.Quoted("(B.7)"));
    public static readonly Formula BasicDevelopment = Shared.BasicDevelopment.Restated(Id + "beta-bc-t", Sources.Quoted("(B.8)"));
    public static readonly Formula BasicCreep = Shared.BasicCreep.Restated(Id + "basic-creep", Sources.Quoted("(B.6)"));
    public static readonly Formula DryingStrength = Shared.DryingStrength.Restated(Id + "beta-dc-fcm", Sources.Quoted("(B.10)"));
    public static readonly Formula DryingHumidities = Shared.DryingHumidities.Restated(Id + "beta-dc-rh", Sources.Quoted("(B.11)"));
    public static readonly Formula DryingLoadingAge = Shared.DryingLoadingAge.Restated(Id + "beta-dc-t0", Sources.Quoted("(B.12)"));
    public static readonly Formula DryingDevelopment = Shared.DryingDevelopment.Restated(Id + "beta-dc-t", Sources.Quoted("(B.13)"));
    public static readonly Formula DryingPower = Shared.DryingPower.Restated(Id + "gamma", Sources.Quoted("(B.14)"));
    public static readonly Formula DryingSpread = Shared.DryingSpread.Restated(Id + "beta-h", Sources.Quoted("(B.15)"));
    public static readonly Formula DryingCreep = Shared.DryingCreep.Restated(Id + "drying-creep", Sources.Quoted("(B.9)"));
    public static readonly Formula Coefficient = Shared.Coefficient.Restated(Id + "phi", Sources.Quoted("(B.5)"));
}
