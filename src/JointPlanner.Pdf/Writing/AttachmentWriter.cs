namespace JointPlanner.Pdf.Writing;

/// <summary>Writes attached files (ISO 32000-1, 7.11.4; their relation by ISO 32000-2, 7.11.3).</summary>
internal static class AttachmentWriter
{
    /// <summary>Writes the files and enters them in the catalog, by name and as files that belong to the document.</summary>
    public static void Write(ObjectFile file, PdfDictionary catalog, Document document)
    {
        if (document.Attachments.Count == 0) return;
        var specifications = document.Attachments.OrderBy(a => a.Name, StringComparer.Ordinal)
            .Select(a => (a.Name, Id: Specification(file, a, document.Date))).ToList();
        var names = string.Join(' ', specifications.Select(s => Syntax.Text(s.Name) + " " + Syntax.Reference(s.Id)));
        var tree = file.Add(new PdfDictionary().Raw("Names", "[" + names + "]"));
        catalog.Dictionary("Names", new PdfDictionary().Reference("EmbeddedFiles", tree)).References("AF", specifications.Select(s => s.Id));
    }

    private static int Specification(ObjectFile file, Attachment attachment, DateTimeOffset date)
    {
        var stream = file.AddStream(
            new PdfDictionary("EmbeddedFile").Name("Subtype", attachment.MediaType)
                .Dictionary("Params", new PdfDictionary().Number("Size", attachment.Bytes.Length).Raw("ModDate", Syntax.Date(date))),
            attachment.Bytes.Span);
        return file.Add(new PdfDictionary("Filespec").Text("F", attachment.Name).Text("UF", attachment.Name).Text("Desc", attachment.Description)
            .Name("AFRelationship", attachment.Relation switch
            {
                AttachmentRelation.Source => "Source",
                AttachmentRelation.Data => "Data",
                _ => throw new InvalidOperationException($"There is no relation {attachment.Relation} of an attachment."),
            })
            .Dictionary("EF", new PdfDictionary().Reference("F", stream).Reference("UF", stream)));
    }
}
