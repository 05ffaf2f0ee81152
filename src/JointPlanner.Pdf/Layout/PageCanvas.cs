using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Collects the painting steps of one page.</summary>
internal sealed class PageCanvas(int index)
{
    private readonly List<Step> _steps = [];

    public int Index { get; } = index;

    public IReadOnlyList<Step> Steps => _steps;

    public List<FieldPlace> Fields { get; } = [];

    public List<OutlineMark> Outline { get; } = [];

    public void Text(double x, double y, Face face, double size, string text, double grey, double angleDegrees = 0) =>
        _steps.Add(new TextStep(x, y, face, size, text, grey, angleDegrees));

    public void Line(double x1, double y1, double x2, double y2, Pen pen) => _steps.Add(new PathStep([(x1, y1), (x2, y2)], false, pen));

    public void Path(IReadOnlyList<(double X, double Y)> points, bool closed, Pen pen) => _steps.Add(new PathStep(points, closed, pen));

    public void Box(double x, double y, double width, double height, Pen pen) =>
        Path([(x, y), (x + width, y), (x + width, y + height), (x, y + height)], true, pen);

    public void Circle(double x, double y, double radius, Pen pen) => _steps.Add(new CircleStep(x, y, radius, pen));

    /// <summary>Paints what belongs to an element of the structure.</summary>
    public void For(StructureElement element, Action paint) => Within(new OpenElement(element), paint);

    /// <summary>Paints rules, bands and repeated heads, which are not read out.</summary>
    public void Furniture(Action paint, string kind = "Layout") => Within(new OpenArtifact(kind), paint);

    /// <summary>Paints what is copied and searched as another text than its letters make.</summary>
    public void ReadAs(string text, Action paint) => Within(new OpenReading(text), paint);

    private void Within(Step open, Action paint)
    {
        _steps.Add(open);
        paint();
        _steps.Add(Close.Step);
    }
}
