namespace JointPlanner.Pictures;

/// <summary>A dimension: line with arrows, witness lines from the measured points, and its number.</summary>
/// <param name="From">One measured point.</param>
/// <param name="To">The other measured point.</param>
/// <param name="Text">The number with its unit.</param>
/// <param name="OffsetMm">How far the line stands from the measured points: above zero it lies to the left of the way from one to the other
/// (above, when drawn from left to right), below zero to the right.</param>
public sealed record Dimension(PaperPoint From, PaperPoint To, string Text, double OffsetMm) : Composite(Role.Dimension)
{
    private const double Head = 1.8, WitnessGap = 0.8, WitnessEnd = 1.2, TextGap = 0.7;

    /// <summary>Type size in millimetres.</summary>
    public double SizeMm { get; init; } = 2.4;

    /// <inheritdoc/>
    public override IReadOnlyList<Element> Parts
    {
        get
        {
            var length = From.DistanceTo(To);
            if (length == 0) return [];
            var (right, down) = ((To.X - From.X) / length, (To.Y - From.Y) / length);
            PaperPoint Beside(PaperPoint p, double off) => p.Moved(down * off, -right * off);
            var (a, b) = (Beside(From, OffsetMm), Beside(To, OffsetMm));
            var side = Math.Sign(OffsetMm);
            List<Element> parts = [];
            if (Math.Abs(OffsetMm) > WitnessGap)
            {
                foreach (var p in new[] { From, To })
                    parts.Add(new Line(Role, Beside(p, side * WitnessGap), Beside(p, OffsetMm + (side * WitnessEnd)), Stroke.Hairline));
            }
            parts.AddRange(Arrows(a, b, right, down, length));
            parts.Add(Number(a, b, right, down));
            return parts;
        }
    }

    private List<Element> Arrows(PaperPoint a, PaperPoint b, double right, double down, double length)
    {
        // Too short for two heads: they stand outside and point inwards.
        var outside = length < 2.6 * Head;
        var (way, over) = outside ? (-1, 2 * Head) : (1, 0);
        return
        [
            new Line(Role, a.Moved(-right * over, -down * over), b.Moved(right * over, down * over), Stroke.Thin),
            Arrow.Head(Role, a, -right * way, -down * way, Head),
            Arrow.Head(Role, b, right * way, down * way, Head),
        ];
    }

    private Label Number(PaperPoint a, PaperPoint b, double right, double down)
    {
        var angle = Math.Atan2(down, right) * 180 / Math.PI;
        // Never upside down: the text reads from below or from the right.
        if (angle > 90.0001) angle -= 180;
        else if (angle <= -90.0001) angle += 180;
        var (across, along) = (Math.Sin(angle * Math.PI / 180), Math.Cos(angle * Math.PI / 180));
        var middle = new PaperPoint((a.X + b.X) / 2, (a.Y + b.Y) / 2);
        return new Label(Role, middle.Moved(across * TextGap, -along * TextGap), Text) { Anchor = Anchor.Middle, SizeMm = SizeMm, AngleDegrees = angle };
    }
}
