using System.Text;

namespace JointPlanner.Pdf;

/// <summary>
/// A document as plain text, line by line, for comparing what a sheet says with what was approved. Says everything that is printed except
/// the shapes in pictures; says nothing of pages.
/// </summary>
public static class DocumentText
{
    /// <summary>The text, with line feeds between lines and at the end.</summary>
    public static string Of(Document document)
    {
        var text = new StringBuilder();
        void Line(string line) => text.Append(line).Append('\n');
        Line("title: " + document.Title);
        Line("author: " + document.Author);
        Line("program: " + document.Program);
        Line("date: " + document.Date.UtcDateTime.ToString("yyyy-MM-dd'T'HH:mm:ss'Z'", System.Globalization.CultureInfo.InvariantCulture));
        Line("paper: " + document.Paper.Name);
        Line("head: " + document.Head.Left + " | " + document.Head.Right);
        Line("foot: " + document.Foot);
        if (document.Watermark is not null) Line("watermark: " + document.Watermark);
        foreach (var file in document.Attachments) Line("attached: " + file.Name + " (" + file.Relation + ", " + file.MediaType + ") " + file.Sha256);
        foreach (var block in document.Blocks)
        {
            text.Append('\n');
            foreach (var line in Lines(block)) Line(line);
        }
        return text.ToString();
    }

    private static IEnumerable<string> Lines(Block block) => block switch
    {
        TitleBlock title => title.Subtitle is null ? ["== " + title.Title] : ["== " + title.Title, "   " + title.Subtitle],
        Heading heading => [new string('#', heading.Rank) + " " + (heading.Number is null ? "" : heading.Number + " ") + heading.Text],
        Paragraph paragraph => [paragraph.Words.Linear],
        Note note => [(note.Caution ? "!! " : "! ") + note.Lead + ". " + note.Words.Linear],
        FormulaBlock formula => Lines(formula),
        Table table => Lines(table),
        KeyValues pairs => pairs.Pairs.Select(p => p.Key + ": " + p.Value.Linear),
        PictureBlock picture => ["[picture] " + picture.Picture.Title + ". " + picture.Picture.Description, .. picture.Caption is null ? [] : new[] { picture.Caption }],
        SignatureFields fields => fields.Fields.Select(f => "[signature] " + f.Name + ": " + f.Label + (f.Person is null ? "" : ", " + f.Person)),
        PageBreak => ["[page]"],
        _ => throw new InvalidOperationException($"There is no text for the block {block.GetType().Name}."),
    };

    private static IEnumerable<string> Lines(FormulaBlock formula)
    {
        if (formula.Label.Runs.Count > 0 || formula.Source is not null)
            yield return formula.Label.Linear + (formula.Source is null ? "" : " [" + formula.Source + "]");
        foreach (var line in formula.Lines) yield return "    " + line.Linear;
        if (formula.Remark.Runs.Count > 0) yield return "    (" + formula.Remark.Linear + ")";
    }

    private static IEnumerable<string> Lines(Table table)
    {
        if (table.Caption is not null) yield return table.Caption;
        if (table.Spans.Count > 0) yield return "|| " + string.Join(" || ", table.Spans.Select(s => s.Head.Linear + " ×" + Writing.Syntax.Number(s.Columns)));
        yield return "| " + string.Join(" | ", table.Columns.Select(c => c.Head.Linear));
        foreach (var group in table.Groups)
        {
            if (group.Title is not null) yield return "-- " + group.Title;
            foreach (var row in group.Rows) yield return (row.Strong ? "* " : "| ") + string.Join(" | ", row.Cells.Select(c => c.Linear));
        }
    }
}
