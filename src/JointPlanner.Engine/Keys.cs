using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;

namespace JointPlanner.Engine;

/// <summary>
/// The words of result keys, all in one place: a key is a path of plan ids and fixed words, permanent once a sheet was issued.
/// </summary>
public static class Keys
{
#pragma warning disable CS1591 // the words say it
    public static string SupportStiffness(string support) => $"support/{support}/stiffness";
    public static string BearingStiffness(string bearing) => $"bearing/{bearing}/stiffness";
    public static string TemperatureMax(string segment) => $"segment/{segment}/temperature/max";
    public static string TemperatureMin(string segment) => $"segment/{segment}/temperature/min";
    public static string ZeroMovementPoint(string segment) => $"segment/{segment}/zero-movement-point";
    public static string ZeroMovementPointByHand(string segment) => $"segment/{segment}/zero-movement-point/hand-check";
    public static string SectionAxialStiffness(string segment) => $"segment/{segment}/section/axial-stiffness";
    public static string NeutralAxis(string segment) => $"segment/{segment}/section/neutral-axis";
    public static string SectionBendingStiffness(string segment) => $"segment/{segment}/section/bending-stiffness";
    public static string EffectiveExpansion(string segment) => $"segment/{segment}/section/effective-expansion";
    public static string ReliefMovement(string segment) => $"segment/{segment}/section/relief-movement";
    public static string ExpansionLength(string joint, string segment) => $"joint/{joint}/expansion-length/{segment}";
    public static string ExpansionLengthByHand(string joint, string segment) => $"joint/{joint}/expansion-length/{segment}/hand-check";
    public static string OpensBy(string joint, Cause cause) => $"joint/{joint}/opens-by/{Word(cause)}";
    public static string ClosesBy(string joint, Cause cause) => $"joint/{joint}/closes-by/{Word(cause)}";
    public static string Part(string joint, string segment, Cause cause) => $"joint/{joint}/part/{segment}/{Word(cause)}";
    public static string Travel(string bearing, Cause cause, string end) => $"bearing/{bearing}/travel/{Word(cause)}/{end}";
    public static string Rotation(string bearing, Cause cause, string end) => $"bearing/{bearing}/rotation/{Word(cause)}/{end}";
    public static string TravelTotal(string bearing, string end) => $"bearing/{bearing}/travel/total/{end}";
    public static string RestraintForce(string bearing, string end) => $"bearing/{bearing}/restraint-force/{end}";
    public static string CountedClosing(string joint, Occasion occasion, Column column) => $"joint/{joint}/{Word(occasion)}/closes-by/{Word(column)}";
    public static string CountedOpening(string joint, Occasion occasion, Column column) => $"joint/{joint}/{Word(occasion)}/opens-by/{Word(column)}";
    public static string Racking(string joint, Occasion occasion) => $"joint/{joint}/{Word(occasion)}/racking";
    public static string Rate(string joint, Occasion occasion) => $"joint/{joint}/{Word(occasion)}/rate";
    public static string FamilySize(string joint, string family) => $"joint/{joint}/fit/{family}";
    public static string SetLeast(string joint) => $"joint/{joint}/setting/least";
    public static string SetGreatest(string joint) => $"joint/{joint}/setting/greatest";
    public static string SetReserve(string joint) => $"joint/{joint}/setting/reserve";
    public static string SetValue(string joint) => $"joint/{joint}/setting/set";
    public static string SetMinus(string joint) => $"joint/{joint}/setting/minus";
    public static string SetPlus(string joint) => $"joint/{joint}/setting/plus";
    public static string SetAlong(string joint) => $"joint/{joint}/setting/set-along";
    public static string SetMinusAlong(string joint) => $"joint/{joint}/setting/minus-along";
    public static string SetPlusAlong(string joint) => $"joint/{joint}/setting/plus-along";
#pragma warning restore CS1591

    /// <summary>The word for a cause in keys and files.</summary>
    public static string Word(Cause cause) => Kebab(cause.ToString());

    /// <summary>The word for a column in keys and files.</summary>
    public static string Word(Column column) => Kebab(column.ToString());

    /// <summary>The word for an occasion in keys.</summary>
    public static string Word(Occasion occasion) => Kebab(occasion.ToString());

    /// <summary>A cause in running text.</summary>
    public static string Said(Cause cause) => Word(cause).Replace('-', ' ');

    /// <summary>A column in running text.</summary>
    public static string Said(Column column) => Word(column).Replace('-', ' ');

    private static string Kebab(string name) =>
        string.Concat(name.Select((c, i) => char.IsAsciiLetterUpper(c) ? (i > 0 ? "-" : "") + char.ToLowerInvariant(c) : c.ToString()));
}
