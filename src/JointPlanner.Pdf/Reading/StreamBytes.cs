using System.IO.Compression;

namespace JointPlanner.Pdf.Reading;

/// <summary>Unpacks a stream: plain or FlateDecode, with the PNG predictors that cross-reference streams use.</summary>
internal static class StreamBytes
{
    public static byte[] Unpack(byte[] file, PdfStream stream, Func<PdfValue?, PdfValue?> resolve, ReadingBudget budget)
    {
        var filter = Single(resolve(stream.Dictionary["Filter"]), resolve);
        var parameters = Single(resolve(stream.Dictionary["DecodeParms"]), resolve) as PdfDictionary;
        if (filter is null or PdfNull)
        {
            budget.Inflated(stream.Length, stream.Length);
            return file.AsSpan(stream.Start, stream.Length).ToArray();
        }
        if (filter is not PdfName { Value: "FlateDecode" }) throw new PdfReadException(PdfReadFailure.Unsupported, "The PDF packs a stream in a way this program does not read.");
        return Unpredict(Inflate(file, stream, budget), parameters, resolve);
    }

    private static PdfValue? Single(PdfValue? value, Func<PdfValue?, PdfValue?> resolve) => value switch
    {
        PdfArray { Items.Count: 0 } => null,
        PdfArray { Items.Count: 1 } array => resolve(array.Items[0]),
        PdfArray => throw new PdfReadException(PdfReadFailure.Unsupported, "The PDF packs a stream twice over, which this program does not read."),
        _ => value,
    };

    private static byte[] Inflate(byte[] file, PdfStream stream, ReadingBudget budget)
    {
        using var packed = new ZLibStream(new MemoryStream(file, stream.Start, stream.Length, writable: false), CompressionMode.Decompress);
        using var plain = new MemoryStream();
        var buffer = new byte[16 * 1024];
        try
        {
            while (true)
            {
                int read = packed.Read(buffer, 0, buffer.Length);
                if (read == 0) return plain.ToArray();
                budget.Inflated(read, plain.Length + read);
                plain.Write(buffer, 0, read);
            }
        }
        catch (Exception e) when (e is InvalidDataException or IOException)
        {
            throw PdfReadException.Malformed("a packed stream cannot be unpacked", stream.Start);
        }
    }

    private static byte[] Unpredict(byte[] data, PdfDictionary? parameters, Func<PdfValue?, PdfValue?> resolve)
    {
        int predictor = Whole("Predictor", 1);
        if (predictor == 1) return data;
        int columns = Whole("Columns", 1);
        if (predictor < 10 || Whole("Colors", 1) != 1 || Whole("BitsPerComponent", 8) != 8 || columns is < 1 or > 4096)
            throw new PdfReadException(PdfReadFailure.Unsupported, "The PDF packs a stream with a predictor this program does not read.");
        int rows = data.Length / (columns + 1);
        if (rows * (columns + 1) != data.Length) throw PdfReadException.Malformed("a packed stream ends inside a row");
        var plain = new byte[rows * columns];
        for (int row = 0; row < rows; row++)
        {
            int from = row * (columns + 1), to = row * columns;
            for (int i = 0; i < columns; i++)
            {
                int left = i > 0 ? plain[to + i - 1] : 0;
                int up = row > 0 ? plain[to + i - columns] : 0;
                int corner = i > 0 && row > 0 ? plain[to + i - columns - 1] : 0;
                int guess = data[from] switch
                {
                    0 => 0,
                    1 => left,
                    2 => up,
                    3 => (left + up) / 2,
                    4 => Paeth(left, up, corner),
                    _ => throw PdfReadException.Malformed("a packed stream names an unknown row filter"),
                };
                plain[to + i] = (byte)((data[from + 1 + i] + guess) & 255);
            }
        }
        return plain;

        int Whole(string key, int otherwise) =>
            resolve(parameters?[key]) is PdfNumber { IsInteger: true, Value: >= 0 and <= int.MaxValue } number ? (int)number.Value : otherwise;
    }

    /// <summary>The predictor of ISO/IEC 15948 (PNG), 9.4.</summary>
    private static int Paeth(int left, int up, int corner)
    {
        int p = left + up - corner, a = Math.Abs(p - left), b = Math.Abs(p - up), c = Math.Abs(p - corner);
        return a <= b && a <= c ? left : b <= c ? up : corner;
    }
}
