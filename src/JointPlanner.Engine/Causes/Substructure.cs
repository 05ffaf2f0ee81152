using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>Movement of supports still to come: settlement, movement along the deck, tilt. Each support moves by itself.</summary>
public static class Substructure
{
    /// <summary>The frame with each support moved alone; none where no support moves.</summary>
    public static ImmutableArray<FrameState> States(Plan plan, DeckModel deck, FrameSolver solver, Derivation derivation) =>
    [
        .. plan.Supports.Where(s => s.Movement is not null).Select(support =>
        {
            var (m, path) = (support.Movement!, $"supports/{support.Id}/movement");
            var load = new FrameLoad(deck.Model)
                .Moved(GroundOf.Settlement(plan, support), m.Settlement).Moved(GroundOf.Along(plan, support), m.Along).Moved(GroundOf.Tilt(plan, support), m.Tilt);
            return new FrameState($"support {support.Id} moved", solver.Solve(load),
            [
                Given("settlement", "s", "settlement", Quantity.Movement, m.Settlement),
                Given("along", "u_g", "movement along the deck at bearing level", Quantity.Movement, m.Along),
                Given("tilt", "φ", "tilt, leaning up-station positive", Quantity.Rotation, m.Tilt),
            ]);

            Number Given(string word, string symbol, string meaning, Quantity quantity, double value) =>
                GivenValues.Of(plan, derivation, $"{path}/{word}", symbol, $"{meaning} of support {support.Id}", quantity, value, m.Source);
        }),
    ];
}
