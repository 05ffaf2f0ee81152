using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Combining;

/// <summary>What one cause computed by the frame does to one bearing line, without factors: extremes of its travel up-station, m, and of the deck's rotation over it, rad; 0 where it acts one way only.</summary>
/// <param name="Bearing">Id of the line.</param>
/// <param name="Cause">The cause.</param>
/// <param name="TravelMost">Largest travel up-station, ≥ 0.</param>
/// <param name="TravelLeast">Largest travel down-station, ≤ 0.</param>
/// <param name="RotationMost">Largest rotation, the deck rising up-station, ≥ 0; null where the deck does not bend in the model.</param>
/// <param name="RotationLeast">Largest rotation the other way, ≤ 0; null likewise.</param>
public sealed record BearingMovement(
    string Bearing, Cause Cause, Number TravelMost, Number TravelLeast, Number? RotationMost, Number? RotationLeast);

/// <summary>Bearings under the causes that the frame computes.</summary>
internal static class BearingMovements
{
    public static ImmutableArray<BearingMovement> Of(Plan plan, DeckModel deck, FrameCauses causes, Derivation derivation)
    {
        var all = ImmutableArray.CreateBuilder<BearingMovement>();
        foreach (var bearing in plan.Bearings)
        {
            var node = deck.DeckAt(bearing.Segment, bearing.Station);
            var (travel, rotation) = (deck.Travel(bearing), node.Bends ? Response.Of(node, Direction.Turning) : null);
            foreach (var cause in Enum.GetValues<Cause>())
            {
                if (causes.States.TryGetValue(cause, out var states) && !states.IsEmpty) Add(cause, r => Extremes(r, cause, states), [.. states.SelectMany(s => s.Inputs)]);
                if (cause == Cause.LiveLoad && causes.Traffic is { } traffic) Add(cause, traffic.Extremes, []);
            }

            void Add(Cause cause, Func<Response, (double Most, double Least, double Residual)> extremesOf, Number[] inputs)
            {
                var (along, turns) = (extremesOf(travel), rotation is null ? default : extremesOf(rotation));
                var said = $"at bearing line {bearing.Id} by {Keys.Said(cause)}";
                all.Add(new BearingMovement(bearing.Id, cause,
                    Solved(Keys.Travel(bearing.Id, cause, "most"), "Δ_b", $"travel up-station {said}", Quantity.Movement, along.Most, along.Residual),
                    Solved(Keys.Travel(bearing.Id, cause, "least"), "Δ_b", $"travel down-station {said}", Quantity.Movement, along.Least, along.Residual),
                    rotation is null ? null : Solved(Keys.Rotation(bearing.Id, cause, "most"), "θ_b", $"rotation of the deck {said}, rising up-station", Quantity.Rotation, turns.Most, turns.Residual),
                    rotation is null ? null : Solved(Keys.Rotation(bearing.Id, cause, "least"), "θ_b", $"rotation of the deck {said}, falling up-station", Quantity.Rotation, turns.Least, turns.Residual)));

                Number Solved(string key, string symbol, string meaning, Quantity quantity, double value, double residual) =>
                    derivation.Solved(key, symbol, meaning, quantity, value, FrameWords.Name, residual, [.. inputs, .. deck.Inputs]);
            }
        }
        return all.ToImmutable();
    }

    /// <summary>Worst of alternative states; of supports that move each by itself, those that act the same way together.</summary>
    private static (double Most, double Least, double Residual) Extremes(Response response, Cause cause, ImmutableArray<FrameState> states)
    {
        var values = states.Select(s => s.Solution.Of(response)).ToArray();
        var residual = states.Max(s => s.Solution.Residual);
        return cause == Cause.Substructure
            ? (values.Where(v => v > 0).Sum(), values.Where(v => v < 0).Sum(), residual)
            : (Math.Max(0, values.Max()), Math.Min(0, values.Min()), residual);
    }
}
