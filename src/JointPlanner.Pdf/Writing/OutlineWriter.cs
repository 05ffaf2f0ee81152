using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Writing;

/// <summary>Writes the outline (ISO 32000-1, 12.3.3): chapters open, their parts folded in.</summary>
internal sealed class OutlineWriter(ObjectFile file, IReadOnlyList<int> pageIds, double pageHeight)
{
    /// <summary>Writes the outline and gives its object's number; null when there are no headings.</summary>
    public int? Write(IReadOnlyList<OutlineMark> marks)
    {
        if (marks.Count == 0) return null;
        var root = file.Reserve();
        List<(OutlineMark Mark, int Id, List<(OutlineMark Mark, int Id)> Parts)> chapters = [];
        foreach (var mark in marks)
        {
            // A part before the first chapter is shown as one.
            if (mark.Rank == 1 || chapters.Count == 0) chapters.Add((mark, file.Reserve(), []));
            else chapters[^1].Parts.Add((mark, file.Reserve()));
        }
        for (var i = 0; i < chapters.Count; i++)
        {
            var (mark, id, parts) = chapters[i];
            var entry = Entry(mark, root, i > 0 ? chapters[i - 1].Id : null, i + 1 < chapters.Count ? chapters[i + 1].Id : null);
            if (parts.Count > 0) entry.Reference("First", parts[0].Id).Reference("Last", parts[^1].Id).Number("Count", -parts.Count);
            file.Set(id, entry);
            for (var k = 0; k < parts.Count; k++)
                file.Set(parts[k].Id, Entry(parts[k].Mark, id, k > 0 ? parts[k - 1].Id : null, k + 1 < parts.Count ? parts[k + 1].Id : null));
        }
        file.Set(root, new PdfDictionary("Outlines").Reference("First", chapters[0].Id).Reference("Last", chapters[^1].Id).Number("Count", chapters.Count));
        return root;
    }

    private PdfDictionary Entry(OutlineMark mark, int parent, int? before, int? after)
    {
        var entry = new PdfDictionary().Text("Title", Pictures.PlainCharacters.Of(mark.Title)).Reference("Parent", parent);
        if (before is { } b) entry.Reference("Prev", b);
        if (after is { } a) entry.Reference("Next", a);
        return entry.Raw("Dest", "[" + Syntax.Reference(pageIds[mark.Page]) + "/XYZ null " + Syntax.Number(pageHeight - mark.Top + 6) + " null]");
    }
}
