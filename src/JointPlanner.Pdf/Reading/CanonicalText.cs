using System.Globalization;
using System.Text;

namespace JointPlanner.Pdf.Reading;

/// <summary>Writes a value in one fixed way, so that two values are the same exactly when their texts are.</summary>
internal static class CanonicalText
{
    public static string Of(PdfValue value)
    {
        var text = new StringBuilder();
        Write(text, value);
        return text.ToString();
    }

    public static bool Same(PdfValue? a, PdfValue? b) => ReferenceEquals(a, b) || (a is not null && b is not null && Of(a) == Of(b));

    private static void Write(StringBuilder text, PdfValue value)
    {
        switch (value)
        {
            case PdfBoolean boolean: text.Append(boolean.Value ? "true" : "false"); break;
            case PdfNumber number: text.Append(number.Value.ToString("R", CultureInfo.InvariantCulture)); break;
            case PdfName name: text.Append('/').Append(Convert.ToHexString(Encoding.Latin1.GetBytes(name.Value))); break;
            case PdfText characters: text.Append('<').Append(Convert.ToHexString(characters.Bytes)).Append('>'); break;
            case PdfReference reference: text.Append(CultureInfo.InvariantCulture, $"{reference.Number} {reference.Generation} R"); break;
            case PdfArray array:
                text.Append('[');
                foreach (var item in array.Items)
                {
                    Write(text, item);
                    text.Append(' ');
                }
                text.Append(']');
                break;
            case PdfDictionary dictionary:
                text.Append("<<");
                foreach (var (key, item) in dictionary.Entries.OrderBy(entry => entry.Key, StringComparer.Ordinal))
                {
                    text.Append('/').Append(Convert.ToHexString(Encoding.Latin1.GetBytes(key))).Append(' ');
                    Write(text, item);
                    text.Append(' ');
                }
                text.Append(">>");
                break;
            // A stream is compared with its bytes, which are not here; see RevisionView.Same.
            case PdfStream stream: Write(text, stream.Dictionary); break;
            default: text.Append("null"); break;
        }
    }
}
