using System.Text.RegularExpressions;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>Stations typed in a row: parted by semicolons, lines, tabs or a comma with a space; one unit at the end may stand for all.</summary>
internal static partial class StationList
{
    internal static IReadOnlyList<string> Of(string typed)
    {
        var texts = Parting.Split(typed).Select(text => text.Trim()).Where(text => text.Length > 0).ToList();
        var one = texts.Count > 0 ? OneUnit.Match(texts[^1]).Groups[1].Value : "";
        // Nothing is nothing in any unit.
        var any = texts.Select(text => Letters.Match(text).Value).FirstOrDefault(unit => unit.Length > 0) ?? "";
        return [.. texts.Select(text => one.Length > 0 && Bare.IsMatch(text) ? $"{text} {one}" : text == "0" && any.Length > 0 ? $"0 {any}" : text)];
    }

    [GeneratedRegex(@"[;\n\t]|,\s")]
    private static partial Regex Parting { get; }

    [GeneratedRegex(@"^[-−+]?[\d.,]+\s*([A-Za-z]+)$")]
    private static partial Regex OneUnit { get; }

    [GeneratedRegex("[A-Za-z]+")]
    private static partial Regex Letters { get; }

    [GeneratedRegex(@"^[-−+]?[\d.,]+$")]
    private static partial Regex Bare { get; }
}
