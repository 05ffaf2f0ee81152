using System.Globalization;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Comparing;

/// <summary>The numbers that are stored joint by joint and not by key: limits, skew, what holds for a setting table as a whole, movements still to come.</summary>
internal static class JointNumbers
{
    /// <summary>One such number.</summary>
    /// <param name="Meaning">What it is, in words.</param>
    /// <param name="Quantity">What kind of number it is.</param>
    /// <param name="Value">SI value.</param>
    internal sealed record One(string Meaning, Quantity Quantity, double Value);

    /// <summary>All of them by a path of their own.</summary>
    public static IReadOnlyDictionary<string, One> Of(StoredResults results)
    {
        var numbers = new Dictionary<string, One>();
        foreach (var joint in results.Joints)
            foreach (var (path, one) in Of(joint))
            {
                // Two limits may go by one name; the second gets a number.
                var key = $"joint/{joint.Joint}/{path}";
                for (var again = 2; !numbers.TryAdd(key, one); again++) key = FormattableString.Invariant($"joint/{joint.Joint}/{path}#{again}");
            }

        return numbers;
    }

    private static IEnumerable<(string Path, One One)> Of(StoredJoint joint)
    {
        yield return ("skew", new("skew of the joint", Quantity.Angle, joint.Skew));
        foreach (var limit in joint.Limits)
            yield return ($"limit/{limit.JudgedBy ?? "on the day"}/{limit.Name}", new($"{limit.Bound} limit, {limit.Measure}: {limit.Name}", Quantity.Opening, limit.Value));
        foreach (var table in joint.Tables)
        {
            var path = $"table/{(table.Method.Length > 0 ? table.Method : "sheet")}";
            yield return ($"{path}/rate", new("how much the opening closes as the structure warms", Quantity.Rate, table.Rate));
            yield return ($"{path}/doubt", new("standard deviation of the temperature as measured", Quantity.TemperatureDifference, table.TemperatureUncertainty));
            yield return ($"{path}/lowest", new("lowest temperature of the table", Quantity.Temperature, table.Min));
            yield return ($"{path}/highest", new("highest temperature of the table", Quantity.Temperature, table.Max));
            if (table.LeastAge is { } age) yield return ($"{path}/least-age", new("least deck age at which the joint may be set", Quantity.Age, age));
        }
        foreach (var movement in joint.ToCome)
        {
            var days = movement.DeckAge is { } age ? string.Create(CultureInfo.InvariantCulture, $"/{age / 86400:R} d") : "";
            var path = $"to-come/{movement.JudgedBy}{days}";
            yield return ($"{path}/closes-by", new("closing still to come after setting, without temperature", Quantity.Movement, movement.ClosesBy));
            yield return ($"{path}/opens-by", new("opening still to come after setting, without temperature", Quantity.Movement, movement.OpensBy));
            foreach (var swing in movement.Swings)
            {
                yield return ($"{path}/rate", new("how much the opening closes as a segment warms", Quantity.Rate, swing.Rate));
                yield return ($"{path}/lowest", new("lowest temperature, with its safety", Quantity.Temperature, swing.Min));
                yield return ($"{path}/highest", new("highest temperature, with its safety", Quantity.Temperature, swing.Max));
            }
        }
    }
}
