using System.Buffers;
using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Documents;

/// <summary>Writes a document always in the same way: fields in the table's order, LF, two spaces, shortest digits that read back the same, UTF-8.</summary>
public static class DocumentWriter
{
    private static readonly JsonWriterOptions Options = new()
    {
        Indented = true,
        IndentSize = 2,
        NewLine = "\n",
        // Readable °, µ and é. A page that embeds the text must escape it itself.
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        SkipValidation = false,
    };

    /// <summary>The document in UTF-8, with a line break at its end.</summary>
    public static byte[] ToUtf8(FieldTable table, MapNode root)
    {
        var buffer = new ArrayBufferWriter<byte>();
        using (var writer = new Utf8JsonWriter(buffer, Options)) Map(writer, table, "", root);
        buffer.Write("\n"u8);
        return buffer.WrittenSpan.ToArray();
    }

    private static void Map(Utf8JsonWriter writer, FieldTable table, string pattern, MapNode map)
    {
        writer.WriteStartObject();
        var known = table.In(pattern).Select(f => f.Word).ToList();
        var ordered = map.Entries.OrderBy(e => known.IndexOf(e.Key) is >= 0 and var place ? place : int.MaxValue);
        foreach (var (name, part) in ordered)
        {
            writer.WritePropertyName(name);
            Node(writer, table, pattern.Length == 0 ? name : $"{pattern}/{name}", part);
        }
        writer.WriteEndObject();
    }

    private static void Node(Utf8JsonWriter writer, FieldTable table, string pattern, DocumentNode node)
    {
        switch (node)
        {
            case MapNode map:
                Map(writer, table, pattern, map);
                break;
            case ListNode list:
                writer.WriteStartArray();
                foreach (var item in list.Items) Node(writer, table, $"{pattern}/*", item);
                writer.WriteEndArray();
                break;
            case TextNode text:
                writer.WriteStringValue(text.Text);
                break;
            case NumberNode number:
                writer.WriteRawValue(Shortest(number.Text));
                break;
            case TruthNode { Value: { } truth }:
                writer.WriteBooleanValue(truth);
                break;
            default:
                writer.WriteNullValue();
                break;
        }
    }

    /// <summary>The fewest digits that read back as the same number; digits beyond a double's range stay as written, for the reader to refuse.</summary>
    private static string Shortest(string digits) =>
        double.TryParse(digits, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && double.IsFinite(value) ? QuantityText.Write(value) : digits;
}
