using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace JointPlanner.Archive.Drafts;

/// <summary>A merged value: absent, or there (and then perhaps the JSON null).</summary>
internal readonly record struct Merged(bool Present, JsonNode? Node)
{
    public static Merged Of(JsonElement? value) => value is { } element ? new Merged(true, Copy(element)) : default;

    private static JsonNode? Copy(JsonElement element) => element.ValueKind switch
    {
        JsonValueKind.Object => JsonObject.Create(element.Clone()),
        JsonValueKind.Array => JsonArray.Create(element.Clone()),
        _ => JsonValue.Create(element.Clone()),
    };
}

/// <summary>One merge, down from the root.</summary>
internal sealed class MergeWalk(IReadOnlyDictionary<string, Take> choices)
{
    public static readonly JsonSerializerOptions Written = new()
    {
        WriteIndented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    private readonly List<Clash> _clashes = [];

    public IReadOnlyList<Clash> Clashes => _clashes;

    public Merged Merge(string path, JsonElement? before, JsonElement? mine, JsonElement? theirs)
    {
        if (JsonSame.Same(mine, theirs) || JsonSame.Same(before, mine)) return Merged.Of(theirs);
        if (JsonSame.Same(before, theirs)) return Merged.Of(mine);
        if (AllAre(JsonValueKind.Object, before, mine, theirs)) return Members(path, before, mine!.Value, theirs!.Value);
        if (AllAre(JsonValueKind.Array, before, mine, theirs)) return List(path, before, mine!.Value, theirs!.Value);
        return Clashing(path, before, mine, theirs);
    }

    private Merged Members(string path, JsonElement? before, JsonElement mine, JsonElement theirs)
    {
        var merged = new JsonObject();
        foreach (var name in Weave(Names(theirs), Names(mine)))
        {
            var value = Merge(Below(path, name), Member(before, name), Member(mine, name), Member(theirs, name));
            if (value.Present) merged.Add(name, value.Node);
        }

        return new Merged(true, merged);
    }

    private Merged List(string path, JsonElement? before, JsonElement mine, JsonElement theirs)
    {
        if (KeyedList.Read(before) is { } a && KeyedList.Read(mine) is { } b && KeyedList.Read(theirs) is { } c && b.Ids.Count + c.Ids.Count > 0)
            return ById(path, a, b, c);

        var merged = new JsonArray();
        var length = Math.Max(mine.GetArrayLength(), theirs.GetArrayLength());
        for (var index = 0; index < length; index++)
        {
            var place = Below(path, index.ToString(CultureInfo.InvariantCulture));
            var value = Merge(place, At(before, index), At(mine, index), At(theirs, index));
            if (value.Present) merged.Add(value.Node);
        }

        return new Merged(true, merged);
    }

    private Merged ById(string path, KeyedList before, KeyedList mine, KeyedList theirs)
    {
        var merged = new JsonArray();
        foreach (var id in Order(path, before, mine, theirs))
        {
            var value = Merge(Below(path, id), before[id], mine[id], theirs[id]);
            if (value.Present) merged.Add(value.Node);
        }

        return new Merged(true, merged);
    }

    private List<string> Order(string path, KeyedList before, KeyedList mine, KeyedList theirs)
    {
        if (!mine.ReordersAgainst(before)) return Weave(theirs.Ids, mine.Ids);
        if (!theirs.ReordersAgainst(before) || !mine.ReordersAgainst(theirs)) return Weave(mine.Ids, theirs.Ids);
        var order = Clashing(Below(path, "(order)"), before.IdsAsJson(), mine.IdsAsJson(), theirs.IdsAsJson());
        var mineFirst = order.Node!.ToJsonString() == Merged.Of(mine.IdsAsJson()).Node!.ToJsonString();
        return mineFirst ? Weave(mine.Ids, theirs.Ids) : Weave(theirs.Ids, mine.Ids);
    }

    private Merged Clashing(string path, JsonElement? before, JsonElement? mine, JsonElement? theirs)
    {
        if (choices.TryGetValue(path, out var take)) return Merged.Of(take == Take.Mine ? mine : theirs);
        _clashes.Add(new Clash(path, before?.GetRawText(), mine?.GetRawText(), theirs?.GetRawText()));
        return Merged.Of(theirs);
    }

    // What only the other has goes behind the neighbour it follows there.
    private static List<string> Weave(IReadOnlyList<string> spine, IReadOnlyList<string> other)
    {
        var woven = new List<string>(spine);
        var known = new HashSet<string>(spine, StringComparer.Ordinal);
        var place = 0;
        foreach (var name in other)
        {
            if (known.Contains(name)) place = woven.IndexOf(name) + 1;
            else woven.Insert(place++, name);
        }

        return woven;
    }

    // A value that both sides added has nothing before it; then the two are merged as if from empty.
    private static bool AllAre(JsonValueKind kind, JsonElement? before, JsonElement? mine, JsonElement? theirs) =>
        (before is null || before.Value.ValueKind == kind) && mine?.ValueKind == kind && theirs?.ValueKind == kind;

    private static List<string> Names(JsonElement element) => [.. element.EnumerateObject().Select(member => member.Name)];

    private static JsonElement? Member(JsonElement? element, string name) =>
        element is { } there && there.TryGetProperty(name, out var value) ? value : null;

    private static JsonElement? At(JsonElement? element, int index) => element is { } there && index < there.GetArrayLength() ? there[index] : null;

    private static string Below(string path, string name)
    {
        var escaped = name.Replace("~", "~0", StringComparison.Ordinal).Replace("/", "~1", StringComparison.Ordinal);
        return path.Length == 0 ? escaped : $"{path}/{escaped}";
    }
}
