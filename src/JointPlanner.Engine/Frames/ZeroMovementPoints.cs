using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Frames;

/// <summary>Where each segment stands still while the whole deck warms.</summary>
public static class ZeroMovementPoints
{
    /// <summary>Station of the point of a segment that does not move; null where every point of it moves.</summary>
    /// <param name="segment">The segment.</param>
    /// <param name="lengths">The solved model.</param>
    /// <param name="expansionOf">Coefficient of expansion of each segment, 1/K.</param>
    /// <param name="derivation">Where the step goes.</param>
    public static Number? Of(Segment segment, ExpansionLengths lengths, Func<string, double> expansionOf, Derivation derivation)
    {
        var warmed = lengths.Solver.Strained(expansionOf);
        // What moves less than this is held: the rest is rounding of the solver.
        var held = 1e-9 * warmed.Displacements.Select(Math.Abs).DefaultIfEmpty(0).Max();
        foreach (var member in lengths.Deck.Model.Members.Where(m => m.Body == segment.Id))
        {
            var (from, to) = (Along(member.From), Along(member.To));
            if (from * to > 0 || from == to) continue;
            var station = member.From.Station + (member.Length * from / (from - to));
            return derivation.Solved(Keys.ZeroMovementPoint(segment.Id), "x_0", $"zero-movement point of segment {segment.Id} while the deck warms",
                Quantity.Length, station, FrameWords.Name, warmed.Residual, [.. lengths.Deck.Inputs]);
        }
        return null;

        double Along(Node node) => Math.Abs(warmed.Of(node)) <= held ? 0 : warmed.Of(node);
    }
}
