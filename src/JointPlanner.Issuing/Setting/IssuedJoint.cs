using System.Collections.Immutable;
using System.Text;
using JointPlanner.Archive.Setting;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Issuing.Setting;

/// <summary>
/// One joint as it was issued: everything that people on site ask is answered from here, that is from the issued results alone. Looks up,
/// compares and carries what was issued; no movement is computed anew.
/// </summary>
public sealed class IssuedJoint
{
    private readonly StoredDay day;
    private readonly StoredJoint joint;

    /// <summary>A joint of some results.</summary>
    public IssuedJoint(StoredDay day, StoredJoint joint) => (this.day, this.joint) = (day, joint);

    /// <summary>Id in the plan.</summary>
    public string Id => joint.Joint;

    /// <summary>What the drawing calls it, or its id.</summary>
    public string Mark => joint.Mark.Length > 0 ? joint.Mark : joint.Joint;

    /// <summary>What was chosen: family and size.</summary>
    public string Device => $"{joint.Family.Replace('-', ' ')} {joint.Size}".Trim();

    /// <summary>True where openings along the road differ from those normal to the joint.</summary>
    public bool IsSkewed => joint.Skew != 0;

    /// <summary>Methods by which the temperature may be measured.</summary>
    public ImmutableArray<StoredMethod> Methods => [.. day.Methods.Where(m => joint.Tables.Any(t => t.Method == m.Id))];

    /// <summary>Points to be measured; one where the mean temperature is found by the person.</summary>
    public ImmutableArray<StoredPoint> Points => day.Points.IsEmpty ? [new("structure", "mean temperature of the structure", 1)] : day.Points;

    /// <summary>The units in which the sheet was printed.</summary>
    public DisplayProfile Profile => DisplayProfile.Of(day.Units);

    /// <summary>True where the opening depends on the age of the deck.</summary>
    public bool AsksForAge => joint.Tables.Any(t => TableLookUp.Ages(t).Count > 0);

    /// <summary>How much the normal opening closes per degree of warming, m/K.</summary>
    public double Rate => joint.Tables[0].Rate;

    /// <summary>The joints that some results have tables for.</summary>
    /// <exception cref="InvalidDataException">They cannot be read.</exception>
    public static IReadOnlyList<IssuedJoint> All(string resultsText)
    {
        var (results, fault) = ResultsFile.Read(Encoding.UTF8.GetBytes(resultsText));
        if (results is null) throw new InvalidDataException($"The issued results cannot be read: {fault!.Wrong}");
        return results.Day is { } day ? [.. results.Joints.Where(j => j.Tables.Any(t => t.Method.Length > 0)).Select(j => new IssuedJoint(day, j))] : [];
    }

    /// <summary>The last moment at which joints may be set by what was issued at some instant.</summary>
    public DateTimeOffset UseBefore(DateTimeOffset issued) => issued.AddSeconds(day.UseWithin);

    /// <summary>The rows of a method's table.</summary>
    public ImmutableArray<StoredRow> Rows(string method) => Table(method).Rows;

    /// <summary>Mean temperature of the structure from one temperature for each point, °C.</summary>
    /// <exception cref="ArgumentException">Not one temperature for each point.</exception>
    public double Mean(IReadOnlyList<double> temperatures)
    {
        if (temperatures.Count != Points.Length) throw new ArgumentException($"There are {Points.Length} points and {temperatures.Count} temperatures.", nameof(temperatures));
        return Points.Zip(temperatures, (p, t) => p.Weight * t).Sum() / Points.Sum(p => p.Weight);
    }

    /// <summary>What the table of a method says.</summary>
    /// <param name="method">Id of the method.</param>
    /// <param name="temperature">Mean temperature of the structure, °C.</param>
    /// <param name="deckAge">Age of the deck, s; null where it plays no part or is not known.</param>
    /// <param name="direction">Direction of measure.</param>
    public SettingAnswer At(string method, double temperature, double? deckAge, Direction direction) =>
        TableLookUp.At(joint, Table(method), temperature, deckAge, direction);

    /// <summary>What to do with the opening that is there now, m, measured in the direction of the answer.</summary>
    public static Correction Correct(MaySet answer, double opening)
    {
        var wanted = answer.Set - opening;
        var isWithin = wanted <= answer.Minus + 1e-9 && -wanted <= answer.Plus + 1e-9;
        return new(wanted > 1e-9 ? wanted : null, wanted < -1e-9 ? -wanted : null, isWithin);
    }

    /// <summary>How far the temperature may still change when the joint stands at an opening, m, measured in the direction of the answer.</summary>
    public AllowedDrift Drift(MaySet answer, double opening)
    {
        // Along the road window, reserve and opening are all longer by the same share, and so is the rate.
        var rate = Math.Abs(Rate) / (answer.Direction == Direction.Along ? Math.Cos(joint.Skew) : 1);
        if (rate == 0) return new(null, null);
        // As it warms a closing joint's window moves down: a held opening comes nearer to its upper end.
        var (toUpper, toLower) = (Left(answer.Greatest - opening), Left(opening - answer.Least));
        return Rate > 0 ? new(toUpper, toLower) : new(toLower, toUpper);

        double Left(double distance) => Math.Max(0, (distance - answer.Reserve) / rate);
    }

    /// <summary>The opening as set at one point, carried to the lowest and to the highest temperature.</summary>
    /// <param name="point">The point.</param>
    /// <param name="deckAge">Age of the deck, s; null where it plays no part.</param>
    public (EndCheck AtMinimum, EndCheck AtMaximum) Carry(SetPoint point, double? deckAge)
    {
        var normal = point.Direction == Direction.Along ? point.Opening * Math.Cos(joint.Skew) : point.Opening;
        var (narrow, wide) = new CarriedOpening(joint, Table(point.Method)).From(normal, point.Temperature, deckAge);
        return Rate >= 0 ? (wide, narrow) : (narrow, wide);
    }

    /// <summary>The verdicts on all points together, as the archive keeps them: the worst point speaks.</summary>
    public (EndVerdict AtMinimum, EndVerdict AtMaximum) Judge(IReadOnlyList<SetPoint> points, double? deckAge)
    {
        var carried = points.Select(p => (p.Place, Ends: Carry(p, deckAge))).ToArray();
        return (Verdict(carried.Select(c => (c.Place, c.Ends.AtMinimum))), Verdict(carried.Select(c => (c.Place, c.Ends.AtMaximum))));
    }

    private EndVerdict Verdict(IEnumerable<(string Place, EndCheck Check)> checks)
    {
        var (place, worst) = checks.OrderBy(c => c.Check.Holds).ThenBy(c => c.Check.Room).First();
        return new(worst.Holds, $"{place}: {FindingText.Of(worst.Says, Profile)}");
    }

    private StoredTable Table(string method) => joint.Tables.FirstOrDefault(t => t.Method == method && method.Length > 0)
        ?? throw new ArgumentException($"There is no table for the method {method}.", nameof(method));
}
