namespace JointPlanner.Pdf.Layout;

/// <summary>Steps of a calculation: a label with its source, then lines aligned at their relation signs.</summary>
internal static class FormulaLayout
{
    private const double Indent = 14, LeastLeft = 34, AroundSign = 4.5, BetweenLines = 3.2;

    public static IEnumerable<Strip> Strips(FormulaBlock block, Frame frame)
    {
        var look = new TextLook(Measures.Formula, 0);
        var quiet = new TextLook(Measures.Tiny, Measures.SmallLine, Faces.FaceStyle.Regular, Measures.Quiet);
        List<Strip> strips = [.. LabelStrips(block, frame, quiet)];
        var formula = frame.Root.Child("Formula", alternative: frame.Set.Settable(block.Linear));

        var math = new MathSetter(frame.Set);
        var lefts = block.Lines.Select(l => l.Left is null ? null : math.Set(l.Left, look)).ToList();
        var sign = Frame.Left + Indent + Math.Clamp(lefts.Max(l => l?.Width ?? 0), LeastLeft, frame.Width * 0.3) + AroundSign;
        var signWidth = block.Lines.Max(l => frame.Set.Width(frame.Set.Settable(l.Relation), look));
        var start = sign + signWidth + AroundSign;
        for (var i = 0; i < block.Lines.Count; i++)
        {
            var line = block.Lines[i];
            var left = lefts[i];
            var rows = math.Lines(line.Right, frame.Right - start, look);
            for (var k = 0; k < rows.Count; k++)
            {
                var relation = k == 0 && line.Relation.Length > 0 ? frame.Set.Text(line.Relation, look) : null;
                var right = rows[k].Piece;
                // One text for the whole line, so that it is copied and searched in one piece however high its fractions are.
                var reading = frame.Set.Settable(k == 0 ? (line with { Right = MathNode.Upright(rows[k].Text) }).Linear : rows[k].Text.Trim());
                var ascent = Math.Max(right.Ascent, Math.Max(relation?.Ascent ?? 0, k == 0 ? left?.Ascent ?? 0 : 0));
                var descent = Math.Max(right.Descent, k == 0 ? left?.Descent ?? 0 : 0);
                var first = k == 0;
                strips.Add(new(ascent + descent + BetweenLines, (canvas, top) =>
                {
                    var y = top + (BetweenLines / 2) + ascent;
                    formula.Enclose(new(canvas.Index, Frame.Left + Indent, top, frame.Right, top + ascent + descent + BetweenLines));
                    canvas.For(formula, () => canvas.ReadAs(reading, () =>
                    {
                        if (first) left?.Paint(canvas, Math.Max(Frame.Left, sign - AroundSign - left.Width), y);
                        relation?.Paint(canvas, sign, y);
                        right.Paint(canvas, start, y);
                    }));
                })
                {
                    SpaceBefore = strips.Count == 0 ? 5 : 0,
                    Link = Link.Weak,
                });
            }
        }
        if (block.Remark.Runs.Count > 0)
            strips.AddRange(frame.TextStrips(frame.Root.Child("P"), block.Remark, quiet, Indent, 0.5));
        strips[^1].Link = Link.None;
        return strips;
    }

    private static List<Strip> LabelStrips(FormulaBlock block, Frame frame, TextLook quiet)
    {
        if (block.Label.Runs.Count == 0 && block.Source is null) return [];
        List<Piece> sources = block.Source is null ? [] : frame.Set.Lines(block.Source, frame.Width * 0.42, quiet);
        var sourceWidth = sources.Select(s => s.Width).DefaultIfEmpty(0).Max();
        var labels = frame.Set.Lines(block.Label, frame.Width - sourceWidth - 14, TextLook.Body);
        var label = block.Label.Runs.Count == 0 ? null : frame.Root.Child("P");
        var source = block.Source is null ? null : frame.Root.Child("P");
        List<Strip> strips = [];
        for (var i = 0; i < Math.Max(labels.Count, sources.Count); i++)
        {
            var line = i < labels.Count ? labels[i] : null;
            var origin = i < sources.Count ? sources[i] : null;
            var height = line is null ? Measures.SmallLine : Frame.LineHeight(line, TextLook.Body);
            strips.Add(new(height, (canvas, top) =>
            {
                if (line is not null && label is not null) canvas.For(label, () => Frame.PaintLine(canvas, line, Frame.Left, top, height));
                if (origin is not null) canvas.For(source!, () => Frame.PaintLine(canvas, origin, frame.Right - origin.Width, top + 0.6, height));
            })
            {
                SpaceBefore = i == 0 ? 7 : 0,
                Link = Link.Strong,
            });
        }
        return strips;
    }
}
