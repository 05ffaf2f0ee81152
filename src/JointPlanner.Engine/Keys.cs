using JointPlanner.Engine.Bases;

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
    public static string ExpansionLength(string joint, string segment) => $"joint/{joint}/expansion-length/{segment}";
    public static string ExpansionLengthByHand(string joint, string segment) => $"joint/{joint}/expansion-length/{segment}/hand-check";
    public static string OpensBy(string joint, Cause cause) => $"joint/{joint}/opens-by/{Word(cause)}";
    public static string ClosesBy(string joint, Cause cause) => $"joint/{joint}/closes-by/{Word(cause)}";
    public static string Part(string joint, string segment, Cause cause) => $"joint/{joint}/part/{segment}/{Word(cause)}";
    public static string Travel(string bearing, Cause cause, string end) => $"bearing/{bearing}/travel/{Word(cause)}/{end}";
    public static string TravelTotal(string bearing, string end) => $"bearing/{bearing}/travel/total/{end}";
    public static string RestraintForce(string bearing, string end) => $"bearing/{bearing}/restraint-force/{end}";
#pragma warning restore CS1591

    /// <summary>The word for a cause in keys and files.</summary>
    public static string Word(Cause cause) => Kebab(cause.ToString());

    /// <summary>A cause in plain words, for sentences.</summary>
    public static string Words(Cause cause) => Word(cause).Replace('-', ' ');

    /// <summary>The word for a column in keys and files.</summary>
    public static string Word(Column column) => Kebab(column.ToString());

    private static string Kebab(string name) =>
        string.Concat(name.Select((c, i) => char.IsAsciiLetterUpper(c) ? (i > 0 ? "-" : "") + char.ToLowerInvariant(c) : c.ToString()));
}
