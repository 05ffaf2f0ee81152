using JointPlanner.Engine;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary>A setting table as text.</summary>
/// <param name="profile">Units and digits.</param>
internal sealed class SettingText(DisplayProfile profile)
{
    /// <summary>Lines of one joint; none where no joint was taken.</summary>
    public IEnumerable<string> Lines(JointResult joint)
    {
        if (joint.Table is not { } table) yield break;
        yield return "  Setting table: openings normal to the joint";
        yield return $"    per degree of warming the opening changes by {Say(-table.Rate.Value, Quantity.Rate)}; values from "
            + $"{Say(table.Min.Value, Quantity.Temperature)} to {Say(table.Max.Value, Quantity.Temperature)} only";
        foreach (var age in table.Ages)
        {
            if (age is { } days) yield return $"    set when the deck is {Say(days, Quantity.Age)} old";
            foreach (var line in Rows([.. table.Rows.Where(r => r.DeckAge.Equals(age))])) yield return line;
        }
        yield return "    the row that the steps derive, as the joint is expected to be set";
        foreach (var line in Rows([table.Design])) yield return line;
    }

    private IEnumerable<string> Rows(IReadOnlyList<SettingRow> rows)
    {
        var table = new TextTable("#temperature", "#set", "#smaller by", "#larger by", "#least", "#greatest", "#reserve", "least by", "greatest by");
        foreach (var row in rows)
            table.Add(
                Say(row.Temperature, Quantity.Temperature),
                row.Set is { } set ? SetValueText.Of(set.Value, profile) + (row.ByGauge ? ", by gauge" : "") : "do not set",
                Tolerance(row.Minus), Tolerance(row.Plus), Say(row.Window?.Least), Say(row.Window?.Greatest), Say(row.Reserve),
                row.Window?.LeastBy.Name ?? "", row.Window?.GreatestBy.Name ?? "");
        var refusals = rows.Where(r => r.Refusal is not null)
            .Select(r => $"      {Say(r.Temperature, Quantity.Temperature)}: {FindingText.Of(r.Refusal!, profile)}"
                + (r.MidWindow is { } middle ? $" The middle of the window is {SetValueText.Of(middle.Value, profile)}." : ""));
        return table.Lines("      ").Concat(refusals);
    }

    private string Tolerance(Number? tolerance) => tolerance is { } value ? SetValueText.Of(value.Value, profile) : "";

    private string Say(Number? opening) => opening is { } value ? Say(value.Value, Quantity.Opening) : "";

    private string Say(double value, Quantity quantity) => NumberText.WithUnit(value, quantity, profile);
}
