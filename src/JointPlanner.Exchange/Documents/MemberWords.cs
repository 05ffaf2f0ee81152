using System.Text;

namespace JointPlanner.Exchange.Documents;

/// <summary>Members of an enumeration as words in files: small letters with hyphens.</summary>
public static class MemberWords
{
    /// <summary>The member of a word; the first member where the word is none, which the field's own check has said already.</summary>
    public static T Of<T>(string word)
        where T : struct, Enum => Enum.GetValues<T>().FirstOrDefault(v => Of(v) == word);

    /// <summary>The word of a member.</summary>
    public static string Of<T>(T member)
        where T : struct, Enum
    {
        var word = new StringBuilder();
        foreach (var c in member.ToString())
        {
            if (char.IsAsciiLetterUpper(c) && word.Length > 0) word.Append('-');
            word.Append(char.ToLowerInvariant(c));
        }
        return word.ToString();
    }
}
