using System.Collections.Immutable;
using JointPlanner.Engine.Bases;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>What the code says about gaps whoever makes the joint.</summary>
/// <param name="SingleGap">Bounds on the one gap of a joint.</param>
/// <param name="PerCell">Bounds on each gap of a joint with several.</param>
public sealed record CodeGapLimits(ImmutableArray<Limit> SingleGap, ImmutableArray<Limit> PerCell)
{
    /// <summary>A code that says nothing about gaps.</summary>
    public static readonly CodeGapLimits None = new([], []);
}
