using System.Globalization;
using System.Text;

namespace JointPlanner.Pdf.Writing;

/// <summary>Values as they stand in a PDF (ISO 32000-1, 7.3), never in the culture of the thread.</summary>
internal static class Syntax
{
    public static string Number(double value)
    {
        if (!double.IsFinite(value)) throw new InvalidOperationException("A coordinate or size on the sheet is not a finite number; it cannot be printed.");
        return (Math.Round(value, 3, MidpointRounding.AwayFromZero) + 0.0).ToString("0.###", CultureInfo.InvariantCulture);
    }

    public static string Number(int value) => value.ToString(CultureInfo.InvariantCulture);

    public static string Reference(int id) => Number(id) + " 0 R";

    /// <summary>A text string: plain letters as they are, others in UTF-16.</summary>
    public static string Text(string text)
    {
        if (text.All(c => c is >= ' ' and <= '~' and not ('(' or ')' or '\\'))) return "(" + text + ")";
        return "<FEFF" + Convert.ToHexString(Encoding.BigEndianUnicode.GetBytes(text)) + ">";
    }

    /// <summary>A name, with everything but letters, digits and hyphens escaped.</summary>
    public static string Name(string name)
    {
        var escaped = new StringBuilder("/");
        foreach (var b in Encoding.UTF8.GetBytes(name))
        {
            if (char.IsAsciiLetterOrDigit((char)b) || b is (byte)'-' or (byte)'.' or (byte)'+' or (byte)'_') escaped.Append((char)b);
            else escaped.Append('#').Append(b.ToString("X2", CultureInfo.InvariantCulture));
        }
        return escaped.ToString();
    }

    public static string Date(DateTimeOffset date) => "(D:" + date.UtcDateTime.ToString("yyyyMMddHHmmss", CultureInfo.InvariantCulture) + "+00'00')";

    public static byte[] Bytes(string syntax) => Encoding.Latin1.GetBytes(syntax);
}
