using System.Globalization;
using System.Text;
using JointPlanner.Pdf.Reading;

namespace JointPlanner.Pdf.Signing;

/// <summary>Writes values in the PDF language, independent of the user's culture.</summary>
internal static class ValueText
{
    public static string Of(PdfValue value)
    {
        var text = new StringBuilder();
        Write(text, value);
        return text.ToString();
    }

    public static PdfText Text(string text) =>
        Bytes(text.All(c => c is >= ' ' and <= '~') ? Encoding.ASCII.GetBytes(text) : [0xFE, 0xFF, .. Encoding.BigEndianUnicode.GetBytes(text)]);

    public static PdfText Bytes(byte[] bytes) => new(bytes, true, 0, 0);

    public static PdfText Date(DateTimeOffset instant) =>
        Text(instant.UtcDateTime.ToString("'D:'yyyyMMddHHmmss'+00''00'''", CultureInfo.InvariantCulture));

    public static PdfNumber Number(double value) => new(value, Math.Truncate(value) == value);

    private static void Write(StringBuilder text, PdfValue value)
    {
        switch (value)
        {
            case PdfBoolean boolean: text.Append(boolean.Value ? "true" : "false"); break;
            case PdfNumber number: text.Append(Digits(number.Value)); break;
            case PdfName name: Name(text, name.Value); break;
            case PdfText characters: text.Append('<').Append(Convert.ToHexString(characters.Bytes)).Append('>'); break;
            case PdfReference reference: text.Append(CultureInfo.InvariantCulture, $"{reference.Number} {reference.Generation} R"); break;
            case PdfArray array:
                text.Append('[').AppendJoin(' ', array.Items.Select(Of)).Append(']');
                break;
            case PdfDictionary dictionary:
                text.Append("<<");
                foreach (var (key, item) in dictionary.Entries)
                {
                    Name(text, key);
                    text.Append(' ');
                    Write(text, item);
                }
                text.Append(">>");
                break;
            case PdfNull: text.Append("null"); break;
            default: throw new InvalidOperationException("A stream is written by the update, not as a value.");
        }
    }

    // PDF knows no exponents. Sixteen digits behind the point give back any number of a sheet as it was read.
    private static string Digits(double value) =>
        Math.Abs(value) < 1e12 ? ((decimal)value).ToString("0.################", CultureInfo.InvariantCulture) : value.ToString("F0", CultureInfo.InvariantCulture);

    private static void Name(StringBuilder text, string name)
    {
        text.Append('/');
        foreach (char c in name)
        {
            if (c is > ' ' and <= '~' and not '#' && !SyntaxReader.IsDelimiter((byte)c)) text.Append(c);
            else text.Append(CultureInfo.InvariantCulture, $"#{(int)c:X2}");
        }
    }
}
