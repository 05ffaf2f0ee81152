using System.Globalization;
using JointPlanner.Pdf.Reading;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Knows what the objects of one state are to a reader, so that a change can be named.</summary>
internal sealed class DocumentMap
{
    private readonly Dictionary<int, (FileChangeKind Kind, string Name)> _names = [];
    private readonly RevisionView _view;

    public DocumentMap(RevisionView view)
    {
        _view = view;
        if (view.Trailer["Info"] is PdfReference information) Name(information, FileChangeKind.DocumentChanged, "the document information (title, author, dates)");
        var catalog = view.Catalog;
        Name(catalog["Metadata"], FileChangeKind.DocumentChanged, "the metadata");
        Name(catalog["Outlines"], FileChangeKind.DocumentChanged, "the outline");
        Name(catalog["StructTreeRoot"], FileChangeKind.DocumentChanged, "the structure for assistive readers");
        Name(catalog["AcroForm"], FileChangeKind.DocumentChanged, "the form");
        Name(catalog["Pages"], FileChangeKind.PagesChanged, "the list of pages");
        foreach (var (name, specification) in Attachments.Specifications(view))
        {
            string shown = $"the attachment {PlainText.Of(name)}";
            if (view.Dictionary(specification["EF"]) is { } embedded) foreach (var file in embedded.Entries.Values) Name(file, FileChangeKind.AttachmentChanged, shown);
        }
        ReadPages();
    }

    /// <summary>Object numbers of the pages, in order.</summary>
    public List<int> Pages { get; } = [];

    public FileChange Changed(int number, string verb)
    {
        if (_names.TryGetValue(number, out var known)) return new(known.Kind, $"{known.Name} was {verb}");
        var value = _view.Object(number)?.Value;
        var dictionary = value as PdfDictionary ?? (value as PdfStream)?.Dictionary;
        string kind = _view.Name(dictionary?["Type"]) is { } type ? $" (a {PlainText.Of(type)})" : "";
        return new(FileChangeKind.DocumentChanged, string.Create(CultureInfo.InvariantCulture, $"object {number}{kind} was {verb}"));
    }

    private void ReadPages()
    {
        var seen = new HashSet<int>();
        var open = new Stack<PdfValue>();
        if (_view.Catalog["Pages"] is { } root) open.Push(root);
        while (open.TryPop(out var next))
        {
            if (next is not PdfReference reference || _view.Dictionary(reference) is not { } node) continue;
            if (!seen.Add(reference.Number)) throw PdfReadException.Malformed("its list of pages runs in a circle");
            if (_view.Array(node["Kids"]) is { } kids)
            {
                Name(reference, FileChangeKind.PagesChanged, "the list of pages");
                foreach (var kid in Enumerable.Reverse(kids.Items)) open.Push(kid);
                continue;
            }
            Pages.Add(reference.Number);
            string page = string.Create(CultureInfo.InvariantCulture, $"page {Pages.Count}");
            Name(reference, FileChangeKind.PageChanged, page);
            Name(node["Contents"], FileChangeKind.PageChanged, $"the content of {page}");
            foreach (var part in _view.Array(node["Contents"])?.Items ?? []) Name(part, FileChangeKind.PageChanged, $"the content of {page}");
            Name(node["Resources"], FileChangeKind.PageChanged, $"what {page} is drawn with");
            Name(node["Annots"], FileChangeKind.PageChanged, $"the annotations of {page}");
            foreach (var part in _view.Array(node["Annots"])?.Items ?? []) Name(part, FileChangeKind.PageChanged, $"an annotation of {page}");
        }
    }

    private void Name(PdfValue? value, FileChangeKind kind, string name)
    {
        if (value is PdfReference reference) _names.TryAdd(reference.Number, (kind, name));
    }
}
