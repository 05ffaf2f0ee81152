using JointPlanner.Engine.Plans;
using JointPlanner.Pictures;

namespace JointPlanner.Drawings;

/// <summary>Draws one elevation: ground, supports, bearings, deck, joints, zero-movement points, dimensions.</summary>
internal sealed class ElevationPen(ElevationRequest request, ElevationFrame frame)
{
    private readonly Plan plan = request.Plan;
    private readonly double letter = request.Paper.LetterMm;
    private readonly PictureBuilder paper = new(frame.WidthMm, frame.HeightMm, frame.View);

    internal Picture Draw()
    {
        var supports = new SupportPen(plan, frame, letter);
        foreach (var support in plan.Supports) supports.Draw(paper, support);
        foreach (var segment in plan.Segments) DrawSegment(segment);
        foreach (var joint in plan.Joints) DrawJoint(joint);
        DrawSpans();
        paper.Add(new Label(Role.Label, new(frame.View.PaperOrigin.X, frame.HeightMm - (letter * 0.5)), frame.View.ScaleSentence) { SizeMm = letter * 0.85 });
        return paper.Build($"Elevation of {plan.Structure.Name}", Words());
    }

    private void DrawSegment(Segment segment)
    {
        var depth = Heights.Depth(segment);
        paper.Thing(Role.Deck, $"segments/{segment.Id}", Name("Deck segment", segment.Mark, segment.Id), drawn =>
        {
            drawn.Box(Role.Deck, new WorldBox(segment.Start, segment.End, -depth, 0), Stroke.Medium, Fill.Tint);
            // The surface that traffic runs on.
            drawn.Line(Role.Deck, new(segment.Start, 0), new(segment.End, 0), Stroke.Heavy);
            if (!request.ZeroMovementPoints.TryGetValue(segment.Id, out var station)) return;
            var at = new WorldPoint(station, -depth / 2);
            drawn.Circle(Role.Marker, at, letter * 0.36, Stroke.Medium, Fill.Paper);
            drawn.Circle(Role.Marker, at, letter * 0.12, Stroke.None, Fill.Ink);
        });
    }

    private void DrawJoint(Joint joint)
    {
        var at = frame.View.ToPaper(new(Heights.Station(plan, joint), 0));
        var (half, up) = (letter * 0.17, letter * 0.55);
        var mark = joint.Mark.Length > 0 ? joint.Mark : joint.Id;
        var down = frame.View.ZScale * plan.Segments.Where(s => s.Id == joint.Near || s.Id == joint.Far).Select(Heights.Depth).DefaultIfEmpty(1).Max();
        paper.Add(new Group(Role.Joint,
        [
            new Box(Role.Joint, new(at.X - half, at.Y - 0.3, 2 * half, down + 0.6), Stroke.None, Fill.Paper),
            new Line(Role.Joint, at.Moved(-half, -up), at.Moved(-half, down), Stroke.Medium),
            new Line(Role.Joint, at.Moved(half, -up), at.Moved(half, down), Stroke.Medium),
            new Label(Role.Label, at.Moved(0, -letter * 0.95), mark) { Anchor = Anchor.Middle, SizeMm = letter, Weight = Weight.Semibold },
        ])
        { PlanPath = $"joints/{joint.Id}", Title = Name("Joint", joint.Mark, joint.Id) });
    }

    private void DrawSpans()
    {
        var stations = plan.Supports.Select(s => s.Station).Distinct().Order().ToList();
        var y = frame.HeightMm - (letter * 1.9);
        for (var i = 1; i < stations.Count; i++)
        {
            var (from, to) = (frame.View.ToPaper(new(stations[i - 1], 0)).X, frame.View.ToPaper(new(stations[i], 0)).X);
            var text = request.Length(stations[i] - stations[i - 1]);
            var dimension = new Dimension(new(from, y), new(to, y), text, 0) { SizeMm = letter * 0.92 };
            // A number wider than its span would run into its neighbours; the ledger below tells it.
            var room = new Label(Role.Dimension, default, text) { SizeMm = letter * 0.92 }.GuessedWidthMm <= to - from;
            paper.Add(room ? dimension : dimension with { Text = " " });
        }
    }

    private string Words()
    {
        var spans = plan.Supports.Select(s => s.Station).Order().ToList();
        var lengths = string.Join(", ", spans.Skip(1).Zip(spans, (to, from) => request.Length(to - from)));
        return $"{plan.Supports.Length} supports, {plan.Segments.Length} deck segments, {plan.Joints.Length} joints. Spans: {lengths}. {frame.View.ScaleSentence}";
    }

    internal static string Name(string kind, string mark, string id) => mark.Length > 0 ? $"{kind} {mark}" : $"{kind} {id}";
}
