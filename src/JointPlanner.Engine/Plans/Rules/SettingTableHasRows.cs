using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>The setting table has rows, and not more than can be read.</summary>
public sealed class SettingTableHasRows : PlanRule
{
    /// <summary>Most rows at one deck age.</summary>
    public const int MostRows = 200;

    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        var table = check.Plan.SettingTable;
        const string from = "setting-table/from", to = "setting-table/to", step = "setting-table/step";
        if (table.From >= table.To)
            yield return new("setting-table.no-rows", to, $"The setting table would run from {{{from}}} up to {{{to}}}.", $"Allowed: more than {{{from}}}.",
                "Correct one of the two temperatures.");
        else if ((table.To - table.From) / table.Step > MostRows)
            yield return new("setting-table.too-long", step, $"The setting table would have more than {{0}} rows.", "Allowed: up to {0} rows.",
                "Choose a larger step or a narrower range.")
            {
                Numbers = [(Quantity.Count, MostRows)],
            };
    }
}
