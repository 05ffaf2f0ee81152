using System.Collections.Immutable;

namespace JointPlanner.Engine.Frames;

/// <summary>A movement that is asked of the frame: a sum of factors times freedoms and shares of given movements of the ground.</summary>
/// <param name="Freedoms">Freedoms with their factors.</param>
/// <param name="Given">Given movements with their shares.</param>
public sealed record Response(ImmutableArray<(int Freedom, double Factor)> Freedoms, ImmutableArray<(int Given, double Share)> Given)
{
    /// <summary>Nothing.</summary>
    public static readonly Response None = new([], []);

    /// <summary>Movement along the deck of what is fixed to a point at a height above it: u − θ·height.</summary>
    public static Response Along(Node node, double height = 0) => node.Bends && height != 0
        ? new([(node.In(Direction.Along), 1), (node.In(Direction.Turning), -height)], [])
        : new([(node.In(Direction.Along), 1)], []);

    /// <summary>A single freedom of a point.</summary>
    public static Response Of(Node node, Direction direction) => new([(node.In(direction), 1)], []);

    /// <summary>A share of a given movement of the ground.</summary>
    public static Response OfGround(int given, double share) => new([], [(given, share)]);

    /// <summary>Both together.</summary>
    public static Response operator +(Response a, Response b) => new([.. a.Freedoms, .. b.Freedoms], [.. a.Given, .. b.Given]);

    /// <summary>The first relative to the second.</summary>
    public static Response operator -(Response a, Response b) => a + (-1 * b);

    /// <summary>Enlarged.</summary>
    public static Response operator *(double factor, Response r) =>
        new([.. r.Freedoms.Select(f => (f.Freedom, factor * f.Factor))], [.. r.Given.Select(g => (g.Given, factor * g.Share))]);
}
