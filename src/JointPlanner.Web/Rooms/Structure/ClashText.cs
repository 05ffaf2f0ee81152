using System.Text.Json;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>One side of a clash as a person reads it: the text as typed, or what an item holds.</summary>
internal static class ClashText
{
    internal static string Of(string? json, string ifNone)
    {
        if (json is null) return ifNone;
        using var value = JsonDocument.Parse(json);
        return string.Join(" · ", Texts(value.RootElement));
    }

    private static IEnumerable<string> Texts(JsonElement value) => value.ValueKind switch
    {
        JsonValueKind.Object => value.EnumerateObject().Where(member => member.Name != "id").SelectMany(member => Texts(member.Value)),
        JsonValueKind.Array => value.EnumerateArray().SelectMany(Texts),
        JsonValueKind.String => [value.GetString()!],
        _ => [value.GetRawText()],
    };
}
