using System.Collections.Immutable;

namespace JointPlanner.Engine.Frames;

/// <summary>In which way a point may move.</summary>
public enum Direction
{
    /// <summary>Along the deck, positive up-station.</summary>
    Along,
    /// <summary>Vertically, positive upward.</summary>
    Vertical,
    /// <summary>By turning, positive when the deck rises up-station.</summary>
    Turning,
}

/// <summary>A point of the model, on the neutral axis of a deck or on a support at bearing level.</summary>
/// <param name="Name">Name in listings, for instance main#2: the second point of body main in station order.</param>
/// <param name="Body">Id of the segment or support.</param>
/// <param name="Station">Station, m.</param>
/// <param name="Bends">True where it also moves vertically and turns; false where it only moves along the deck.</param>
/// <param name="First">Number of its first freedom, along the deck; vertical and turning follow where it has them.</param>
public sealed record Node(string Name, string Body, double Station, bool Bends, int First)
{
    /// <summary>Number of its freedom in a direction.</summary>
    /// <exception cref="InvalidOperationException">The point only moves along the deck.</exception>
    public int In(Direction direction) => direction == Direction.Along || Bends
        ? First + (int)direction
        : throw new InvalidOperationException($"{Name} only moves along the deck.");
}

/// <summary>A straight piece between two points.</summary>
/// <param name="Body">Segment or pier it belongs to.</param>
/// <param name="From">Point at the smaller station, or the foot of a pier.</param>
/// <param name="To">Point at the larger station, or the head of a pier.</param>
/// <param name="AxialStiffness">EA, N; a pier's length is taken as unchanging.</param>
/// <param name="BendingStiffness">EI, N·m²; 0 for a piece that only changes its length.</param>
/// <param name="Length">Length, m.</param>
/// <param name="IsUpright">True for a pier.</param>
public sealed record Member(
    string Body, Node From, Node To, double AxialStiffness, double BendingStiffness, double Length, bool IsUpright = false);

/// <summary>A spring between a point and another one or the ground.</summary>
/// <param name="Name">Name in listings.</param>
/// <param name="Direction">Way in which it acts.</param>
/// <param name="From">One end.</param>
/// <param name="FromHeight">Height of that end above its point, m.</param>
/// <param name="To">Other end; null for the ground.</param>
/// <param name="ToHeight">Height of that end above its point, m.</param>
/// <param name="Stiffness">N/m, or N·m/rad for turning.</param>
/// <param name="Ground">Given movements of the ground that it stands on, with their shares.</param>
public sealed record Spring(
    string Name, Direction Direction, Node From, double FromHeight, Node? To, double ToHeight, double Stiffness,
    ImmutableArray<(int Given, double Share)> Ground);

/// <summary>A rigid condition between freedoms: the sum of factor times freedom equals the sum of share times given movement. Levels enter exactly, never as stiff members.</summary>
/// <param name="Name">What it stands for, for listings.</param>
/// <param name="Terms">Freedoms with their factors; the first that is still free is made to follow the others.</param>
/// <param name="Given">Given movements with their shares.</param>
public sealed record Link(string Name, ImmutableArray<(int Freedom, double Factor)> Terms, ImmutableArray<(int Given, double Share)> Given);

/// <summary>The structure as a plane frame along the neutral axes: enough to type into any frame program.</summary>
/// <param name="Nodes">Points in station order, decks before supports at one station.</param>
/// <param name="Members">Members.</param>
/// <param name="Springs">Springs.</param>
/// <param name="Links">Rigid conditions: bearings that hold, levels, supports that do not yield.</param>
/// <param name="Freedoms">Number of freedoms before links.</param>
/// <param name="GivenMovements">Names of the movements that may be given to the ground: of each support its settlement, movement along and tilt.</param>
public sealed record FrameModel(
    ImmutableArray<Node> Nodes, ImmutableArray<Member> Members, ImmutableArray<Spring> Springs, ImmutableArray<Link> Links, int Freedoms,
    ImmutableArray<string> GivenMovements)
{
    /// <summary>The point and direction of a freedom.</summary>
    public (Node Node, Direction Direction) OwnerOf(int freedom)
    {
        var (low, high) = (0, Nodes.Length - 1);
        while (low < high)
        {
            var middle = (low + high + 1) / 2;
            if (Nodes[middle].First <= freedom) low = middle;
            else high = middle - 1;
        }
        return (Nodes[low], (Direction)(freedom - Nodes[low].First));
    }
}
