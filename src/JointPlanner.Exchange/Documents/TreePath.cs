namespace JointPlanner.Exchange.Documents;

/// <summary>Finds and sets parts of a document by path.</summary>
internal static class TreePath
{
    /// <summary>The part at a path; null where there is none.</summary>
    public static DocumentNode? Find(FieldTable table, MapNode root, string path)
    {
        DocumentNode? node = root;
        var pattern = "";
        foreach (var part in path.Split('/'))
        {
            switch (node)
            {
                case MapNode map:
                    node = map[part];
                    pattern = pattern.Length == 0 ? part : $"{pattern}/{part}";
                    break;
                case ListNode list:
                    var at = Place(table, pattern, list, part);
                    node = at < 0 ? null : list.Items[at];
                    pattern += "/*";
                    break;
                default:
                    return null;
            }
        }
        return node;
    }

    /// <summary>The document with a part set, or taken out where it is null; groups on the way are made, and taken out when they become empty.</summary>
    /// <exception cref="ArgumentException">An item on the way does not exist.</exception>
    public static MapNode Set(FieldTable table, MapNode root, string path, DocumentNode? part) =>
        (MapNode?)Set(table, root, "", path.Split('/'), part) ?? MapNode.Empty;

    private static DocumentNode? Set(FieldTable table, DocumentNode? node, string pattern, ReadOnlySpan<string> parts, DocumentNode? value)
    {
        if (parts.IsEmpty) return value;
        var name = parts[0];
        if (table.Find(pattern) is { Entry: ListEntry })
        {
            var list = node as ListNode ?? new ListNode([]);
            var at = Place(table, pattern, list, name);
            if (at < 0) throw new ArgumentException($"There is no item “{name}” in {pattern}.", nameof(parts));
            var item = Set(table, list.Items[at], $"{pattern}/*", parts[1..], value);
            // An item stays when its last field is taken out; it goes only when it is itself named.
            if (item is null && parts.Length > 1) item = MapNode.Empty;
            return new ListNode(item is null ? list.Items.RemoveAt(at) : list.Items.SetItem(at, item));
        }
        var map = node as MapNode ?? MapNode.Empty;
        var changed = map.With(name, Set(table, map[name], pattern.Length == 0 ? name : $"{pattern}/{name}", parts[1..], value));
        return changed.Entries.IsEmpty && pattern.Length > 0 ? null : changed;
    }

    /// <summary>Every text with its path, fields in the table's order.</summary>
    public static IEnumerable<KeyValuePair<string, string>> Leaves(FieldTable table, MapNode root) => Leaves(table, "", "", root);

    private static IEnumerable<KeyValuePair<string, string>> Leaves(FieldTable table, string pattern, string path, DocumentNode node)
    {
        switch (node)
        {
            case MapNode map:
                foreach (var field in table.In(pattern))
                    if (map[field.Word] is { } part)
                        foreach (var leaf in Leaves(table, field.Pattern, path.Length == 0 ? field.Word : $"{path}/{field.Word}", part))
                            yield return leaf;
                break;
            case ListNode list:
                var addresses = ItemAddresses.Of(list, table.ItemsHaveIds(pattern)).InOrder;
                for (var i = 0; i < addresses.Count; i++)
                    foreach (var leaf in Leaves(table, $"{pattern}/*", $"{path}/{addresses[i]}", list.Items[i]))
                        yield return leaf;
                break;
            default:
                yield return KeyValuePair.Create(path, FormCheck.Text(node));
                break;
        }
    }

    private static int Place(FieldTable table, string pattern, ListNode list, string address) =>
        ItemAddresses.Of(list, table.ItemsHaveIds(pattern)).Place(address);
}
