using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>The window of openings that may be set, the value that is recommended, and how far off it may be.</summary>
public static class SettingFormulas
{
    private static readonly Operand Cos = new("cos β", "cosine of the skew", Quantity.Ratio);
    private static readonly Operand Part = new("r", "movement along the deck per degree, one segment", Quantity.Rate);
    private static readonly Operand Limit = new("G", "limit of the gap, normal to the joint", Quantity.Opening);
    private static readonly Operand Closes = new("C", "how far the joint still closes, normal to it", Quantity.Movement);
    private static readonly Operand Opens = new("O", "how far the joint still opens, normal to it", Quantity.Movement);
    private static readonly Operand LowEnd = new("G_1", "least opening by one limit", Quantity.Opening);
    private static readonly Operand HighEnd = new("G_2", "greatest opening by one limit", Quantity.Opening);
    private static readonly Operand Least = new("G_lo", "least opening that may be set", Quantity.Opening);
    private static readonly Operand Greatest = new("G_hi", "greatest opening that may be set", Quantity.Opening);
    private static readonly Operand Middle = new("G_m", "middle of the window", Quantity.Opening);
    private static readonly Operand ByRule = new("G_rule", "opening by the rule, before rounding", Quantity.Opening);
    private static readonly Operand Step = new("δ", "step of rounding", Quantity.Opening);
    private static readonly Operand OfTolerance = new("δ_t", "step of rounding of the tolerance", Quantity.Opening);
    private static readonly Operand Set = new("G_set", "opening to set, normal to the joint", Quantity.Opening);
    private static readonly Operand SetAlong = new("W_set", "opening to set, along the road", Quantity.Opening);
    private static readonly Operand Reserve = new("U", "reserve for what cannot be known exactly on the day", Quantity.Movement);
    private static readonly Operand Sigmas = new("k_U", "standard deviations in the reserve", Quantity.Ratio);
    private static readonly Operand WindowRate = new("k_w", "slope of the window, normal to the joint, without factor", Quantity.Rate);
    private static readonly Operand OfTemperature = new("u_T", "standard deviation of the temperature of the structure", Quantity.TemperatureDifference);
    private static readonly Operand OfMeasure = new("u_m", "standard deviation of the measured gap", Quantity.Movement);
    private static readonly Operand OfRemaining = new("u_r", "standard deviation of the movement still to come", Quantity.Movement);
    private static readonly Operand Distance = new("D", "distance from the opening as set to the end of the window that comes nearer", Quantity.Opening);
    private static readonly Operand Rate = new("k", "how much the normal opening closes per degree of warming, without factor", Quantity.Rate);

    private static readonly Provenance Window = Provenance.Derived("after all its closing the gap must not be below a lower limit, after all its opening not above an upper one");
    private static readonly Provenance Rounding = Provenance.Derived("to the nearest step; a half goes toward the middle of the window");
    private static readonly Provenance OffSet = Provenance.Derived("what is left between the value set and the end of the window after the reserve, rounded toward zero");

    /// <summary>k, by the code's coefficient.</summary>
    public static readonly Formula Slope = new(
        "setting.rate", "k", "how much the normal opening closes per degree of warming, without factor", Quantity.Rate, [Cos, Part],
        Cos * Total(Part), Provenance.Derived("rates of the segments at the joint, seen normal to it"), new(0.9e-3, 1e-12, "own arithmetic", 0.9, 0.6e-3, 0.4e-3));

    /// <summary>Slope of the window, by the larger of the code's coefficient and the best estimate.</summary>
    public static readonly Formula WindowSlope = new(
        "setting.window-rate", "k_w", "slope of the window, normal to the joint, without factor", Quantity.Rate, [Cos, Part],
        Cos * Total(Part), Provenance.Derived("rates of the segments at the joint, seen normal to it"), new(0.9e-3, 1e-12, "own arithmetic", 0.9, 0.6e-3, 0.4e-3));

    /// <summary>Least opening by one lower limit.</summary>
    public static readonly Formula AboveLower = new(
        "setting.above-lower-limit", "G_1", "least opening that may be set, by one lower limit", Quantity.Opening, [Limit, Closes], Limit + Closes,
        Window, new(0.0508, 1e-9, "own arithmetic", 0.0127, 0.0381));

    /// <summary>Greatest opening by one upper limit.</summary>
    public static readonly Formula BelowUpper = new(
        "setting.below-upper-limit", "G_2", "greatest opening that may be set, by one upper limit", Quantity.Opening, [Limit, Opens], Limit - Opens,
        Window, new(0.0635, 1e-9, "own arithmetic", 0.1016, 0.0381));

    /// <summary>G_lo.</summary>
    public static readonly Formula LeastOpening = new(
        "setting.least", "G_lo", "least opening that may be set, normal to the joint", Quantity.Opening, [LowEnd], Largest(LowEnd),
        Window, new(0.0381, 1e-12, "own arithmetic", 0.028, 0.0381));

    /// <summary>G_hi.</summary>
    public static readonly Formula GreatestOpening = new(
        "setting.greatest", "G_hi", "greatest opening that may be set, normal to the joint", Quantity.Opening, [HighEnd], Smallest(HighEnd),
        Window, new(0.0652, 1e-12, "own arithmetic", 0.0713, 0.0652));

    /// <summary>Middle of the window.</summary>
    public static readonly Formula MiddleOfWindow = new(
        "setting.middle", "G_m", "middle of the window, normal to the joint", Quantity.Opening, [Least, Greatest], 0.5 * (Least + Greatest),
        Provenance.Derived("as far from one end as from the other"), new(0.045, 1e-12, "own arithmetic", 0.03, 0.06));

    /// <summary>U.</summary>
    public static readonly Formula ReserveOfTheDay = new(
        "setting.reserve", "U", "reserve for what cannot be known exactly on the day", Quantity.Movement,
        [Sigmas, WindowRate, OfTemperature, OfMeasure, OfRemaining],
        Sigmas * Root(Power(WindowRate * OfTemperature, 2) + Power(OfMeasure, 2) + Power(OfRemaining, 2)),
        Provenance.Derived("independent uncertainties add by their squares"), new(2.6e-3, 1e-9, "own arithmetic", 2, 0.5e-3, 1, 1.2e-3, 0));

    /// <summary>The value to set.</summary>
    public static readonly Formula Rounded = new(
        "setting.rounded", "G_set", "opening to set, normal to the joint", Quantity.Opening, [ByRule, Middle, Step],
        Choose(ByRule, Relation.AtLeast, Middle,
            RoundTo(ByRule - (0.5 * Step), Step, Formulas.Rounding.Up),
            RoundTo(ByRule + (0.5 * Step), Step, Formulas.Rounding.Down)),
        Rounding, new(0.047, 1e-9, "own arithmetic: a half above the middle goes down", 0.0475, 0.040, 0.001));

    /// <summary>How much smaller.</summary>
    public static readonly Formula Minus = new(
        "setting.minus", "t_−", "how much smaller than set the opening may be made", Quantity.Movement, [Set, Least, Reserve, OfTolerance],
        RoundTo(Set - Least - Reserve, OfTolerance, Formulas.Rounding.TowardZero), OffSet, new(0.005, 1e-9, "own arithmetic", 0.047, 0.0398, 0.0016, 0.001));

    /// <summary>How much larger.</summary>
    public static readonly Formula Plus = new(
        "setting.plus", "t_+", "how much larger than set the opening may be made", Quantity.Movement, [Greatest, Set, Reserve, OfTolerance],
        RoundTo(Greatest - Set - Reserve, OfTolerance, Formulas.Rounding.TowardZero), OffSet, new(0.009, 1e-9, "own arithmetic", 0.0582, 0.047, 0.0016, 0.001));

    /// <summary>The value to set, measured along the road.</summary>
    public static readonly Formula RoundedAlong = new(
        "setting.rounded-along", "W_set", "opening to set, along the road", Quantity.Opening, [ByRule, Middle, Cos, Step],
        Choose(ByRule, Relation.AtLeast, Middle,
            RoundTo((ByRule / Cos) - (0.5 * Step), Step, Formulas.Rounding.Up),
            RoundTo((ByRule / Cos) + (0.5 * Step), Step, Formulas.Rounding.Down)),
        Rounding, new(0.053, 1e-9, "own arithmetic", 0.0475, 0.040, 0.9, 0.001));

    /// <summary>How much smaller, along the road.</summary>
    public static readonly Formula MinusAlong = new(
        "setting.minus-along", "t_−", "how much smaller than set the opening may be made, along the road", Quantity.Movement,
        [SetAlong, Least, Reserve, Cos, OfTolerance], RoundTo(SetAlong - ((Least + Reserve) / Cos), OfTolerance, Formulas.Rounding.TowardZero), OffSet,
        new(0.007, 1e-9, "own arithmetic", 0.053, 0.0398, 0.0016, 0.9, 0.001));

    /// <summary>How much larger, along the road.</summary>
    public static readonly Formula PlusAlong = new(
        "setting.plus-along", "t_+", "how much larger than set the opening may be made, along the road", Quantity.Movement,
        [Greatest, SetAlong, Reserve, Cos, OfTolerance], RoundTo(((Greatest - Reserve) / Cos) - SetAlong, OfTolerance, Formulas.Rounding.TowardZero), OffSet,
        new(0.009, 1e-9, "own arithmetic", 0.0582, 0.053, 0.0016, 0.9, 0.001));

    /// <summary>Drift that may still follow the setting.</summary>
    public static readonly Formula Drift = new(
        "setting.drift", "ΔT_all", "change of temperature that may follow before the joint is fixed", Quantity.TemperatureDifference,
        [Distance, Reserve, Rate], (Distance - Reserve) / Larger(Rate, new Zero(Quantity.Rate) - Rate),
        Provenance.Derived("while the opening is held, the window moves past it by k per degree"),
        new(3.1584, 1e-3, "own arithmetic: 1/8 in at 0.02199 in/°F is 5.7 °F", 0.003175, 0, 1.00525e-3));
}
