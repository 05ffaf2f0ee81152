using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine;

/// <summary>Values of the plan that several rooms need, as steps: asked twice, listed once.</summary>
internal static class GivenValues
{
    public static Number AxialStiffness(Plan plan, Segment segment, Derivation derivation) =>
        Of(plan, derivation, $"segments/{segment.Id}/axial-stiffness", "EA", $"axial stiffness of segment {segment.Id}",
            Quantity.AxialStiffness, segment.AxialStiffness);

    public static Number Station(Plan plan, BearingLine bearing, Derivation derivation) =>
        Of(plan, derivation, $"bearings/{bearing.Id}/station", "x", $"station of bearing line {bearing.Id}", Quantity.Length, bearing.Station);

    public static Number Start(Plan plan, Segment segment, Derivation derivation) =>
        Of(plan, derivation, $"segments/{segment.Id}/start", "x_start", $"station of the lower end of segment {segment.Id}",
            Quantity.Length, segment.Start);

    public static Number End(Plan plan, Segment segment, Derivation derivation) =>
        Of(plan, derivation, $"segments/{segment.Id}/end", "x_end", $"station of the upper end of segment {segment.Id}",
            Quantity.Length, segment.End);

    public static Number Of(Plan plan, Derivation derivation, string path, string symbol, string meaning, Quantity quantity, double value, string source = "") =>
        derivation.Given(path, symbol, meaning, quantity, value, plan.IsDefault(path) ? plan.DefaultReason(path) : source, plan.IsDefault(path));
}
