using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Titles and headings.</summary>
internal static class HeadingLayout
{
    public static IEnumerable<Strip> Strips(TitleBlock title, Frame frame)
    {
        var h1 = frame.Root.Child("H1");
        foreach (var strip in Linked(frame.TextStrips(h1, title.Title, new(17.5, 22, FaceStyle.Strong), 0, 0))) yield return strip;
        if (title.Subtitle is not null)
        {
            var p = frame.Root.Child("P");
            foreach (var strip in Linked(frame.TextStrips(p, title.Subtitle, new(10.5, 15, FaceStyle.Regular, Measures.Quiet), 0, 0))) yield return strip;
        }
        yield return Strip.Space(5);
    }

    public static IEnumerable<Strip> Strips(Heading heading, Frame frame)
    {
        if (heading.Rank is not (1 or 2))
            throw new ArgumentException($"A heading's rank must be 1 or 2, not {heading.Rank}: \"{heading.Text}\".");
        var first = heading.Rank == 1;
        var look = first ? new TextLook(12.4, 17, FaceStyle.Strong) : new TextLook(10, 14, FaceStyle.Strong);
        var number = heading.Number is null ? null : frame.Set.Text(heading.Number, look);
        var indent = number is null ? 0 : Math.Max(first ? 22 : 28, number.Width + 9);
        var element = frame.Root.Child("H" + (first ? "1" : "2"));
        var lines = frame.Set.Lines(heading.Text, frame.Width - indent, look);
        for (var i = 0; i < lines.Count; i++)
        {
            var (line, opening) = (lines[i], i == 0);
            yield return new(look.LineHeight, (canvas, top) =>
            {
                if (opening) canvas.Outline.Add(new(heading.Rank, heading.Number is null ? heading.Text : heading.Number + " " + heading.Text, canvas.Index, top));
                canvas.For(element, () =>
                {
                    if (opening && number is not null) Frame.PaintLine(canvas, number, Frame.Left, top, look.LineHeight);
                    Frame.PaintLine(canvas, line, Frame.Left + indent, top, look.LineHeight);
                });
            })
            {
                SpaceBefore = opening ? (first ? 17 : 11) : 0,
                Link = Link.Strong,
            };
        }
        var below = first ? 5.0 : 2.5;
        yield return new(below, (canvas, top) =>
        {
            if (first) canvas.Furniture(() => canvas.Line(Frame.Left, top + 1.2, frame.Right, top + 1.2, Pen.Thin));
        })
        { Link = Link.Strong };
    }

    private static List<Strip> Linked(List<Strip> strips)
    {
        foreach (var strip in strips) strip.Link = Link.Strong;
        return strips;
    }
}
