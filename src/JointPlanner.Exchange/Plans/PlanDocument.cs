using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Plans;

/// <summary>
/// A plan as people edit it: every text as it was typed, right or wrong. Paths name fields (joints/j1/setting/temperature); items go by
/// their id, items without one by their number (setting-table/ages/#1). Never changed once made: each edit gives a new document, so
/// keeping an old one is undo.
/// </summary>
public sealed class PlanDocument
{
    private PlanDocument(MapNode root) => Root = root;

    /// <summary>The tree behind it.</summary>
    public MapNode Root { get; }

    /// <summary>A plan that says nothing yet but what it is.</summary>
    public static readonly PlanDocument Empty = new(MapNode.Empty.With("schema", new TextNode(PlanFields.Table.Schema)));

    /// <summary>A document round a tree.</summary>
    public static PlanDocument Of(MapNode root) => new(root);

    /// <summary>Reads a file's bytes; only its being a document at all is checked here, its content by <see cref="PlanReader"/>.</summary>
    /// <returns>The document, or null with the faults.</returns>
    public static (PlanDocument? Document, ImmutableArray<Fault> Faults) Parse(ReadOnlySpan<byte> utf8) => From(DocumentParser.Parse(utf8));

    /// <summary>Reads JSON text.</summary>
    public static (PlanDocument? Document, ImmutableArray<Fault> Faults) Parse(string json) => Parse(Encoding.UTF8.GetBytes(json));

    /// <summary>Reads a stream, never more of it than a plan may have.</summary>
    public static (PlanDocument? Document, ImmutableArray<Fault> Faults) Parse(Stream stream) => From(DocumentParser.Parse(stream));

    private static (PlanDocument?, ImmutableArray<Fault>) From(ParsedDocument parsed) => (parsed.Root is { } root ? new PlanDocument(root) : null, parsed.Faults);

    /// <summary>The text at a path as typed; null where nothing stands there, or a group or list.</summary>
    public string? TextAt(string path) => TreePath.Find(PlanFields.Table, Root, path) switch
    {
        TextNode text => text.Text,
        NumberNode number => number.Text,
        TruthNode { Value: { } truth } => truth ? "true" : "false",
        _ => null,
    };

    /// <summary>True where something stands at the path: a text, a group, a list.</summary>
    public bool Has(string path) => TreePath.Find(PlanFields.Table, Root, path) is not null;

    /// <summary>Addresses of a list's items in order: their ids, or #1 for items without one. Empty where there is no list.</summary>
    public IReadOnlyList<string> Items(string listPath) =>
        TreePath.Find(PlanFields.Table, Root, listPath) is ListNode list
            ? ItemAddresses.Of(list, PlanFields.Table.ItemsHaveIds(PlanFields.Table.PatternOf(listPath))).InOrder
            : [];

    /// <summary>Every text with its path, in the order they are written.</summary>
    public IEnumerable<KeyValuePair<string, string>> Texts() => TreePath.Leaves(PlanFields.Table, Root);

    /// <summary>This document with a text set as typed; null or an empty text takes the field out, and groups that become empty with it.</summary>
    /// <exception cref="ArgumentException">No field of a plan has this path, or the item in it does not exist.</exception>
    public PlanDocument With(string path, string? text)
    {
        var field = PlanFields.Table.At(path);
        if (field is null or { Entry: GroupEntry or ListEntry }) throw new ArgumentException($"{path} is not a field of a plan.", nameof(path));
        return new PlanDocument(TreePath.Set(PlanFields.Table, Root, path, string.IsNullOrEmpty(text) ? null : Node(field.Entry, text)));
    }

    /// <summary>This document without the field, group, list or item at a path.</summary>
    public PlanDocument Without(string path) =>
        TreePath.Find(PlanFields.Table, Root, path) is null ? this : new PlanDocument(TreePath.Set(PlanFields.Table, Root, path, null));

    /// <summary>This document with a new item in a list; an item of a list with ids gets a fresh one.</summary>
    /// <param name="listPath">Path of the list; it is made where there is none.</param>
    /// <param name="prefix">What the fresh id starts with, for instance p.</param>
    /// <param name="at">Place in the list; null for its end.</param>
    /// <param name="reserved">Ids that were used before and must not come again.</param>
    /// <returns>The document and the new item's path.</returns>
    /// <exception cref="ArgumentException">No list of a plan has this path.</exception>
    public (PlanDocument Document, string Path) WithItem(string listPath, string prefix, int? at = null, IEnumerable<string>? reserved = null)
    {
        var pattern = PlanFields.Table.PatternOf(listPath);
        if (PlanFields.Table.Find(pattern) is not { Entry: ListEntry }) throw new ArgumentException($"{listPath} is not a list of a plan.", nameof(listPath));
        var hasIds = PlanFields.Table.ItemsHaveIds(pattern);
        var items = TreePath.Find(PlanFields.Table, Root, listPath) is ListNode list ? list.Items : [];
        var place = Math.Clamp(at ?? items.Length, 0, items.Length);
        var id = hasIds ? FreshId(prefix, reserved ?? []) : "";
        DocumentNode item = PlanFields.Table.Find($"{pattern}/*") is not null ? new TextNode("")
            : hasIds ? MapNode.Empty.With("id", new TextNode(id)) : MapNode.Empty;
        var root = TreePath.Set(PlanFields.Table, Root, listPath, new ListNode(items.Insert(place, item)));
        return (new PlanDocument(root), $"{listPath}/{(hasIds ? id : FormattableString.Invariant($"#{place + 1}"))}");
    }

    /// <summary>A short id that no support, segment, bearing, joint or movement has, one above the highest number in use.</summary>
    private string FreshId(string prefix, IEnumerable<string> reserved)
    {
        var highest = PlanFields.Table.Fields.Where(f => f.Entry is ListEntry && PlanFields.Table.ItemsHaveIds(f.Pattern))
            .SelectMany(f => Items(f.Pattern)).Concat(reserved)
            .Select(id => id.StartsWith(prefix, StringComparison.Ordinal)
                && int.TryParse(id.AsSpan(prefix.Length), NumberStyles.None, CultureInfo.InvariantCulture, out var number) ? number : 0)
            .DefaultIfEmpty(0).Max();
        return FormattableString.Invariant($"{prefix}{highest + 1}");
    }

    /// <summary>The file in UTF-8: fixed order, LF, texts as typed. Reading it back and writing it again gives the same bytes.</summary>
    public byte[] ToUtf8() => DocumentWriter.ToUtf8(PlanFields.Table, Root);

    /// <summary>The same as text.</summary>
    public string ToJson() => Encoding.UTF8.GetString(ToUtf8());

    /// <summary>A typed text as a node: a bare number where the field wants one and the text is one, else a text, so that nothing typed is lost.</summary>
    private static DocumentNode Node(Entry entry, string text)
    {
        if (entry is RatioEntry or CountEntry
            && QuantityText.Parse(text, Engine.Formulas.Quantity.Ratio) is { Fault: null, Unit: var unit } read && unit == Engine.Formulas.Unit.One)
            return new NumberNode(QuantityText.Write(read.Value));
        return entry is FalseEntry && text == "false" ? new TruthNode(false) : new TextNode(Whole(text).Normalize());
    }

    /// <summary>Half a character pair cannot be written to a file; the mark that says so can.</summary>
    private static string Whole(string text) => Encoding.UTF8.GetString(Encoding.UTF8.GetBytes(text));
}
