using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Issuing.Comparing;

/// <summary>
/// How far apart the same result may come out on two machines: 1e-10 of the largest term in it where it rests on closed forms alone, 1e-7 where
/// something solved is in it. The largest term is found by walking the steps, so that a small difference of large numbers gets the room that these ask for.
/// </summary>
public sealed class Tolerances
{
    /// <summary>Share for closed forms.</summary>
    public const double Closed = 1e-10;

    /// <summary>Share for what rests on a solved system.</summary>
    public const double Solved = 1e-7;

    private readonly IReadOnlyDictionary<string, double> rooms;

    private Tolerances(IReadOnlyDictionary<string, double> rooms) => this.rooms = rooms;

    /// <summary>Where nothing could be computed, each number is held to its own size and to the wider share.</summary>
    public static readonly Tolerances Unknown = new(new Dictionary<string, double>());

    /// <summary>The room of each keyed result.</summary>
    public static Tolerances Of(Result? result)
    {
        if (result is null) return Unknown;
        var (share, largest) = (new double[result.Steps.Count], new double[result.Steps.Count]);
        foreach (var step in result.Steps)
        {
            var own = Math.Abs(step.Value);
            (share[step.Index], largest[step.Index]) = (step.Origin is SolvedOrigin ? Solved : Closed, own);
            foreach (var from in step.Origin.Operands)
            {
                var operand = result.Steps[from];
                share[step.Index] = Math.Max(share[step.Index], share[from]);
                // A term of the same dimension stands beside the result; one of another dimension multiplies it, and hands on by how much it is itself a difference.
                var term = operand.Quantity.Dimension == step.Quantity.Dimension ? largest[from] : own * Cancelled(operand, largest[from]);
                largest[step.Index] = Math.Max(largest[step.Index], term);
            }
        }

        return new Tolerances(result.ByKey().ToDictionary(k => k.Key, k => share[k.Value.Index] * largest[k.Value.Index]));
    }

    /// <summary>How two values of one key stand to each other.</summary>
    public Sameness Compare(string key, double before, double after)
    {
        if (BitConverter.DoubleToInt64Bits(before) == BitConverter.DoubleToInt64Bits(after)) return Sameness.Same;
        var room = Math.Max(rooms.GetValueOrDefault(key), Solved * Math.Max(Math.Abs(before), Math.Abs(after)) * (rooms.ContainsKey(key) ? 0 : 1));
        return Math.Abs(after - before) <= room ? Sameness.WithinRounding : Sameness.Changed;
    }

    /// <summary>The same for numbers that no step names, held to the largest of those beside them.</summary>
    public static Sameness Compare(double? before, double? after, double largest) => (before, after) switch
    {
        (null, null) => Sameness.Same,
        ({ } a, { } b) when BitConverter.DoubleToInt64Bits(a) == BitConverter.DoubleToInt64Bits(b) => Sameness.Same,
        ({ } a, { } b) when Math.Abs(b - a) <= Solved * largest => Sameness.WithinRounding,
        _ => Sameness.Changed,
    };

    private static double Cancelled(Step operand, double largest) => operand.Value == 0 ? 1 : Math.Min(1e6, largest / Math.Abs(operand.Value));
}
