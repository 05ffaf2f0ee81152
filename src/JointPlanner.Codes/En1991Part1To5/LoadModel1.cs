using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.En1991Part1To5;

/// <summary>EN 1991-2:2003, 4.3.2: load model 1 with adjustment factors 1. Tandems stand side by side; impact is in the values.</summary>
internal static class LoadModel1
{
    private const double LaneWidth = 3, Other = 2.5e3;
    private static readonly double[] Axles = [300e3, 200e3, 100e3];
    private static readonly double[] Loads = [9e3, 2.5e3, 2.5e3];

    private static readonly Operand Axle = new("Q_ik", "axle load of one lane", Quantity.Force);
    private static readonly Operand Pressure = new("q_ik", "load of one lane per area", Quantity.Stress);
    private static readonly Operand Width = new("w_i", "width of the lane or of the remaining area", Quantity.Length);
    private static readonly Operand Strip = new("q_i", "load per length of one lane or of the remaining area", Quantity.LineLoad);
    private static readonly Operand Carriageway = new("w", "width of the carriageway", Quantity.Length);
    private static readonly Operand Lanes = new("n", "number of notional lanes", Quantity.Count);

    private static readonly Provenance Values = new(Mark.Seen, "a public extract of EN 1991-2 and an open-source finite-element library restating it", "2003", "4.3.2, table 4.2; lanes 4.2.3, table 4.1");

    /// <summary>Axles side by side.</summary>
    public static readonly Formula AxlesTogether = new("en-1991-2.tandem-axle", "ΣQ", "axle loads of all tandem systems side by side", Quantity.Force, [Axle], Total(Axle), Values,
        new(600e3, 1e-6, "own arithmetic", 300e3, 200e3, 100e3));

    /// <summary>Load of a lane.</summary>
    public static readonly Formula OfLane = new("en-1991-2.lane-load", "q_i", "load per length of one lane or of the remaining area", Quantity.LineLoad, [Pressure, Width],
        Pressure * Width, Values, new(27e3, 1e-6, "own arithmetic", 9e3, 3));

    /// <summary>Loads together.</summary>
    public static readonly Formula LoadsTogether = new("en-1991-2.uniform-load", "Σq", "load per length of all lanes and of the remaining area", Quantity.LineLoad, [Strip], Total(Strip), Values,
        new(34.5e3, 1e-6, "own arithmetic", 27e3, 7.5e3));

    /// <summary>Remaining width.</summary>
    public static readonly Formula Remaining = new("en-1991-2.remaining-width", "w_r", "width of the remaining area", Quantity.Length, [Carriageway, Lanes, Width],
        Carriageway - Lanes * Width, Values, new(2, 1e-12, "own arithmetic", 8, 2, 3));

    /// <summary>The model on what the frame stands for.</summary>
    public static Answer<LoadModel> Of(LiveLoad traffic, Derivation derivation)
    {
        if (traffic is { StandsFor: FrameShare.GirderLine, Distribution: { } share })
        {
            var factor = derivation.Given("live-load/distribution", "g", "lanes that one girder line takes", Quantity.Ratio, share, traffic.DistributionSource);
            return Model(AxleOf(0, derivation), OneLane(0, LaneWidth, derivation), factor, "load model 1, first lane", derivation);
        }
        if (traffic.Carriageway is not { } width) return new Silent<LoadModel>("load model 1 wants the width of the carriageway to make lanes of it");
        // Table 4.1: one lane of 3 m below 5.4 m, two of half the width up to 6 m, then as many of 3 m as fit.
        var (count, lane) = width < 5.4 ? (1, LaneWidth) : width < 6 ? (2, width / 2) : ((int)Math.Floor(width / LaneWidth + 1e-9), LaneWidth);
        Number[] axles = [.. Enumerable.Range(0, Math.Min(count, Axles.Length)).Select(i => AxleOf(i, derivation))];
        List<Number> loads = [.. Enumerable.Range(0, count).Select(i => OneLane(i, lane, derivation))];
        if (width - (count * lane) > 1e-9)
            loads.Add(derivation.Use(OfLane, "", Area(Other, "remaining area", derivation), derivation.Use(Remaining, "",
                derivation.Given("live-load/carriageway", "w", Carriageway.Meaning, Quantity.Length, width),
                derivation.Table("n", Lanes.Meaning, Quantity.Count, count, Values, "table 4.1"), WidthOf(lane, derivation))));
        var one = derivation.Table("f", "adjustment factors 1, impact within the values", Quantity.Ratio, 1, Values, "adjustment factors");
        return Model(derivation.Use(AxlesTogether, "", axles), derivation.Use(LoadsTogether, "", [.. loads]), one, "load model 1, all lanes side by side", derivation);
    }

    private static LoadModel Model(Number axle, Number uniform, Number factor, string name, Derivation derivation)
    {
        var spacing = derivation.Table("s", "axle spacing of a tandem", Quantity.Length, 1.2, Memory("4.3.2(4)", "en-1991-2-2003/tandem-spacing"), "tandem").Value;
        var longest = derivation.Table("L", "longest loaded length of load model 1", Quantity.Length, 200, Memory("4.1", "en-1991-2-2003/lm1-length"), "scope").Value;
        return new("Load model 1 of EN 1991-2",
            [new LoadArrangement(name, [new AxleTrain("tandem", [new TrainAxle(axle, 0, 0), new TrainAxle(axle, spacing, spacing)])], factor, uniform, factor)], longest);
    }

    private static Provenance Memory(string place, string valueId) => new(Mark.Memory, "EN 1991-2", "2003", place, valueId);

    private static Number AxleOf(int lane, Derivation derivation) =>
        derivation.Table("Q_ik", Axle.Meaning, Quantity.Force, Axles[lane], Values, FormattableString.Invariant($"lane {lane + 1}"));

    private static Number OneLane(int lane, double width, Derivation derivation) => derivation.Use(OfLane, "",
        Area(lane < Loads.Length ? Loads[lane] : Other, FormattableString.Invariant($"lane {lane + 1}"), derivation), WidthOf(width, derivation));

    private static Number Area(double load, string row, Derivation derivation) => derivation.Table("q_ik", Pressure.Meaning, Quantity.Stress, load, Values, row);

    private static Number WidthOf(double width, Derivation derivation) => derivation.Table("w_i", "width of a notional lane", Quantity.Length, width, Values, "table 4.1");
}
