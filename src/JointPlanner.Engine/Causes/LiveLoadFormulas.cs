using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Causes;

/// <summary>From ordinates of an influence line to the movement under traffic.</summary>
public static class LiveLoadFormulas
{
    private static readonly Operand Force = new("P", "axle load", Quantity.Force);
    private static readonly Operand Ordinate = new("y_P", "ordinate of the influence line under the axle, closing positive", Quantity.Flexibility);
    private static readonly Operand AxlePart = new("Δ_P", "closing by one axle", Quantity.Movement);
    private static readonly Operand Uniform = new("q", "load per length", Quantity.LineLoad);
    private static readonly Operand Area = new("A_y", "area of the influence line over the loaded lengths, closing positive", Quantity.InfluenceArea);
    private static readonly Operand TrainFactor = new("f_P", "factor on the train", Quantity.Ratio);
    private static readonly Operand UniformFactor = new("f_q", "factor on the load per length", Quantity.Ratio);
    private static readonly Operand TrainPart = new("Δ_ΣP", "closing by the train, without factor", Quantity.Movement);
    private static readonly Operand UniformPart = new("Δ_q", "closing by the load per length, without factor", Quantity.Movement);
    private static readonly Operand Closing = new("c", "closing by traffic where it stands worst", Quantity.Movement);
    private static readonly Operand Lanes = new("n", "number of lanes loaded", Quantity.Count);
    private static readonly Operand Presence = new("m", "factor for several lanes at once", Quantity.Ratio);
    private static readonly Operand Dynamic = new("φ", "dynamic factor", Quantity.Ratio);
    private static readonly Operand Loaded = new("n·m", "lanes that count", Quantity.Ratio);

    private static readonly Provenance Line = Provenance.Derived("superposition by the influence line of the frame");

    /// <summary>One axle.</summary>
    public static readonly Formula ByAxle = new("live-load.axle", "Δ_P", "closing by one axle", Quantity.Movement, [Force, Ordinate], Force * Ordinate, Line,
        new(0.00145, 1e-12, "own arithmetic", 145e3, 1e-8));

    /// <summary>All axles.</summary>
    public static readonly Formula ByTrain = new("live-load.train", "Δ_ΣP", "closing by the train, without factor", Quantity.Movement, [AxlePart],
        Total(AxlePart), Line, new(0.003, 1e-12, "own arithmetic", 0.001, 0.002));

    /// <summary>The load per length.</summary>
    public static readonly Formula ByUniform = new("live-load.uniform", "Δ_q", "closing by the load per length, without factor", Quantity.Movement,
        [Uniform, Area], Uniform * Area, Line, new(0.00093, 1e-12, "own arithmetic", 9.3e3, 1e-7));

    /// <summary>Both.</summary>
    public static readonly Formula ByBoth = new("live-load.closing", "c", "closing by traffic where it stands worst", Quantity.Movement,
        [TrainFactor, TrainPart, UniformFactor, UniformPart], TrainFactor * TrainPart + UniformFactor * UniformPart, Line,
        new(0.00499, 1e-12, "own arithmetic", 1.33, 0.003, 1, 0.001));

    /// <summary>Closes by.</summary>
    public static readonly Formula ClosesBy = new("live-load.closes-by", "Δ_closes", "the joint closes by, traffic where it stands worst", Quantity.Movement,
        [Closing], Positive(Closing, Quantity.Movement), Line, new(0.003, 1e-12, "own arithmetic", 0.003));

    /// <summary>Opens by.</summary>
    public static readonly Formula OpensBy = new("live-load.opens-by", "Δ_opens", "the joint opens by, traffic where it stands worst", Quantity.Movement,
        [Closing], Positive(-1 * Closing, Quantity.Movement), Line, new(0.003, 1e-12, "own arithmetic", -0.003));

    /// <summary>Lanes with their presence factor.</summary>
    public static readonly Formula LanesThatCount = new("live-load.lanes", "n·m", "lanes that count", Quantity.Ratio, [Lanes, Presence], Lanes * Presence,
        Provenance.Derived("every lane carries the same, each with the factor for several lanes at once"), new(2, 1e-12, "own arithmetic", 2, 1));

    /// <summary>Lanes with impact.</summary>
    public static readonly Formula WithImpact = new("live-load.lanes-with-impact", "f_P", "factor on the train: lanes that count times the dynamic factor", Quantity.Ratio,
        [Loaded, Dynamic], Loaded * Dynamic, Provenance.Derived("the dynamic factor is on trains alone"), new(2.66, 1e-12, "own arithmetic", 2, 1.33));
}
