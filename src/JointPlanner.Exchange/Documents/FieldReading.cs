using System.Globalization;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Exchange.Documents;

/// <summary>
/// Second pass: each field by itself. Is it there where it must be, is it what its entry asks, is it within its range? Parts that the
/// first pass found broken are left out.
/// </summary>
public sealed class FieldReading
{
    private readonly FieldTable table;
    private readonly IReadOnlySet<string> broken;
    private readonly bool showsUs;
    private readonly IReadOnlyDictionary<string, IReadOnlyCollection<string>> outsideWords;
    private readonly List<Fault> faults = [];

    private FieldReading(FieldTable table, IReadOnlySet<string> broken, bool showsUs, IReadOnlyDictionary<string, IReadOnlyCollection<string>> outsideWords) =>
        (this.table, this.broken, this.showsUs, this.outsideWords) = (table, broken, showsUs, outsideWords);

    /// <summary>What was read.</summary>
    public FieldValues Values { get; } = new();

    /// <summary>What is wrong or unusual, in the order of the table.</summary>
    public IReadOnlyList<Fault> Faults => faults;

    /// <summary>Reads every field.</summary>
    /// <param name="table">The fields.</param>
    /// <param name="root">The document.</param>
    /// <param name="broken">Paths that the first pass found broken.</param>
    /// <param name="showsUs">True where a bare number was more likely meant in US units.</param>
    /// <param name="outsideWords">Words known outside the document, by what they name; what is not named here is not checked.</param>
    public static FieldReading Of(
        FieldTable table, MapNode root, IReadOnlySet<string> broken, bool showsUs = false,
        IReadOnlyDictionary<string, IReadOnlyCollection<string>>? outsideWords = null)
    {
        var reading = new FieldReading(table, broken, showsUs, outsideWords ?? new Dictionary<string, IReadOnlyCollection<string>>());
        foreach (var path in broken) reading.Values.Miss(path);
        reading.Group("", "", root);
        return reading;
    }

    private void Group(string pattern, string path, MapNode map)
    {
        if (path.Length > 0) Values.PutGroup(path);
        foreach (var field in table.In(pattern))
        {
            var at = path.Length == 0 ? field.Word : $"{path}/{field.Word}";
            if (broken.Contains(at)) continue;
            var part = map[field.Word];
            switch (field.Entry)
            {
                case GroupEntry group when part is MapNode || (part is null && (field.IsRequired || group.IsAlwaysThere)):
                    Group(field.Pattern, at, part as MapNode ?? MapNode.Empty);
                    break;
                case ListEntry entry:
                    List(field, entry, at, part as ListNode);
                    break;
                case GroupEntry:
                    break;
                case OpenGroupEntry:
                    if (part is not null) Values.PutGroup(at);
                    break;
                default:
                    if (part is null) Absent(field, at);
                    else Value(field, at, part);
                    break;
            }
        }
    }

    private void List(Field field, ListEntry entry, string path, ListNode? list)
    {
        var count = list?.Items.Length ?? 0;
        if (count < entry.Fewest)
        {
            Add(new Fault("field.too-few", path, list is null ? "" : FormattableString.Invariant($"{count} entries"), entry.WhyFewest,
                $"Allowed: {entry.Fewest} or more.", $"Add a {entry.Item}."));
            Values.Miss(path);
        }
        if (list is null) return;
        var addresses = ItemAddresses.Of(list, table.ItemsHaveIds(field.Pattern)).InOrder.Select(a => $"{path}/{a}").ToArray();
        Values.PutItems(path, addresses);
        var itemPattern = $"{field.Pattern}/*";
        var leaf = table.Find(itemPattern);
        for (var i = 0; i < count; i++)
        {
            if (broken.Contains(addresses[i])) continue;
            if (leaf is not null) Value(leaf, addresses[i], list.Items[i]);
            else if (list.Items[i] is MapNode item) Group(itemPattern, addresses[i], item);
        }
    }

    private void Absent(Field field, string path)
    {
        if (field.Default is { } text)
        {
            Value(field, path, new TextNode(text));
            Values.Default(path, text, field.DefaultReason);
        }
        else if (field.IsRequired)
        {
            Add(new Fault("field.missing", path, "", $"{field.Name}: nothing is given.", FieldValueReader.AllowedBy(field), Remedy(field)));
            Values.Miss(path);
        }
    }

    private static string Remedy(Field field) => field.Hint.Length > 0 ? $"Give it: {field.Hint}." : "Give it.";

    private void Value(Field field, string path, DocumentNode part)
    {
        var read = FieldValueReader.Read(field, part, showsUs, outsideWords);
        foreach (var fault in read.Faults)
        {
            Add(fault with { Path = path, Value = FormCheck.Shown(part) });
            if (!fault.IsWarning) Values.Miss(path);
        }
        if (read.Faults.Any(f => !f.IsWarning)) return;
        if (read.Number is { } number) Values.Put(path, number);
        if (read.Text is { } text) Values.Put(path, text);
    }

    private void Add(Fault fault) => faults.Add(fault);
}
