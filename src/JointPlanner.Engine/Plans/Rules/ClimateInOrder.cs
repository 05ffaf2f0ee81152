namespace JointPlanner.Engine.Plans.Rules;

/// <summary>The highest temperature lies above the lowest, and none of a pair is given alone.</summary>
public sealed class ClimateInOrder : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        var climate = check.Plan.Climate;
        foreach (var (kind, words, min, max) in new[]
        {
            ("shade", "shade air", climate.ShadeMin, climate.ShadeMax), ("effective", "effective", climate.EffectiveMin, climate.EffectiveMax),
        })
        {
            var (low, high) = ($"climate/{kind}-min", $"climate/{kind}-max");
            if (!check.Knows(low, high)) continue;
            if (max <= min)
                yield return new("climate.out-of-order", high, $"The highest {words} temperature, {{{high}}}, is not above the lowest, {{{low}}}.",
                    $"Allowed: more than {{{low}}}.", "Correct one of the two, or change them round.");
            if (min is null != max is null)
                yield return new("climate.half-a-pair", min is null ? low : high, $"Only the {(min is null ? "highest" : "lowest")} {words} temperature is given.",
                    "Allowed: both or none.", $"Give the {(min is null ? "lowest" : "highest")} one too.");
        }
    }
}
