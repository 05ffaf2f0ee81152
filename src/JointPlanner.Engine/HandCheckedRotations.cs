using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.HandChecks;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine;

/// <summary>Sets θ·h by hand beside what end rotation does to a joint, where the deck is one simply supported span with its fixed bearing there on an unyielding abutment.</summary>
internal sealed class HandCheckedRotations(Plan plan, DeckModel deck, FrameCauses causes, Derivation derivation)
{
    /// <summary>Half-width of the band as a share of the value: both are the same theory, so no more than rounding and layers that also lengthen the deck.</summary>
    private const double Band = 0.01;

    /// <summary>Least half-width, m: a tenth of what is printed.</summary>
    private const double Least = 1e-5;

    public IEnumerable<HandCheck> Of(Joint joint, ImmutableArray<OtherPart> parts)
    {
        if (Simple(joint) is not { } span)
        {
            foreach (var part in parts.Where(p => p.Cause is Cause.TemperatureDifference or Cause.DeadLoad or Cause.LiveLoad))
                yield return Check(joint, part, null, "the deck is not one simply supported span with its fixed bearing at this joint: no elementary formula");
            yield break;
        }
        var height = SectionLevels.Height(span.Section, derivation);
        var (start, end) = (GivenValues.Station(plan, span.Lines[0], derivation), GivenValues.Station(plan, span.Lines[1], derivation));
        foreach (var part in parts)
        {
            if (part.Cause == Cause.TemperatureDifference && causes.Gradients.FirstOrDefault(g => g.Segment == span.Segment) is { Segment: not null } gradient)
                // Cooler above sags the deck and opens the joint.
                yield return Check(joint, part, OpeningBy(derivation.Use(EndRotationByHand.ByCurvature, "", gradient.Cool.Curvature, end, start)), Reason);
            if (part.Cause == Cause.DeadLoad && span.Segment.DeadLoad is { Value: > 0 } load && span.Lines[0].Station == span.Segment.Start && span.Lines[1].Station == span.Segment.End)
                yield return Check(joint, part, OpeningBy(derivation.Use(EndRotationByHand.ByLoad, "", derivation.Given($"segments/{span.Segment.Id}/dead-load/load", "g",
                    $"dead load still to come on segment {span.Segment.Id}", Quantity.LineLoad, load.Value, load.Source), end, start, span.Section.BendingStiffness)), Reason);
            if (part.Cause == Cause.LiveLoad)
                yield return Check(joint, part, null, "traffic stands where the influence line says: no single elementary formula");
        }

        Number OpeningBy(Number rotation) => derivation.Use(EndRotationByHand.Opening, "", rotation, height);
    }

    private const string Reason = "by hand the end turns about its bearing and opens the joint by θ·h";

    private static HandCheck Check(Joint joint, OtherPart part, Number? byHand, string reason) => new(
        $"opening of joint {joint.Id} by {Keys.Said(part.Cause)}", $"joints/{joint.Id}", part.OpensBy, byHand, Math.Max(Least, Band * part.OpensBy.Value), reason)
    {
        Quantity = Quantity.Movement,
    };

    private (Segment Segment, SectionProperties Section, BearingLine[] Lines)? Simple(Joint joint)
    {
        var decks = plan.Segments.Where(s => s.Id == joint.Near || s.Id == joint.Far).ToArray();
        if (decks is not [var segment] || deck.SectionOf(segment.Id) is not { } section) return null;
        BearingLine[] lines = [.. plan.Bearings.Where(b => b.Segment == segment.Id).OrderBy(b => b.Station)];
        if (lines.Length != 2 || plan.Bearings.Any(b => b.On == segment.Id) || lines.Any(l => l.Depth is not null || plan.Supports.All(s => s.Id != l.On))) return null;
        var here = joint.Far == segment.Id ? lines[0] : lines[1];
        var other = lines.First(l => l != here);
        return here.Kind == BearingKind.Fixed && other.Kind == BearingKind.Free && plan.Supports.First(s => s.Id == here.On).Stiffness is null ? (segment, section, lines) : null;
    }
}
