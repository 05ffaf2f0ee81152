using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>Braking and acceleration: the given force along every segment at road-surface level, each segment by itself, either way.</summary>
public static class Braking
{
    /// <summary>The frame with each segment braked either way; none where no force is given.</summary>
    public static ImmutableArray<FrameState> States(Plan plan, DeckModel deck, FrameSolver solver, Derivation derivation) =>
        [.. plan.Segments.Where(s => s.Braking is not null).SelectMany(segment => new[] { 1, -1 }.Select(way =>
        {
            var force = derivation.Given($"segments/{segment.Id}/braking/force", "F_br", $"braking force on segment {segment.Id}", Quantity.Force,
                segment.Braking!.Force, segment.Braking.Source);
            var load = new FrameLoad(deck.Model).Along(segment.Id, way * force.Value / segment.Length, deck.SectionOf(segment.Id)?.SurfaceHeight ?? 0);
            return new FrameState($"segment {segment.Id} braked {(way > 0 ? "up-station" : "down-station")}", solver.Solve(load), [force]);
        }))];
}
