using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.HandChecks;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine;

/// <summary>Sets the elementary check beside every solved expansion length.</summary>
internal sealed class HandCheckedLengths
{
    /// <summary>Half-width of the band as a share of the segment's length: the deck's own elasticity, which the hand check leaves out.</summary>
    private const double Band = 0.02;

    private readonly ImmutableDictionary<string, DeckByHand> bySegment;
    private readonly List<HandCheck> checks = [];

    public HandCheckedLengths(Plan plan, DeckModel deck, Derivation derivation) => bySegment = plan.Segments.ToImmutableDictionary(
        s => s.Id, s => new DeckByHand(plan, s, deck.StiffnessOf, b => deck.StiffnessOf(b.Id)!.Value, derivation));

    /// <summary>All checks made so far.</summary>
    public ImmutableArray<HandCheck> All => [.. checks];

    /// <summary>The lengths, after each got its check.</summary>
    public ImmutableArray<(Segment Segment, Number Length)> Checked(Joint joint, ImmutableArray<(Segment Segment, Number Length)> lengths)
    {
        foreach (var (segment, length) in lengths)
        {
            var byHand = bySegment[segment.Id];
            checks.Add(new HandCheck(
                $"expansion length of joint {joint.Id} for segment {segment.Id}", $"joints/{joint.Id}", length, byHand.LengthAt(joint),
                Band * segment.Length,
                byHand.ZeroPoint is null ? byHand.WhyNone : "by hand the deck is rigid along its axis and no other segment pulls at its supports"));
        }
        return lengths;
    }
}
