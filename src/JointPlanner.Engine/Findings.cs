using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.HandChecks;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine;

/// <summary>The sentences that a whole calculation gives rise to, in one place.</summary>
internal static class Findings
{
    public static void Note(
        Plan plan, CodeBasis basis, ImmutableDictionary<string, SegmentTemperature> temperatures, ImmutableArray<HandCheck> checks,
        ImmutableArray<SegmentResult> segments, ImmutableArray<RestraintForce> restraints, Derivation derivation)
    {
        foreach (var bearing in plan.Bearings.Where(b => b.Kind == BearingKind.Free))
            derivation.Note(new("friction-not-counted", Severity.Warning, $"bearings/{bearing.Id}",
                $"Bearing line {bearing.Id} slides; its friction is not counted in the movements."));
        foreach (var segment in segments.Where(s => s.ZeroMovementPoint is null))
            derivation.Note(new("no-zero-movement-point", Severity.Note, $"segments/{segment.Segment.Id}",
                $"No point of segment {segment.Segment.Id} stands still while the deck warms: it is carried along by what holds it."));
        foreach (var check in checks.Where(c => !c.Agrees))
            derivation.Note(new("hand-check-outside-band", Severity.Warning, check.Path,
                $"The {check.What} is {{0}} as solved and {{1}} by hand, further apart than {{2}}: {check.Reason}.",
                [(check.Quantity, check.Solved.Value), (check.Quantity, check.ByHand!.Value.Value), (check.Quantity, check.Band)]));
        foreach (var segment in plan.Segments.Where(s => RigidLines(plan, s) > 1))
            derivation.Note(new("restrained-by-several-lines", Severity.Warning, $"segments/{segment.Id}",
                $"More than one unyielding line holds segment {segment.Id}; the restraint force reaches {{0}}.",
                [(Quantity.Force, LargestForce(plan, segment, restraints))]));
        foreach (var bearing in plan.Bearings.Where(b => b.SettingTemperature is null))
            derivation.Note(new("bearing-set-with-joint", Severity.Note, $"bearings/{bearing.Id}/setting",
                $"Assumed: bearing line {bearing.Id} is tied at zero shear at the setting temperature of the nearest joint."));
        foreach (var joint in plan.Joints)
            foreach (var segment in plan.Segments.Where(s => s.Id == joint.Near || s.Id == joint.Far))
                if (temperatures[segment.Id] is var t && (joint.SettingTemperature < t.Min.Value || joint.SettingTemperature > t.Max.Value))
                    derivation.Note(new("setting-outside-range", Severity.Warning, $"joints/{joint.Id}/setting/temperature",
                        $"Joint {joint.Id} is expected to be set at {{0}}, outside the effective temperatures {{1}} to {{2}} of segment {segment.Id}.",
                        [(Quantity.Temperature, joint.SettingTemperature), (Quantity.Temperature, t.Min.Value), (Quantity.Temperature, t.Max.Value)]));
        if (plan.Segments.All(s => s.Section is null))
            derivation.Note(new("model-axial", Severity.Note, "",
                "The model is axial: supports do not tilt, backwalls move as their bearing level, level effects of rotation are not in it."));
        else
            foreach (var segment in plan.Segments.Where(s => s.Section is null))
                derivation.Note(new("segment-axial", Severity.Note, $"segments/{segment.Id}",
                    $"The section of segment {segment.Id} is not described: it changes its length in the model, but does not bend."));
        derivation.Note(new("basis-examples", Severity.Note, "basis/code", $"{basis.Title}: {basis.PublishedExamples}."));
    }

    public static Finding NotHeld(MechanismException free) => free.Direction switch
    {
        Direction.Along => new("not-held", Severity.Error, "bearings",
            "The deck can move along its axis at station {0} without resistance: nothing but sliding bearings holds it there. Fix one line or give it pads.",
            [(Quantity.Length, free.Node.Station)]),
        Direction.Vertical => new("not-carried", Severity.Error, "bearings",
            $"Segment {free.Node.Body} can move up and down at station {{0}} without resistance. Give it a bearing line at each of its supports.",
            [(Quantity.Length, free.Node.Station)]),
        _ => new("not-carried", Severity.Error, "bearings",
            $"Segment {free.Node.Body} can turn at station {{0}} without resistance. Give it a second bearing line, or build a column into it.",
            [(Quantity.Length, free.Node.Station)]),
    };

    private static int RigidLines(Plan plan, Segment segment) => plan.Bearings.Count(b =>
        b.Segment == segment.Id && b.Kind is BearingKind.Fixed or BearingKind.Monolithic && plan.Supports.Any(s => s.Id == b.On && s.Stiffness is null));

    private static double LargestForce(Plan plan, Segment segment, ImmutableArray<RestraintForce> restraints) => restraints
        .Where(r => plan.Bearings.Any(b => b.Id == r.Bearing && b.Segment == segment.Id))
        .Select(r => Math.Max(Math.Abs(r.Hot.Value), Math.Abs(r.Cold.Value))).DefaultIfEmpty(0).Max();
}
