using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Writing;

/// <summary>Writes the logical structure (ISO 32000-1, 14.7): the tree of elements, and the way from marked content back to it.</summary>
internal sealed class StructureWriter(ObjectFile file, IReadOnlyList<int> pageIds, double pageHeight)
{
    private readonly Dictionary<StructureElement, int> _ids = [];
    private readonly Dictionary<FieldPlace, int> _fields = [];

    /// <summary>The structure element of a signature field points to the field's object.</summary>
    public void Know(FieldPlace place, int fieldId) => _fields[place] = fieldId;

    /// <summary>Writes the tree and gives the number of its root object.</summary>
    /// <param name="document">The topmost element.</param>
    /// <param name="owners">For each page, the elements of its marked stretches in order.</param>
    /// <param name="fieldKeys">The key of each field in the parent tree; keys of pages are their indexes.</param>
    public int Write(StructureElement document, IReadOnlyList<IReadOnlyList<StructureElement>> owners, IReadOnlyList<(int Key, FieldPlace Place)> fieldKeys)
    {
        Number(document);
        var root = file.Reserve();
        Write(document, root);
        List<string> parents = [];
        for (var page = 0; page < owners.Count; page++)
        {
            var ids = string.Join(' ', owners[page].Select(e => Syntax.Reference(_ids[e])));
            parents.Add(Syntax.Number(page) + " " + Syntax.Reference(file.AddArray("[" + ids + "]")));
        }
        foreach (var (key, place) in fieldKeys) parents.Add(Syntax.Number(key) + " " + Syntax.Reference(_ids[place.Element]));
        var parentTree = file.Add(new PdfDictionary().Raw("Nums", "[" + string.Join(' ', parents) + "]"));
        file.Set(root, new PdfDictionary("StructTreeRoot").References("K", [_ids[document]])
            .Reference("ParentTree", parentTree).Number("ParentTreeNextKey", owners.Count + fieldKeys.Count));
        return root;
    }

    private void Number(StructureElement element)
    {
        _ids[element] = file.Reserve();
        foreach (var kid in element.Kids.OfType<StructureElement>()) Number(kid);
    }

    private void Write(StructureElement element, int parent)
    {
        var id = _ids[element];
        var content = new PdfDictionary("StructElem").Name("S", element.Type).Reference("P", parent);
        if (element.Alternative is not null) content.Text("Alt", element.Alternative);
        if (Attributes(element) is { } attributes) content.Raw("A", attributes);
        var marks = element.Kids.OfType<ContentMark>().ToList();
        int? ownPage = marks.Count > 0 ? marks[0].Page : null;
        if (ownPage is { } page) content.Reference("Pg", pageIds[page]);
        if (element.Kids.Count > 0) content.Raw("K", "[" + string.Join(' ', element.Kids.Select(k => Kid(k, ownPage))) + "]");
        file.Set(id, content);
        foreach (var kid in element.Kids.OfType<StructureElement>()) Write(kid, id);
    }

    private string Kid(object kid, int? ownPage) => kid switch
    {
        StructureElement element => Syntax.Reference(_ids[element]),
        ContentMark mark when mark.Page == ownPage => Syntax.Number(mark.Number),
        ContentMark mark => new PdfDictionary("MCR").Reference("Pg", pageIds[mark.Page]).Number("MCID", mark.Number).ToString(),
        FieldPlace field => new PdfDictionary("OBJR").Reference("Pg", pageIds[field.Bounds.Page]).Reference("Obj", _fields[field]).ToString(),
        _ => throw new InvalidOperationException($"The structure cannot hold a {kid.GetType().Name}."),
    };

    private string? Attributes(StructureElement element)
    {
        if (element.Type is "Figure" or "Formula" && element.Bounds is { } box)
        {
            return new PdfDictionary().Name("O", "Layout").Name("Placement", "Block")
                .Numbers("BBox", box.Left, pageHeight - box.Bottom, box.Right, pageHeight - box.Top).ToString();
        }
        if (element.Scope is null && element.ColumnSpan == 1) return null;
        var table = new PdfDictionary().Name("O", "Table");
        if (element.Scope is not null) table.Name("Scope", element.Scope);
        if (element.ColumnSpan > 1) table.Number("ColSpan", element.ColumnSpan);
        return table.ToString();
    }
}
