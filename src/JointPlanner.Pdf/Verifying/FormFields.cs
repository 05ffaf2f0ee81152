using JointPlanner.Pdf.Reading;

namespace JointPlanner.Pdf.Verifying;

/// <summary>A field of the form that takes a signature.</summary>
/// <param name="Name">Full name, outer names first, joined by points.</param>
/// <param name="Number">Its object number.</param>
/// <param name="Dictionary">What the field says.</param>
internal sealed record FormField(string Name, int Number, PdfDictionary Dictionary)
{
    public bool IsFilled(RevisionView view) => view.Resolve(Dictionary["V"]) is not null;
}

internal static class FormFields
{
    private const int Most = 1000;

    public static PdfDictionary? Form(RevisionView view) => view.Dictionary(view.Catalog["AcroForm"]);

    /// <summary>All signature fields, in the order of the form.</summary>
    public static List<FormField> In(RevisionView view)
    {
        var found = new List<FormField>();
        var seen = new HashSet<int>();
        var open = new Stack<(PdfValue Value, string Prefix, string? Type)>();
        PushAll(view.Array(Form(view)?["Fields"]), "", null);
        while (open.TryPop(out var next))
        {
            // A field that is no object of its own could not be filled by an update, so it is none of ours.
            if (next.Value is not PdfReference reference || view.Dictionary(reference) is not { } field) continue;
            if (!seen.Add(reference.Number)) throw PdfReadException.Malformed("its list of form fields runs in a circle");
            if (seen.Count > Most) throw new PdfReadException(PdfReadFailure.TooManyObjects, "The PDF has more than 1000 form fields.");
            string own = view.Text(field["T"]) ?? "", type = view.Name(field["FT"]) ?? next.Type ?? "";
            string name = next.Prefix.Length == 0 ? own : own.Length == 0 ? next.Prefix : next.Prefix + "." + own;
            if (name.Length > 1000) throw PdfReadException.Malformed("a form field's name is too long");
            if (type == "Sig" && field["T"] is not null) found.Add(new FormField(name, reference.Number, field));
            PushAll(view.Array(field["Kids"]), name, type);
        }
        return found;

        void PushAll(PdfArray? fields, string prefix, string? type)
        {
            foreach (var item in Enumerable.Reverse(fields?.Items ?? [])) open.Push((item, prefix, type));
        }
    }
}
