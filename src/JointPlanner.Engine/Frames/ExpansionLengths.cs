using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Frames;

/// <summary>
/// How the strain of each segment moves each joint and bearing, from one factorisation: the movement per unit strain is a length,
/// the expansion length. Overhangs, yielding supports and coupled segments are in it.
/// </summary>
public sealed class ExpansionLengths
{
    /// <summary>Shares of a segment below this part of its length are taken as nothing: they are rounding of the solver.</summary>
    private const double Negligible = 1e-9;

    private readonly Plan plan;
    private readonly Derivation derivation;
    private readonly ImmutableDictionary<string, FrameSolution> unitStrains;

    private ExpansionLengths(Plan plan, DeckModel deck, FrameSolver solver, Derivation derivation)
    {
        (this.plan, Deck, Solver, this.derivation) = (plan, deck, solver, derivation);
        unitStrains = plan.Segments.ToImmutableDictionary(s => s.Id, s => solver.Strained(id => id == s.Id ? 1 : 0));
    }

    /// <summary>The model.</summary>
    public DeckModel Deck { get; }

    /// <summary>The factorised model.</summary>
    public FrameSolver Solver { get; }

    /// <summary>Largest residual of all states solved.</summary>
    public double Residual => unitStrains.Values.Select(s => s.Residual).DefaultIfEmpty(0).Max();

    /// <summary>Largest refinement change of all states solved.</summary>
    public double RefinementChange => unitStrains.Values.Select(s => s.RefinementChange).DefaultIfEmpty(0).Max();

    /// <summary>Builds, factorises and solves a unit strain of each segment.</summary>
    /// <exception cref="MechanismException">The deck is not held along its axis.</exception>
    public static ExpansionLengths Of(Plan plan, Derivation derivation)
    {
        var deck = DeckModel.Of(plan, derivation);
        return new ExpansionLengths(plan, deck, new FrameSolver(deck.Model), derivation);
    }

    /// <summary>By how much a joint closes at road-surface level when a segment lengthens by a unit strain, for each segment that moves it; m.</summary>
    public ImmutableArray<(Segment Segment, Number Length)> Of(Joint joint)
    {
        var closing = Deck.Closing(joint);
        return Lengths(s => s.Of(closing), s => Keys.ExpansionLength(joint.Id, s), s => $"expansion length of joint {joint.Id} for segment {s}: closing per unit strain");
    }

    /// <summary>By how much the deck moves up-station over a bearing line when a segment lengthens by a unit strain; m.</summary>
    public ImmutableArray<(Segment Segment, Number Length)> Of(BearingLine bearing)
    {
        var travel = Deck.Travel(bearing);
        return Lengths(s => s.Of(travel), _ => "", s => $"expansion length of bearing line {bearing.Id} for segment {s}: travel up-station per unit strain");
    }

    private ImmutableArray<(Segment, Number)> Lengths(
        Func<FrameSolution, double> movement, Func<string, string> key, Func<string, string> meaning) =>
    [
        .. plan.Segments
            .Select(s => (Segment: s, Value: movement(unitStrains[s.Id])))
            .Where(p => Math.Abs(p.Value) > Negligible * p.Segment.Length)
            .Select(p => (p.Segment, derivation.Solved(
                key(p.Segment.Id), "L", meaning(p.Segment.Id), Quantity.Length, p.Value, FrameWords.Name,
                unitStrains[p.Segment.Id].Residual, [.. Deck.Inputs]))),
    ];
}
