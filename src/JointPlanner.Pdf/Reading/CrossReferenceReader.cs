using System.Globalization;

namespace JointPlanner.Pdf.Reading;

/// <summary>Finds the revisions of a file by walking its cross-reference sections from the last to the first.</summary>
internal sealed class CrossReferenceReader(byte[] file, NameTable names, ReadingBudget budget)
{
    private const int TailSearched = 64;

    /// <summary>The revisions, the first one first.</summary>
    public List<Revision> ReadAll()
    {
        if (file.Length > budget.Limits.FileBytes)
            throw new PdfReadException(PdfReadFailure.FileTooLarge, Text($"The file has {file.Length} bytes; at most {budget.Limits.FileBytes} are read."));
        if (!file.AsSpan().StartsWith("%PDF-"u8)) throw new PdfReadException(PdfReadFailure.NotAPdf, "The file is not a PDF: it does not begin with %PDF-.");
        var revisions = new List<Revision>();
        int next = LastSection();
        while (true)
        {
            if (revisions.Count == budget.Limits.Revisions)
                throw new PdfReadException(PdfReadFailure.TooManyRevisions, Text($"The PDF has more than {budget.Limits.Revisions} revisions."));
            var revision = ReadSection(next);
            if (revisions.Count == 0 && revision.End != file.Length) throw PdfReadException.Malformed("bytes follow its end", revision.End);
            if (revisions.Count > 0 && revision.End > revisions[^1].CrossReferenceStart)
                throw PdfReadException.Malformed("two revisions overlap", revision.End);
            revisions.Add(revision);
            if (revision.Trailer["Prev"] is not { } value) break;
            int previous = Whole(value, "/Prev");
            if (previous >= next)
                throw new PdfReadException(PdfReadFailure.RevisionsNotDescending, "A revision of the PDF names a later one as its predecessor.");
            next = previous;
        }
        revisions.Reverse();
        return revisions;
    }

    private int LastSection()
    {
        int from = Math.Max(0, file.Length - TailSearched);
        int at = file.AsSpan(from).LastIndexOf("startxref"u8);
        if (at < 0) throw PdfReadException.Malformed("it does not end with \"startxref\" and \"%%EOF\"");
        var reader = Reader(from + at);
        reader.Expect("startxref"u8);
        return reader.ReadInteger();
    }

    private SyntaxReader Reader(int at)
    {
        if (at < 0 || at >= file.Length) throw PdfReadException.Malformed("a place outside the file is named", at);
        return new SyntaxReader(file, at, file.Length, names, budget);
    }

    private Revision ReadSection(int at)
    {
        var reader = Reader(at);
        bool isTable = file.AsSpan(at).StartsWith("xref"u8);
        var entries = new Dictionary<int, CrossReference>();
        var trailer = isTable ? ReadTable(reader, entries) : ReadStream(reader, entries);
        if (trailer["Encrypt"] is not null) throw new PdfReadException(PdfReadFailure.Unsupported, "The PDF is encrypted.");
        if (trailer["XRefStm"] is not null) throw new PdfReadException(PdfReadFailure.Unsupported, "The PDF carries two tables of contents side by side (a hybrid file).");
        if (trailer["Root"] is not PdfReference) throw PdfReadException.Malformed("a trailer names no catalog", at);
        reader.Expect("startxref"u8);
        if (reader.ReadInteger() != at)
            throw PdfReadException.Malformed("\"startxref\" does not name the section before it", reader.Position);
        int mark = reader.Position;
        while (mark < file.Length && SyntaxReader.IsWhite(file[mark])) mark++;
        budget.Work(mark - reader.Position);
        if (!file.AsSpan(mark).StartsWith("%%EOF"u8)) throw PdfReadException.Malformed("\"%%EOF\" expected", mark);
        mark += 5;
        int end = mark;
        if (end < file.Length && file[end] == 13) end++;
        if (end < file.Length && file[end] == 10) end++;
        return new Revision(at, mark, end, entries, trailer, isTable);
    }

    private PdfDictionary ReadTable(SyntaxReader reader, Dictionary<int, CrossReference> entries)
    {
        reader.Expect("xref"u8);
        while (!reader.Take("trailer"u8))
        {
            int first = reader.ReadInteger(), count = reader.ReadInteger();
            for (int i = 0; i < count; i++)
            {
                int place = reader.ReadInteger(), generation = reader.ReadInteger();
                bool used = reader.Take("n"u8);
                if (!used) reader.Expect("f"u8);
                Add(entries, first, i, used ? new(CrossReferenceKind.InFile, place, generation) : default);
            }
        }
        return reader.ReadValue() as PdfDictionary ?? throw PdfReadException.Malformed("a trailer is not a dictionary", reader.Position);
    }

    private PdfDictionary ReadStream(SyntaxReader reader, Dictionary<int, CrossReference> entries)
    {
        int at = reader.Position;
        var found = IndirectReader.Read(file, reader, _ => throw PdfReadException.Malformed("a cross-reference stream's length is not given directly", at));
        if (found.Value is not PdfStream stream || stream.Dictionary["Type"] is not PdfName { Value: "XRef" })
            throw PdfReadException.Malformed("no cross-reference section stands where one is named", at);
        int size = Whole(stream.Dictionary["Size"], "/Size");
        var widths = Wholes(stream.Dictionary["W"], "/W");
        var index = stream.Dictionary["Index"] is null ? [0, size] : Wholes(stream.Dictionary["Index"], "/Index");
        if (widths.Length != 3 || widths.Any(w => w > 8) || widths[1] == 0 || index.Length % 2 != 0)
            throw PdfReadException.Malformed("a cross-reference stream's layout makes no sense", at);
        var data = StreamBytes.Unpack(file, stream, value => value, budget);
        int position = 0;
        for (int section = 0; section < index.Length; section += 2)
            for (int i = 0; i < index[section + 1]; i++)
            {
                long kind = widths[0] == 0 ? 1 : Field(data, ref position, widths[0]);
                long place = Field(data, ref position, widths[1]), detail = Field(data, ref position, widths[2]);
                if (kind is < 0 or > 2 || place > int.MaxValue || detail > int.MaxValue)
                    throw PdfReadException.Malformed("a cross-reference stream's entry makes no sense", at);
                Add(entries, index[section], i, kind == 0 ? default : new((CrossReferenceKind)kind, (int)place, (int)detail));
            }
        return stream.Dictionary;
    }

    private void Add(Dictionary<int, CrossReference> entries, int first, int offset, CrossReference entry)
    {
        budget.Entry();
        if (first > int.MaxValue - offset || !entries.TryAdd(first + offset, entry))
            throw PdfReadException.Malformed("an object number stands twice in one cross-reference section");
    }

    private static long Field(byte[] data, ref int position, int width)
    {
        if (position + width > data.Length) throw PdfReadException.Malformed("a cross-reference stream is too short");
        ulong value = 0;
        for (int i = 0; i < width; i++) value = value << 8 | data[position++];
        return value > int.MaxValue ? long.MaxValue : (long)value;
    }

    private static int[] Wholes(PdfValue? value, string name) =>
        value is PdfArray { Items.Count: <= 4096 } array ? [.. array.Items.Select(item => Whole(item, name))] : throw PdfReadException.Malformed($"{name} is not a list of whole numbers");

    private static int Whole(PdfValue? value, string name) =>
        value is PdfNumber { IsInteger: true, Value: >= 0 and <= int.MaxValue } number ? (int)number.Value : throw PdfReadException.Malformed($"{name} is not a whole number");

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
