using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Causes;

/// <summary>How the strain of deck segments still to come moves a joint: opening parts count in opening only, closing parts in closing only.</summary>
public static class ShorteningMovements
{
    private static readonly Operand Remaining = new("ε_r", "strain still to come after setting", Quantity.Strain);
    private static readonly Operand Length = new("L", "expansion length of the joint for this segment", Quantity.Length);
    private static readonly Operand Part = new("Δ_j", "part of one segment", Quantity.Movement);

    private static readonly Provenance OneCurve = Provenance.Derived("what is still to come is the difference of one curve from setting to the end of life");

    /// <summary>How far the shortening of one segment opens a joint.</summary>
    public static readonly Formula Opens = new(
        "shortening.opens", "Δ_j", "opening by the shortening of one segment", Quantity.Movement, [Remaining, Length],
        Positive(Remaining * Length, Quantity.Movement), OneCurve, new(0.0048768, 1e-7,
            "own arithmetic: 160 millionths of 30.48 m are 4.8768 mm", 160e-6, 30.48));

    /// <summary>How far the shortening of one segment closes a joint whose face it pulls toward the other.</summary>
    public static readonly Formula Closes = new(
        "shortening.closes", "Δ_j", "closing by the shortening of one segment", Quantity.Movement, [Remaining, Length],
        Positive(-1 * (Remaining * Length), Quantity.Movement), OneCurve, new(0.001, 1e-9, "own arithmetic", 100e-6, -10));

    /// <summary>All segments that open.</summary>
    public static readonly Formula SumOpens = new(
        "shortening.opens-by", "Δ_opens", "the joint opens by shortening still to come", Quantity.Movement, [Part], Total(Part),
        Provenance.Derived("opening parts count in opening only"), new(0.03, 1e-12, "own arithmetic", 0.01, 0.02));

    /// <summary>All segments that close.</summary>
    public static readonly Formula SumCloses = new(
        "shortening.closes-by", "Δ_closes", "the joint closes by shortening still to come", Quantity.Movement, [Part], Total(Part),
        Provenance.Derived("closing parts count in closing only"), new(0.03, 1e-12, "own arithmetic", 0.01, 0.02));
}
