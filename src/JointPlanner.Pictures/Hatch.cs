namespace JointPlanner.Pictures;

/// <summary>
/// An area filled with parallel lines. The lines are worked out, not left to a pattern of the file format: they fall on the same places on
/// screen and sheet, and two pictures on one page cannot mix their patterns up.
/// </summary>
/// <param name="Role">What it stands for.</param>
/// <param name="Outline">Three corners or more; crossing outlines fill by the even-odd rule.</param>
/// <param name="SpacingMm">Distance between the lines, above zero.</param>
/// <param name="AngleDegrees">Slope of the lines; above zero they rise to the right.</param>
public sealed record Hatch(Role Role, IReadOnlyList<PaperPoint> Outline, double SpacingMm = 1.2, double AngleDegrees = 45) : Composite(Role)
{
    private const int MostLines = 5000;

    /// <inheritdoc/>
    public override IReadOnlyList<Element> Parts
    {
        get
        {
            if (!(SpacingMm > 0)) throw new InvalidOperationException($"A hatch needs a spacing above zero, not {SpacingMm} mm.");
            if (Outline.Count < 3) throw new InvalidOperationException("A hatch needs an outline of three corners or more.");
            var angle = AngleDegrees * Math.PI / 180;
            var (right, up) = (Math.Cos(angle), Math.Sin(angle));
            // Along and across the hatch lines; across is counted from the paper's corner, so that neighbouring areas match.
            var turned = Outline.Select(p => (Along: (p.X * right) - (p.Y * up), Across: (p.X * up) + (p.Y * right))).ToList();
            var first = (int)Math.Ceiling(turned.Min(p => p.Across) / SpacingMm);
            var last = (int)Math.Floor(turned.Max(p => p.Across) / SpacingMm);
            if (last - first >= MostLines) throw new InvalidOperationException($"A hatch of {last - first} lines is too fine for its area.");
            List<Element> lines = [];
            for (var i = first; i <= last; i++) AddLines(lines, turned, i * SpacingMm, right, up);
            return lines;
        }
    }

    private void AddLines(List<Element> lines, List<(double Along, double Across)> corners, double across, double right, double up)
    {
        List<double> crossings = [];
        for (var i = 0; i < corners.Count; i++)
        {
            var (a, b) = (corners[i], corners[(i + 1) % corners.Count]);
            // Half open, so that a corner on the line counts once.
            if (a.Across <= across == b.Across <= across) continue;
            crossings.Add(a.Along + ((b.Along - a.Along) * (across - a.Across) / (b.Across - a.Across)));
        }
        crossings.Sort();
        for (var i = 0; i + 1 < crossings.Count; i += 2)
        {
            if (crossings[i + 1] - crossings[i] < 0.01) continue;
            lines.Add(new Line(Role, Back(crossings[i]), Back(crossings[i + 1]), Stroke.Hairline));
        }

        PaperPoint Back(double along) => new((along * right) + (across * up), (across * right) - (along * up));
    }
}
