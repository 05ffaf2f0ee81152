using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.HandChecks;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine;

/// <summary>The main path, top to bottom: an accepted plan, a basis and an owner's rules become movements, fits and setting tables.</summary>
public sealed class Movements
{
    private readonly Plan plan;
    private readonly CodeBasis basis;
    private readonly Owner? owner;
    private readonly RemainingStrains strains;
    private readonly Derivation derivation = new();

    private Movements(Plan plan, CodeBasis basis, Owner? owner, IReadOnlyList<CreepModel> models) =>
        (this.plan, this.basis, this.owner, strains) = (plan, basis, owner, new RemainingStrains(plan, basis, models));

    /// <summary>Computes a plan whose concrete, where it describes any, follows the basis's own model.</summary>
    /// <param name="plan">An accepted plan.</param>
    /// <param name="basis">The code edition.</param>
    /// <param name="owner">The owner's rules; null for none, and then nothing is fitted.</param>
    /// <param name="cancellation">Stops between joints.</param>
    public static Result Of(Plan plan, CodeBasis basis, Owner? owner, CancellationToken cancellation = default) => Of(plan, basis, owner, [], cancellation);

    /// <summary>Computes a plan. What stands in the way is a finding of the result, never an exception.</summary>
    /// <param name="plan">An accepted plan.</param>
    /// <param name="basis">The code edition.</param>
    /// <param name="owner">The owner's rules; null for none, and then nothing is fitted.</param>
    /// <param name="models">Models of creep and shrinkage that the plan may name.</param>
    /// <param name="cancellation">Stops between joints.</param>
    public static Result Of(Plan plan, CodeBasis basis, Owner? owner, IReadOnlyList<CreepModel> models, CancellationToken cancellation = default)
    {
        var movements = new Movements(plan, basis, owner, models);
        var counting = CountingLayers.Of(plan, basis, owner?.Rules);
        try
        {
            return movements.Compute(counting, cancellation);
        }
        catch (SilentBasisException silent)
        {
            movements.derivation.Note(silent.Finding);
        }
        catch (MechanismException free)
        {
            movements.derivation.Note(Findings.NotHeld(free));
        }
        catch (NotFiniteException broken)
        {
            movements.derivation.Note(new("not-finite", Severity.Error, "", broken.Message));
        }
        return movements.Unfinished(counting);
    }

    private Result Compute(CountingTable counting, CancellationToken cancellation)
    {
        var temperatures = plan.Segments.ToImmutableDictionary(s => s.Id, s => DeckTemperatures.Of(s, plan, basis, derivation));
        var lengths = ExpansionLengths.Of(plan, derivation);
        var segments = plan.Segments.Select(s => new SegmentResult(s, temperatures[s.Id],
            ZeroMovementPoints.Of(s, lengths, id => temperatures[id].Expansion.Value, derivation),
            SectionResult.Of(plan, lengths.Deck.SectionOf(s.Id), temperatures[s.Id], derivation))).ToImmutableArray();
        segments = [.. segments.Select(s => s with { Temperature = s.Temperature with { BestEstimate = s.Section?.EffectiveExpansion } })];
        temperatures = segments.ToImmutableDictionary(s => s.Segment.Id, s => s.Temperature);
        var causes = new FrameCauses(plan, basis, lengths, id => temperatures[id], derivation);
        var checks = new HandCheckedLengths(plan, lengths.Deck, derivation);

        var (byHand, rotations) = (new HandCheckedRotations(plan, lengths.Deck, causes, derivation), new List<HandCheck>());
        strains.Note(derivation);

        var joints = new List<JointResult>();
        foreach (var joint in plan.Joints)
        {
            cancellation.ThrowIfCancellationRequested();
            var byFrame = causes.Of(joint);
            rotations.AddRange(byHand.Of(joint, byFrame));
            joints.Add(new JointCalculation(plan, basis, owner, counting, strains, derivation)
                .Of(joint, checks.Checked(joint, lengths.Of(joint)), id => temperatures[id], byFrame));
        }
        var bearings = plan.Bearings
            .Select(b => BearingTravels.Of(plan, b, lengths.Of(b), id => temperatures[id], SettingTemperatures.Of(b, plan), strains, derivation))
            .OfType<BearingTravel>().ToImmutableArray();
        var restraints = RestraintForces.Of(plan, lengths, id => temperatures[id], strains, derivation);
        Findings.Note(plan, basis, temperatures, [.. checks.All, .. rotations], segments, restraints, derivation);

        return Unfinished(counting) with
        {
            Segments = segments,
            Joints = [.. joints],
            Bearings = bearings,
            Restraints = restraints,
            BearingMovements = BearingMovements.Of(plan, lengths.Deck, causes, derivation),
            Gradients = [.. causes.Gradients.Select(g => (g.Segment.Id, g.Warm, g.Cool))],
            HandChecks = [.. checks.All, .. rotations],
            Model = new ModelListing(lengths.Deck.Model, Math.Max(lengths.Residual, causes.Residual), lengths.Solver.PivotRatio, Math.Max(lengths.RefinementChange, causes.RefinementChange),
                causes.Listed),
            MemoryValues = MemoryValues.Of(derivation.Steps, counting, joints, owner?.Rules),
        };
    }

    private Result Unfinished(CountingTable counting) =>
        new() { Plan = plan, Counting = counting, Strains = strains, Steps = derivation.Steps, Findings = derivation.Findings };
}
