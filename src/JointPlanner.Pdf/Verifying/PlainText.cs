using System.Globalization;
using System.Text;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Makes text out of a stranger's file safe to show: no control, direction or invisible characters, no endless length.</summary>
internal static class PlainText
{
    private const int Longest = 200;

    public static string Of(string? text)
    {
        var plain = new StringBuilder();
        foreach (var rune in (text ?? "").EnumerateRunes())
        {
            if (plain.Length >= Longest) return plain.Append('…').ToString();
            bool shown = Rune.GetUnicodeCategory(rune) is not (UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.LineSeparator
                or UnicodeCategory.ParagraphSeparator or UnicodeCategory.PrivateUse or UnicodeCategory.Surrogate or UnicodeCategory.OtherNotAssigned);
            plain.Append(shown ? rune.ToString() : "\uFFFD");
        }
        return plain.ToString();
    }

    /// <summary>A list of things for one sentence, cut after twelve.</summary>
    public static string List(IReadOnlyCollection<string> things) => things.Count <= 12
        ? string.Join("; ", things)
        : string.Join("; ", things.Take(12)) + string.Create(CultureInfo.InvariantCulture, $"; and {things.Count - 12} more");
}
