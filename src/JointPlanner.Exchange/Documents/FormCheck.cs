using JointPlanner.Engine.Plans;

namespace JointPlanner.Exchange.Documents;

/// <summary>
/// First pass: is every part where it belongs and of the right sort? Repeated and unknown names, a text where a group belongs, too many
/// items, ids that cannot be used. What it finds broken is not looked at by the passes after it.
/// </summary>
public sealed class FormCheck
{
    private readonly FieldTable table;
    private readonly List<Fault> faults = [];
    private readonly HashSet<string> broken = new(StringComparer.Ordinal);

    private FormCheck(FieldTable table) => this.table = table;

    /// <summary>What is wrong, in the order of the document.</summary>
    public IReadOnlyList<Fault> Faults => faults;

    /// <summary>Paths of the parts that can be looked at no further.</summary>
    public IReadOnlySet<string> Broken => broken;

    /// <summary>Looks through a document.</summary>
    public static FormCheck Of(FieldTable table, MapNode root)
    {
        var check = new FormCheck(table);
        check.Map("", "", root);
        return check;
    }

    private void Map(string pattern, string path, MapNode map)
    {
        foreach (var name in map.Repeated.Distinct())
            Break(new Fault("form.repeated", Join(path, PersonText.Shown(name)), PersonText.Shown(name), $"“{PersonText.Shown(name)}” stands here more than once.",
                "Allowed: each name once in its group.", "Take out all but one."));
        foreach (var (name, part) in map.Entries)
        {
            if (table.Find(Join(pattern, name)) is { } field) Part(field, Join(path, name), part);
            else Unknown(pattern, path, name, map);
        }
    }

    private void Part(Field field, string path, DocumentNode part)
    {
        switch (field.Entry)
        {
            case GroupEntry when part is MapNode map:
                Map(field.Pattern, path, map);
                break;
            case OpenGroupEntry when part is MapNode:
                break;
            case ListEntry entry when part is ListNode list:
                List(field, entry, path, list);
                break;
            case GroupEntry or OpenGroupEntry:
                Break(new Fault("form.not-a-group", path, Shown(part), $"{field.Name}: a group of fields belongs here.", "Allowed: { … }.", "Write the group, or take this out."));
                break;
            case ListEntry entry:
                Break(new Fault("form.not-a-list", path, Shown(part), $"{field.Name}: a list belongs here.", $"Allowed: [ … ] with one entry for each {entry.Item}.", "Write the list, or take this out."));
                break;
            default:
                if (part is MapNode or ListNode)
                    Break(new Fault("form.not-a-value", path, Shown(part), $"{field.Name}: a single value belongs here.", "Allowed: one value.", "Write the value itself."));
                break;
        }
    }

    private void List(Field field, ListEntry entry, string path, ListNode list)
    {
        if (list.Items.Length > entry.Most)
        {
            Break(new Fault("form.too-many", path, Shown(list), $"There are {list.Items.Length} entries.", $"Allowed: up to {entry.Most} of them.",
                "Describe fewer, or split the structure."));
            return;
        }
        var itemPattern = $"{field.Pattern}/*";
        var hasIds = table.ItemsHaveIds(field.Pattern);
        var addresses = ItemAddresses.Of(list, hasIds).InOrder;
        for (var i = 0; i < addresses.Count; i++)
        {
            var itemPath = $"{path}/{addresses[i]}";
            if (table.Find(itemPattern) is { } leaf) Part(leaf, itemPath, list.Items[i]);
            else if (list.Items[i] is MapNode item)
            {
                if (hasIds) Id(entry, itemPath, addresses[i], item["id"]);
                Map(itemPattern, itemPath, item);
            }
            else
                Break(new Fault("form.not-a-group", itemPath, Shown(list.Items[i]), $"A group of fields for one {entry.Item} belongs here.", "Allowed: { … }.",
                    "Write the group, or take this out."));
        }
    }

    private void Id(ListEntry entry, string itemPath, string address, DocumentNode? id)
    {
        if (address[0] != '#') return;
        const string allowed = "Allowed: 1 to 24 of the characters a–z, 0–9 and hyphen, each id once.";
        if (id is null)
            Break(new Fault("id.missing", $"{itemPath}/id", "", $"This {entry.Item} has no id.", allowed, "Give it an id, for instance p1."));
        else if (id is TextNode { Text: var text } && ItemAddresses.IsId(text))
            Break(new Fault("id.repeated", $"{itemPath}/id", text, $"Another {entry.Item} has the id “{text}” already.", allowed, "Give this one another id."));
        else
            Break(new Fault("id.shape", $"{itemPath}/id", Shown(id), $"“{Shown(id)}” cannot be an id.", allowed, "Give it another id; what the drawing calls it goes into “mark”."));
    }

    private void Unknown(string pattern, string path, string name, MapNode map)
    {
        var nearest = Nearest.Of(name, table.In(pattern).Select(f => f.Word));
        var shown = PersonText.Shown(name);
        // A misspelled field is one fault, not also a missing one.
        if (nearest is not null && map[nearest] is null) broken.Add(Join(path, nearest));
        Break(new Fault("form.unknown-name", Join(path, shown), shown, $"“{shown}” is not a field of this group.",
            $"Allowed: {string.Join(", ", table.In(pattern).Select(f => f.Word))}.",
            nearest is null ? "Take it out." : $"Did you mean “{nearest}”? Rename it, or take it out."));
    }

    private void Break(Fault fault)
    {
        faults.Add(fault);
        broken.Add(fault.Path);
    }

    private static string Join(string path, string name) => path.Length == 0 ? name : $"{path}/{name}";

    /// <summary>A part as a message shows it.</summary>
    internal static string Shown(DocumentNode part) => PersonText.Shown(Text(part));

    /// <summary>A part as text.</summary>
    internal static string Text(DocumentNode part) => part switch
    {
        TextNode text => text.Text,
        NumberNode number => number.Text,
        TruthNode truth => truth.Value switch { true => "true", false => "false", null => "null" },
        ListNode list => FormattableString.Invariant($"[ {list.Items.Length} entries ]"),
        _ => "{ … }",
    };
}
