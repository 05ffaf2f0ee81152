using System.Text.RegularExpressions;

namespace JointPlanner.Exchange.Documents;

/// <summary>How items of a list are called in a path: by their id, or as #3 where they have none that can be used.</summary>
public static partial class ItemAddresses
{
    [GeneratedRegex("^[a-z0-9-]{1,24}$")]
    private static partial Regex IdShape { get; }

    /// <summary>True where the text may be an id.</summary>
    public static bool IsId(string text) => IdShape.IsMatch(text);

    /// <summary>The addresses of a list's items, in order. A second item of the same id goes by its number.</summary>
    public static string[] Of(ListNode list, bool itemsHaveIds)
    {
        var taken = new HashSet<string>(StringComparer.Ordinal);
        var addresses = new string[list.Items.Length];
        for (var i = 0; i < addresses.Length; i++)
        {
            var id = itemsHaveIds && list.Items[i] is MapNode item && item["id"] is TextNode { Text: var text } && IsId(text) ? text : null;
            addresses[i] = id is not null && taken.Add(id) ? id : FormattableString.Invariant($"#{i + 1}");
        }
        return addresses;
    }
}
