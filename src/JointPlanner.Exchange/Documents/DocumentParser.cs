using System.Collections.Immutable;
using System.Text;
using System.Text.Json;
using System.Text.Unicode;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Exchange.Documents;

/// <summary>A document as it came from JSON: its root, or why it is none.</summary>
/// <param name="Root">The root; null where the text is not a document.</param>
/// <param name="Faults">What is wrong with the text as a whole.</param>
public sealed record ParsedDocument(MapNode? Root, ImmutableArray<Fault> Faults);

/// <summary>Reads JSON strictly: no comments, no trailing commas, no repeated names taken silently, within <see cref="DocumentLimits"/>.</summary>
public static class DocumentParser
{
    /// <summary>Reads a stream, never more of it than a document may have.</summary>
    public static ParsedDocument Parse(Stream stream, DocumentLimits? limits = null)
    {
        var most = (limits ?? DocumentLimits.OfPeople).MostBytes;
        var buffer = new byte[64 * 1024];
        using var read = new MemoryStream();
        int count;
        while (read.Length <= most && (count = stream.Read(buffer, 0, buffer.Length)) > 0) read.Write(buffer, 0, count);
        return Parse(read.ToArray(), limits);
    }

    /// <summary>Reads UTF-8 bytes.</summary>
    public static ParsedDocument Parse(ReadOnlySpan<byte> utf8, DocumentLimits? limits = null)
    {
        limits ??= DocumentLimits.OfPeople;
        if (utf8.Length > limits.MostBytes)
            return Whole("form.too-large", $"The file is larger than {limits.MostBytes >> 20} MiB.", $"Allowed: up to {limits.MostBytes >> 20} MiB.",
                "Check that this is the right file; a plan of 200 joints takes a few hundred kB.");
        if (utf8.StartsWith(Encoding.UTF8.Preamble)) utf8 = utf8[Encoding.UTF8.Preamble.Length..];
        if (!Utf8.IsValid(utf8))
            return Whole("form.encoding", "The file is not UTF-8 text.", "Allowed: JSON in UTF-8.", "Save the file as UTF-8, or choose the right file.");
        var walk = new Walk(utf8, limits);
        try
        {
            return walk.Root() is MapNode root
                ? new ParsedDocument(root, [])
                : Whole("form.no-object", "The file does not hold a JSON object.", "Allowed: one object { … }.", "Choose the right file.");
        }
        catch (JsonException fault)
        {
            return Whole("form.json", Sentence(utf8, fault), "Allowed: strict JSON, without comments and trailing commas.",
                "Correct the file at that place, or save it anew from this program.");
        }
        catch (LimitException limit)
        {
            return Whole(limit.Id, limit.Message, limit.Allowed, "Split the file, or check that this is the right one.");
        }
    }

    private static string Sentence(ReadOnlySpan<byte> utf8, JsonException fault)
    {
        var (line, column) = ((int)(fault.LineNumber ?? 0), (int)(fault.BytePositionInLine ?? 0));
        var place = FormattableString.Invariant($"line {line + 1}, byte {column + 1}");
        var at = utf8;
        for (var i = 0; i < line && at.IndexOf((byte)'\n') is >= 0 and var end; i++) at = at[(end + 1)..];
        var (here, before) = (column < at.Length ? (char)at[column] : ' ', Before(utf8, utf8.Length - at.Length + column));
        if (here == '/' || before == '/') return $"There is a comment at {place}.";
        if (before == ',' && here is '}' or ']') return $"There is a trailing comma at {place}.";
        if (utf8.Trim("\r\n\t "u8).IsEmpty) return "The file is empty.";
        return $"The file is not valid JSON at {place}.";
    }

    private static char Before(ReadOnlySpan<byte> utf8, int position)
    {
        var at = Math.Min(position, utf8.Length) - 1;
        while (at >= 0 && char.IsWhiteSpace((char)utf8[at])) at--;
        return at < 0 ? ' ' : (char)utf8[at];
    }

    private static ParsedDocument Whole(string id, string wrong, string allowed, string remedy) =>
        new(null, [new Fault(id, "", "", wrong, allowed, remedy)]);

    private sealed class LimitException(string id, string wrong, string allowed) : Exception(wrong)
    {
        public string Id => id;
        public string Allowed => allowed;
    }

    private ref struct Walk(ReadOnlySpan<byte> utf8, DocumentLimits limits)
    {
        private Utf8JsonReader reader = new(utf8, new JsonReaderOptions { MaxDepth = 64 });
        private int items;

        public DocumentNode Root()
        {
            reader.Read();
            var root = Node();
            reader.Read();
            return root;
        }

        private DocumentNode Node()
        {
            if (reader.CurrentDepth >= limits.MostDepth && reader.TokenType is JsonTokenType.StartObject or JsonTokenType.StartArray)
                throw new LimitException("form.too-deep", $"Lists and groups stand more than {limits.MostDepth} deep inside one another.",
                    $"Allowed: up to {limits.MostDepth} deep.");
            return reader.TokenType switch
            {
                JsonTokenType.StartObject => Map(),
                JsonTokenType.StartArray => List(),
                JsonTokenType.String => new TextNode(Text()),
                JsonTokenType.Number => new NumberNode(Encoding.UTF8.GetString(reader.ValueSpan)),
                JsonTokenType.True => new TruthNode(true),
                JsonTokenType.False => new TruthNode(false),
                _ => new TruthNode(null),
            };
        }

        private MapNode Map()
        {
            var entries = ImmutableArray.CreateBuilder<KeyValuePair<string, DocumentNode>>();
            var names = new HashSet<string>(StringComparer.Ordinal);
            var repeated = ImmutableArray.CreateBuilder<string>();
            while (reader.Read() && reader.TokenType != JsonTokenType.EndObject)
            {
                var name = Text();
                reader.Read();
                var part = Node();
                if (names.Add(name)) entries.Add(KeyValuePair.Create(name, part));
                else repeated.Add(name);
                if (entries.Count > limits.MostItems) throw TooMany();
            }
            return new MapNode(entries.ToImmutable(), repeated.ToImmutable());
        }

        private ListNode List()
        {
            var list = ImmutableArray.CreateBuilder<DocumentNode>();
            while (reader.Read() && reader.TokenType != JsonTokenType.EndArray)
            {
                if (++items > limits.MostItems) throw TooMany();
                list.Add(Node());
            }
            return new ListNode(list.ToImmutable());
        }

        private readonly LimitException TooMany() => new("form.too-many-items",
            $"The file holds more than {limits.MostItems} list items.", $"Allowed: up to {limits.MostItems} list items in all.");

        /// <summary>Half a character pair, written as an escape, is no text; it is kept as a mark that the check of characters finds.</summary>
        private readonly string Text()
        {
            try
            {
                return (reader.GetString() ?? "").Normalize();
            }
            catch (Exception e) when (e is InvalidOperationException or ArgumentException)
            {
                return "\u0000";
            }
        }
    }
}
