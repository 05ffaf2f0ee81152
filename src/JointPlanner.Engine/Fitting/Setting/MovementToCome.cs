using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>
/// What a joint still moves after it was set, by one column of the counting table, in a form that carries an opening from any temperature:
/// by temperature, and by everything else. Factored, normal to the joint.
/// </summary>
/// <param name="JudgedBy">The column.</param>
/// <param name="DeckAge">Deck age at setting, s; null where it plays no part.</param>
/// <param name="Swings">One for each segment whose temperature moves the joint.</param>
/// <param name="ClosesBy">How far it closes by everything but temperature, m.</param>
/// <param name="OpensBy">How far it opens by everything but temperature, m.</param>
public sealed record MovementToCome(Column JudgedBy, double? DeckAge, ImmutableArray<TemperatureSwing> Swings, double ClosesBy, double OpensBy)
{
    /// <summary>The movement of a demand in one column.</summary>
    public static MovementToCome Of(JointDemand demand, CountingTable counting, Column column)
    {
        var cos = demand.CosSkew.Value;
        // The share of other causes and the factor do not depend on the temperature: any will do.
        var parts = new CountedMovements(demand, counting, Occasion.Setting, new Number(-1, 0), new Derivation(keepsSteps: false)).In(column).Parts;
        var thermal = parts.Where(p => p.Cause == Cause.UniformTemperature).ToDictionary(p => p.Segment, p => p.Factor.Value);
        var others = parts.Where(p => p.Cause != Cause.UniformTemperature).ToArray();
        return new MovementToCome(column, demand.DeckAge,
            [.. demand.Thermal.Where(t => thermal.ContainsKey(t.Segment)).Select(t => new TemperatureSwing(thermal[t.Segment] * t.WindowRate.Value * cos, t.Min.Value, t.Max.Value))],
            cos * others.Sum(p => p.ClosesBy?.Value ?? 0), cos * others.Sum(p => p.OpensBy?.Value ?? 0));
    }
}

/// <summary>How the temperature of one segment moves a joint.</summary>
/// <param name="Rate">How much the normal opening closes per degree of warming, with the column's factor, m/K; negative where warming opens.</param>
/// <param name="Min">Lowest temperature with its safety degrees, °C.</param>
/// <param name="Max">Highest, °C.</param>
public sealed record TemperatureSwing(double Rate, double Min, double Max);
