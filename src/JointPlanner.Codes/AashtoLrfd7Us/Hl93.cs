using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.AashtoLrfd7Us;

/// <summary>HL-93: truck with lane, or tandem with lane, in as many lanes as make the worst with their presence factor. End rotation takes the general impact of 33 %.</summary>
internal static class Hl93
{
    private static readonly Provenance Loads = new(Mark.Seen, "public summary of AASHTO HL-93 loading (aboutcivil.org)", "", "restates LRFD 3.6.1.2: truck, tandem, lane");
    private static readonly double[] Presence = [1.20, 1.00, 0.85, 0.65];

    /// <summary>The model on what the frame stands for.</summary>
    public static Answer<LoadModel> Of(LiveLoad traffic, Derivation derivation)
    {
        if (LanesOf(traffic, derivation) is not { } lanes) return new Silent<LoadModel>("HL-93 on the whole width wants the number of lanes");
        var impact = derivation.Table("1 + IM", "dynamic factor on truck and tandem", Quantity.Ratio, 1.33, Memory("table 3.6.2.1-1, all other components", "aashto-lrfd-7-us/impact"), "33 %");
        var factor = derivation.Use(LiveLoadFormulas.WithImpact, "", lanes, impact);
        var lane = derivation.Table("q", "lane load", Quantity.LineLoad, Unit.KipPerFoot.ToSi(0.64), Loads, "lane");
        return new LoadModel("HL-93",
        [
            new LoadArrangement("design truck with lane", [new AxleTrain("truck", [Axle(8, 0, 0), Axle(32, 14, 14), Axle(32, 14, 30)])], factor, lane, lanes),
            new LoadArrangement("design tandem with lane", [new AxleTrain("tandem", [Axle(25, 0, 0), Axle(25, 4, 4)])], factor, lane, lanes),
        ]);

        TrainAxle Axle(double kip, double least, double most) => new(
            derivation.Table("P", "axle load", Quantity.Force, Unit.Kip.ToSi(kip), Loads, FormattableString.Invariant($"{kip} kip")), Unit.Foot.ToSi(least), Unit.Foot.ToSi(most));
    }

    /// <summary>Lanes that count: the distribution factor of a girder line, or the worst of one to all lanes with their presence factor.</summary>
    private static Number? LanesOf(LiveLoad traffic, Derivation derivation)
    {
        if (traffic is { StandsFor: FrameShare.GirderLine, Distribution: { } share })
            return derivation.Given("live-load/distribution", "g", "lanes that one girder line takes", Quantity.Ratio, share, traffic.DistributionSource);
        if (traffic.Lanes is not { } all) return null;
        var worst = Enumerable.Range(1, all).MaxBy(n => n * Factor(n));
        return derivation.Use(LiveLoadFormulas.LanesThatCount, "", derivation.Table("n", "number of lanes loaded, worst of one to all", Quantity.Count, worst, Provenance.Derived("one to all lanes tried with their factor"), "worst"),
            derivation.Table("m", "factor for several lanes at once", Quantity.Ratio, Factor(worst), Memory("table 3.6.1.1.2-1", "aashto-lrfd-7-us/presence"), FormattableString.Invariant($"{worst} lanes")));
    }

    private static double Factor(int lanes) => Presence[Math.Min(lanes, Presence.Length) - 1];

    private static Provenance Memory(string place, string valueId) => new(Mark.Memory, "AASHTO LRFD Bridge Design Specifications", "7th edition, 2014, US units", place, valueId);
}
