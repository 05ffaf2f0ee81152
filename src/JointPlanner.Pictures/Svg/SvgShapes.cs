using System.Xml;

namespace JointPlanner.Pictures.Svg;

/// <summary>Writes the elements of one picture.</summary>
internal sealed class SvgShapes(XmlWriter xml, bool pressable)
{
    public void Write(Element element)
    {
        switch (element)
        {
            case Line line:
                Start("line", line);
                Number("x1", line.From.X);
                Number("y1", line.From.Y);
                Number("x2", line.To.X);
                Number("y2", line.To.Y);
                Stroke(line.Stroke);
                break;
            case Polyline polyline:
                Start("polyline", polyline);
                Points(polyline.Points);
                Stroke(polyline.Stroke);
                break;
            case Polygon polygon:
                Start("polygon", polygon);
                Points(polygon.Points);
                Area(polygon.Fill);
                Stroke(polygon.Stroke);
                break;
            case Box box:
                Start("rect", box);
                Number("x", box.Edges.Left);
                Number("y", box.Edges.Top);
                Number("width", box.Edges.Width);
                Number("height", box.Edges.Height);
                Area(box.Fill);
                Stroke(box.Stroke);
                break;
            case Circle circle:
                Start("circle", circle);
                Number("cx", circle.Centre.X);
                Number("cy", circle.Centre.Y);
                Number("r", circle.RadiusMm);
                Area(circle.Fill);
                Stroke(circle.Stroke);
                break;
            case Label label:
                WriteLabel(label);
                return;
            case Composite composite:
                Start("g", composite);
                Title(composite);
                foreach (var part in composite.Parts) Write(part);
                xml.WriteEndElement();
                return;
            default:
                throw new InvalidOperationException($"The SVG writer does not know the element {element.GetType().Name}.");
        }
        Title(element);
        xml.WriteEndElement();
    }

    private void WriteLabel(Label label)
    {
        Start("text", label);
        // The drop to the baseline is across the text, so it turns with it.
        var turn = label.AngleDegrees * Math.PI / 180;
        var at = label.At.Moved(-Math.Sin(turn) * label.BaselineDropMm, Math.Cos(turn) * label.BaselineDropMm);
        Number("x", at.X);
        Number("y", at.Y);
        Number("font-size", label.SizeMm);
        Text("text-anchor", label.Anchor switch
        {
            Anchor.Start => "start",
            Anchor.Middle => "middle",
            Anchor.End => "end",
            _ => throw new InvalidOperationException($"There is no text anchor {label.Anchor}."),
        });
        if (label.Weight == Weight.Semibold) Text("font-weight", "600");
        if (label.AngleDegrees != 0) Text("transform", $"rotate({SvgNumber.Of(label.AngleDegrees)} {SvgNumber.Of(at.X)} {SvgNumber.Of(at.Y)})");
        Text("fill", "currentColor");
        Title(label);
        xml.WriteString(PlainCharacters.Of(label.Text));
        xml.WriteEndElement();
    }

    private void Start(string name, Element element)
    {
        xml.WriteStartElement(name, "http://www.w3.org/2000/svg");
        Text("class", ClassOf(element.Role));
        if (element.PlanPath is null) return;
        Text("data-path", PlainCharacters.Of(element.PlanPath));
        if (!pressable) return;
        Text("tabindex", "0");
        Text("role", "button");
        Text("aria-label", PlainCharacters.Of(element.Title ?? element.PlanPath));
    }

    private void Title(Element element)
    {
        if (element.Title is not null) xml.WriteElementString("title", "http://www.w3.org/2000/svg", PlainCharacters.Of(element.Title));
    }

    private void Points(IReadOnlyList<PaperPoint> points) =>
        Text("points", string.Join(' ', points.Select(p => SvgNumber.Of(p.X) + "," + SvgNumber.Of(p.Y))));

    private void Stroke(Stroke stroke)
    {
        if (stroke.WeightMm == 0) return;
        Text("stroke", "currentColor");
        Number("stroke-width", stroke.WeightMm);
        if (stroke.Pattern.Count > 0) Text("stroke-dasharray", string.Join(' ', stroke.Pattern.Select(SvgNumber.Of)));
    }

    private void Area(Fill fill)
    {
        switch (fill)
        {
            case Fill.None:
                // Transparent, yet it can be pressed: "none" would let the press fall through an outline.
                Text("fill", "transparent");
                break;
            case Fill.Paper:
                Text("fill", "var(--picture-paper, Canvas)");
                break;
            case Fill.Tint:
                Text("fill", "currentColor");
                Text("fill-opacity", "0.14");
                break;
            case Fill.Ink:
                Text("fill", "currentColor");
                break;
            default:
                throw new InvalidOperationException($"There is no filling {fill}.");
        }
        if (fill != Fill.None) Text("fill-rule", "evenodd");
    }

    private static string ClassOf(Role role) => Enum.IsDefined(role)
        ? "pic-" + role.ToString().ToLowerInvariant()
        : throw new InvalidOperationException($"There is no role {role}.");

    private void Number(string name, double value) => Text(name, SvgNumber.Of(value));

    private void Text(string name, string value) => xml.WriteAttributeString(name, value);
}
