namespace JointPlanner.Engine.Plans.Rules;

/// <summary>Traffic says how much of it one frame carries, and trains have their spacings.</summary>
public sealed class TrafficIsWhole : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        if (check.Plan.LiveLoad is not { } traffic || !check.Knows("live-load/stands-for")) yield break;
        if (traffic is { StandsFor: FrameShare.GirderLine, Distribution: null } && check.Knows("live-load/distribution"))
            yield return new("live-load.no-distribution", "live-load/distribution", "The frame stands for one girder line, but nothing says how many lanes it takes.",
                "Allowed: a distribution factor; there is no default.", "Give the factor with its source, or let the frame stand for the whole width.");
        if (traffic is { StandsFor: FrameShare.GirderLine, Distribution: not null, DistributionSource: "" } && check.Knows("live-load/distribution-source"))
            yield return new("live-load.no-distribution-source", "live-load/distribution-source", "The distribution factor has no source.", "Allowed: a sentence.",
                "Say where the factor comes from.");
        if (traffic is { StandsFor: FrameShare.WholeWidth, Lanes: null, Own: not null } && check.Knows("live-load/lanes"))
            yield return new("live-load.no-lanes", "live-load/lanes", "Own loads act in every lane, but the number of lanes is not given.", "Allowed: 1 to 20.", "Give the number of lanes.");
        foreach (var train in traffic.Own?.Trains ?? [])
            for (var i = 1; i < train.Axles.Length; i++)
            {
                var path = FormattableString.Invariant($"live-load/own/trains/{train.Id}/axles/#{i + 1}/spacing");
                if (!check.Knows(path, $"{path}-most")) continue;
                if (train.Axles[i].Spacing <= 0)
                    yield return new("live-load.no-spacing", path, FormattableString.Invariant($"Axle {i + 1} of train {train.Id} has no distance behind the axle before it."),
                        "Allowed: more than nothing.", "Give its spacing.");
                else if (train.Axles[i].SpacingMost < train.Axles[i].Spacing)
                    yield return new("live-load.spacings", $"{path}-most", FormattableString.Invariant($"The largest spacing of axle {i + 1} of train {train.Id}, {{{path}-most}}, is below its spacing, {{{path}}}."),
                        $"Allowed: {{{path}}} or more.", "Correct one of the two.");
            }
    }
}
