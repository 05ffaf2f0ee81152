using JointPlanner.Pdf.Layout;
using JointPlanner.Pdf.Writing;

namespace JointPlanner.Pdf;

/// <summary>
/// Makes a tagged PDF 1.7 of a document: lays it out, writes the pages, then what binds them together. Uses no PDF library, no clock and
/// no culture; safe to call from any number of threads.
/// </summary>
public static class PdfWriter
{
    /// <summary>The document as a file.</summary>
    /// <exception cref="ArgumentException">The document contradicts itself: a row with too few cells, two fields of one name, a name that is
    /// no file name. The message says what and where.</exception>
    /// <exception cref="InvalidOperationException">A picture holds an unknown element or a coordinate that is no number.</exception>
    public static PdfFile Write(Document document)
    {
        var laidOut = Composer.Compose(document);
        return new(Assemble(laidOut), laidOut.Pages.Count, laidOut.SpeltOut);
    }

    private static byte[] Assemble(LaidOutDocument laidOut)
    {
        var document = laidOut.Document;
        var (pages, height) = (laidOut.Pages, document.Paper.HeightPoints);
        var file = new ObjectFile();
        int catalogId = file.ReservePlain(), treeId = file.ReservePlain(), formId = file.ReservePlain(), resourcesId = file.Reserve();
        List<int> pageIds = [.. pages.Select(_ => file.ReservePlain())];
        var structure = new StructureWriter(file, pageIds, height);
        var fields = pages.SelectMany(p => p.Fields).Select((place, i) => (Id: file.ReservePlain(), Key: pages.Count + i, Place: place)).ToList();
        foreach (var field in fields)
        {
            structure.Know(field.Place, field.Id);
            new FieldWriter(file, height).Write(field.Id, field.Place, pageIds[field.Place.Bounds.Page], field.Key);
        }

        var fonts = new FontShelf();
        List<IReadOnlyList<StructureElement>> owners = [];
        foreach (var page in pages)
        {
            var content = new ContentWriter(page, height, fonts);
            var contentId = file.AddStream(new PdfDictionary(), content.Write());
            owners.Add(content.Owners);
            var entry = new PdfDictionary("Page").Reference("Parent", treeId).Numbers("MediaBox", 0, 0, document.Paper.WidthPoints, height)
                .Reference("Resources", resourcesId).Reference("Contents", contentId).Number("StructParents", page.Index).Name("Tabs", "S");
            var annotations = fields.Where(f => f.Place.Bounds.Page == page.Index).Select(f => f.Id).ToList();
            if (annotations.Count > 0) entry.References("Annots", annotations);
            file.Set(pageIds[page.Index], entry);
        }
        file.Set(resourcesId, fonts.Write(file));
        file.Set(treeId, new PdfDictionary("Pages").References("Kids", pageIds).Number("Count", pageIds.Count));
        file.Set(formId, new PdfDictionary().References("Fields", fields.Select(f => f.Id)).Number("SigFlags", fields.Count > 0 ? 3 : 0));

        var structureId = structure.Write(laidOut.Root, owners, [.. fields.Select(f => (f.Key, f.Place))]);
        var outlineId = new OutlineWriter(file, pageIds, height).Write([.. pages.SelectMany(p => p.Outline)]);
        file.Set(catalogId, Catalog(file, document, treeId, formId, structureId, outlineId));
        return file.Finish(catalogId, Information(file, document));
    }

    private static PdfDictionary Catalog(ObjectFile file, Document document, int treeId, int formId, int structureId, int? outlineId)
    {
        var profile = file.AddStream(new PdfDictionary().Number("N", 3), ColourProfile.Srgb);
        var metadata = file.AddStream(new PdfDictionary("Metadata").Name("Subtype", "XML"), MetadataWriter.Write(document), compress: false);
        var intent = new PdfDictionary("OutputIntent").Name("S", "GTS_PDFA1").Text("OutputConditionIdentifier", "sRGB")
            .Text("Info", "sRGB IEC61966-2.1").Reference("DestOutputProfile", profile);
        var catalog = new PdfDictionary("Catalog").Reference("Pages", treeId).Text("Lang", document.Language)
            .Dictionary("MarkInfo", new PdfDictionary().Raw("Marked", "true")).Reference("StructTreeRoot", structureId)
            .Dictionary("ViewerPreferences", new PdfDictionary().Raw("DisplayDocTitle", "true"))
            .Reference("Metadata", metadata).Raw("OutputIntents", "[" + intent + "]").Reference("AcroForm", formId);
        if (outlineId is { } outline) catalog.Reference("Outlines", outline).Name("PageMode", "UseOutlines");
        AttachmentWriter.Write(file, catalog, document);
        return catalog;
    }

    private static int Information(ObjectFile file, Document document) => file.Add(new PdfDictionary()
        .Text("Title", Pictures.PlainCharacters.Of(document.Title)).Text("Author", Pictures.PlainCharacters.Of(document.Author))
        .Text("Creator", document.Program).Text("Producer", document.Program)
        .Raw("CreationDate", Syntax.Date(document.Date)).Raw("ModDate", Syntax.Date(document.Date)));
}
