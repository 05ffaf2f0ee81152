using System.Globalization;
using System.Text;
using JointPlanner.Archive.Acts;

namespace JointPlanner.Archive.Values;

/// <summary>Text from people: NFC, without control characters and without marks that turn the writing direction round.</summary>
public static class PlainText
{
    public const int NameLimit = 200;
    public const int NoteLimit = 4000;

    /// <summary>The text as it is kept; refused with the field's name when empty, too long or holding a forbidden character.</summary>
    public static string Required(string field, string? text, int limit)
    {
        var kept = Optional(field, text, limit);
        return kept ?? throw new ActRefused(RefusalReason.TextMissing, $"The field \"{field}\" is empty; write up to {limit} characters.");
    }

    public static string? Optional(string field, string? text, int limit)
    {
        if (string.IsNullOrWhiteSpace(text)) return null;
        foreach (var rune in text.EnumerateRunes())
        {
            if (IsForbidden(rune))
                throw new ActRefused(
                    RefusalReason.TextForbidden,
                    $"The field \"{field}\" holds the character U+{rune.Value:X4}, which is not allowed; delete it. Allowed are letters, digits, signs, blanks and new lines.");
        }

        var kept = text.Normalize(NormalizationForm.FormC).Trim();
        if (kept.Length > limit)
            throw new ActRefused(RefusalReason.TextTooLong, $"The field \"{field}\" has {kept.Length} characters; at most {limit} are allowed. Shorten it.");
        return kept;
    }

    private static bool IsForbidden(Rune rune)
    {
        if (rune == Rune.ReplacementChar) return true;
        if (rune.Value is '\n' or '\r' or '\t') return false;
        // The embedding, override and isolate marks change the order in which the text around them is read.
        return Rune.GetUnicodeCategory(rune) == UnicodeCategory.Control || rune.Value is (>= 0x202A and <= 0x202E) or (>= 0x2066 and <= 0x2069);
    }
}
