using System.Globalization;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Makes text out of a stranger's file safe to show: no control, direction or invisible characters, no endless length.</summary>
internal static class PlainText
{
    private const int Longest = 200;

    public static string Of(string? text)
    {
        if (text is null) return "";
        return Pictures.PlainCharacters.Of(text.Length > Longest ? text[..Longest] + "…" : text);
    }

    /// <summary>A list of things for one sentence, cut after twelve.</summary>
    public static string List(IReadOnlyCollection<string> things) => things.Count <= 12
        ? string.Join("; ", things)
        : string.Join("; ", things.Take(12)) + string.Create(CultureInfo.InvariantCulture, $"; and {things.Count - 12} more");
}
