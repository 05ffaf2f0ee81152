using System.Globalization;
using System.Text;

namespace JointPlanner.Exchange.Documents;

/// <summary>Text from people: what may stand in it.</summary>
public static class PersonText
{
    /// <summary>True where the text holds a control character, a line break, a bidirectional override, or half a character pair.</summary>
    public static bool HasForbidden(string text)
    {
        for (var i = 0; i < text.Length; i++)
        {
            if (char.IsHighSurrogate(text[i]) && i + 1 < text.Length && char.IsLowSurrogate(text[i + 1])) i++;
            else if (char.IsSurrogate(text[i]) || IsForbidden(text[i])) return true;
        }
        return false;
    }

    /// <summary>The text with forbidden characters shown as their code, for messages.</summary>
    public static string Shown(string text)
    {
        var shown = new StringBuilder();
        for (var i = 0; i < text.Length; i++)
        {
            var isPair = char.IsHighSurrogate(text[i]) && i + 1 < text.Length && char.IsLowSurrogate(text[i + 1]);
            if (isPair) shown.Append(text[i]).Append(text[++i]);
            else if (char.IsSurrogate(text[i]) || IsForbidden(text[i])) shown.Append(CultureInfo.InvariantCulture, $"[U+{(int)text[i]:X4}]");
            else shown.Append(text[i]);
            if (shown.Length > 120) return shown.Append('…').ToString();
        }
        return shown.ToString();
    }

    private static bool IsForbidden(char c) =>
        char.IsControl(c) || c is '\u2028' or '\u2029' or '\u061C' or '\u200E' or '\u200F' or '\uFFFE' or '\uFFFF'
        or (>= '\u202A' and <= '\u202E') or (>= '\u2066' and <= '\u2069');
}
