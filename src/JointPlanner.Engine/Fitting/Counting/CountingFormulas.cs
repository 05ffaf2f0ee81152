using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Fitting.Counting;

/// <summary>From the movements of the causes to the factored closing and opening of a joint.</summary>
public static class CountingFormulas
{
    private static readonly Operand Factor = new("γ", "factor on the movement from setting", Quantity.Ratio);
    private static readonly Operand Rate = new("r", "movement along the deck per degree, positive when warming closes the joint", Quantity.Rate);
    private static readonly Operand Max = new("T_max", "highest temperature of the segment", Quantity.Temperature);
    private static readonly Operand Min = new("T_min", "lowest temperature of the segment", Quantity.Temperature);
    private static readonly Operand Setting = new("T_set", "temperature of the structure at setting", Quantity.Temperature);
    private static readonly Operand Doubt = new("S", "allowance for the doubt about the temperature at setting", Quantity.TemperatureDifference);
    private static readonly Operand Movement = new("u", "movement along the deck from setting, without factor", Quantity.Movement);
    private static readonly Operand Part = new("c", "factored movement along the deck by one cause", Quantity.Movement);
    private static readonly Operand Cos = new("cos β", "cosine of the skew", Quantity.Ratio);
    private static readonly Operand Sin = new("sin β", "sine of the skew, without sign", Quantity.Ratio);
    private static readonly Operand Along = new("W", "limit of the gap, along the road", Quantity.Opening);
    private static readonly Operand One = new("R_c", "movement along the joint line while it closes", Quantity.Movement);
    private static readonly Operand Other = new("R_o", "movement along the joint line while it opens", Quantity.Movement);

    private static readonly Provenance FromSetting =
        Provenance.Derived("movement from the setting temperature to the extreme of the range; the factor is on the movement, never on the range");
    private static readonly Provenance Reversed =
        Provenance.Derived("as for other segments, with warming and cooling changed over, because warming of this segment opens the joint");
    private static readonly Provenance Widened =
        Provenance.Derived("the joint may be set this much hotter or colder than expected, so both ends of the range are moved out");
    private static readonly Provenance Components =
        Provenance.Derived("closings are added to closings and openings to openings; skew β is measured from the line square to the deck axis");
    private static readonly Provenance Irreversible = Provenance.Derived("what does not come back counts in its own direction only");

    /// <summary>Highest temperature with the doubt about setting.</summary>
    public static readonly Formula MaxWithDoubt = new(
        "counting.max-with-doubt", "T_max,S", "highest temperature of the segment with the allowance for the doubt about setting",
        Quantity.Temperature, [Max, Doubt], Max + Doubt, Widened, new(46, 1e-9, "own arithmetic", 36, 10));

    /// <summary>Lowest temperature with the doubt about setting.</summary>
    public static readonly Formula MinWithDoubt = new(
        "counting.min-with-doubt", "T_min,S", "lowest temperature of the segment with the allowance for the doubt about setting",
        Quantity.Temperature, [Min, Doubt], Min - Doubt, Widened, new(-21, 1e-9, "own arithmetic", -11, 10));

    /// <summary>Closing by warming.</summary>
    public static readonly Formula ClosingByWarming = new(
        "counting.closing-by-warming", "c_T", "closing along the deck by warming of one segment, factored", Quantity.Movement,
        [Factor, Rate, Max, Setting], Factor * Rate * Positive(Max - Setting, Quantity.TemperatureDifference), FromSetting,
        new(0.0141, 1e-9, "own arithmetic", 1.2, 0.5e-3, 36, 12.5));

    /// <summary>Opening by cooling.</summary>
    public static readonly Formula OpeningByCooling = new(
        "counting.opening-by-cooling", "o_T", "opening along the deck by cooling of one segment, factored", Quantity.Movement,
        [Factor, Rate, Setting, Min], Factor * Rate * Positive(Setting - Min, Quantity.TemperatureDifference), FromSetting,
        new(0.0141, 1e-9, "own arithmetic", 1.2, 0.5e-3, 12.5, -11));

    /// <summary>Closing by cooling, where the rate is negative.</summary>
    public static readonly Formula ClosingByCooling = new(
        "counting.closing-by-cooling", "c_T", "closing along the deck by cooling of a segment whose warming opens the joint, factored",
        Quantity.Movement, [Factor, Rate, Min, Setting], Factor * Rate * (Smaller(Min, Setting) - Setting), Reversed,
        new(0.0141, 1e-9, "own arithmetic", 1.2, -0.5e-3, -11, 12.5));

    /// <summary>Opening by warming, where the rate is negative.</summary>
    public static readonly Formula OpeningByWarming = new(
        "counting.opening-by-warming", "o_T", "opening along the deck by warming of a segment whose warming opens the joint, factored",
        Quantity.Movement, [Factor, Rate, Setting, Max], Factor * Rate * (Setting - Larger(Max, Setting)), Reversed,
        new(0.0141, 1e-9, "own arithmetic", 1.2, -0.5e-3, 12.5, 36));

    /// <summary>Closing by a cause other than temperature.</summary>
    public static readonly Formula OtherClosing = new(
        "counting.closing-by-cause", "c", "closing along the deck by one cause, factored", Quantity.Movement, [Factor, Movement],
        Factor * Movement, Irreversible, new(0.006, 1e-9, "own arithmetic", 1.2, 0.005));

    /// <summary>Opening by a cause other than temperature.</summary>
    public static readonly Formula OtherOpening = new(
        "counting.opening-by-cause", "o", "opening along the deck by one cause, factored", Quantity.Movement, [Factor, Movement],
        Factor * Movement, Irreversible, new(0.006, 1e-9, "own arithmetic", 1.2, 0.005));

    /// <summary>C, normal to the joint.</summary>
    public static readonly Formula Closing = new(
        "counting.closing", "C", "how far the joint still closes, normal to it", Quantity.Movement, [Cos, Part], Cos * Total(Part),
        Components, new(0.0198, 1e-9, "own arithmetic", 0.9, 0.012, 0.010));

    /// <summary>O, normal to the joint.</summary>
    public static readonly Formula Opening = new(
        "counting.opening", "O", "how far the joint still opens, normal to it", Quantity.Movement, [Cos, Part], Cos * Total(Part),
        Components, new(0.0198, 1e-9, "own arithmetic", 0.9, 0.012, 0.010));

    /// <summary>Racking while closing.</summary>
    public static readonly Formula RackingClosing = new(
        "counting.racking-closing", "R_c", "movement along the joint line while it closes", Quantity.Movement, [Sin, Part],
        Sin * Total(Part), Components, new(0.011, 1e-9, "own arithmetic", 0.5, 0.012, 0.010));

    /// <summary>Racking while opening.</summary>
    public static readonly Formula RackingOpening = new(
        "counting.racking-opening", "R_o", "movement along the joint line while it opens", Quantity.Movement, [Sin, Part],
        Sin * Total(Part), Components, new(0.011, 1e-9, "own arithmetic", 0.5, 0.012, 0.010));

    /// <summary>Racking as the larger one-way value.</summary>
    public static readonly Formula RackingOneWay = new(
        "counting.racking-one-way", "R", "movement along the joint line, the larger of both ways from setting", Quantity.Movement,
        [One, Other], Larger(One, Other), Provenance.Derived("a seal is not racked both ways at once"), new(0.011, 1e-9, "own arithmetic", 0.007, 0.011));

    /// <summary>Racking as the total range.</summary>
    public static readonly Formula RackingTotal = new(
        "counting.racking-total", "R", "movement along the joint line, both ways together", Quantity.Movement, [One, Other], One + Other,
        Provenance.Derived("the owner's rules judge racking by its total range"), new(0.018, 1e-9, "own arithmetic", 0.007, 0.011));

    /// <summary>A gap along the road, seen normal to the joint.</summary>
    public static readonly Formula AlongToNormal = new(
        "counting.along-to-normal", "G", "limit of the gap, normal to the joint", Quantity.Opening, [Along, Cos], Along * Cos,
        Provenance.Derived("gap along the road = gap normal to the joint / cos β"), new(0.09, 1e-9, "own arithmetic", 0.1, 0.9));
}
