using System.Text.Json;

namespace JointPlanner.Archive.Drafts;

/// <summary>Whether two values say the same as typed. The order of members says nothing; the digits of a number do.</summary>
internal static class JsonSame
{
    public static bool Same(JsonElement? one, JsonElement? other)
    {
        if (one is not { } a || other is not { } b) return one is null && other is null;
        if (a.ValueKind != b.ValueKind) return false;
        return a.ValueKind switch
        {
            JsonValueKind.Object => SameMembers(a, b),
            JsonValueKind.Array => a.GetArrayLength() == b.GetArrayLength()
                && a.EnumerateArray().Zip(b.EnumerateArray()).All(pair => Same(pair.First, pair.Second)),
            JsonValueKind.String => a.GetString() == b.GetString(),
            _ => a.GetRawText() == b.GetRawText(),
        };
    }

    private static bool SameMembers(JsonElement a, JsonElement b) =>
        a.GetPropertyCount() == b.GetPropertyCount()
        && a.EnumerateObject().All(member => b.TryGetProperty(member.Name, out var twin) && Same(member.Value, twin));
}
