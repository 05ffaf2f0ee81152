using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>The development of creep and shrinkage rises: ages strictly, shares at least not falling.</summary>
public sealed class DevelopmentRises : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var segment in check.Plan.Segments)
            foreach (var (word, shortening) in new[] { ("creep", segment.Creep), ("shrinkage", segment.Shrinkage) })
                for (var i = 1; i < (shortening?.Development.Length ?? 0); i++)
                {
                    var (before, point) = (shortening!.Development[i - 1], shortening.Development[i]);
                    var path = FormattableString.Invariant($"segments/{segment.Id}/{word}/development/#{i + 1}");
                    var behind = FormattableString.Invariant($"segments/{segment.Id}/{word}/development/#{i}");
                    if (point.Age <= before.Age)
                        yield return new("development.ages", $"{path}/age", $"The {word} of segment {segment.Id} is given at {{{path}/age}} after {{{behind}/age}}.",
                            $"Allowed: more than {{{behind}/age}}.", "Put the points in order of age, each age once.");
                    if (point.Share < before.Share)
                        yield return new("development.falls", $"{path}/share", $"The share of {word} of segment {segment.Id} that is over falls from {{0}} to {{1}}.",
                            "Allowed: {0} or more.", "Correct the share; what is over does not come back.")
                        {
                            Numbers = [(Quantity.Ratio, before.Share), (Quantity.Ratio, point.Share)],
                        };
                }
    }
}
