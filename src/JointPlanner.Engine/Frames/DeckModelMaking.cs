using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Frames;

/// <summary>
/// Builds the frame: a point at every segment end and bearing, a point at every support's bearing level, members between, bearing lines
/// and supports as springs and rigid links at their own levels. A column that is built into the deck is a member.
/// </summary>
internal sealed class DeckModelMaking
{
    private readonly Derivation derivation;
    private readonly List<Node> all = [];
    private readonly List<Member> members = [];
    private readonly List<Spring> springs = [];
    private readonly List<Link> links = [];
    private int freedoms;

    public DeckModelMaking(Plan plan, Derivation derivation)
    {
        (Plan, this.derivation) = (plan, derivation);
        Sections = plan.Segments.Select(s => SectionProperties.Of(plan, s, derivation)).OfType<SectionProperties>().ToImmutableDictionary(s => s.Segment.Id);
        AddNodes();
        foreach (var support in plan.Supports) AddSupport(support);
        foreach (var bearing in plan.Bearings.Where(b => b.Kind == BearingKind.Elastomeric))
            Note(bearing.Id, BearingStiffnesses.Of(bearing, derivation));
        foreach (var bearing in plan.Bearings) AddBearing(bearing);
        foreach (var segment in plan.Segments) AddMembers(segment);
    }

    public Plan Plan { get; }
    public Dictionary<(string Body, double Station), Node> Nodes { get; } = [];
    public Dictionary<string, Node> Supports { get; } = [];
    public Dictionary<string, Number> Stiffnesses { get; } = [];
    public ImmutableDictionary<string, SectionProperties> Sections { get; }
    public List<Number> Inputs { get; } = [];

    public FrameModel Model() => new([.. all], [.. members], [.. springs], [.. links], freedoms,
        [.. Plan.Supports.SelectMany(s => new[] { $"{s.Id} settles", $"{s.Id} moves along", $"{s.Id} tilts" })]);

    /// <summary>Every point, in station order, decks before supports at one station; the foot of a column right after its head.</summary>
    private void AddNodes()
    {
        var decks = Plan.Segments.SelectMany(s => new[] { (s.Id, s.Start), (s.Id, s.End) })
            .Concat(Plan.Bearings.Select(b => (b.Segment, b.Station)))
            .Concat(Plan.Bearings.Where(b => Plan.Supports.All(s => s.Id != b.On)).Select(b => (b.On, b.Station)));
        var counts = new Dictionary<string, int>();
        foreach (var place in decks.Concat(Plan.Supports.Select(s => (s.Id, s.Station))).Distinct().OrderBy(p => p.Item2))
        {
            var (body, station) = place;
            var number = counts[body] = counts.GetValueOrDefault(body) + 1;
            var isMember = Plan.Bearings.Any(b => b.On == body && b.Kind == BearingKind.Monolithic);
            var node = Add(FormattableString.Invariant($"{body}#{number}"), body, station, Sections.ContainsKey(body) || isMember);
            Nodes[place] = node;
            if (Plan.Supports.All(s => s.Id != body)) continue;
            Supports[body] = node;
            if (isMember && Plan.Supports.First(s => s.Id == body).Stiffness is ColumnStiffness) Nodes[($"{body}/foot", station)] = Add($"{body}#foot", body, station, true);
        }
    }

    private Node Add(string name, string body, double station, bool bends)
    {
        var node = new Node(name, body, station, bends, freedoms);
        freedoms += bends ? 3 : 1;
        all.Add(node);
        return node;
    }

    private void AddSupport(Support support)
    {
        var (settlement, along) = (GroundOf.Settlement(Plan, support), GroundOf.Along(Plan, support));
        var head = Supports[support.Id];
        if (head.Bends && support.Stiffness is ColumnStiffness column)
        {
            AddColumn(support, column, head, Nodes[($"{support.Id}/foot", support.Station)]);
            return;
        }
        if (head.Bends)
        {
            links.Add(new($"{support.Id} carries", [(head.In(Direction.Vertical), 1)], [(settlement, -1)]));
            links.Add(new($"{support.Id} does not turn", [(head.In(Direction.Turning), 1)], [(GroundOf.Tilt(Plan, support), -1)]));
        }
        if (SupportStiffnesses.Of(support, Plan, derivation) is { } k)
        {
            Note(support.Id, k);
            springs.Add(new(support.Id, Direction.Along, head, 0, null, 0, k.Value, [(along, 1)]));
        }
        else links.Add(new($"{support.Id} does not yield", [(head.In(Direction.Along), 1)], [(along, 1)]));
    }

    /// <summary>A column as a member: its head is built into the deck, its length does not change, its foot stands on the foundation.</summary>
    private void AddColumn(Support support, ColumnStiffness column, Node head, Node foot)
    {
        var (settlement, along, tilt) = (GroundOf.Settlement(Plan, support), GroundOf.Along(Plan, support), GroundOf.Tilt(Plan, support));
        Inputs.AddRange(SupportStiffnesses.ColumnInputs(support, column, derivation));
        members.Add(new(support.Id, foot, head, 0, column.Modulus * column.Inertia, column.Height, IsUpright: true));
        links.Add(new($"{support.Id} carries", [(head.In(Direction.Vertical), 1), (foot.In(Direction.Vertical), -1)], []));
        links.Add(new($"{support.Id} stands", [(foot.In(Direction.Vertical), 1)], [(settlement, -1)]));
        ImmutableArray<(int, double)> sideways = [(along, 1), (tilt, -column.Height)];
        if (column.FoundationAlong is { } slides) springs.Add(new($"{support.Id} foundation along", Direction.Along, foot, 0, null, 0, slides, sideways));
        else links.Add(new($"{support.Id} foundation along", [(foot.In(Direction.Along), 1)], sideways));
        if (column.FoundationTurning is { } turns) springs.Add(new($"{support.Id} foundation turning", Direction.Turning, foot, 0, null, 0, turns, [(tilt, -1)]));
        else links.Add(new($"{support.Id} foundation turning", [(foot.In(Direction.Turning), 1)], [(tilt, -1)]));
    }

    private void AddBearing(BearingLine bearing)
    {
        var deck = Nodes[(bearing.Segment, bearing.Station)];
        var support = Plan.Supports.FirstOrDefault(s => s.Id == bearing.On);
        var below = support is null ? Nodes[(bearing.On, bearing.Station)] : Supports[support.Id];
        var (height, heightBelow) = (-DeckLevels.DropOf(bearing, Sections), support is null ? DeckLevels.HeightOn(bearing, Sections) : 0);
        if (bearing.Kind is BearingKind.Fixed or BearingKind.Monolithic)
            links.Add(new($"{bearing.Id} holds", (Response.Along(deck, height) - Response.Along(below, heightBelow)).Freedoms, []));
        if (bearing.Kind == BearingKind.Elastomeric)
            springs.Add(new(bearing.Id, Direction.Along, deck, height, below, heightBelow, Stiffnesses[bearing.Id].Value, []));
        if (!deck.Bends) return;
        if (bearing.Kind == BearingKind.Monolithic && below.Bends)
            links.Add(new($"{bearing.Id} clamps", [(deck.In(Direction.Turning), 1), (below.In(Direction.Turning), -1)], []));
        if (below.Bends) links.Add(new($"{bearing.Id} carries", [(deck.In(Direction.Vertical), 1), (below.In(Direction.Vertical), -1)], []));
        else links.Add(new($"{bearing.Id} carries", [(deck.In(Direction.Vertical), 1)], support is null ? [] : [(GroundOf.Settlement(Plan, support), -1)]));
    }

    private void AddMembers(Segment segment)
    {
        var section = Sections.GetValueOrDefault(segment.Id);
        var (ea, ei) = (section?.AxialStiffness.Value ?? segment.AxialStiffness, section?.BendingStiffness.Value ?? 0);
        if (section is null) Inputs.Add(GivenValues.AxialStiffness(Plan, segment, derivation));
        else Inputs.AddRange([section.AxialStiffness, section.NeutralAxis, section.BendingStiffness]);
        var line = all.Where(n => n.Body == segment.Id).ToArray();
        for (var i = 1; i < line.Length; i++)
            members.Add(new Member(segment.Id, line[i - 1], line[i], ea, ei, line[i].Station - line[i - 1].Station));
    }

    private void Note(string id, Number stiffness)
    {
        Stiffnesses[id] = stiffness;
        Inputs.Add(stiffness);
    }
}
