using System.Globalization;
using JointPlanner.Pdf.Reading;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Says what one appended update changed, by comparing the states before and after it object by object.</summary>
internal sealed class UpdateChanges
{
    private readonly PdfRevisions _file;
    private readonly RevisionView _before;
    private readonly RevisionView _after;
    private readonly int _revision;
    private readonly DocumentMap _map;
    private readonly List<FileChange> _found = [];
    private readonly HashSet<int> _added = [];
    private readonly HashSet<int> _accounted = []; // added objects that an allowed change needs
    private readonly List<int> _signatures = [];   // signature dictionaries put into fields

    private UpdateChanges(PdfRevisions file, int revision)
    {
        _file = file;
        _revision = revision;
        _before = file.View(revision - 1);
        _after = file.View(revision);
        _map = new DocumentMap(_before);
    }

    /// <param name="file">The file.</param>
    /// <param name="revision">Index of the update; 1 is the first one after the file's first state.</param>
    public static List<FileChange> Of(PdfRevisions file, int revision)
    {
        var changes = new UpdateChanges(file, revision);
        changes.Compare();
        return changes._found;
    }

    private void Compare()
    {
        CompareTrailers();
        var changed = new List<int>();
        foreach (int number in _file.All[_revision].Entries.Keys.Order())
        {
            bool was = _before.Entry(number) is not null, isNow = _after.Entry(number) is not null;
            if (!was && isNow) _added.Add(number);
            else if (was && (!isNow || !SameObject(number))) changed.Add(number);
        }
        var fields = FormFields.In(_before).ToDictionary(field => field.Number);
        int form = (_before.Catalog["AcroForm"] as PdfReference)?.Number ?? -1;
        foreach (int number in changed.Where(fields.ContainsKey)) CompareField(fields[number]);
        if (changed.Contains(_before.Root.Number)) CompareCatalogs();
        if (changed.Contains(form)) CompareForms(_before.Dictionary(_before.Catalog["AcroForm"]), _after.Object(form)?.Value as PdfDictionary);
        var rest = changed.Where(number => number != _before.Root.Number && number != form && !fields.ContainsKey(number)).ToList();
        if (rest.Count > 0) NameTheRest(rest);
        ComparePages();
        FindStrays();
    }

    private void Add(FileChangeKind kind, string text)
    {
        var change = new FileChange(kind, text);
        if (!_found.Contains(change)) _found.Add(change);
    }

    private bool SameObject(int number)
    {
        var a = _before.Object(number)!;
        var b = _after.Object(number)!;
        if (ReferenceEquals(a.Value, b.Value)) return a.Generation == b.Generation;
        if (a.Generation != b.Generation || (a.Value is PdfStream) != (b.Value is PdfStream)) return false;
        _file.Budget.Work(Math.Max(a.End - a.Start, 64));
        if (a.Value is PdfStream x && b.Value is PdfStream y && !_before.Packed(x).SequenceEqual(_after.Packed(y))) return false;
        return CanonicalText.Same(a.Value, b.Value);
    }

    private void CompareTrailers()
    {
        if (!CanonicalText.Same(_before.Root, _after.Root)) Add(FileChangeKind.DocumentChanged, "the catalog was replaced by another");
        var information = (_before.Trailer["Info"], _after.Trailer["Info"]);
        if (information is not (null, null) && !CanonicalText.Same(information.Item1, information.Item2))
            Add(FileChangeKind.DocumentChanged, "the document information (title, author, dates) was replaced");
        var before = _before.Array(_before.Trailer["ID"]);
        var after = _after.Array(_after.Trailer["ID"]);
        if (before is { Items.Count: > 0 } && !(after is { Items.Count: > 0 } && CanonicalText.Same(before.Items[0], after.Items[0])))
            Add(FileChangeKind.DocumentChanged, "the file's lasting identifier was changed");
    }

    private void CompareField(FormField field)
    {
        string name = PlainText.Of(field.Name);
        if (_after.Object(field.Number)?.Value is not PdfDictionary after)
        {
            Add(FileChangeKind.FieldChanged, $"the field {name} was removed");
            return;
        }
        foreach (string key in field.Dictionary.Entries.Keys.Union(after.Entries.Keys).Where(key => key is not ("V" or "AP")))
            if (!CanonicalText.Same(field.Dictionary[key], after[key])) Add(FileChangeKind.FieldChanged, $"/{PlainText.Of(key)} of the field {name} was changed");
        bool signed = false;
        if (!CanonicalText.Same(field.Dictionary["V"], after["V"]) && (field.Dictionary["V"] ?? after["V"]) is not null)
        {
            if (field.IsFilled(_before)) Add(FileChangeKind.FieldChanged, $"the signature in the field {name} was {(after["V"] is null ? "removed" : "replaced")}");
            else if (IsSignatureOfThisUpdate(after["V"])) signed = true;
            else Add(FileChangeKind.FieldChanged, $"the field {name} was filled with something that is no signature over this update");
        }
        bool sameAppearance = field.Dictionary["AP"] is null && after["AP"] is null || CanonicalText.Same(field.Dictionary["AP"], after["AP"]);
        if (!sameAppearance && !(signed && IsNewAppearance(after["AP"]))) Add(FileChangeKind.FieldChanged, $"the appearance of the field {name} was changed");
        if (!signed) return;
        Add(FileChangeKind.FieldSigned, $"the field {name} was signed");
        _signatures.Add(((PdfReference)after["V"]!).Number);
        foreach (var part in new[] { after["V"], sameAppearance ? null : after["AP"] })
            if (part is not null) _accounted.UnionWith(ReferenceWalk.Reached(_after, _file.Budget, part, _added.Contains));
    }

    private bool IsSignatureOfThisUpdate(PdfValue? value)
    {
        if (value is not PdfReference reference || !_added.Contains(reference.Number) || _after.Dictionary(reference) is not { } signature)
            return false;
        var range = _after.Array(signature["ByteRange"])?.Items.Select(_after.Whole).ToList();
        var update = _file.All[_revision];
        return signature["Contents"] is PdfText && range is [_, _, { } start, { } length] && (long)start + length is var end && (end == update.End || end == update.MarkEnd);
    }

    // An appearance is clipped to the field's own rectangle, so a new one cannot cover anything else.
    private bool IsNewAppearance(PdfValue? value) =>
        value is PdfDictionary { Entries.Count: 1 } states && states["N"] is PdfReference normal && _added.Contains(normal.Number) && _after.Resolve(normal) is PdfStream;

    private void CompareCatalogs()
    {
        var before = _before.Catalog;
        if (_after.Object(_before.Root.Number)?.Value is not PdfDictionary after)
        {
            Add(FileChangeKind.DocumentChanged, "the catalog was removed");
            return;
        }
        foreach (string key in before.Entries.Keys.Union(after.Entries.Keys).Order(StringComparer.Ordinal))
        {
            if (CanonicalText.Same(before[key], after[key])) continue;
            if (key == "AcroForm")
            {
                CompareForms(_before.Dictionary(before[key]), _after.Dictionary(after[key]));
                if (after[key] is PdfReference moved) _accounted.Add(moved.Number);
            }
            else if (key == "DSS") StoreChanged(after[key]);
            else if (key == "Perms" && before[key] is null && IsCertification(after[key])) Add(FileChangeKind.Certified, "the file was certified: it may only be signed further");
            else if (key == "Pages") Add(FileChangeKind.PagesChanged, "the list of pages was replaced");
            else Add(FileChangeKind.DocumentChanged, $"the catalog's /{PlainText.Of(key)} was {(before[key] is null ? "added" : after[key] is null ? "removed" : "changed")}");
        }
    }

    private bool IsCertification(PdfValue? value) =>
        value is PdfDictionary { Entries.Count: 1 } permissions && permissions["DocMDP"] is PdfReference signature && _signatures.Contains(signature.Number)
        && LeavesRoomForSignatures(_after.Dictionary(signature)) && !FormFields.In(_before).Exists(field => field.IsFilled(_before));

    /// <summary>P = 1 would forbid the next signature too (ISO 32000-2, 12.8.2.2); 2, which stands where none is given, allows it.</summary>
    private bool LeavesRoomForSignatures(PdfDictionary? signature)
    {
        var reference = _after.Array(signature?["Reference"])?.Items.Select(_after.Dictionary).FirstOrDefault(item => _after.Name(item?["TransformMethod"]) == "DocMDP");
        return reference is not null && (_after.Whole(_after.Dictionary(reference["TransformParams"])?["P"]) ?? 2) == 2;
    }

    private void StoreChanged(PdfValue? value)
    {
        Add(FileChangeKind.SecurityStore, "certificates or revocation data were stored beside the signatures");
        if (value is not null) _accounted.UnionWith(ReferenceWalk.Reached(_after, _file.Budget, value, _added.Contains));
    }

    private void CompareForms(PdfDictionary? before, PdfDictionary? after)
    {
        if (before is null || after is null)
        {
            Add(FileChangeKind.DocumentChanged, $"the form was {(before is null ? "added" : "removed")}");
            return;
        }
        foreach (string key in before.Entries.Keys.Union(after.Entries.Keys).Order(StringComparer.Ordinal))
        {
            if (CanonicalText.Same(before[key], after[key])) continue;
            if (key == "SigFlags" && _after.Whole(after[key]) is >= 1 and <= 3) Add(FileChangeKind.SignatureFlags, "the form says that the file is signed");
            else if (key == "Fields") Add(FileChangeKind.FieldAdded, AddedFields());
            else Add(FileChangeKind.DocumentChanged, $"the form's /{PlainText.Of(key)} was changed");
        }
    }

    private string AddedFields()
    {
        var before = FormFields.In(_before).Select(field => field.Name).ToHashSet();
        var added = FormFields.In(_after).Select(field => field.Name).Where(name => !before.Contains(name)).Select(PlainText.Of).ToList();
        return added.Count > 0 ? $"signature fields were added: {PlainText.List(added)}" : "the list of form fields was changed";
    }

    private void NameTheRest(List<int> numbers)
    {
        var store = StoreAlone();
        foreach (int number in numbers)
        {
            if (store.Contains(number) && _after.Object(number) is { } found) StoreChanged(found.Value);
            else _found.Add(_map.Changed(number, _after.Entry(number) is null ? "removed" : "changed"));
        }
    }

    /// <summary>Objects that belonged to the store of certificates and to nothing else: a store could name a page as its own.</summary>
    private HashSet<int> StoreAlone()
    {
        if (_before.Catalog["DSS"] is not { } store) return [];
        var others = new PdfArray([_before.Trailer["Info"] ?? PdfNull.Instance, .. _before.Catalog.Entries.Where(entry => entry.Key != "DSS").Select(entry => entry.Value)]);
        var elsewhere = ReferenceWalk.Reached(_before, _file.Budget, others, _ => true);
        var own = ReferenceWalk.Reached(_before, _file.Budget, store, number => number != _before.Root.Number);
        own.ExceptWith(elsewhere);
        return own;
    }

    private void ComparePages()
    {
        if (_found.TrueForAll(change => change.IsAllowed)) return;
        var after = new DocumentMap(_after).Pages;
        if (after.SequenceEqual(_map.Pages)) return;
        string text = after.Count == _map.Pages.Count ? "pages were exchanged or put into another order" : after.Count > _map.Pages.Count ? "pages were added" : "pages were removed";
        _found.Insert(0, new FileChange(FileChangeKind.PagesChanged, string.Create(CultureInfo.InvariantCulture, $"{text} ({_map.Pages.Count} before, {after.Count} after)")));
    }

    /// <summary>Added objects do nothing unless something refers to them: a change named above, or a dangling reference that was signed.</summary>
    private void FindStrays()
    {
        if (_added.Count == 0) return;
        var awaited = new HashSet<int>();
        foreach (int number in _before.Numbers())
        {
            _file.Budget.Work(16);
            foreach (var reference in ReferenceWalk.In(_before.Object(number)!.Value))
                if (_added.Contains(reference.Number)) awaited.Add(reference.Number);
        }
        foreach (int number in _added.Order())
        {
            var found = _after.Object(number)!;
            if (awaited.Contains(number)) Add(FileChangeKind.ObjectAdded, string.Create(CultureInfo.InvariantCulture, $"object {number} was slipped in where the signed state refers to nothing"));
            else if (!_accounted.Contains(number) && !IsContainer(found)) Add(FileChangeKind.ObjectAdded, string.Create(CultureInfo.InvariantCulture, $"object {number} was added that is no part of a signature"));
        }
    }

    private bool IsContainer(PdfIndirect found) =>
        found.Value is PdfStream stream && (found.Start == _file.All[_revision].CrossReferenceStart || _after.Name(stream.Dictionary["Type"]) == "ObjStm");
}
