using System.Globalization;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>Puts a finding's numbers into its sentence, in the reader's units.</summary>
public static class FindingText
{
    /// <summary>The sentence.</summary>
    /// <exception cref="FormatException">The sentence has a place for a number that the finding does not hold.</exception>
    public static string Of(Finding finding, DisplayProfile profile, NumberStyle style = NumberStyle.Screen) =>
        finding.Values.Count == 0
            ? finding.Template
            : string.Format(
                CultureInfo.InvariantCulture, finding.Template,
                [.. finding.Values.Select(v => (object)NumberText.WithUnit(v.Value, v.Quantity, profile, style))]);

    /// <summary>How grave it is, in words.</summary>
    public static string Of(Severity severity) => severity switch
    {
        Severity.Note => "note",
        Severity.Warning => "look at this",
        Severity.BlocksIssue => "stops issue",
        Severity.Error => "cannot be computed",
        _ => throw new ArgumentOutOfRangeException(nameof(severity)),
    };
}
