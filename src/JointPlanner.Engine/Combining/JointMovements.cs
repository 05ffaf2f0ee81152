using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Combining;

/// <summary>What one cause does to one joint from its setting state, along the deck and without factors, m.</summary>
/// <param name="Cause">The cause.</param>
/// <param name="OpensBy">Opens by.</param>
/// <param name="ClosesBy">Closes by.</param>
public sealed record CauseMovement(Cause Cause, Number OpensBy, Number ClosesBy);

/// <summary>The movement table of one joint.</summary>
public static class JointMovements
{
    /// <summary>Every cause at the joint's own setting state: temperature first, then the others.</summary>
    public static ImmutableArray<CauseMovement> Of(JointDemand demand, Number settingTemperature, Derivation derivation)
    {
        var rows = demand.Others.Select(o => new CauseMovement(o.Cause, o.OpensBy, o.ClosesBy));
        return demand.Thermal.IsEmpty ? [.. rows] : [Temperature(demand, settingTemperature, derivation), .. rows];
    }

    private static CauseMovement Temperature(JointDemand demand, Number set, Derivation derivation)
    {
        var cold = Sum(demand.Thermal.Select(p => derivation.Use(UniformTemperature.Cooling, "", p.Rate, set, p.Min)));
        var hot = Sum(demand.Thermal.Select(p => derivation.Use(UniformTemperature.Warming, "", p.Rate, p.Max, set)));
        var joint = demand.Joint.Id;
        return new CauseMovement(Cause.UniformTemperature,
            derivation.Use(UniformTemperature.Opening, Keys.OpensBy(joint, Cause.UniformTemperature), cold, hot),
            derivation.Use(UniformTemperature.Closing, Keys.ClosesBy(joint, Cause.UniformTemperature), cold, hot));

        Number Sum(IEnumerable<Number> parts)
        {
            var all = parts.ToArray();
            return all.Length == 1 ? all[0] : derivation.Use(UniformTemperature.Sum, "", all);
        }
    }
}
