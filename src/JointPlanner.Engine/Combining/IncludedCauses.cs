using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Combining;

/// <summary>Which causes a joint's result holds, and which are missing from it.</summary>
public static class IncludedCauses
{
    private static readonly Column[] GapColumns = [Column.GapService, Column.GapStrength, Column.SealRange];

    /// <summary>Causes that may move the joint, are neither computed nor given, and are not left out by rule.</summary>
    public static ImmutableArray<Cause> Missing(Plan plan, Joint joint, IReadOnlyCollection<Segment> moving, CountingTable counting)
    {
        var given = plan.GivenMovements.Where(m => m.Joint == joint.Id).Select(m => m.Cause).ToHashSet();
        return [.. Enum.GetValues<Cause>().Where(c =>
            !given.Contains(c) && MayAct(c, plan, moving) && !IsComputed(c, moving) && !ComputedCauses.ByFrame(plan, joint, c) && !IsLeftOut(c, counting))];
    }

    private static bool IsLeftOut(Cause cause, CountingTable counting) => GapColumns.All(c => counting[cause, c] is NotCounted);

    private static bool IsComputed(Cause cause, IReadOnlyCollection<Segment> moving) => cause switch
    {
        Cause.UniformTemperature => true,
        Cause.Creep => moving.Where(Creeps).All(s => RemainingStrains.Has(cause, s)),
        Cause.Prestress => moving.Where(Creeps).All(s => RemainingStrains.Has(cause, s)),
        Cause.Shrinkage => moving.Where(Shrinks).All(s => RemainingStrains.Has(cause, s)),
        _ => false,
    };

    private static bool MayAct(Cause cause, Plan plan, IReadOnlyCollection<Segment> moving) => cause switch
    {
        Cause.Creep => moving.Any(Creeps),
        Cause.Shrinkage => moving.Any(Shrinks),
        Cause.Prestress => moving.Any(Creeps),
        Cause.Friction => plan.Bearings.Any(b => b.Kind == BearingKind.Free),
        // A plan cannot describe clearance yet: every chain is tight.
        Cause.Clearance => false,
        _ => true,
    };

    private static bool Creeps(Segment segment) => segment.Kind == DeckKind.Concrete;

    private static bool Shrinks(Segment segment) => segment.Kind is DeckKind.Concrete or DeckKind.Composite;
}
