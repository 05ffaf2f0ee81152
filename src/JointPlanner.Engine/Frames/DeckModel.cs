using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Frames;

/// <summary>The frame of a plan, and where in it the faces of joints and the two sides of bearings are.</summary>
public sealed class DeckModel
{
    private readonly Plan plan;
    private readonly Dictionary<(string Body, double Station), Node> nodes;
    private readonly Dictionary<string, Node> supports;
    private readonly Dictionary<string, Number> stiffnesses;
    private readonly ImmutableDictionary<string, SectionProperties> sections;

    private DeckModel(DeckModelMaking made, Derivation derivation)
    {
        (plan, nodes, supports, stiffnesses, sections) = (made.Plan, made.Nodes, made.Supports, made.Stiffnesses, made.Sections);
        Model = made.Model();
        Inputs =
        [
            derivation.Solved("", "n_f", "number of freedoms of the frame, before rigid links; every solved movement rests on it and so on all that it was built from",
                Quantity.Count, Model.Freedoms, FrameWords.Name, 0, [.. made.Inputs]),
        ];
    }

    /// <summary>The frame.</summary>
    public FrameModel Model { get; }

    /// <summary>The one step that stands for the frame: it rests on all that the frame was built from.</summary>
    public ImmutableArray<Number> Inputs { get; }

    /// <summary>Builds the frame; stiffnesses become steps of the derivation.</summary>
    public static DeckModel Of(Plan plan, Derivation derivation) => new(new DeckModelMaking(plan, derivation), derivation);

    /// <summary>Stiffness of a support or an elastomeric line by id; null where it does not yield or has none.</summary>
    public Number? StiffnessOf(string id) => stiffnesses.TryGetValue(id, out var k) ? k : null;

    /// <summary>Section of a segment; null where it is not described.</summary>
    public SectionProperties? SectionOf(string segment) => sections.GetValueOrDefault(segment);

    /// <summary>Axial stiffness of a segment, N.</summary>
    public double AxialStiffnessOf(Segment segment) => SectionOf(segment.Id)?.AxialStiffness.Value ?? segment.AxialStiffness;

    /// <summary>The deck's point at a station.</summary>
    public Node DeckAt(string segment, double station) => nodes[(segment, station)];

    /// <summary>The point of a support at bearing level.</summary>
    public Node SupportAt(string support) => supports[support];

    /// <summary>Members that traffic stands on, in station order: those of segments that bend, between their ends.</summary>
    public IEnumerable<Member> Carriageway => Model.Members
        .Where(m => !m.IsUpright && m.BendingStiffness > 0 && plan.Segments.Any(s => s.Id == m.Body && m.From.Station >= s.Start && m.To.Station <= s.End))
        .OrderBy(m => m.From.Station);

    /// <summary>By how much a joint closes, along the deck at road-surface level.</summary>
    public Response Closing(Joint joint) => Face(joint.Near, true, joint.Far) - Face(joint.Far, false, joint.Near);

    /// <summary>By how much the deck moves up-station over a bearing line, at the line's level.</summary>
    public Response Travel(BearingLine bearing) =>
        Response.Along(DeckAt(bearing.Segment, bearing.Station), -DeckLevels.DropOf(bearing, sections)) - Below(bearing);

    /// <summary>Movement of a joint's face at road-surface level, positive up-station. A backwall leans with its support.</summary>
    private Response Face(string body, bool isNear, string other)
    {
        if (plan.Segments.FirstOrDefault(s => s.Id == body) is { } segment)
            return Response.Along(DeckAt(body, isNear ? segment.End : segment.Start), SectionOf(body)?.SurfaceHeight ?? 0);
        var head = Response.Along(SupportAt(body));
        if (SectionOf(other) is not { } deck) return head;
        var height = deck.Section.BearingDepth + deck.Section.Surfacing;
        return head + Leaning(plan.Supports.First(s => s.Id == body), height);
    }

    /// <summary>What leaning of a support adds at a height above bearing level: given tilt, and the bending and turning of a column that is pushed at its top.</summary>
    private Response Leaning(Support support, double height)
    {
        var (along, tilt) = (GroundOf.Along(plan, support), GroundOf.Tilt(plan, support));
        var given = Response.OfGround(tilt, height);
        if (support.Stiffness is not ColumnStiffness column || StiffnessOf(support.Id) is not { } k) return given;
        var perForce = (column.Height * column.Height / (2 * column.Modulus * column.Inertia)) + (column.FoundationTurning is { } turning ? column.Height / turning : 0);
        var share = height * k.Value * perForce;
        return given + (share * Response.Along(SupportAt(support.Id))) + Response.OfGround(along, -share);
    }

    private Response Below(BearingLine bearing) => plan.Supports.Any(s => s.Id == bearing.On)
        ? Response.Along(SupportAt(bearing.On))
        : Response.Along(DeckAt(bearing.On, bearing.Station), DeckLevels.HeightOn(bearing, sections));
}
