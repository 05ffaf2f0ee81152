using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.HandChecks;

/// <summary>
/// The elementary check of where a deck stands still: Σkx/Σk over its support lines, the deck taken as rigid along its axis and every
/// support taken as if no other segment pulled at it.
/// </summary>
public static class ZeroPointByHand
{
    private static readonly Operand Bearing = new("k_b", "stiffness of the bearing line", Quantity.Stiffness);
    private static readonly Operand Support = new("k_s", "stiffness of the support", Quantity.Stiffness);
    private static readonly Operand Line = new("k", "stiffness of bearing line and support in series", Quantity.Stiffness);
    private static readonly Operand Station = new("x", "station of the line", Quantity.Length);
    private static readonly Operand Moment = new("k·x", "stiffness times station of one line", Quantity.Force);
    private static readonly Operand SumOfMoments = new("Σkx", "sum of stiffness times station", Quantity.Force);
    private static readonly Operand SumOfLines = new("Σk", "sum of the lines' stiffnesses", Quantity.Stiffness);
    private static readonly Operand ZeroPoint = new("x_0", "zero-movement point by hand", Quantity.Length);
    private static readonly Operand Face = new("x_f", "station of the deck end", Quantity.Length);
    private static readonly Operand DeckLength = new("L_d", "expansion length of the deck end by hand", Quantity.Length);
    private static readonly Operand LineDistance = new("a", "distance from the zero-movement point to the bearing line of the abutment", Quantity.Length);
    private static readonly Operand Taken = new("L_b", "part of it that the backwall follows", Quantity.Length);

    private static readonly Provenance RigidDeck = Provenance.Derived("a deck rigid along its axis stands still where the forces of its springs balance: Σk(x − x_0) = 0");
    private static readonly Provenance InSeries = Provenance.Derived("springs in series");

    /// <summary>Bearing line and support in series.</summary>
    public static readonly Formula Series = new(
        "hand.series", "k", "stiffness of bearing line and support in series", Quantity.Stiffness, [Bearing, Support],
        Bearing * Support / (Bearing + Support), InSeries, new(5e6, 1, "own arithmetic", 1e7, 1e7));

    /// <summary>k·x.</summary>
    public static readonly Formula LineMoment = new(
        "hand.line-moment", "k·x", "stiffness times station of one line", Quantity.Force, [Line, Station], Line * Station, RigidDeck,
        new(3e8, 1, "own arithmetic", 1e7, 30));

    /// <summary>Σkx.</summary>
    public static readonly Formula Moments = new(
        "hand.moments", "Σkx", "sum of stiffness times station", Quantity.Force, [Moment], Total(Moment), RigidDeck, new(4e8, 1, "own arithmetic", 3e8, 1e8));

    /// <summary>Σk.</summary>
    public static readonly Formula Lines = new(
        "hand.lines", "Σk", "sum of the lines' stiffnesses", Quantity.Stiffness, [Line], Total(Line), RigidDeck, new(3e7, 1, "own arithmetic", 1e7, 2e7));

    /// <summary>x_0 = Σkx/Σk.</summary>
    public static readonly Formula Balance = new(
        "hand.zero-point", "x_0", "zero-movement point by hand", Quantity.Length, [SumOfMoments, SumOfLines],
        SumOfMoments / SumOfLines, RigidDeck, new(20, 1e-9, "own arithmetic", 6e8, 3e7));

    /// <summary>Distance from the zero-movement point down to the lower deck end.</summary>
    public static readonly Formula ToLowerEnd = new(
        "hand.length-to-lower-end", "L_d", "expansion length of the lower deck end by hand", Quantity.Length, [ZeroPoint, Face],
        ZeroPoint - Face, RigidDeck, new(30.48, 1e-9, "own arithmetic: half of a deck of 60.96 m", 30.48, 0));

    /// <summary>Distance from the zero-movement point up to the upper deck end.</summary>
    public static readonly Formula ToUpperEnd = new(
        "hand.length-to-upper-end", "L_d", "expansion length of the upper deck end by hand", Quantity.Length, [Face, ZeroPoint],
        Face - ZeroPoint, RigidDeck, new(30.48, 1e-9, "own arithmetic: half of a deck of 60.96 m", 60.96, 30.48));

    /// <summary>How far the backwall follows the deck: its support takes the share that the series gives it.</summary>
    public static readonly Formula BackwallFollows = new(
        "hand.backwall-follows", "L_b", "part of the deck's movement that the backwall follows", Quantity.Length, [LineDistance, Line, Support],
        LineDistance * Line / Support, InSeries, new(15, 1e-9, "own arithmetic", 30, 5e6, 1e7));

    /// <summary>Expansion length of the joint between deck end and backwall.</summary>
    public static readonly Formula LessBackwall = new(
        "hand.length-less-backwall", "L", "expansion length of the joint by hand", Quantity.Length, [DeckLength, Taken],
        DeckLength - Taken, RigidDeck, new(15, 1e-9, "own arithmetic", 30, 15));
}
