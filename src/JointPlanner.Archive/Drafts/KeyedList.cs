using System.Text.Json;

namespace JointPlanner.Archive.Drafts;

/// <summary>A list whose every item is an object with an "id" of its own.</summary>
internal sealed class KeyedList
{
    private readonly Dictionary<string, JsonElement> _byId = new(StringComparer.Ordinal);
    private readonly List<string> _ids = [];

    public IReadOnlyList<string> Ids => _ids;

    public JsonElement? this[string id] => _byId.TryGetValue(id, out var element) ? element : null;

    /// <summary>Null when an item has no id or two have one; a missing list is an empty one.</summary>
    public static KeyedList? Read(JsonElement? list)
    {
        var keyed = new KeyedList();
        if (list is not { } there) return keyed;
        foreach (var item in there.EnumerateArray())
        {
            if (item.ValueKind != JsonValueKind.Object || !item.TryGetProperty("id", out var id) || id.ValueKind != JsonValueKind.String) return null;
            if (!keyed._byId.TryAdd(id.GetString()!, item)) return null;
            keyed._ids.Add(id.GetString()!);
        }

        return keyed;
    }

    /// <summary>Whether the ids that both hold stand in another order.</summary>
    public bool ReordersAgainst(KeyedList other) =>
        !_ids.Where(other._byId.ContainsKey).SequenceEqual(other._ids.Where(_byId.ContainsKey), StringComparer.Ordinal);

    public JsonElement IdsAsJson() => JsonSerializer.SerializeToElement(_ids);
}
