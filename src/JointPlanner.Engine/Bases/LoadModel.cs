using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Bases;

/// <summary>Traffic loads on what one frame stands for: arrangements of which the worst counts.</summary>
/// <param name="Name">What the model is called.</param>
/// <param name="Arrangements">Arrangements; each may load any length of the deck.</param>
/// <param name="LongestDeck">Length of deck up to which the model holds, m; null without bound.</param>
public sealed record LoadModel(string Name, ImmutableArray<LoadArrangement> Arrangements, double? LongestDeck = null);

/// <summary>A train together with a load per length.</summary>
/// <param name="Name">What it is called.</param>
/// <param name="Trains">Trains of which one stands on the deck, the worst, either way round; empty for none.</param>
/// <param name="TrainFactor">Factor on the train: lanes, presence, impact.</param>
/// <param name="Uniform">Load per length on adverse lengths, N/m.</param>
/// <param name="UniformFactor">Factor on it.</param>
public sealed record LoadArrangement(string Name, ImmutableArray<AxleTrain> Trains, Number TrainFactor, Number Uniform, Number UniformFactor);

/// <summary>Axles one behind the other.</summary>
/// <param name="Name">What the train is called.</param>
/// <param name="Axles">Axles from the first on.</param>
public sealed record AxleTrain(string Name, ImmutableArray<TrainAxle> Axles)
{
    /// <summary>Axles as force and distance behind the first, both ways round, at either end of every spacing that varies.</summary>
    public IEnumerable<ImmutableArray<(Number Force, double Behind)>> Orders()
    {
        foreach (var most in Axles.Any(a => a.SpacingMost > a.Spacing) ? new[] { false, true } : [false])
        {
            var behind = new double[Axles.Length];
            for (var i = 1; i < Axles.Length; i++) behind[i] = behind[i - 1] + (most ? Axles[i].SpacingMost : Axles[i].Spacing);
            ImmutableArray<(Number, double)> forward = [.. Axles.Select((a, i) => (a.Force, behind[i]))];
            yield return forward;
            if (Axles.Length > 1) yield return [.. forward.Reverse().Select(a => (a.Item1, behind[^1] - a.Item2))];
        }
    }
}

/// <summary>An axle.</summary>
/// <param name="Force">N.</param>
/// <param name="Spacing">Least distance behind the axle before it, m.</param>
/// <param name="SpacingMost">Largest, m.</param>
public sealed record TrainAxle(Number Force, double Spacing, double SpacingMost);
