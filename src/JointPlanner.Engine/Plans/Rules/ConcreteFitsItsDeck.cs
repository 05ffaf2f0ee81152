namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A described concrete is that of a concrete deck, and nothing in its life comes after its end.</summary>
public sealed class ConcreteFitsItsDeck : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var segment in check.Plan.Segments)
        {
            if (segment.Concrete is not { } concrete) continue;
            var path = $"segments/{segment.Id}/concrete";
            if (segment.Kind != DeckKind.Concrete && check.Knows($"segments/{segment.Id}/kind"))
                yield return new("concrete.other-deck", path, $"Segment {segment.Id} is no concrete deck: its steel holds the slab back, so the slab's free strain is not the deck's.",
                    "Allowed: a description of the concrete for concrete decks.", "Give the deck's own creep and shrinkage strain instead.");
            if (!check.Knows($"{path}/end-of-life")) continue;
            foreach (var (at, age, what) in Ages(check.Plan, segment, concrete, path))
                if (age > concrete.EndOfLife && check.Knows(at))
                    yield return new("concrete.after-end-of-life", at, $"{what} comes at an age of {{{at}}}, after the end of life of segment {segment.Id}, {{{path}/end-of-life}}.",
                        $"Allowed: up to {{{path}/end-of-life}}.", "Correct one of the two ages.");
        }
    }

    private static IEnumerable<(string Path, double? Age, string What)> Ages(Plan plan, Segment segment, Concrete concrete, string path)
    {
        yield return ($"{path}/curing-end", concrete.CuringEnd, "The end of curing");
        for (var i = 0; i < concrete.Stages.Length; i++)
            yield return (FormattableString.Invariant($"{path}/stages/#{i + 1}/age"), concrete.Stages[i].Age, FormattableString.Invariant($"Stress {i + 1}"));
        foreach (var bearing in plan.Bearings.Where(b => b.Segment == segment.Id))
            yield return ($"bearings/{bearing.Id}/setting/deck-age", bearing.SettingAge, $"The setting of bearing line {bearing.Id}");
        foreach (var joint in plan.Joints)
        {
            if (joint.Near == segment.Id) yield return ($"joints/{joint.Id}/setting/near-deck-age", joint.NearAge, $"The setting of joint {joint.Id}");
            if (joint.Far == segment.Id) yield return ($"joints/{joint.Id}/setting/far-deck-age", joint.FarAge, $"The setting of joint {joint.Id}");
        }
        for (var i = 0; i < plan.SettingTable.Ages.Length; i++)
            yield return (FormattableString.Invariant($"setting-table/ages/#{i + 1}"), plan.SettingTable.Ages[i], "A row of the setting table");
    }
}
