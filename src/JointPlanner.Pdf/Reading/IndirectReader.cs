namespace JointPlanner.Pdf.Reading;

/// <summary>Reads "n g obj … endobj", a stream's extent included.</summary>
internal static class IndirectReader
{
    // "resolve" finds the length of a stream that gives it by reference.
    public static PdfIndirect Read(byte[] file, SyntaxReader reader, Func<PdfReference, PdfValue?> resolve)
    {
        int start = reader.Position;
        int number = reader.ReadInteger(), generation = reader.ReadInteger();
        reader.Expect("obj"u8);
        var value = reader.ReadValue();
        if (value is PdfDictionary dictionary && reader.Take("stream"u8))
        {
            reader.SkipStreamLineEnd();
            var length = dictionary["Length"] is PdfReference reference ? resolve(reference) : dictionary["Length"];
            if (length is not PdfNumber { IsInteger: true, Value: >= 0 and <= int.MaxValue } bytes || bytes.Value > file.Length - reader.Position)
                throw PdfReadException.Malformed("a stream's length makes no sense", start);
            value = new PdfStream(dictionary, reader.Position, (int)bytes.Value);
            reader.Jump(reader.Position + (int)bytes.Value);
            reader.Expect("endstream"u8);
        }
        reader.Expect("endobj"u8);
        return new PdfIndirect(number, generation, value, start, reader.Position);
    }
}
