using System.Text.RegularExpressions;

namespace JointPlanner.Exchange.Documents;

/// <summary>How the items of one list are called in a path: by their id, or as #3 where they have none that can be used.</summary>
public sealed partial class ItemAddresses
{
    private readonly Dictionary<string, int> places = new(StringComparer.Ordinal);

    internal ItemAddresses(ListNode list, bool itemsHaveIds)
    {
        var addresses = new string[list.Items.Length];
        for (var i = 0; i < addresses.Length; i++)
        {
            var id = itemsHaveIds && list.Items[i] is MapNode item && item["id"] is TextNode { Text: var text } && IsId(text) ? text : null;
            if (id is null || !places.TryAdd(id, i)) places.Add(id = FormattableString.Invariant($"#{i + 1}"), i);
            addresses[i] = id;
        }
        InOrder = addresses;
    }

    [GeneratedRegex("^[a-z0-9-]{1,24}$")]
    private static partial Regex IdShape { get; }

    /// <summary>The addresses in the order of the items. A second item of the same id goes by its number.</summary>
    public IReadOnlyList<string> InOrder { get; }

    /// <summary>True where the text may be an id.</summary>
    public static bool IsId(string text) => IdShape.IsMatch(text);

    /// <summary>The addresses of a list's items.</summary>
    public static ItemAddresses Of(ListNode list, bool itemsHaveIds) => itemsHaveIds ? list.ById : list.ByNumber;

    /// <summary>Place of the item of an address; −1 where there is none.</summary>
    public int Place(string address) => places.GetValueOrDefault(address, -1);
}
