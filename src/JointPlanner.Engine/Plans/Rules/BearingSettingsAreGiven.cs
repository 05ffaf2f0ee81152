namespace JointPlanner.Engine.Plans.Rules;

/// <summary>
/// A bearing that travels, or that shares a restraint, says when its parts were tied at zero shear. Decks of concrete and decks that
/// shorten must say it; of others the joints' setting state is taken and stated.
/// </summary>
public sealed class BearingSettingsAreGiven : PlanRule
{
    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var bearing in check.Plan.Bearings)
        {
            var path = $"bearings/{bearing.Id}";
            if (!check.Knows($"{path}/kind", $"{path}/segment") || check.SegmentOf(bearing.Segment) is not { } deck) continue;
            if (!check.Knows($"segments/{deck.Id}/kind") || !NeedsSetting(check.Plan, deck, bearing)) continue;
            if (bearing.SettingTemperature is null && check.Knows($"{path}/setting/temperature"))
                yield return new("bearings.no-setting", $"{path}/setting/temperature",
                    $"Bearing line {bearing.Id} carries segment {deck.Id}, {(deck.Kind == DeckKind.Concrete ? "a concrete deck" : "a deck that shortens")}, but nothing says at which temperature its parts were tied at zero shear.",
                    "Allowed: a structure temperature.", "Give it; where it is set together with the joint, repeat the joint's temperature.");
            if (bearing.SettingAge is null && DeckAgesAreGiven.Develops(deck) && check.Knows($"{path}/setting/deck-age"))
                yield return new("bearings.no-deck-age", $"{path}/setting/deck-age",
                    $"Segment {deck.Id} shortens over time, but its age when bearing line {bearing.Id} was tied at zero shear is not given.",
                    "Allowed: an age from the deck's concreting on.", "Give the age, for instance 60 d.");
        }
    }

    private static bool NeedsSetting(Plan plan, Segment deck, BearingLine bearing)
    {
        if (deck is { Kind: not DeckKind.Concrete, Creep: null, Shrinkage: null }) return false;
        // A single fixed line neither travels nor shares its restraint.
        if (bearing.Kind == BearingKind.Monolithic) return false;
        return bearing.Kind != BearingKind.Fixed || plan.Bearings.Count(b => b.Segment == deck.Id && b.Kind == BearingKind.Fixed) > 1;
    }
}
