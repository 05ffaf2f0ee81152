using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Lays a document out: blocks into strips, strips on pages, then head and foot when the number of pages is known.</summary>
internal static class Composer
{
    public static LaidOutDocument Compose(Document document)
    {
        Check(document);
        var set = new TextSetter(TypeSet.Standard);
        var root = new StructureElement("Document", null);
        var frame = new Frame(set, document.Paper, root);
        var furniture = new PageFurniture(document, frame);
        List<Strip> strips = [];
        foreach (var block in document.Blocks) strips.AddRange(Strips(block, frame));
        var pages = new Paginator(Measures.Top, document.Paper.HeightPoints - Measures.Bottom, furniture.PaintWatermark).Place(strips);
        foreach (var page in pages) furniture.PaintHeadAndFoot(page, pages.Count);
        return new(document, pages, root, set.Missing);
    }

    private static IEnumerable<Strip> Strips(Block block, Frame frame) => block switch
    {
        TitleBlock title => HeadingLayout.Strips(title, frame),
        Heading heading => HeadingLayout.Strips(heading, frame),
        Paragraph paragraph => ParagraphLayout.Strips(paragraph, frame),
        Note note => ParagraphLayout.Strips(note, frame),
        FormulaBlock formula => FormulaLayout.Strips(formula, frame),
        Table table => TableLayout.Strips(table, frame),
        KeyValues pairs => KeyValuesLayout.Strips(pairs, frame),
        PictureBlock picture => PictureLayout.Strips(picture, frame),
        SignatureFields fields => SignatureLayout.Strips(fields, frame),
        PageBreak => [new Strip(0, (_, _) => { }) { BeginsPage = true }],
        _ => throw new InvalidOperationException($"The sheet does not know the block {block.GetType().Name}."),
    };

    private static void Check(Document document)
    {
        if (document.Blocks.OfType<FormulaBlock>().Any(f => f.Lines.Count == 0))
            throw new ArgumentException("A calculation step without a line cannot be printed.");
        var names = document.Blocks.OfType<SignatureFields>().SelectMany(s => s.Fields).Select(f => f.Name).ToList();
        if (names.FirstOrDefault(n => n.Length == 0 || !n.All(c => c is (>= 'a' and <= 'z') or (>= '0' and <= '9') or '-')) is { } odd)
            throw new ArgumentException($"The signature field \"{odd}\" needs a name of letters a to z, digits and hyphens.");
        if (names.Count != names.Distinct(StringComparer.Ordinal).Count())
            throw new ArgumentException("Two signature fields have the same name; each needs its own.");
        if (document.Attachments.Count != document.Attachments.Select(a => a.Name).Distinct(StringComparer.Ordinal).Count())
            throw new ArgumentException("Two attachments have the same name; each needs its own.");
        if (document.Attachments.FirstOrDefault(a => a.Name.Length == 0 || a.Name.IndexOfAny(['/', '\\', ':', '\0']) >= 0) is { } file)
            throw new ArgumentException($"The attachment \"{file.Name}\" needs a file name without folders.");
    }
}
