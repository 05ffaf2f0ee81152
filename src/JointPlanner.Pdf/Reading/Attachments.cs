namespace JointPlanner.Pdf.Reading;

/// <summary>Gets the files carried inside a PDF back out: the calculation package and the results of an issued sheet.</summary>
public static class Attachments
{
    private const int Most = 100;

    /// <summary>All attachments of the file's last state, in the order in which the file lists them.</summary>
    /// <exception cref="PdfReadException">The bytes cannot be read within the limits, or two attachments have the same name.</exception>
    public static IReadOnlyList<AttachedFile> Read(byte[] pdf, PdfReadLimits? limits = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(pdf);
        return In(PdfRevisions.Open(pdf, limits, cancellation).Last);
    }

    internal static List<AttachedFile> In(RevisionView view) =>
        [.. Specifications(view).Select(found => Unpack(view, found.Name, found.Specification))];

    /// <summary>Names and file specifications, nothing unpacked.</summary>
    internal static List<(string Name, PdfDictionary Specification)> Specifications(RevisionView view)
    {
        var found = new List<(string, PdfDictionary)>();
        var seen = new HashSet<int>();
        var open = new Stack<PdfValue>();
        if (view.Dictionary(view.Catalog["Names"])?["EmbeddedFiles"] is { } tree) open.Push(tree);
        while (open.TryPop(out var next))
        {
            if (next is PdfReference reference && !seen.Add(reference.Number))
                throw PdfReadException.Malformed("its list of attachments runs in a circle");
            var node = view.Dictionary(next) ?? throw PdfReadException.Malformed("its list of attachments is broken");
            var names = view.Array(node["Names"])?.Items ?? [];
            for (int i = 0; i + 1 < names.Count; i += 2)
            {
                string name = view.Text(names[i]) ?? throw PdfReadException.Malformed("an attachment has no name");
                var specification = view.Dictionary(names[i + 1]) ?? throw PdfReadException.Malformed("an attachment is missing");
                if (found.Exists(other => other.Item1 == name)) throw PdfReadException.Malformed("two attachments have the same name");
                if (found.Count == Most)
                    throw new PdfReadException(PdfReadFailure.TooManyObjects, "The PDF carries more than 100 attachments.");
                found.Add((name, specification));
            }
            foreach (var kid in Enumerable.Reverse(view.Array(node["Kids"])?.Items ?? [])) open.Push(kid);
        }
        return found;
    }

    private static AttachedFile Unpack(RevisionView view, string name, PdfDictionary specification)
    {
        var embedded = view.Dictionary(specification["EF"]);
        if (view.Resolve(embedded?["UF"] ?? embedded?["F"]) is not PdfStream stream) throw PdfReadException.Malformed("an attachment has no content");
        return new AttachedFile(name, view.Name(specification["AFRelationship"]) ?? "", view.Unpacked(stream));
    }
}
