namespace JointPlanner.Pdf.Reading;

/// <summary>The file as it stood at the end of one revision.</summary>
internal sealed class RevisionView(PdfRevisions file, int index)
{
    private const int LongestChain = 16;

    public Revision Revision => file.All[index];

    public PdfDictionary Trailer => Revision.Trailer;

    public PdfReference Root => (PdfReference)Trailer["Root"]!;

    public PdfDictionary Catalog => Resolve(Root) as PdfDictionary ?? throw PdfReadException.Malformed("its catalog is missing");

    /// <summary>All object numbers in use.</summary>
    public IEnumerable<int> Numbers()
    {
        var seen = new HashSet<int>();
        for (int i = index; i >= 0; i--)
            foreach (var (number, entry) in file.All[i].Entries)
                if (seen.Add(number) && entry.Kind != CrossReferenceKind.Free) yield return number;
    }

    public CrossReference? Entry(int number) =>
        Find(number) is { } found && found.Entry.Kind != CrossReferenceKind.Free ? found.Entry : null;

    public PdfIndirect? Object(int number)
    {
        if (Find(number) is not { } place || place.Entry.Kind == CrossReferenceKind.Free) return null;
        var (entry, since) = place;
        if (entry.Kind == CrossReferenceKind.InStream)
        {
            if (Entry(entry.Place) is not { Kind: CrossReferenceKind.InFile })
                throw PdfReadException.Malformed("an object stream that is named is missing");
            return new PdfIndirect(number, 0, file.InStream(Object(entry.Place)!, entry.Detail, number), 0, 0);
        }
        var found = file.AtByte(entry.Place, this);
        if (found.Number != number || found.Generation != entry.Detail)
            throw PdfReadException.Malformed("another object stands where one is named", entry.Place);
        // Else bytes appended later could change what an earlier state shows, without a word in any later section.
        if (found.End > since.CrossReferenceStart && found.Start != since.CrossReferenceStart)
            throw PdfReadException.Malformed("an object reaches behind the end of its revision", found.Start);
        return found;
    }

    private (CrossReference Entry, Revision Since)? Find(int number)
    {
        for (int i = index; i >= 0; i--)
            if (file.All[i].Entries.TryGetValue(number, out var entry)) return (entry, file.All[i]);
        return null;
    }

    /// <summary>Follows references to the value meant; null where it is missing, as ISO 32000-2, 7.3.10 wants it.</summary>
    public PdfValue? Resolve(PdfValue? value)
    {
        for (int i = 0; value is PdfReference reference; i++)
        {
            if (i == LongestChain) throw PdfReadException.Malformed("a reference leads in a circle");
            var found = Object(reference.Number);
            value = found is null || found.Generation != reference.Generation ? null : found.Value;
        }
        return value is PdfNull ? null : value;
    }

    public PdfDictionary? Dictionary(PdfValue? value) => Resolve(value) as PdfDictionary;

    public PdfArray? Array(PdfValue? value) => Resolve(value) as PdfArray;

    public string? Name(PdfValue? value) => (Resolve(value) as PdfName)?.Value;

    public string? Text(PdfValue? value) => (Resolve(value) as PdfText)?.Characters();

    public int? Whole(PdfValue? value) =>
        Resolve(value) is PdfNumber { IsInteger: true, Value: >= 0 and <= int.MaxValue } number ? (int)number.Value : null;

    /// <summary>The packed bytes of a stream.</summary>
    public ReadOnlySpan<byte> Packed(PdfStream stream) => file.File.AsSpan(stream.Start, stream.Length);

    public byte[] Unpacked(PdfStream stream) => StreamBytes.Unpack(file.File, stream, Resolve, file.Budget);
}
