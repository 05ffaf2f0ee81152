using JointPlanner.Engine.Plans;
using JointPlanner.Pictures;

namespace JointPlanner.Drawings;

/// <summary>Draws supports with the bearings on them and the ground at their feet.</summary>
internal sealed class SupportPen(Plan plan, ElevationFrame frame, double letter)
{
    private readonly double bearing = letter * 0.8;

    internal void Draw(PictureBuilder paper, Support support)
    {
        var top = frame.View.ToPaper(new(support.Station, Heights.Soffit(plan, support)));
        var foot = frame.View.ToPaper(new(support.Station, Heights.Foot(plan, support)));
        var drawn = support.Kind switch
        {
            SupportKind.Abutment => Abutment(support, top, foot),
            SupportKind.Pier => Shaft(top.Moved(0, bearing), foot, letter * 0.32),
            SupportKind.Tower => Shaft(top.Moved(0, -letter * 3), foot, letter * 0.45),
            _ => throw new InvalidOperationException($"There is no kind of support {support.Kind}."),
        };
        drawn.AddRange(Ground(foot));
        foreach (var line in plan.Bearings.Where(b => b.On == support.Id)) drawn.AddRange(Bearing(line, frame.View.ToPaper(new(line.Station, 0)).X, top.Y));
        var mark = support.Mark.Length > 0 ? support.Mark : support.Id;
        drawn.Add(new Label(Role.Label, foot.Moved(0, letter * 1.55), mark) { Anchor = Anchor.Middle, SizeMm = letter });
        paper.Add(new Group(Role.Support, drawn) { PlanPath = $"supports/{support.Id}", Title = ElevationPen.Name("Support", support.Mark, support.Id) });
    }

    private static List<Element> Shaft(PaperPoint top, PaperPoint foot, double half) =>
    [
        new Box(Role.Support, new(top.X - (half * 2.2), top.Y, half * 4.4, half), Stroke.Medium, Fill.Paper),
        new Box(Role.Support, new(top.X - half, top.Y + half, half * 2, Math.Max(foot.Y - top.Y - half, 0.1)), Stroke.Medium, Fill.Paper),
        new Box(Role.Support, new(top.X - (half * 3), foot.Y, half * 6, half), Stroke.Medium, Fill.Paper),
    ];

    private List<Element> Abutment(Support support, PaperPoint top, PaperPoint foot)
    {
        // Earth lies on the side away from the deck.
        var side = plan.Segments.Any(s => s.Start < support.Station - 1e-9 && s.End <= support.Station + (s.Length / 2)) ? 1 : -1;
        var seat = top.Y + bearing;
        var (front, back) = (top.X - (side * letter * 0.55), top.X + (side * letter * 1.25));
        var wall = back - (side * letter * 0.45);
        var surface = frame.View.PaperOrigin.Y;
        var earth = back + (side * letter * 1.4);
        return
        [
            new Hatch(Role.Hatch, [new(back, surface), new(earth, surface), new(earth, foot.Y), new(back, foot.Y)], letter * 0.34, side * 45),
            new Line(Role.Ground, new(back, surface), new(earth, surface), Stroke.Medium),
            new Polygon(Role.Support, [new(front, seat), new(front, foot.Y), new(back, foot.Y), new(back, surface), new(wall, surface), new(wall, seat)], Stroke.Medium, Fill.Paper),
        ];
    }

    private IEnumerable<Element> Ground(PaperPoint foot)
    {
        var half = letter * 1.9;
        yield return new Line(Role.Ground, foot.Moved(-half, letter * 0.35), foot.Moved(half, letter * 0.35), Stroke.Thin);
        for (var i = -4; i <= 4; i++)
        {
            var at = foot.Moved(i * half / 4.4, letter * 0.35);
            yield return new Line(Role.Ground, at, at.Moved(-letter * 0.18, letter * 0.24), Stroke.Hairline);
        }
    }

    // The trade's symbols: a filled triangle holds, circles roll, a layered block shears.
    private List<Element> Bearing(BearingLine line, double x, double soffit)
    {
        var (half, below) = (bearing * 0.55, soffit + bearing);
        return line.Kind switch
        {
            BearingKind.Fixed => [new Polygon(Role.Bearing, [new(x, soffit), new(x - half, below), new(x + half, below)], Stroke.Medium, Fill.Ink)],
            BearingKind.Free =>
            [
                new Polygon(Role.Bearing, [new(x, soffit), new(x - half, below - (half * 0.75)), new(x + half, below - (half * 0.75))], Stroke.Medium, Fill.Paper),
                new Circle(Role.Bearing, new(x - (half * 0.5), below - (half * 0.36)), half * 0.33, Stroke.Medium, Fill.Paper),
                new Circle(Role.Bearing, new(x + (half * 0.5), below - (half * 0.36)), half * 0.33, Stroke.Medium, Fill.Paper),
            ],
            BearingKind.Elastomeric =>
            [
                new Box(Role.Bearing, new(x - half, soffit, half * 2, bearing), Stroke.Medium, Fill.Paper),
                .. Enumerable.Range(1, 3).Select(i => new Line(Role.Bearing, new(x - half, soffit + (bearing * i / 4)), new(x + half, soffit + (bearing * i / 4)), Stroke.Thin)),
            ],
            BearingKind.Monolithic => [new Box(Role.Bearing, new(x - (half * 0.5), soffit, half, bearing), Stroke.Medium, Fill.Ink)],
            _ => throw new InvalidOperationException($"There is no kind of bearing {line.Kind}."),
        };
    }
}
