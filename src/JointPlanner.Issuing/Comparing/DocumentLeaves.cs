using JointPlanner.Exchange.Documents;

namespace JointPlanner.Issuing.Comparing;

/// <summary>Every text of a document with its path, parts with free names included: what two documents are compared by.</summary>
internal static class DocumentLeaves
{
    // What tells one item of a list from the others, in this order; an item without any goes by its number.
    private static readonly string[] Marks = ["id", "family", "value-id"];

    public static IReadOnlyDictionary<string, string> Of(DocumentNode? root)
    {
        var leaves = new Dictionary<string, string>();
        if (root is not null) Walk(root, "", leaves);
        return leaves;
    }

    private static void Walk(DocumentNode node, string path, Dictionary<string, string> leaves)
    {
        switch (node)
        {
            case MapNode map:
                foreach (var (name, part) in map.Entries) Walk(part, Under(path, name), leaves);
                break;
            case ListNode list:
                for (var i = 0; i < list.Items.Length; i++) Walk(list.Items[i], Under(path, Address(list.Items[i], i)), leaves);
                break;
            case TextNode text:
                leaves[path] = text.Text;
                break;
            case NumberNode number:
                leaves[path] = number.Text;
                break;
            case TruthNode truth:
                leaves[path] = truth.Value switch { true => "yes", false => "no", null => "nothing" };
                break;
        }
    }

    private static string Address(DocumentNode item, int at) => item is MapNode map && Marks.Select(m => map[m]).OfType<TextNode>().FirstOrDefault() is { } mark
        ? mark.Text
        : FormattableString.Invariant($"#{at + 1}");

    private static string Under(string path, string name) => path.Length == 0 ? name : $"{path}/{name}";
}
