using System.Globalization;
using System.Text.RegularExpressions;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Documents;

/// <summary>
/// The JSON Schema (2020-12) of a field table. What fails it the reader refuses too; the reader sees more: units and ranges together,
/// fields together.
/// </summary>
public static class JsonSchema
{
    private const string Id = "^[a-z0-9-]{1,24}$";

    /// <summary>The schema in UTF-8.</summary>
    public static byte[] Of(FieldTable table, string title)
    {
        var head = MapNode.Empty.With("$schema", Text("https://json-schema.org/draft/2020-12/schema")).With("title", Text(title));
        return DocumentWriter.ToUtf8(new MapNode(head.Entries.AddRange(Group(table, "").Entries)));
    }

    private static MapNode Group(FieldTable table, string pattern)
    {
        var (properties, required) = (MapNode.Empty, new List<DocumentNode>());
        foreach (var field in table.In(pattern))
        {
            properties = properties.With(field.Word, Part(table, field));
            if (field.IsRequired && IsNeeded(table, field)) required.Add(Text(field.Word));
        }
        var group = MapNode.Empty.With("type", Text("object")).With("additionalProperties", new TruthNode(false)).With("properties", properties);
        return required.Count > 0 ? group.With("required", new ListNode([.. required])) : group;
    }

    /// <summary>A group must be there where something in it must.</summary>
    private static bool IsNeeded(FieldTable table, Field field) =>
        field.Entry is not GroupEntry || table.In(field.Pattern).Any(f => f.IsRequired && IsNeeded(table, f));

    private static MapNode Part(FieldTable table, Field field)
    {
        var part = field.Entry switch
        {
            GroupEntry => Group(table, field.Pattern),
            OpenGroupEntry => Typed("object"),
            ListEntry list => Typed("array").With("minItems", Number(list.Fewest)).With("maxItems", Number(list.Most))
                .With("items", table.Find($"{field.Pattern}/*") is { } leaf ? Part(table, leaf) : Group(table, $"{field.Pattern}/*")),
            QuantityEntry quantity => Quantity(quantity),
            RatioEntry ratio => Typed("number").With("minimum", Number(ratio.Low)).With("maximum", Number(ratio.High)),
            CountEntry count => Typed("integer").With("minimum", Number(count.Low)).With("maximum", Number(count.High)),
            TextEntry text => Typed("string").With("minLength", Number(field.IsRequired ? 1 : 0)).With("maxLength", Number(text.Longest)),
            WordEntry words => MapNode.Empty.With("enum", new ListNode([.. words.Words.Select(Text)])),
            IdEntry or ReferenceEntry => Typed("string").With("pattern", Text(Id)),
            FalseEntry => MapNode.Empty.With("const", new TruthNode(false)),
            TruthEntry => Typed("boolean"),
            _ => Typed("string").With("minLength", Number(1)).With("maxLength", Number(DocumentLimits.NameLength)),
        };
        var description = field.Meaning + (field.Default is { } text2 ? $" Default: {text2} ({field.DefaultReason})." : "");
        return part.With("description", Text(description));
    }

    private static MapNode Quantity(QuantityEntry entry)
    {
        var kind = UnitTable.Of(entry.Kind);
        var isPlainNumber = kind.Units.Contains(Unit.One);
        // A unit at the end; what stands before it is the reader's to judge.
        var units = kind.Units.SelectMany(UnitTable.SpellingsOf).Where(s => s.Length > 0).Append(entry.OrWord).Where(s => s.Length > 0)
            .Append("′").Append("’").Append("″").Append("”").Distinct()
            .Where(s => entry.Kind.Dimension == Unit.Metre.Dimension || !"′’″”".Contains(s, StringComparison.Ordinal))
            .OrderByDescending(s => s.Length).ThenBy(s => s, StringComparer.Ordinal).Select(Escape);
        var pattern = $"({string.Join("|", units)}{(isPlainNumber ? "|[0-9.,½¼¾⅓⅔⅛⅜⅝⅞⁰¹²³⁴⁵⁶⁷⁸⁹]" : "")})\\s*$";
        var part = MapNode.Empty
            .With("type", isPlainNumber ? new ListNode([Text("string"), Text("number")]) : Text("string"))
            .With("maxLength", Number(QuantityText.LongestText)).With("pattern", Text(pattern));
        return part;
    }

    private static string Escape(string spelling) => Regex.Replace(spelling, @"[\\^$.|?*+()\[\]{}/]", m => "\\" + m.Value).Replace(" ", "\\s", StringComparison.Ordinal);

    private static MapNode Typed(string type) => MapNode.Empty.With("type", Text(type));

    private static DocumentNode Text(string text) => new TextNode(text);

    private static NumberNode Number(double value) => new(value.ToString(CultureInfo.InvariantCulture));
}
