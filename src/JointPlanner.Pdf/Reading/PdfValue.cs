using System.Text;

namespace JointPlanner.Pdf.Reading;

/// <summary>One value of the PDF language (ISO 32000-2, 7.3), as read.</summary>
internal abstract class PdfValue;

internal sealed class PdfNull : PdfValue
{
    public static readonly PdfNull Instance = new();
}

internal sealed class PdfBoolean(bool value) : PdfValue
{
    public bool Value { get; } = value;
}

internal sealed class PdfNumber(double value, bool isInteger) : PdfValue
{
    public double Value { get; } = value;

    public bool IsInteger { get; } = isInteger;
}

internal sealed class PdfName(string value) : PdfValue
{
    public string Value { get; } = value;
}

/// <summary>A string and where it stands in the file, delimiters included; a signature's hole is found by that place.</summary>
internal sealed class PdfText(byte[] bytes, bool isHex, int start, int end) : PdfValue
{
    public byte[] Bytes { get; } = bytes;

    public bool IsHex { get; } = isHex;

    public int Start { get; } = start;

    public int End { get; } = end;

    /// <summary>The characters meant: UTF-16 or UTF-8 with its mark, else one byte a character.</summary>
    public string Characters() => Bytes switch
    {
        [0xFE, 0xFF, ..] => Encoding.BigEndianUnicode.GetString(Bytes.AsSpan(2)),
        [0xEF, 0xBB, 0xBF, ..] => Encoding.UTF8.GetString(Bytes.AsSpan(3)),
        _ => Encoding.Latin1.GetString(Bytes),
    };
}

internal sealed class PdfArray(List<PdfValue> items) : PdfValue
{
    public List<PdfValue> Items { get; } = items;
}

internal sealed class PdfDictionary(Dictionary<string, PdfValue> entries) : PdfValue
{
    public Dictionary<string, PdfValue> Entries { get; } = entries;

    public PdfValue? this[string key] => Entries.GetValueOrDefault(key);
}

internal sealed class PdfReference(int number, int generation) : PdfValue
{
    public int Number { get; } = number;

    public int Generation { get; } = generation;
}

/// <summary>A stream: its dictionary, and its bytes as they stand in the file (still packed).</summary>
internal sealed class PdfStream(PdfDictionary dictionary, int start, int length) : PdfValue
{
    public PdfDictionary Dictionary { get; } = dictionary;

    public int Start { get; } = start;

    public int Length { get; } = length;
}

/// <summary>An object with its number, and the stretch of the file it fills (empty for one out of an object stream).</summary>
internal sealed record PdfIndirect(int Number, int Generation, PdfValue Value, int Start, int End)
{
    public bool IsPacked => End == 0;
}
