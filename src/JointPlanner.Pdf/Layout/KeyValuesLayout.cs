namespace JointPlanner.Pdf.Layout;

/// <summary>Facts beside their names, one or two across, between two rules.</summary>
internal static class KeyValuesLayout
{
    private const double Gap = 16;

    public static IEnumerable<Strip> Strips(KeyValues block, Frame frame)
    {
        if (block.Pairs.Count == 0) return [];
        var look = TextLook.Cell with { Size = 8.4, LineHeight = 11 };
        var keyLook = look with { Grey = Measures.Quiet };
        var across = block.TwoAcross ? 2 : 1;
        var width = (frame.Width - ((across - 1) * Gap)) / across;
        var keyWidth = Math.Min(width * 0.42, block.Pairs.Max(p => frame.Set.Text(p.Key, keyLook).Width) + 12);
        var element = frame.Root.Child("Table");
        List<Strip> strips = [];
        for (var i = 0; i < block.Pairs.Count; i += across)
        {
            var row = element.Child("TR");
            List<TableCell> cells = [];
            for (var k = 0; k < across && i + k < block.Pairs.Count; k++)
            {
                var pair = block.Pairs[i + k];
                var left = Frame.Left + (k * (width + Gap));
                cells.Add(new(frame.Set.Lines(pair.Key, keyWidth - 8, keyLook), left, keyWidth, Align.Left, row.Child("TH", scope: "Row")));
                cells.Add(new(frame.Set.Lines(pair.Value, width - keyWidth, look), left + keyWidth, width - keyWidth, Align.Left, row.Child("TD")));
            }
            var last = i + across >= block.Pairs.Count;
            strips.AddRange(new RowSlices(cells, Frame.Left, frame.Right)
            {
                Look = look,
                Above = i == 0 ? Pen.Thin : null,
                Below = last ? Pen.Thin : Pen.Hair,
                SpaceBefore = i == 0 ? 6 : 0,
            }.Strips());
            if (!last) strips[^1].Link = Link.Weak;
        }
        strips.Add(Strip.Space(3));
        return strips;
    }
}
