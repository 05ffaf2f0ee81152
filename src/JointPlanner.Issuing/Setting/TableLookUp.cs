using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Setting;

/// <summary>
/// Reads an issued table. Between two rows nothing is interpolated: what may be set is what both rows allow, and of their two values the nearer
/// one that lies in it.
/// </summary>
internal static class TableLookUp
{
    // Rows reached through another scale are off by the last bit.
    private const double LastBit = 1e-9;

    public static SettingAnswer At(StoredJoint joint, StoredTable table, double temperature, double? deckAge, Direction direction)
    {
        var path = $"joints/{joint.Joint}";
        if (temperature < table.Min - LastBit || temperature > table.Max + LastBit)
            return No("setting-outside-temperatures", path, "Do not set at {0}: values are given from {1} to {2} only.",
                (Quantity.Temperature, temperature), (Quantity.Temperature, table.Min), (Quantity.Temperature, table.Max));
        if (Ages(table) is { Count: > 0 } ages)
        {
            if (deckAge is not { } age) return No("setting-no-age", path, "Give the age of the deck: this joint's opening depends on it.");
            var least = Math.Max(table.LeastAge ?? 0, ages[0]);
            if (age < least - LastBit)
                return No("setting-too-young", path, "Do not set at a deck age of {0}: values are given from {1} on.", (Quantity.Age, age), (Quantity.Age, least));
        }
        return Around(table, temperature, deckAge) is { Count: > 0 } rows
            ? Common(joint, rows, temperature, direction, path)
            : No("setting-no-row", path, "Do not set at {0}: the table has no rows round it.", (Quantity.Temperature, temperature));
    }

    /// <summary>Deck ages that the table has rows for, rising.</summary>
    public static IReadOnlyList<double> Ages(StoredTable table) => [.. table.Rows.Select(r => r.DeckAge).OfType<double>().Distinct().Order()];

    /// <summary>The age whose rows and movements hold: the greatest that the deck has reached, for less is then still to come.</summary>
    public static double? Reached(IReadOnlyList<double> ages, double? deckAge) =>
        ages.Count == 0 ? null : ages.LastOrDefault(a => a <= deckAge + LastBit, ages[0]);

    /// <summary>The rows next to a temperature and deck age, nearest first: one to four.</summary>
    private static List<StoredRow> Around(StoredTable table, double temperature, double? deckAge)
    {
        var ages = Ages(table);
        var around = ages.Count == 0
            ? [null]
            : ((double?[])[Reached(ages, deckAge), ages.Where(a => a >= deckAge - LastBit).Select(a => (double?)a).FirstOrDefault()]).OfType<double>().Distinct().Select(a => (double?)a);
        return
        [
            .. around.SelectMany(age =>
            {
                var rows = table.Rows.Where(r => Nullable.Equals(r.DeckAge, age)).ToArray();
                return ((StoredRow?[])[rows.Where(r => r.Temperature <= temperature + LastBit).MaxBy(r => r.Temperature), rows.Where(r => r.Temperature >= temperature - LastBit).MinBy(r => r.Temperature)])
                    .OfType<StoredRow>();
            }).Distinct().OrderBy(r => Math.Abs(r.Temperature - temperature)).ThenBy(r => Math.Abs((r.DeckAge - deckAge) ?? 0)),
        ];
    }

    private static SettingAnswer Common(StoredJoint joint, List<StoredRow> rows, double temperature, Direction direction, string path)
    {
        if (rows.FirstOrDefault(r => r.Set is null) is { } closed)
            return new DoNotSet(closed.Refusal is { } why ? StoredSentences.Of(why) : new("setting-no-value", Severity.Warning, path, "Do not set: the table gives no value here."));
        var isAlong = direction == Direction.Along && joint.Skew != 0;
        if (isAlong && rows.Any(r => r.Along is null))
            return No("setting-along", path, "Measured along the road no tolerance is left at {0}: measure normal to the joint.", (Quantity.Temperature, temperature));
        var openings = rows.Select(r => isAlong ? r.Along! : new StoredOpening(r.Set!.Value, r.Minus ?? 0, r.Plus ?? 0)).ToArray();
        var (low, high) = (openings.Max(o => o.Set - o.Minus), openings.Min(o => o.Set + o.Plus));
        if (openings.FirstOrDefault(o => o.Set > low + LastBit && o.Set < high - LastBit) is not { } chosen)
            return No("setting-between-rows", path, "Do not set at {0}: the rows next to it have no opening in common that leaves a tolerance. Wait until the structure is at a temperature of the table.",
                (Quantity.Temperature, temperature));
        var (least, greatest) = (rows.MaxBy(r => r.Least ?? double.NegativeInfinity)!, rows.MinBy(r => r.Greatest ?? double.PositiveInfinity)!);
        var toDirection = isAlong ? 1 / Math.Cos(joint.Skew) : 1;
        return new MaySet(direction, chosen.Set, chosen.Set - low, high - chosen.Set, (least.Least ?? low) * toDirection, (greatest.Greatest ?? high) * toDirection,
            least.LeastBy ?? "", greatest.GreatestBy ?? "", rows.Max(r => r.Reserve ?? 0) * toDirection);
    }

    private static DoNotSet No(string id, string path, string sentence, params (Quantity, double)[] numbers) => new(new(id, Severity.Warning, path, sentence, numbers));
}
