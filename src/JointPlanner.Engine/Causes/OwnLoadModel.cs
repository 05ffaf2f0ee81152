using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>The designer's own loads as a load model.</summary>
public static class OwnLoadModel
{
    /// <summary>The model: the worst train with the load per length, in every lane that the frame carries.</summary>
    public static LoadModel Of(LiveLoad traffic, OwnLoads own, Derivation derivation)
    {
        const string path = "live-load/own";
        var lanes = LanesOf(traffic, derivation);
        var dynamic = derivation.Given($"{path}/dynamic", "φ", "dynamic factor on the trains", Quantity.Ratio, own.Dynamic, own.Source);
        var uniform = derivation.Given($"{path}/uniform", "q", "load per length of one lane", Quantity.LineLoad, own.Uniform, own.Source);
        return new LoadModel("own loads",
        [
            new LoadArrangement("own loads", [.. own.Trains.Select(Train)], derivation.Use(LiveLoadFormulas.WithImpact, "", lanes, dynamic), uniform, lanes),
        ]);

        AxleTrain Train(OwnTrain train) => new(train.Id,
        [
            .. train.Axles.Select((a, i) => new TrainAxle(
                derivation.Given(FormattableString.Invariant($"{path}/trains/{train.Id}/axles/#{i + 1}/force"), "P", $"axle load of train {train.Id}", Quantity.Force, a.Force, own.Source),
                a.Spacing, a.SpacingMost ?? a.Spacing)),
        ]);
    }

    /// <summary>Lanes of one and the same load on what the frame stands for: the distribution factor of a girder line, or the number of lanes without any reduction.</summary>
    private static Number LanesOf(LiveLoad traffic, Derivation derivation) => traffic is { StandsFor: FrameShare.GirderLine, Distribution: { } share }
        ? derivation.Given("live-load/distribution", "g", "lanes that one girder line takes", Quantity.Ratio, share, traffic.DistributionSource)
        : derivation.Given("live-load/lanes", "n", "lanes on the whole width, without reduction", Quantity.Ratio, traffic.Lanes ?? 1);
}
