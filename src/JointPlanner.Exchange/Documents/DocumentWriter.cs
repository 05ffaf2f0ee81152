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
    public static byte[] ToUtf8(FieldTable table, MapNode root) => ToUtf8(InOrder(table, root));

    /// <summary>The same for a document that stands in order already.</summary>
    public static byte[] ToUtf8(MapNode root)
    {
        var buffer = new ArrayBufferWriter<byte>();
        using (var writer = new Utf8JsonWriter(buffer, Options)) Node(writer, root);
        buffer.Write("\n"u8);
        return buffer.WrittenSpan.ToArray();
    }

    /// <summary>The document with its fields in the table's order; what the table does not know comes last, as it stood.</summary>
    public static MapNode InOrder(FieldTable table, MapNode root) => (MapNode)InOrder(table, "", root);

    private static DocumentNode InOrder(FieldTable table, string pattern, DocumentNode node)
    {
        if (node is ListNode list) return new ListNode([.. list.Items.Select(item => InOrder(table, $"{pattern}/*", item))]);
        if (node is not MapNode map) return node;
        var known = table.In(pattern).Select(f => f.Word).ToList();
        return new MapNode(
        [
            .. map.Entries.OrderBy(e => known.IndexOf(e.Key) is >= 0 and var place ? place : int.MaxValue)
                .Select(e => KeyValuePair.Create(e.Key, InOrder(table, pattern.Length == 0 ? e.Key : $"{pattern}/{e.Key}", e.Value))),
        ]);
    }

    private static void Node(Utf8JsonWriter writer, DocumentNode node)
    {
        switch (node)
        {
            case MapNode map:
                writer.WriteStartObject();
                foreach (var (name, part) in map.Entries)
                {
                    writer.WritePropertyName(name);
                    Node(writer, part);
                }
                writer.WriteEndObject();
                break;
            case ListNode list:
                writer.WriteStartArray();
                foreach (var item in list.Items) Node(writer, item);
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
