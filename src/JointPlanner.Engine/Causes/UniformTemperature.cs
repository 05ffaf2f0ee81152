using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Causes;

/// <summary>Movement by the uniform change of a deck's temperature.</summary>
public static class UniformTemperature
{
    private static readonly Operand Alpha = new("α", "coefficient of thermal expansion", Quantity.Expansion);
    private static readonly Operand Estimate = new("α_eff", "best estimate of the coefficient of expansion of the whole section", Quantity.Expansion);
    private static readonly Operand Length = new("L", "expansion length of the joint for this segment", Quantity.Length);
    private static readonly Operand PerDegree = new("r", "movement per degree, closing when warmer", Quantity.Rate);
    private static readonly Operand Set = new("T_set", "structure temperature at setting", Quantity.Temperature);
    private static readonly Operand Min = new("T_min", "lowest effective temperature", Quantity.Temperature);
    private static readonly Operand Max = new("T_max", "highest effective temperature", Quantity.Temperature);
    private static readonly Operand Cold = new("Δ_cold", "opening by cooling to the lowest temperature", Quantity.Movement);
    private static readonly Operand Hot = new("Δ_hot", "closing by warming to the highest temperature", Quantity.Movement);
    private static readonly Operand Part = new("Δ_j", "part of one segment", Quantity.Movement);

    private static readonly Provenance Bar = Provenance.Derived("free change of length of a bar: α·L per degree");
    private static readonly Provenance Extremes = Provenance.Derived("a joint opens by the larger of what cooling opens and what warming opens, never less than nothing");

    /// <summary>Movement per degree.</summary>
    public static readonly Formula Rate = new(
        "thermal.rate", "r", "movement of the joint per degree along the deck, closing when warmer", Quantity.Rate, [Alpha, Length],
        Alpha * Length, Bar, new(0.72e-3, 1e-9, "own arithmetic: 60 m at 12e-6 per K", 12e-6, 60));

    /// <summary>Coefficient for the slope of the window.</summary>
    public static readonly Formula WindowExpansion = new(
        "thermal.window-expansion", "α_w", "coefficient of expansion for the slope of the window: the larger of the basis's and the best estimate", Quantity.Expansion,
        [Alpha, Estimate], Larger(Alpha, Estimate), Provenance.Derived("on the day the deck moves as it is, so the larger of both is allowed for"),
        new(12e-6, 1e-12, "own arithmetic", 12e-6, 10.4e-6));

    /// <summary>Opening by cooling from setting; negative where cooling closes.</summary>
    public static readonly Formula Cooling = new(
        "thermal.cooling", "Δ_cold", "opening by cooling from setting to the lowest temperature", Quantity.Movement, [PerDegree, Set, Min],
        PerDegree * (Set - Min), Bar, new(0.0216, 1e-9, "own arithmetic", 0.72e-3, 10, -20));

    /// <summary>Closing by warming from setting; negative where warming opens.</summary>
    public static readonly Formula Warming = new(
        "thermal.warming", "Δ_hot", "closing by warming from setting to the highest temperature", Quantity.Movement, [PerDegree, Max, Set],
        PerDegree * (Max - Set), Bar, new(0.0216, 1e-9, "own arithmetic", 0.72e-3, 40, 10));

    /// <summary>Parts of several segments together.</summary>
    public static readonly Formula Sum = new(
        "thermal.sum", "Δ", "parts of all segments that move the joint", Quantity.Movement, [Part],
        Total(Part), Provenance.Derived("movements of the two faces add along the deck"), new(0.03, 1e-12, "own arithmetic", 0.01, 0.02));

    /// <summary>Opens by.</summary>
    public static readonly Formula Opening = new(
        "thermal.opens-by", "Δ_opens", "the joint opens by, uniform temperature", Quantity.Movement, [Cold, Hot],
        Larger(Positive(Cold, Quantity.Movement), -1 * Hot), Extremes, new(0.02, 1e-12, "own arithmetic", 0.02, 0.01));

    /// <summary>Closes by.</summary>
    public static readonly Formula Closing = new(
        "thermal.closes-by", "Δ_closes", "the joint closes by, uniform temperature", Quantity.Movement, [Cold, Hot],
        Larger(Positive(Hot, Quantity.Movement), -1 * Cold), Extremes, new(0.01, 1e-12, "own arithmetic", 0.02, 0.01));
}
