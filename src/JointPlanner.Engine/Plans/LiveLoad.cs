using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans;

/// <summary>What one frame stands for under traffic.</summary>
public enum FrameShare
{
    /// <summary>The whole width with all its lanes.</summary>
    WholeWidth,
    /// <summary>One girder line, which takes a share of the lanes.</summary>
    GirderLine,
}

/// <summary>Traffic on the deck.</summary>
public sealed record LiveLoad
{
    /// <summary>What the frame stands for.</summary>
    public required FrameShare StandsFor { get; init; }
    /// <summary>Number of traffic lanes that the deck can hold; null where the basis makes them from the width.</summary>
    public int? Lanes { get; init; }
    /// <summary>Width of the carriageway between kerbs, m; null where not given.</summary>
    public double? Carriageway { get; init; }
    /// <summary>Lanes that one girder line takes; null for the whole width.</summary>
    public double? Distribution { get; init; }
    /// <summary>Where the distribution factor comes from.</summary>
    public string DistributionSource { get; init; } = "";
    /// <summary>The designer's own loads; null for those of the basis.</summary>
    public OwnLoads? Own { get; init; }
}

/// <summary>Loads of one lane as the designer gives them.</summary>
/// <param name="Trains">Trains of axles; the worst of them counts.</param>
/// <param name="Uniform">Load per length on adverse lengths, N/m.</param>
/// <param name="Dynamic">Factor on the trains for impact.</param>
/// <param name="Source">Where they come from.</param>
public sealed record OwnLoads(ImmutableArray<OwnTrain> Trains, double Uniform, double Dynamic, string Source);

/// <summary>A train of axles.</summary>
/// <param name="Id">Id in the plan.</param>
/// <param name="Axles">Axles from the first on.</param>
public sealed record OwnTrain(string Id, ImmutableArray<OwnAxle> Axles);

/// <summary>An axle.</summary>
/// <param name="Force">N.</param>
/// <param name="Spacing">Distance behind the axle before it, m; 0 for the first.</param>
/// <param name="SpacingMost">Largest distance where it varies, m; null where it does not.</param>
public sealed record OwnAxle(double Force, double Spacing, double? SpacingMost);
