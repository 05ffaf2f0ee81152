namespace JointPlanner.Pdf.Layout;

/// <summary>Running text and notes.</summary>
internal static class ParagraphLayout
{
    private const double NoteIndent = 11;

    public static IEnumerable<Strip> Strips(Paragraph paragraph, Frame frame) =>
        frame.TextStrips(frame.Root.Child("P"), paragraph.Words, TextLook.Body, 0, 4.5);

    public static IEnumerable<Strip> Strips(Note note, Frame frame)
    {
        var words = Words.Join(Words.Strong(note.Lead + ". "), note.Words);
        var pen = note.Caution ? new Pen(2, Measures.Ink) : new Pen(1, Measures.Rule);
        return frame.TextStrips(frame.Root.Child("P"), words, TextLook.Body, NoteIndent, 6.5, (canvas, top, height) =>
            canvas.Furniture(() => canvas.Line(Frame.Left + 2, top, Frame.Left + 2, top + height, pen)));
    }
}
