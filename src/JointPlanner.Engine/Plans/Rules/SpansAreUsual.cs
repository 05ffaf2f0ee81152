using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A girder deck rarely spans more than 500 m; beyond that a station is probably mistyped, or the deck needs cables.</summary>
public sealed class SpansAreUsual : PlanRule
{
    /// <summary>Longest usual span of a girder deck, m.</summary>
    public const double LongestUsual = 500;

    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        var supports = check.Plan.Supports;
        for (var i = 1; i < supports.Length; i++)
        {
            var span = supports[i].Station - supports[i - 1].Station;
            if (!(span > LongestUsual) || !check.Knows($"supports/{supports[i].Id}/station", $"supports/{supports[i - 1].Id}/station")) continue;
            yield return new("spans.unusual", $"supports/{supports[i].Id}/station",
                $"Between supports {supports[i - 1].Id} and {supports[i].Id} the deck spans {{0}}.", "Usual for a girder deck: up to {1}.",
                "Check the stations and their unit; leave them where they are meant.")
            {
                IsWarning = true,
                Numbers = [(Quantity.Length, span), (Quantity.Length, LongestUsual)],
            };
        }
    }
}
