using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>Dead load still to come after the joint is set: surfacing, barriers.</summary>
public static class DeadLoad
{
    /// <summary>The frame under all of it; none where none is described.</summary>
    public static ImmutableArray<FrameState> States(Plan plan, DeckModel deck, FrameSolver solver, Derivation derivation)
    {
        var loaded = plan.Segments.Where(s => s is { DeadLoad: not null, Section: not null }).ToArray();
        if (loaded.Length == 0) return [];
        var load = new FrameLoad(deck.Model);
        foreach (var segment in loaded) load.Uniform(segment.Id, segment.DeadLoad!.Value, segment.Start, segment.End);
        return [new FrameState("all of it placed", solver.Solve(load), [.. loaded.Select(s => derivation.Given($"segments/{s.Id}/dead-load/load", "g",
            $"dead load still to come on segment {s.Id}", Quantity.LineLoad, s.DeadLoad!.Value, s.DeadLoad.Source))])];
    }
}
