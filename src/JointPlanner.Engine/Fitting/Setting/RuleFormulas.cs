using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>Owners' rules for the value to set.</summary>
public static class RuleFormulas
{
    private static readonly Operand Reference = new("G_ref", "opening at the reference temperature, normal to the joint", Quantity.Opening);
    private static readonly Operand Rate = new("k", "how much the normal opening closes per degree of warming, without factor", Quantity.Rate);
    private static readonly Operand Setting = new("T_set", "temperature of the structure at setting", Quantity.Temperature);
    private static readonly Operand AtReference = new("T_ref", "reference temperature", Quantity.Temperature);
    private static readonly Operand Min = new("T_min", "lowest temperature", Quantity.Temperature);
    private static readonly Operand Max = new("T_max", "highest temperature", Quantity.Temperature);
    private static readonly Operand Mid = new("T_mid", "middle temperature", Quantity.Temperature);
    private static readonly Operand Lower = new("G_1", "lower limit in service, normal to the joint", Quantity.Opening);
    private static readonly Operand Upper = new("G_2", "upper limit in service, normal to the joint", Quantity.Opening);
    private static readonly Operand MidGap = new("G_mid", "middle of the limits in service", Quantity.Opening);
    private static readonly Operand StillOpens = new("O_i", "irreversible opening still to come, normal to the joint", Quantity.Movement);
    private static readonly Operand StillCloses = new("C_i", "irreversible closing still to come, normal to the joint", Quantity.Movement);
    private static readonly Operand Cos = new("cos β", "cosine of the skew", Quantity.Ratio);
    private static readonly Operand Along = new("u_i", "irreversible movement along the deck by one cause", Quantity.Movement);
    private static readonly Operand OneMin = new("T_1", "lowest temperature of one segment", Quantity.Temperature);
    private static readonly Operand OneMax = new("T_2", "highest temperature of one segment", Quantity.Temperature);

    private static readonly Provenance InAll = Provenance.Derived("the temperature must be possible for every segment at the joint");
    private static readonly Provenance Centred = Provenance.Derived(
        "centred in the limits at the middle temperature when half of the irreversible movement is over");

    /// <summary>Lowest temperature that every segment can have.</summary>
    public static readonly Formula Lowest = new(
        "setting.lowest-temperature", "T_min", "lowest temperature for which a value is given", Quantity.Temperature, [OneMin], Largest(OneMin),
        InAll, new(-17, 1e-12, "own arithmetic", -28, -17));

    /// <summary>Highest temperature that every segment can have.</summary>
    public static readonly Formula Highest = new(
        "setting.highest-temperature", "T_max", "highest temperature for which a value is given", Quantity.Temperature, [OneMax], Smallest(OneMax),
        InAll, new(32, 1e-12, "own arithmetic", 46, 32));

    /// <summary>By a fixed reference.</summary>
    public static readonly Formula FromReference = new(
        "setting.from-reference", "G_rule", "opening by the owner's reference, normal to the joint", Quantity.Opening,
        [Reference, Rate, Setting, AtReference], Reference - (Rate * (Setting - AtReference)),
        Provenance.Derived("the reference opening carried by the thermal slope, without factor"), new(0.0445, 1e-9, "own arithmetic", 0.05, 0.55e-3, 20, 10));

    /// <summary>Middle of the temperatures.</summary>
    public static readonly Formula MidTemperature = new(
        "setting.mid-temperature", "T_mid", "middle temperature", Quantity.Temperature, [Min, Max], Min + (0.5 * (Max - Min)), Centred,
        new(12.5, 1e-12, "own arithmetic", -11, 36));

    /// <summary>Middle of the limits.</summary>
    public static readonly Formula MiddleOfLimits = new(
        "setting.mid-gap", "G_mid", "middle of the limits in service, normal to the joint", Quantity.Opening, [Lower, Upper], 0.5 * (Lower + Upper),
        Centred, new(0.05715, 1e-9, "own arithmetic", 0.0127, 0.1016));

    /// <summary>Irreversible opening.</summary>
    public static readonly Formula IrreversibleOpening = new(
        "setting.irreversible-opening", "O_i", "irreversible opening still to come, normal to the joint", Quantity.Movement, [Cos, Along],
        Cos * Total(Along), Centred, new(0.0081, 1e-9, "own arithmetic", 0.9, 0.004, 0.005));

    /// <summary>Irreversible closing.</summary>
    public static readonly Formula IrreversibleClosing = new(
        "setting.irreversible-closing", "C_i", "irreversible closing still to come, normal to the joint", Quantity.Movement, [Cos, Along],
        Cos * Total(Along), Centred, new(0.0081, 1e-9, "own arithmetic", 0.9, 0.004, 0.005));

    /// <summary>By the middle of the range.</summary>
    public static readonly Formula FromMidRange = new(
        "setting.from-mid-range", "G_rule", "opening by the middle of the range, normal to the joint", Quantity.Opening,
        [MidGap, Rate, Setting, Mid, StillOpens, StillCloses],
        MidGap - (Rate * (Setting - Mid)) - (0.5 * (StillOpens - StillCloses)), Centred,
        new(0.05, 1e-9, "own arithmetic", 0.057, 0.5e-3, 20, 10, 0.004, 0));

    /// <summary>By spreading the working range over the range of temperature.</summary>
    public static readonly Formula FromRangeShare = new(
        "setting.from-range-share", "G_rule", "opening by spreading the limits over the temperatures, normal to the joint", Quantity.Opening,
        [Upper, Lower, Setting, Min, Max], Upper - ((Upper - Lower) * ((Setting - Min) / (Max - Min))),
        Provenance.Derived("the owner's rule: greatest opening at the lowest temperature, least at the highest, linear between"),
        new(0.68026, 1e-4, "own arithmetic, plain numbers for lengths", 0.80, 0.45, 40, 14, 90));
}
