using System.Collections.Immutable;

namespace JointPlanner.Engine.Frames;

/// <summary>A point of the model that may move along the deck.</summary>
/// <param name="Name">Name in listings, for instance main#2: the second point of body main in station order.</param>
/// <param name="Station">Station, m.</param>
/// <param name="Unknown">Number of its unknown; −1 for a point that cannot move. Points tied rigidly share one.</param>
public sealed record Node(string Name, double Station, int Unknown);

/// <summary>A piece of deck between two nodes.</summary>
/// <param name="Segment">Segment it belongs to.</param>
/// <param name="From">Node at the smaller station.</param>
/// <param name="To">Node at the larger station.</param>
/// <param name="AxialStiffness">EA, N.</param>
/// <param name="Length">Length, m.</param>
public sealed record Member(string Segment, Node From, Node To, double AxialStiffness, double Length);

/// <summary>A spring along the deck.</summary>
/// <param name="Name">Name in listings.</param>
/// <param name="From">One end.</param>
/// <param name="To">Other end; null for the ground.</param>
/// <param name="Stiffness">N/m.</param>
public sealed record Spring(string Name, Node From, Node? To, double Stiffness);

/// <summary>The deck as axial members on springs: enough to type into any frame program. Its only freedom is along the deck.</summary>
/// <param name="Nodes">Nodes in station order of making.</param>
/// <param name="Members">Members.</param>
/// <param name="Springs">Springs.</param>
/// <param name="Unknowns">Number of unknowns.</param>
public sealed record AxialModel(
    ImmutableArray<Node> Nodes, ImmutableArray<Member> Members, ImmutableArray<Spring> Springs, int Unknowns);
