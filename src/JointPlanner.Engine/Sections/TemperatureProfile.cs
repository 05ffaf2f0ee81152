using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Sections;

/// <summary>A point of a temperature profile.</summary>
/// <param name="Depth">Depth below the top of the section, m.</param>
/// <param name="Difference">Temperature above that of the uniform part, K.</param>
public readonly record struct ProfilePoint(Number Depth, Number Difference);

/// <summary>
/// A vertical temperature difference: straight between its points, which stand in order of depth; above the first and below the last
/// the value stays.
/// </summary>
/// <param name="Name">What it is, for instance "deck warmer above".</param>
/// <param name="Points">Points from the top down, two or more.</param>
public sealed record TemperatureProfile(string Name, ImmutableArray<ProfilePoint> Points)
{
    /// <summary>Value at a depth as a step, K.</summary>
    public Number At(Number depth, Derivation derivation)
    {
        if (depth.Value <= Points[0].Depth.Value) return Points[0].Difference;
        for (var i = 1; i < Points.Length; i++)
        {
            var (above, below) = (Points[i - 1], Points[i]);
            if (depth.Value == below.Depth.Value) return below.Difference;
            if (depth.Value > below.Depth.Value) continue;
            return above.Difference.Value == below.Difference.Value
                ? below.Difference
                : derivation.Use(StrainFormulas.Between, "", above.Difference, below.Difference, depth, above.Depth, below.Depth);
        }
        return Points[^1].Difference;
    }
}
