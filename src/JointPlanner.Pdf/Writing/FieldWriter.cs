using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Writing;

/// <summary>Writes the empty signature fields; what a signer may rely on is written at <see cref="SignatureField"/>.</summary>
internal sealed class FieldWriter(ObjectFile file, double pageHeight)
{
    /// <summary>Writes a field that is its own widget.</summary>
    public void Write(int id, FieldPlace place, int pageId, int structureKey)
    {
        var box = place.Bounds;
        double width = box.Right - box.Left, height = box.Bottom - box.Top;
        var empty = file.AddStream(new PdfDictionary("XObject").Name("Subtype", "Form").Numbers("BBox", 0, 0, width, height), []);
        file.Set(id, new PdfDictionary("Annot").Name("Subtype", "Widget").Name("FT", "Sig")
            .Text("T", place.Field.Name).Text("TU", place.Field.Label)
            .Numbers("Rect", box.Left, pageHeight - box.Bottom, box.Right, pageHeight - box.Top)
            .Reference("P", pageId).Number("F", 4).Number("StructParent", structureKey)
            .Dictionary("AP", new PdfDictionary().Reference("N", empty)));
    }
}
