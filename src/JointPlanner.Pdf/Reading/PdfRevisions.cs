namespace JointPlanner.Pdf.Reading;

/// <summary>A PDF opened for reading: all its revisions, each of which can be looked at as if the file ended there.</summary>
internal sealed class PdfRevisions
{
    private const int DeepestDependence = 8;

    private readonly NameTable _names = new();
    private readonly Dictionary<int, PdfIndirect> _atByte = [];
    private readonly Dictionary<int, (int[] Numbers, PdfValue[] Values)> _packed = [];
    private readonly HashSet<int> _open = [];

    private PdfRevisions(byte[] file, ReadingBudget budget)
    {
        File = file;
        Budget = budget;
        All = new CrossReferenceReader(file, _names, budget).ReadAll();
    }

    public byte[] File { get; }

    public ReadingBudget Budget { get; }

    /// <summary>The revisions, the first one first.</summary>
    public IReadOnlyList<Revision> All { get; }

    /// <summary>The file as it is.</summary>
    public RevisionView Last => View(All.Count - 1);

    public static PdfRevisions Open(byte[] file, PdfReadLimits? limits = null, CancellationToken cancellation = default) =>
        new(file, new ReadingBudget(limits ?? PdfReadLimits.Default, cancellation));

    public RevisionView View(int revision) => new(this, revision);

    /// <summary>Reads every object of every revision once, each as its own revision saw it, so that none is left whose place or extent lies.</summary>
    public void ReadEverything()
    {
        for (int i = 0; i < All.Count; i++)
            foreach (int number in All[i].Entries.Keys) View(i).Object(number);
    }

    internal PdfIndirect AtByte(int at, RevisionView view)
    {
        if (_atByte.TryGetValue(at, out var known)) return known;
        if (at <= 0 || at >= File.Length || File[at] is < (byte)'0' or > (byte)'9')
            throw PdfReadException.Malformed("no object stands where one is named", at);
        // A stream may give its length by a reference, which may lead back to it or on and on.
        if (_open.Count == DeepestDependence || !_open.Add(at)) throw PdfReadException.Malformed("an object depends on itself", at);
        var reader = new SyntaxReader(File, at, File.Length, _names, Budget);
        var found = IndirectReader.Read(File, reader, view.Resolve);
        _open.Remove(at);
        return _atByte[at] = found;
    }

    internal PdfValue InStream(PdfIndirect holder, int index, int number)
    {
        if (!_packed.TryGetValue(holder.Start, out var content)) _packed[holder.Start] = content = Unpack(holder);
        if (index >= content.Numbers.Length || content.Numbers[index] != number)
            throw PdfReadException.Malformed("an object is not in the object stream that is named for it", holder.Start);
        return content.Values[index];
    }

    private (int[] Numbers, PdfValue[] Values) Unpack(PdfIndirect holder)
    {
        if (holder.Value is not PdfStream stream || stream.Dictionary["Type"] is not PdfName { Value: "ObjStm" }) throw PdfReadException.Malformed("no object stream stands where one is named", holder.Start);
        // Its head is read from direct values alone: a reference could lead into another object stream, and from there on and on.
        int count = Direct(stream, "N"), first = Direct(stream, "First");
        var data = StreamBytes.Unpack(File, stream, value => value, Budget);
        if (count < 0 || count > Budget.Limits.Objects || first < 0 || first > data.Length)
            throw PdfReadException.Malformed("an object stream's head makes no sense", holder.Start);
        var head = new SyntaxReader(data, 0, first, _names, Budget);
        var numbers = new int[count];
        var places = new int[count];
        for (int i = 0; i < count; i++)
        {
            numbers[i] = head.ReadInteger();
            places[i] = head.ReadInteger();
            if (places[i] > data.Length - first)
                throw PdfReadException.Malformed("an object stream's head points outside it", holder.Start);
        }
        var values = new PdfValue[count];
        for (int i = 0; i < count; i++) values[i] = new SyntaxReader(data, first + places[i], data.Length, _names, Budget).ReadValue();
        return (numbers, values);
    }

    private static int Direct(PdfStream stream, string key) =>
        stream.Dictionary[key] is PdfNumber { IsInteger: true, Value: >= 0 and <= int.MaxValue } number ? (int)number.Value : -1;
}
