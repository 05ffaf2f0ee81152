namespace JointPlanner.Pictures;

/// <summary>
/// Lays a picture out for a given box: takes world points through its <see cref="View"/> and keeps labels, radii and line weights in
/// millimetres of paper.
/// </summary>
public sealed class PictureBuilder(double widthMm, double heightMm, View view)
{
    private readonly List<Element> _elements = [];

    /// <summary>The way from the world to the paper; may be changed between parts of one picture that have scales of their own.</summary>
    public View View { get; set; } = view;

    /// <summary>The whole paper.</summary>
    public PaperBox Paper { get; } = new(0, 0, widthMm, heightMm);

    /// <summary>Adds an element that is laid out already.</summary>
    public PictureBuilder Add(Element element)
    {
        _elements.Add(element);
        return this;
    }

    /// <summary>A straight line between two world points.</summary>
    public PictureBuilder Line(Role role, WorldPoint from, WorldPoint to, Stroke stroke) =>
        Add(new Line(role, View.ToPaper(from), View.ToPaper(to), stroke));

    /// <summary>A line through world points.</summary>
    public PictureBuilder Polyline(Role role, IEnumerable<WorldPoint> points, Stroke stroke) =>
        Add(new Polyline(role, [.. points.Select(View.ToPaper)], stroke));

    /// <summary>A closed area with corners at world points.</summary>
    public PictureBuilder Polygon(Role role, IEnumerable<WorldPoint> points, Stroke stroke, Fill fill = Fill.None) =>
        Add(new Polygon(role, [.. points.Select(View.ToPaper)], stroke, fill));

    /// <summary>An upright rectangle of the world.</summary>
    public PictureBuilder Box(Role role, WorldBox box, Stroke stroke, Fill fill = Fill.None)
    {
        var (a, b) = (View.ToPaper(new(box.Left, box.Top)), View.ToPaper(new(box.Right, box.Bottom)));
        return Add(new Box(role, new(a.X, a.Y, b.X - a.X, b.Y - a.Y), stroke, fill));
    }

    /// <summary>A circle round a world point, with its radius in millimetres of paper.</summary>
    public PictureBuilder Circle(Role role, WorldPoint centre, double radiusMm, Stroke stroke, Fill fill = Fill.None) =>
        Add(new Circle(role, View.ToPaper(centre), radiusMm, stroke, fill));

    /// <summary>An area of the world filled with parallel lines.</summary>
    public PictureBuilder Hatch(Role role, IEnumerable<WorldPoint> outline, double spacingMm = 1.2, double angleDegrees = 45) =>
        Add(new Hatch(role, [.. outline.Select(View.ToPaper)], spacingMm, angleDegrees));

    /// <summary>Words tied to a world point, moved by millimetres of paper to the right and downwards.</summary>
    public PictureBuilder Label(Role role, WorldPoint at, string text, Anchor anchor = Anchor.Middle, double rightMm = 0, double downMm = 0,
        double sizeMm = 2.6, Weight weight = Weight.Regular) =>
        Add(new Label(role, View.ToPaper(at).Moved(rightMm, downMm), text) { Anchor = anchor, SizeMm = sizeMm, Weight = weight });

    /// <summary>A dimension between two world points; the offset is in millimetres of paper, above zero to the left of the way.</summary>
    public PictureBuilder Dimension(WorldPoint from, WorldPoint to, string text, double offsetMm) =>
        Add(new Dimension(View.ToPaper(from), View.ToPaper(to), text, offsetMm));

    /// <summary>An arrow whose tip stands at a world point and whose tail lies so many millimetres of paper to the right and below.</summary>
    public PictureBuilder Arrow(Role role, WorldPoint tip, double tailRightMm, double tailDownMm, Stroke stroke)
    {
        var to = View.ToPaper(tip);
        return Add(new Arrow(role, to.Moved(tailRightMm, tailDownMm), to, stroke));
    }

    /// <summary>Draws several elements as one thing with a path in the plan and a name, so that it can be pressed as one.</summary>
    public PictureBuilder Thing(Role role, string planPath, string title, Action<PictureBuilder> draw)
    {
        var inner = new PictureBuilder(Paper.Width, Paper.Height, View);
        draw(inner);
        return Add(new Group(role, inner._elements) { PlanPath = planPath, Title = title });
    }

    /// <summary>The finished picture.</summary>
    public Picture Build(string title, string description) => new(Paper.Width, Paper.Height, title, description, [.. _elements]);
}
