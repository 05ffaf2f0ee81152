using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Frames;

/// <summary>
/// The axial model of a plan's deck: a node at every segment end and bearing, a node at every support's bearing level, members
/// between, bearing lines and supports as springs. A fixed line ties deck and what is below into one unknown, exactly.
/// </summary>
public sealed class DeckModel
{
    private readonly Dictionary<(string Body, double Station), Node> nodes;

    private readonly Dictionary<string, Number> stiffnesses;

    private DeckModel(
        AxialModel model, Dictionary<(string, double), Node> nodes, Dictionary<string, Number> stiffnesses, ImmutableArray<Number> inputs) =>
        (Model, this.nodes, this.stiffnesses, Inputs) = (model, nodes, stiffnesses, inputs);

    /// <summary>The model.</summary>
    public AxialModel Model { get; }

    /// <summary>Steps that the model was built from.</summary>
    public ImmutableArray<Number> Inputs { get; }

    /// <summary>Stiffness of a support or an elastomeric line by id; null where it does not yield or has none.</summary>
    public Number? StiffnessOf(string id) => stiffnesses.TryGetValue(id, out var k) ? k : null;

    /// <summary>The deck's node at a station.</summary>
    public Node DeckAt(string segment, double station) => nodes[(segment, station)];

    /// <summary>The node of a support at bearing level.</summary>
    public Node SupportAt(string support) => nodes.First(n => n.Key.Body == support).Value;

    /// <summary>Builds the model; stiffnesses become steps of the derivation.</summary>
    public static DeckModel Of(Plan plan, Derivation derivation)
    {
        var tied = new Ties();
        var places = Places(plan);
        foreach (var bearing in plan.Bearings.Where(b => b.Kind == BearingKind.Fixed))
            tied.Tie(AboveOf(bearing), BelowOf(plan, bearing));

        var stiffnesses = new Dictionary<string, Number>();
        var springs = new List<(string Name, (string, double) From, (string, double)? To, double Stiffness)>();
        foreach (var support in plan.Supports)
        {
            var place = (support.Id, support.Station);
            if (SupportStiffnesses.Of(support, plan, derivation) is { } k)
            {
                stiffnesses[support.Id] = k;
                springs.Add((support.Id, place, null, k.Value));
            }
            else tied.Hold(place);
        }
        foreach (var bearing in plan.Bearings.Where(b => b.Kind == BearingKind.Elastomeric))
        {
            var k = BearingStiffnesses.Of(bearing, derivation);
            stiffnesses[bearing.Id] = k;
            springs.Add((bearing.Id, AboveOf(bearing), BelowOf(plan, bearing), k.Value));
        }

        var nodes = Number(places, tied);
        var inputs = stiffnesses.Values.ToList();
        var members = new List<Member>();
        foreach (var segment in plan.Segments)
        {
            inputs.Add(GivenValues.AxialStiffness(plan, segment, derivation));
            var line = places.Where(p => p.Body == segment.Id).OrderBy(p => p.Station).Select(p => nodes[p]).ToArray();
            for (var i = 1; i < line.Length; i++)
                members.Add(new Member(segment.Id, line[i - 1], line[i], segment.AxialStiffness, line[i].Station - line[i - 1].Station));
        }
        var model = new AxialModel(
            [.. nodes.Values], [.. members],
            [.. springs.Select(s => new Spring(s.Name, nodes[s.From], s.To is { } to ? nodes[to] : null, s.Stiffness))],
            nodes.Values.Select(n => n.Unknown).DefaultIfEmpty(-1).Max() + 1);
        return new DeckModel(model, nodes, stiffnesses, [.. inputs]);
    }

    private static (string, double) AboveOf(BearingLine b) => (b.Segment, b.Station);

    private static (string, double) BelowOf(Plan plan, BearingLine b) =>
        plan.Supports.FirstOrDefault(s => s.Id == b.On) is { } support ? (support.Id, support.Station) : (b.On, b.Station);

    /// <summary>Every point that needs a node, in station order, decks before supports at one station.</summary>
    private static (string Body, double Station)[] Places(Plan plan)
    {
        var decks = plan.Segments.SelectMany(s => new[] { (s.Id, s.Start), (s.Id, s.End) })
            .Concat(plan.Bearings.Select(AboveOf))
            .Concat(plan.Bearings.Select(b => BelowOf(plan, b)));
        return [.. decks.Concat(plan.Supports.Select(s => (s.Id, s.Station))).Distinct().OrderBy(p => p.Item2)];
    }

    private static Dictionary<(string Body, double Station), Node> Number((string Body, double Station)[] places, Ties tied)
    {
        var unknowns = new Dictionary<(string, double), int>();
        var nodes = new Dictionary<(string, double), Node>();
        foreach (var place in places)
        {
            var master = tied.MasterOf(place);
            var unknown = -1;
            if (!tied.IsHeld(place) && !unknowns.TryGetValue(master, out unknown)) unknowns[master] = unknown = unknowns.Count;
            var within = nodes.Count(n => n.Key.Item1 == place.Body) + 1;
            nodes[place] = new Node(FormattableString.Invariant($"{place.Body}#{within}"), place.Station, unknown);
        }
        return nodes;
    }
}
