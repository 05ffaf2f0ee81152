using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Comparing;

namespace JointPlanner.Cli.Comparing;

/// <summary>A run again as text for people.</summary>
internal static class DifferenceLines
{
    /// <summary>The lines.</summary>
    public static IEnumerable<string> Of(RunAgain again, DisplayProfile profile)
    {
        yield return $"package SHA-256 {again.Stored.PackageHash}";
        yield return $"results SHA-256 {again.Stored.ResultsHash}";
        yield return again.Summary;
        foreach (var note in again.Notes.Concat(again.Obstacles)) yield return note;
        if (again.Differences is not { } differences) yield break;
        foreach (var choice in differences.Choices) yield return $"  {choice.Name}: {choice.Before ?? "none"} stored, {choice.After ?? "none"} today";
        if (differences.Results.Length > 0)
        {
            var table = new TextTable("result", "#stored", "#today", "moved");
            foreach (var d in differences.Results)
                table.Add(d.Key, DifferenceText.Value(d.Before, d.Quantity, profile), DifferenceText.Value(d.After, d.Quantity, profile), DifferenceText.Moved(d, profile));
            foreach (var line in table.Lines("  ")) yield return line;
        }
        foreach (var table in differences.Tables) yield return $"  joint {table.Joint}: {DifferenceText.Of(table, profile)}";
        foreach (var finding in differences.Findings)
        {
            if (finding.Before is { } before) yield return $"  stored: {DifferenceText.Of(before, profile)}";
            if (finding.After is { } after) yield return $"  today:  {DifferenceText.Of(after, profile)}";
        }
    }
}
