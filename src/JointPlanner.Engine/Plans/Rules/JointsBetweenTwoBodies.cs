using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Plans.Rules;

/// <summary>A joint lies between two bodies whose faces meet: deck ends, an abutment's backwall, a tower's leg.</summary>
public sealed class JointsBetweenTwoBodies : PlanRule
{
    /// <summary>How far the two faces may be apart in the stations of the plan (an overhang past the support line), m.</summary>
    public const double Reach = 5;

    /// <inheritdoc/>
    public override IEnumerable<Breach> Breaches(PlanUnderCheck check)
    {
        foreach (var joint in check.Plan.Joints)
        {
            var (near, far) = ($"joints/{joint.Id}/near", $"joints/{joint.Id}/far");
            if (!check.Knows(near, far)) continue;
            if (joint.Near == joint.Far)
            {
                yield return new("joints.one-body", far, $"Joint {joint.Id} has {joint.Near} on both sides.", "Allowed: two different bodies.",
                    "Name the body ahead.");
                continue;
            }
            var piers = new[] { (Path: near, Id: joint.Near), (Path: far, Id: joint.Far) }
                .Where(b => check.SupportOf(b.Id) is { Kind: SupportKind.Pier } && check.Knows($"supports/{b.Id}/kind")).ToArray();
            foreach (var pier in piers)
                yield return new("joints.pier", pier.Path, $"Joint {joint.Id} names pier {pier.Id}, which carries the deck from below and has no face at the joint.",
                    "Allowed: a deck segment, an abutment, a tower.", "Name the deck segment that ends there.");
            if (piers.Length > 0) continue;
            if (check.SegmentOf(joint.Near) is null && check.SegmentOf(joint.Far) is null)
            {
                yield return new("joints.no-deck", far, $"Joint {joint.Id} lies between two supports.", "Allowed: a deck segment on one side at least.",
                    "Name the deck segment that ends there.");
                continue;
            }
            foreach (var breach in Faces(check, joint, near, far)) yield return breach;
        }
    }

    private static IEnumerable<Breach> Faces(PlanUnderCheck check, Joint joint, string near, string far)
    {
        if (!check.KnowsStationsOf(joint.Near) || !check.KnowsStationsOf(joint.Far)) yield break;
        var gap = Start(check, joint.Far) - End(check, joint.Near);
        if (!(Math.Abs(gap) > Reach)) yield break;
        if (Math.Abs(Start(check, joint.Near) - End(check, joint.Far)) <= Reach)
            yield return new("joints.turned-round", near, $"Joint {joint.Id}: {joint.Near} lies ahead of {joint.Far}; near and far are turned round.",
                "Allowed: near is the body whose face is at the smaller station.", $"Make {joint.Far} the near body and {joint.Near} the far one.");
        else
            yield return new("joints.apart", far, $"Joint {joint.Id}: the end of {joint.Near} and the start of {joint.Far} are {{0}} apart.",
                "Allowed: up to {1}.", "Name the two bodies that meet at this joint, or correct their stations.")
            {
                Numbers = [(Quantity.Length, Math.Abs(gap)), (Quantity.Length, Reach)],
            };
    }

    private static double Start(PlanUnderCheck check, string body) => check.SegmentOf(body)?.Start ?? check.SupportOf(body)?.Station ?? double.NaN;

    private static double End(PlanUnderCheck check, string body) => check.SegmentOf(body)?.End ?? check.SupportOf(body)?.Station ?? double.NaN;
}
