using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Issuing.Setting;

/// <summary>Carries an opening as set to both ends of the temperatures, by the movements that were issued, and sets it against the issued limits.</summary>
/// <param name="joint">The joint as issued.</param>
/// <param name="table">Its table for the method by which the temperature was measured.</param>
internal sealed class CarriedOpening(StoredJoint joint, StoredTable table)
{
    /// <summary>The narrow and the wide end.</summary>
    /// <param name="opening">Opening normal to the joint, m.</param>
    /// <param name="temperature">Temperature of the structure, °C.</param>
    /// <param name="deckAge">Deck age, s; null where it plays no part.</param>
    public (EndCheck Narrow, EndCheck Wide) From(double opening, double temperature, double? deckAge) => OutOfTable(temperature, deckAge) is { } outside
        ? (new(false, double.NaN, outside), new(false, double.NaN, outside))
        : (Worst("lower", opening, temperature, deckAge), Worst("upper", opening, temperature, deckAge));

    private Finding? OutOfTable(double temperature, double? deckAge)
    {
        var path = $"joints/{joint.Joint}";
        if (temperature < table.Min - 1e-9 || temperature > table.Max + 1e-9)
            return new("set-outside-temperatures", Severity.Warning, path, "It was set at {0}; values were given from {1} to {2} only, so this opening cannot be judged.",
                [(Quantity.Temperature, temperature), (Quantity.Temperature, table.Min), (Quantity.Temperature, table.Max)]);
        var ages = TableLookUp.Ages(table);
        var least = ages.Count == 0 ? 0 : Math.Max(table.LeastAge ?? 0, ages[0]);
        return ages.Count == 0 || deckAge >= least - 1e-9
            ? null
            : new("set-too-young", Severity.Warning, path, "It was set at a deck age of {0}; values were given from {1} on, so this opening cannot be judged.",
                [(Quantity.Age, deckAge ?? 0), (Quantity.Age, least)]);
    }

    private EndCheck Worst(string bound, double opening, double temperature, double? deckAge) => joint.Limits
        .Where(l => l.Bound == bound).Select(l => Against(l, opening, temperature, deckAge)).MinBy(c => c.Room)
        ?? throw new InvalidDataException($"The issued results of joint {joint.Joint} hold no {bound} limit.");

    private EndCheck Against(StoredLimit limit, double opening, double temperature, double? deckAge)
    {
        var normal = limit.Measure == "along" ? limit.Value * Math.Cos(joint.Skew) : limit.Value;
        var reserve = table.Rows.Select(r => r.Reserve).OfType<double>().DefaultIfEmpty(0).Max();
        var (carried, end) = limit.JudgedBy is { } column ? Carried(column, limit.Bound == "lower", opening, temperature, deckAge) : (opening, (double?)null);
        var room = (limit.Bound == "lower" ? carried - normal : normal - carried) - reserve;
        var holds = room >= -1e-9;
        var verdict = holds ? "{3} of room is left" : limit.Bound == "lower" ? "too narrow by {3}" : "too wide by {3}";
        var where = limit.JudgedBy is { } judged ? $"Carried to {{4}} with all that counts for {Words.Of(MemberWords.Of<Column>(judged))}" : "On the day";
        return new(holds, room, new(
            holds ? "set-holds" : "set-fails", holds ? Severity.Note : Severity.Warning, $"joints/{joint.Joint}",
            $"{where} the opening is {{0}}; the limit “{limit.Name}” is {{1}}, the reserve {{2}}: {verdict}.",
            [
                (Quantity.Opening, carried), (Quantity.Opening, normal), (Quantity.Movement, reserve), (Quantity.Movement, Math.Abs(room)),
                .. end is { } t ? [(Quantity.Temperature, t)] : Array.Empty<(Quantity, double)>(),
            ]));
    }

    /// <summary>The opening at the narrow or wide end, and the temperature there.</summary>
    private (double Opening, double? End) Carried(string column, bool isNarrow, double opening, double temperature, double? deckAge)
    {
        var ages = joint.ToCome.Where(m => m.JudgedBy == column).Select(m => m.DeckAge).OfType<double>().Distinct().Order().ToArray();
        var age = TableLookUp.Reached(ages, deckAge);
        var movement = joint.ToCome.FirstOrDefault(m => m.JudgedBy == column && Nullable.Equals(m.DeckAge, age))
            ?? throw new InvalidDataException($"The issued results of joint {joint.Joint} hold no movement for {column}.");
        var byTemperature = movement.Swings.Sum(s => Math.Abs(s.Rate) * Math.Max(0, s.Rate > 0 == isNarrow ? s.Max - temperature : temperature - s.Min));
        double? end = movement.Swings.IsEmpty ? temperature : table.Rate >= 0 == isNarrow ? movement.Swings.Max(s => s.Max) : movement.Swings.Min(s => s.Min);
        return (isNarrow ? opening - byTemperature - movement.ClosesBy : opening + byTemperature + movement.OpensBy, end);
    }
}
