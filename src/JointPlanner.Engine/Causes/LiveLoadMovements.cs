using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>
/// End rotation and sway by traffic. One solution of the frame gives the influence line of one response; trains stand where it is worst, both
/// ways round, and the load per length lies on adverse lengths alone, exact between the roots.
/// </summary>
/// <param name="model">Loads.</param>
/// <param name="deck">The frame.</param>
/// <param name="solver">The factorised frame.</param>
/// <param name="derivation">Where the steps go.</param>
public sealed class LiveLoadMovements(LoadModel model, DeckModel deck, FrameSolver solver, Derivation derivation)
{
    /// <summary>Opening and closing of a joint.</summary>
    public (Number Opens, Number Closes) Of(Joint joint)
    {
        var line = InfluenceLine.Of(deck.Closing(joint), solver, deck);
        return (derivation.Use(LiveLoadFormulas.OpensBy, Keys.OpensBy(joint.Id, Cause.LiveLoad), Told(joint, line, Worst(line, positive: false))),
            derivation.Use(LiveLoadFormulas.ClosesBy, Keys.ClosesBy(joint.Id, Cause.LiveLoad), Told(joint, line, Worst(line, positive: true))));
    }

    /// <summary>Largest and least value of a response under traffic, never on the wrong side of nothing.</summary>
    public (double Most, double Least, double Residual) Extremes(Response response)
    {
        var line = InfluenceLine.Of(response, solver, deck);
        return (Worst(line, true).Value, Worst(line, false).Value, line.Residual);
    }

    private Standing Worst(InfluenceLine line, bool positive)
    {
        var (above, below) = line.Areas();
        var area = positive ? above : below;
        return model.Arrangements.Select(a =>
        {
            var stands = a.Trains.SelectMany(t => t.Orders().Select(o => (Train: t, Axles: o)))
                .Select(t => (t.Train, t.Axles, At: line.Worst([.. t.Axles.Select(x => (x.Force.Value, x.Behind))], positive)))
                .OrderByDescending(t => positive ? t.At.Value : -t.At.Value).Select(t => ((AxleTrain, ImmutableArray<(Number Force, double Behind)> Axles, WorstPosition At)?)t).FirstOrDefault();
            var value = (a.TrainFactor.Value * (stands?.At.Value ?? 0)) + (a.UniformFactor.Value * a.Uniform.Value * area);
            return new Standing(a, stands?.Axles ?? [], stands?.At ?? default, area, value);
        }).OrderByDescending(s => positive ? s.Value : -s.Value).First();
    }

    /// <summary>The worst arrangement as steps.</summary>
    private Number Told(Joint joint, InfluenceLine line, Standing worst)
    {
        var parts = new List<Number>();
        if (worst.At.Value != 0)
        {
            var first = Solved("x_P", $"station of the first axle where {worst.Arrangement.Name} stands worst for joint {joint.Id}", Quantity.Length, worst.At.Position);
            foreach (var (force, behind) in worst.Axles)
            {
                var ordinate = derivation.Solved("", "y_P", $"ordinate of the influence line of joint {joint.Id} under the axle, closing positive", Quantity.Flexibility,
                    line.At(worst.At.Position - behind), FrameWords.Name, line.Residual, [first, .. deck.Inputs]);
                parts.Add(derivation.Use(LiveLoadFormulas.ByAxle, "", force, ordinate));
            }
        }
        else parts.Add(Nothing("Δ_P", "no train acts this way"));
        var area = Solved("A_y", $"area of the influence line of joint {joint.Id} over the loaded lengths, closing positive", Quantity.InfluenceArea, worst.Area);
        return derivation.Use(LiveLoadFormulas.ByBoth, "", worst.Arrangement.TrainFactor, derivation.Use(LiveLoadFormulas.ByTrain, "", [.. parts]),
            worst.Arrangement.UniformFactor, derivation.Use(LiveLoadFormulas.ByUniform, "", worst.Arrangement.Uniform, area));

        Number Solved(string symbol, string meaning, Quantity quantity, double value) =>
            derivation.Solved("", symbol, meaning, quantity, value, FrameWords.Name, line.Residual, [.. deck.Inputs]);
    }

    private Number Nothing(string symbol, string why) =>
        derivation.Table(symbol, why, Quantity.Movement, 0, Provenance.Derived("the influence line has no ordinate of this sign"), "nil");

    private sealed record Standing(
        LoadArrangement Arrangement, ImmutableArray<(Number Force, double Behind)> Axles, WorstPosition At, double Area, double Value);
}
