using System.Collections.Immutable;

namespace JointPlanner.Exchange.Documents;

/// <summary>A part of a document, as it was written: texts stay texts, numbers keep the digits they were written with. Never changed once made.</summary>
public abstract class DocumentNode
{
    private protected DocumentNode()
    {
    }
}

/// <summary>A text.</summary>
/// <param name="text">The text, unescaped.</param>
public sealed class TextNode(string text) : DocumentNode
{
    /// <summary>The text.</summary>
    public string Text { get; } = text;
}

/// <summary>A bare number.</summary>
/// <param name="text">Its digits as written.</param>
public sealed class NumberNode(string text) : DocumentNode
{
    /// <summary>Its digits as written.</summary>
    public string Text { get; } = text;
}

/// <summary>true, false or null.</summary>
/// <param name="value">The value; null for null.</param>
public sealed class TruthNode(bool? value) : DocumentNode
{
    /// <summary>The value; null for null.</summary>
    public bool? Value { get; } = value;
}

/// <summary>A list.</summary>
/// <param name="items">Its items in order.</param>
public sealed class ListNode(ImmutableArray<DocumentNode> items) : DocumentNode
{
    /// <summary>Its items in order.</summary>
    public ImmutableArray<DocumentNode> Items { get; } = items;

    /// <summary>Addresses of the items by id, worked out once: a long list is asked for them at every look-up.</summary>
    internal ItemAddresses ById => field ??= new ItemAddresses(this, itemsHaveIds: true);

    /// <summary>Addresses of the items by number.</summary>
    internal ItemAddresses ByNumber => field ??= new ItemAddresses(this, itemsHaveIds: false);
}

/// <summary>Named parts, in the order they were written.</summary>
/// <param name="entries">The parts; the first of each name.</param>
/// <param name="repeated">Names that were written more than once.</param>
public sealed class MapNode(ImmutableArray<KeyValuePair<string, DocumentNode>> entries, ImmutableArray<string> repeated = default) : DocumentNode
{
    /// <summary>A map without parts.</summary>
    public static readonly MapNode Empty = new([]);

    /// <summary>The parts; the first of each name.</summary>
    public ImmutableArray<KeyValuePair<string, DocumentNode>> Entries { get; } = entries;

    /// <summary>Names that were written more than once.</summary>
    public ImmutableArray<string> Repeated { get; } = repeated.IsDefault ? [] : repeated;

    /// <summary>The part of a name; null where there is none.</summary>
    public DocumentNode? this[string name]
    {
        get
        {
            foreach (var (key, value) in Entries)
                if (key == name)
                    return value;
            return null;
        }
    }

    /// <summary>This map with a part set, or taken out where it is null.</summary>
    public MapNode With(string name, DocumentNode? part)
    {
        var at = -1;
        for (var i = 0; i < Entries.Length && at < 0; i++)
            if (Entries[i].Key == name)
                at = i;
        var repeated = Repeated.RemoveAll(r => r == name);
        if (part is null) return at < 0 ? this : new MapNode(Entries.RemoveAt(at), repeated);
        var entry = KeyValuePair.Create(name, part);
        return new MapNode(at < 0 ? Entries.Add(entry) : Entries.SetItem(at, entry), repeated);
    }
}
