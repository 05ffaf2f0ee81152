using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Causes;

/// <summary>The frame in one state of one cause.</summary>
/// <param name="Name">What the state is, for instance "deck warmer above".</param>
/// <param name="Solution">The solved frame.</param>
/// <param name="Inputs">Steps that the state was made from.</param>
public sealed record FrameState(string Name, FrameSolution Solution, ImmutableArray<Number> Inputs);

/// <summary>Movements of joints and bearings by a cause that the frame computes in a few states of its own.</summary>
public static class FrameMovements
{
    private static readonly Operand Closing = new("c", "closing at road-surface level in one state", Quantity.Movement);

    private static readonly Provenance Alternatives = Provenance.Derived("the states are alternatives: the worst of them counts each way, never less than nothing");
    private static readonly Provenance Together = Provenance.Derived("each part counts in its own direction only, because it may come alone");

    /// <summary>Opening: the worst of alternative states.</summary>
    public static readonly Formula OpensBy = new(
        "frame.opens-by", "Δ_opens", "the joint opens by, worst of the states", Quantity.Movement, [Closing],
        Positive(-1 * Smallest(Closing), Quantity.Movement), Alternatives, new(0.003, 1e-12, "own arithmetic", 0.002, -0.003));

    /// <summary>Closing: the worst of alternative states.</summary>
    public static readonly Formula ClosesBy = new(
        "frame.closes-by", "Δ_closes", "the joint closes by, worst of the states", Quantity.Movement, [Closing],
        Positive(Largest(Closing), Quantity.Movement), Alternatives, new(0.002, 1e-12, "own arithmetic", 0.002, -0.003));

    private static readonly Operand Part = new("Δ_j", "part of one support", Quantity.Movement);

    /// <summary>One part, where it opens.</summary>
    public static readonly Formula PartOpens = new(
        "frame.part-opens", "Δ_j", "opening by one part", Quantity.Movement, [Closing], Positive(-1 * Closing, Quantity.Movement), Together,
        new(0.003, 1e-12, "own arithmetic", -0.003));

    /// <summary>One part, where it closes.</summary>
    public static readonly Formula PartCloses = new(
        "frame.part-closes", "Δ_j", "closing by one part", Quantity.Movement, [Closing], Positive(Closing, Quantity.Movement), Together,
        new(0.003, 1e-12, "own arithmetic", 0.003));

    /// <summary>Parts that open.</summary>
    public static readonly Formula PartsOpen = new(
        "frame.parts-open", "Δ_opens", "the joint opens by, all parts that open", Quantity.Movement, [Part], Total(Part), Together,
        new(0.005, 1e-12, "own arithmetic", 0.002, 0.003));

    /// <summary>Parts that close.</summary>
    public static readonly Formula PartsClose = new(
        "frame.parts-close", "Δ_closes", "the joint closes by, all parts that close", Quantity.Movement, [Part], Total(Part), Together,
        new(0.005, 1e-12, "own arithmetic", 0.002, 0.003));

    /// <summary>Worst of alternative states at a joint.</summary>
    public static (Number Opens, Number Closes) Worst(Joint joint, Cause cause, DeckModel deck, IEnumerable<FrameState> states, Derivation derivation)
    {
        var closings = Closings(joint, cause, deck, states, derivation);
        return (derivation.Use(OpensBy, Keys.OpensBy(joint.Id, cause), closings), derivation.Use(ClosesBy, Keys.ClosesBy(joint.Id, cause), closings));
    }

    /// <summary>Parts that come independently at a joint, each counted in its own direction.</summary>
    public static (Number Opens, Number Closes) Parts(Joint joint, Cause cause, DeckModel deck, IEnumerable<FrameState> states, Derivation derivation)
    {
        var closings = Closings(joint, cause, deck, states, derivation);
        return (derivation.Use(PartsOpen, Keys.OpensBy(joint.Id, cause), [.. closings.Select(c => derivation.Use(PartOpens, "", c))]),
            derivation.Use(PartsClose, Keys.ClosesBy(joint.Id, cause), [.. closings.Select(c => derivation.Use(PartCloses, "", c))]));
    }

    private static Number[] Closings(Joint joint, Cause cause, DeckModel deck, IEnumerable<FrameState> states, Derivation derivation)
    {
        var closing = deck.Closing(joint);
        return [.. states.Select(s => derivation.Solved("", "c", $"closing of joint {joint.Id} at road-surface level by {Keys.Said(cause)}, {s.Name}", Quantity.Movement,
            s.Solution.Of(closing), FrameWords.Name, s.Solution.Residual, [.. s.Inputs, .. deck.Inputs]))];
    }
}
