using JointPlanner.Pdf.Faces;
using JointPlanner.Pictures;

namespace JointPlanner.Pdf.Layout;

/// <summary>Paints a picture's elements, each role in its shade of grey.</summary>
/// <param name="canvas">The page.</param>
/// <param name="set">The setter of text.</param>
/// <param name="left">The picture's left edge in points.</param>
/// <param name="top">The picture's top edge in points.</param>
/// <param name="scale">Points for one millimetre of the picture.</param>
internal sealed class PicturePainter(PageCanvas canvas, TextSetter set, double left, double top, double scale)
{
    public void Paint(Picture picture)
    {
        foreach (var element in picture.Elements) Paint(element);
    }

    private void Paint(Element element)
    {
        switch (element)
        {
            case Line line:
                canvas.Path([At(line.From), At(line.To)], false, PenOf(line.Role, line.Stroke, Fill.None));
                break;
            case Polyline polyline:
                canvas.Path([.. polyline.Points.Select(At)], false, PenOf(polyline.Role, polyline.Stroke, Fill.None));
                break;
            case Polygon polygon:
                canvas.Path([.. polygon.Points.Select(At)], true, PenOf(polygon.Role, polygon.Stroke, polygon.Fill));
                break;
            case Pictures.Box box:
                var (x, y) = At(new(box.Edges.Left, box.Edges.Top));
                canvas.Box(x, y, box.Edges.Width * scale, box.Edges.Height * scale, PenOf(box.Role, box.Stroke, box.Fill));
                break;
            case Circle circle:
                var centre = At(circle.Centre);
                canvas.Circle(centre.X, centre.Y, circle.RadiusMm * scale, PenOf(circle.Role, circle.Stroke, circle.Fill));
                break;
            case Label label:
                Paint(label);
                break;
            case Composite composite:
                foreach (var part in composite.Parts) Paint(part);
                break;
            default:
                throw new InvalidOperationException($"The sheet cannot draw the picture element {element.GetType().Name}.");
        }
    }

    private void Paint(Label label)
    {
        var look = new TextLook(label.SizeMm * scale, 0, label.Weight == Weight.Semibold ? FaceStyle.Strong : FaceStyle.Regular);
        var text = set.Settable(label.Text);
        var width = set.Width(text, look);
        var back = label.Anchor switch
        {
            Anchor.Start => 0,
            Anchor.Middle => width / 2,
            Anchor.End => width,
            _ => throw new InvalidOperationException($"There is no text anchor {label.Anchor}."),
        };
        var turn = label.AngleDegrees * Math.PI / 180;
        var (along, across) = (Math.Cos(turn), Math.Sin(turn));
        var drop = label.BaselineDropMm * scale;
        var (x, y) = At(label.At);
        (x, y) = (x - (back * along) - (drop * across), y - (back * across) + (drop * along));
        foreach (var run in TypeSet.Standard.Split(text, look.Style))
        {
            canvas.Text(x, y, run.Face, look.Size, run.Text, ShadeOf(label.Role), label.AngleDegrees);
            (x, y) = (x + (run.Width * look.Size * along), y + (run.Width * look.Size * across));
        }
    }

    private (double X, double Y) At(PaperPoint point) => (left + (point.X * scale), top + (point.Y * scale));

    private Pen PenOf(Role role, Stroke stroke, Fill fill) => new(
        stroke.WeightMm * scale,
        ShadeOf(role),
        fill switch
        {
            Fill.None => null,
            Fill.Paper => 1,
            Fill.Tint => 0.9,
            Fill.Ink => ShadeOf(role),
            _ => throw new InvalidOperationException($"There is no filling {fill}."),
        },
        stroke.Pattern.Count == 0 ? null : [.. stroke.Pattern.Select(d => d * scale)]);

    private static double ShadeOf(Role role) => role switch
    {
        Role.Deck or Role.Support or Role.Cable or Role.Joint or Role.Bearing or Role.Curve or Role.Marker or Role.Label or Role.Limit => Measures.Ink,
        Role.Dimension or Role.Axis => 0.25,
        Role.Ground or Role.Water or Role.Hatch => 0.45,
        Role.Guide => 0.7,
        _ => throw new InvalidOperationException($"The sheet has no shade for the role {role}."),
    };
}
