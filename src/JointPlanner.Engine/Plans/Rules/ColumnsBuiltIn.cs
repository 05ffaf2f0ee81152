namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A column built into a deck needs the deck's section and its own dimensions: both bend together.</summary>
public sealed class ColumnsBuiltIn : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var bearing in check.Plan.Bearings.Where(b => b.Kind == BearingKind.Monolithic))
        {
            var (path, on) = ($"bearings/{bearing.Id}/kind", $"bearings/{bearing.Id}/on");
            if (!check.Knows(path, on, $"bearings/{bearing.Id}/segment")) continue;
            if (check.SegmentOf(bearing.Segment) is { Section: null } deck && check.Knows($"segments/{deck.Id}/section"))
                yield return new("bearings.monolithic-without-section", path, $"Line {bearing.Id} builds a column into segment {deck.Id}, whose section is not described.",
                    "Allowed: with a segment whose section is described.", "Describe the section of the segment, or choose another kind.");
            if (check.SegmentOf(bearing.On) is not null)
                yield return new("bearings.monolithic-on-segment", path, $"Line {bearing.Id} would build segment {bearing.Segment} into segment {bearing.On}.",
                    "Allowed: on a support.", "Describe both as one segment, or choose another kind.");
            if (check.SupportOf(bearing.On) is { Stiffness: GivenStiffness } support && check.Knows($"supports/{support.Id}/stiffness"))
                yield return new("bearings.monolithic-without-column", path,
                    $"Line {bearing.Id} builds support {support.Id} into the deck, but only its stiffness along the deck is given: it turns as well.",
                    "Allowed: with a column, or an unyielding support.", $"Give the column of support {support.Id} instead of its stiffness.");
        }
    }
}
