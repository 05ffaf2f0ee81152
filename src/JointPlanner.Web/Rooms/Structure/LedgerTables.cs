using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Printing;
using JointPlanner.Exchange.Tables;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>The ledger's tables for other programs: what the screen shows, row by row.</summary>
internal static class LedgerTables
{
    /// <summary>What each cause does at each joint, without factors, along the deck.</summary>
    internal static ExportTable Movements(Workbench bench, DisplayProfile profile)
    {
        var table = new ExportTable(profile).Text("joint").Text("cause").Numbers("opens by", Quantity.Movement).Numbers("closes by", Quantity.Movement);
        foreach (var joint in bench.Result?.Joints ?? [])
            foreach (var movement in joint.Movements)
                table.Row(Called(joint), Words.Of(movement.Cause), movement.OpensBy, movement.ClosesBy);
        return table;
    }

    /// <summary>The families tried at a joint, with the reason of each rejection.</summary>
    internal static ExportTable Families(JointFit fit, DisplayProfile profile)
    {
        var table = new ExportTable(profile).Text("family").Text("size").Text("taken").Text("governing rule").Text("why");
        foreach (var family in fit.Families)
            table.Row(family.Family, family.Best?.Size ?? "none", fit.Chosen?.Family == family.Family ? "yes" : "no", (family.Best ?? family.Sizes.LastOrDefault())?.Governing?.Name ?? "",
                family.Rejection is { } left ? FindingText.Of(left, profile) : "fits");
        return table;
    }

    /// <summary>Every rule of one size.</summary>
    internal static ExportTable Rules(SizeFit size, DisplayProfile profile)
    {
        var table = new ExportTable(profile).Text("rule").Text("asked").Text("bound").Text("limit").Text("room left").Text("source");
        foreach (var rule in size.Rules)
            table.Row(rule.Name, Shown(rule.Value.Value, rule), rule.Bound == Bound.Lower ? "at least" : "at most", Shown(rule.Limit.Value, rule),
                rule.Holds ? Shown(rule.Room, rule) : "does not hold", ProvenanceText.Of(rule.Source));
        return table;

        string Shown(double value, RuleCheck rule) => NumberText.WithUnit(value, rule.Quantity, profile);
    }

    /// <summary>The setting table of a joint; a row without a value says why.</summary>
    internal static ExportTable Setting(SettingTable setting, DisplayProfile profile)
    {
        var table = new ExportTable(profile).Numbers("structure temperature", Quantity.Temperature).Numbers("deck age", Quantity.Age).Numbers("set to, normal to the joint", Quantity.Opening)
            .Numbers("tighter by at most", Quantity.Movement).Numbers("wider by at most", Quantity.Movement).Numbers("least opening", Quantity.Opening)
            .Numbers("greatest opening", Quantity.Opening).Numbers("set to, along the road", Quantity.Opening).Text("do not set because");
        foreach (var row in setting.Rows)
            table.Row(row.Temperature, row.DeckAge, row.Set, row.Minus, row.Plus, row.Window?.Least, row.Window?.Greatest, row.Along?.Set, row.Refusal is { } why ? FindingText.Of(why, profile) : null);
        return table;
    }

    /// <summary>The defaults that stand in.</summary>
    internal static ExportTable Defaults(Workbench bench, DisplayProfile profile)
    {
        var table = new ExportTable(profile).Text("field").Text("value").Text("why");
        foreach (var standsIn in bench.Outcome.Reading.Defaults) table.Row(FieldPlace.Of(bench.Document, standsIn.Path), standsIn.Text, standsIn.Reason);
        return table;
    }

    private static string Called(JointResult joint) => joint.Joint.Mark.Length > 0 ? joint.Joint.Mark : joint.Joint.Id;
}
