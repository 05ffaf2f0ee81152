using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Causes;

/// <summary>Every cause that the frame computes, solved once for the whole plan, and what each does to a joint.</summary>
public sealed class FrameCauses
{
    private readonly Plan plan;
    private readonly DeckModel deck;
    private readonly Derivation derivation;

    /// <summary>Solves the frame for every cause that the plan describes.</summary>
    /// <exception cref="SilentBasisException">The basis does not answer what the plan leaves to it.</exception>
    public FrameCauses(Plan plan, CodeBasis basis, ExpansionLengths lengths, Func<string, SegmentTemperature> temperatureOf, Derivation derivation)
    {
        (this.plan, deck, this.derivation) = (plan, lengths.Deck, derivation);
        Gradients = TemperatureDifference.Sections(plan, basis, deck, temperatureOf, derivation);
        States = ImmutableDictionary<Cause, ImmutableArray<FrameState>>.Empty
            .Add(Cause.TemperatureDifference, TemperatureDifference.States(Gradients, deck, lengths.Solver))
            .Add(Cause.DeadLoad, DeadLoad.States(plan, deck, lengths.Solver, derivation))
            .Add(Cause.Substructure, Substructure.States(plan, deck, lengths.Solver, derivation))
            .Add(Cause.Braking, Braking.States(plan, deck, lengths.Solver, derivation));
        Traffic = LiveLoadModels.Of(plan, basis, derivation) is { } model && plan.Segments.Any(s => s.Section is not null)
            ? new LiveLoadMovements(model, deck, lengths.Solver, derivation)
            : null;
    }

    /// <summary>Sections under vertical temperature differences.</summary>
    public ImmutableArray<(Segment Segment, SectionState Warm, SectionState Cool)> Gradients { get; }

    /// <summary>The solved frame by cause.</summary>
    public ImmutableDictionary<Cause, ImmutableArray<FrameState>> States { get; }

    /// <summary>Traffic; null where there is none.</summary>
    public LiveLoadMovements? Traffic { get; }

    /// <summary>Largest residual of all states.</summary>
    public double Residual => States.Values.SelectMany(s => s).Select(s => s.Solution.Residual).DefaultIfEmpty(0).Max();

    /// <summary>Largest refinement change of all states.</summary>
    public double RefinementChange => States.Values.SelectMany(s => s).Select(s => s.Solution.RefinementChange).DefaultIfEmpty(0).Max();

    /// <summary>Every state with the numbers that it was made from, by cause.</summary>
    public ImmutableArray<(Cause Cause, string State, ImmutableArray<Number> Numbers)> Listed =>
        [.. States.OrderBy(c => c.Key).SelectMany(c => c.Value.Select(s => (c.Key, s.Name, s.Inputs)))];

    /// <summary>What the frame's causes do to a joint, for those that the plan describes whole.</summary>
    public ImmutableArray<OtherPart> Of(Joint joint)
    {
        var parts = ImmutableArray.CreateBuilder<OtherPart>();
        Add(Cause.TemperatureDifference, FrameMovements.Worst, isIrreversible: false);
        Add(Cause.DeadLoad, FrameMovements.Worst, isIrreversible: true);
        Add(Cause.Substructure, FrameMovements.Parts, isIrreversible: true);
        if (Traffic is not null && ComputedCauses.ByFrame(plan, joint, Cause.LiveLoad))
        {
            var (opens, closes) = Traffic.Of(joint);
            parts.Add(new OtherPart(Cause.LiveLoad, opens, closes, IsIrreversible: false));
        }
        Add(Cause.Braking, FrameMovements.Worst, isIrreversible: false);
        return parts.ToImmutable();

        void Add(Cause cause, Func<Joint, Cause, DeckModel, IEnumerable<FrameState>, Derivation, (Number Opens, Number Closes)> combine, bool isIrreversible)
        {
            if (States[cause].IsEmpty || !ComputedCauses.ByFrame(plan, joint, cause)) return;
            var (opens, closes) = combine(joint, cause, deck, States[cause], derivation);
            parts.Add(new OtherPart(cause, opens, closes, isIrreversible));
        }
    }
}
