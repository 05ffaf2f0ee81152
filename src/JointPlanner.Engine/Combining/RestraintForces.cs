using System.Collections.Immutable;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Combining;

/// <summary>Forces by which bearing lines hold back a deck that wants to change its length: what the members bring to the line's node.</summary>
internal static class RestraintForces
{
    /// <summary>A force below this share of EA times one ten-thousandth of strain is rounding of the solver.</summary>
    private const double Negligible = 1e-9;

    public static ImmutableArray<RestraintForce> Of(
        Plan plan, ExpansionLengths lengths, Func<string, SegmentTemperature> temperatureOf, RemainingStrains strains, Derivation derivation)
    {
        var forces = new List<RestraintForce>();
        foreach (var bearing in plan.Bearings.Where(b => b.Kind != BearingKind.Free))
        {
            var set = SettingTemperatures.Of(bearing, plan);
            var hot = ForceOn(bearing, id => temperatureOf(id).Expansion.Value * (temperatureOf(id).Max.Value - set));
            var cold = ForceOn(bearing, id =>
                (temperatureOf(id).Expansion.Value * (temperatureOf(id).Min.Value - set)) - strains.Total(plan.SegmentOf(id), bearing.SettingAge ?? 0));
            var scale = lengths.Deck.AxialStiffnessOf(plan.SegmentOf(bearing.Segment)) * 1e-4;
            if (Math.Max(Math.Abs(hot.Force), Math.Abs(cold.Force)) < Negligible * scale) continue;
            forces.Add(new RestraintForce(bearing.Id,
                Solved(bearing, "hot", "warmed to the highest temperature", hot), Solved(bearing, "cold", "cooled to the lowest temperature, all shortening over", cold)));
        }
        return [.. forces];

        (double Force, double Residual) ForceOn(BearingLine bearing, Func<string, double> strainOf)
        {
            var solution = lengths.Solver.Strained(strainOf);
            var node = lengths.Deck.DeckAt(bearing.Segment, bearing.Station);
            var members = lengths.Deck.Model.Members.Where(m => m.Body == bearing.Segment).ToArray();
            var below = members.Where(m => m.To == node).Sum(m => solution.ForceIn(m, strainOf(m.Body)));
            var ahead = members.Where(m => m.From == node).Sum(m => solution.ForceIn(m, strainOf(m.Body)));
            return (below - ahead, solution.Residual);
        }

        Number Solved(BearingLine bearing, string end, string state, (double Force, double Residual) found) => derivation.Solved(
            Keys.RestraintForce(bearing.Id, end), "F", $"force of bearing line {bearing.Id} on the deck, up-station, {state}", Quantity.Force,
            found.Force, FrameWords.Name, found.Residual, [.. lengths.Deck.Inputs]);
    }
}
