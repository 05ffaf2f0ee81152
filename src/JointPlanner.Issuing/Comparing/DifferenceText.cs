using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Issuing.Comparing;

/// <summary>Writes differences in the reader's units, the direction in words.</summary>
public static class DifferenceText
{
    /// <summary>A value before or after; "none" where there is none.</summary>
    public static string Value(double? value, Quantity quantity, DisplayProfile profile) =>
        value is { } v ? NumberText.WithUnit(v, quantity, profile) : "none";

    /// <summary>By how much and which way a result moved.</summary>
    public static string Moved(ResultDifference difference, DisplayProfile profile)
    {
        if (difference.Before is not { } before) return "new";
        if (difference.After is not { } after) return "gone";
        var kind = difference.Quantity == Quantity.Temperature ? Quantity.TemperatureDifference : difference.Quantity;
        var by = NumberText.WithUnit(Math.Abs(after - before), kind, profile);
        var more = after > before;
        return (difference.Key.Split('/'), difference.Quantity) switch
        {
            (var key, _) when key.Contains("opens-by") => $"opens {(more ? "more" : "less")}, by {by}",
            (var key, _) when key.Contains("closes-by") => $"closes {(more ? "more" : "less")}, by {by}",
            (var key, _) when key.Contains("racking") => $"racks {(more ? "more" : "less")}, by {by}",
            (var key, _) when key.Contains("travel") => $"further {(more ? "up" : "down")}-station, by {by}",
            (_, var q) when q == Quantity.Opening => $"{(more ? "wider" : "narrower")} by {by}",
            (_, var q) when q == Quantity.Temperature => $"{(more ? "warmer" : "colder")} by {by}",
            (var key, _) when key is [.., "zero-movement-point"] => $"further {(more ? "up" : "down")}-station, by {by}",
            _ => $"{(more ? "larger" : "smaller")} by {by}",
        };
    }

    /// <summary>What differs in a setting table.</summary>
    public static string Of(TableDifference table, DisplayProfile profile)
    {
        var which = table.Method.Length == 0 ? "the sheet's table" : $"the table for {table.Method}";
        var rows = FormattableString.Invariant($"{which}: {table.Differing} of {table.Rows} rows differ");
        if (table.Largest is not { } most) return rows + ".";
        var at = NumberText.WithUnit(most.Temperature, Quantity.Temperature, profile);
        var age = most.DeckAge is { } a ? $" and a deck age of {NumberText.WithUnit(a, Quantity.Age, profile)}" : "";
        var (before, after) = (SetValueText.Of(most.Before, profile), SetValueText.Of(most.After, profile));
        return before == after
            ? $"{rows}; no set value by more than its last printed digit."
            : $"{rows}; most at {at}{age}: set {before} before, {after} now, {(most.After > most.Before ? "wider" : "narrower")}.";
    }

    /// <summary>Name and version of a rule set as it stands in a package.</summary>
    public static string RuleSet(MapNode rules) => (rules["name"], rules["version"]) is (TextNode name, TextNode version) ? $"{name.Text}, version {version.Text}" : "a rule set without a name";

    /// <summary>A stored finding as a sentence.</summary>
    public static string Of(StoredFinding finding, DisplayProfile profile)
    {
        var numbers = finding.Numbers.Select(n => (Quantity.All.FirstOrDefault(q => q.Id == n.Quantity) ?? Quantity.Ratio, n.Value)).ToList();
        var severity = MemberWords.Of<Severity>(finding.Severity);
        return $"{FindingText.Of(severity)}: {FindingText.Of(new Finding(finding.Id, severity, finding.Path, finding.Sentence, numbers), profile)}";
    }

    /// <summary>The whole in a sentence.</summary>
    public static string Summary(Differences differences) => differences switch
    {
        { SameResults: true, WithinRounding: 0 } => FormattableString.Invariant($"Same: all {differences.Compared} numbers are the same, bit for bit."),
        { SameResults: true } => FormattableString.Invariant(
            $"Same within rounding: of {differences.Compared} numbers {differences.WithinRounding} differ, none by more than two machines may."),
        _ => FormattableString.Invariant(
            $"Different: {differences.Results.Length} results, {differences.Choices.Length} choices, {differences.Tables.Length} setting tables, {differences.Findings.Length} findings."),
    };
}
