using System.Globalization;
using System.Text;

namespace JointPlanner.Pictures;

/// <summary>
/// The last guard before text reaches a screen or a page. Input is refused elsewhere when it holds control characters or marks that turn
/// the reading direction; what still comes through shows as its code point in brackets, such as <c>[U+202E]</c>: visible and harmless.
/// </summary>
public static class PlainCharacters
{
    /// <summary>The text in composed form (NFC) with every invisible or broken character spelt out.</summary>
    public static string Of(string text)
    {
        // Normalize throws on broken surrogate pairs, so they are spelt out first.
        var spelt = new StringBuilder(text.Length);
        var at = 0;
        while (at < text.Length)
        {
            if (!Rune.TryGetRuneAt(text, at, out var rune))
            {
                spelt.Append(Spell(text[at++]));
                continue;
            }
            at += rune.Utf16SequenceLength;
            if (IsPlain(rune)) spelt.Append(rune);
            else spelt.Append(Spell(rune.Value));
        }
        return spelt.ToString().Normalize(NormalizationForm.FormC);
    }

    /// <summary>A code point in brackets: <c>[U+202E]</c>.</summary>
    public static string Spell(int codePoint) => string.Create(CultureInfo.InvariantCulture, $"[U+{codePoint:X4}]");

    private static bool IsPlain(Rune rune) => Rune.GetUnicodeCategory(rune) switch
    {
        UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.Surrogate or UnicodeCategory.PrivateUse
            or UnicodeCategory.OtherNotAssigned or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator => false,
        _ => true,
    };
}
