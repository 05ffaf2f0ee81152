using System.Collections.Immutable;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>Which of the sizes tried is taken: the designer's choice, kept even where it does not fit, else the first family's smallest that fits.</summary>
internal static class JointChoice
{
    public static (SizeFit? Chosen, bool ByDesigner) Among(ImmutableArray<FamilyFit> ranked, JointDemand demand, Derivation derivation)
    {
        var joint = demand.Joint;
        if (ranked.IsEmpty)
        {
            derivation.Note(FitFindings.NoFamilies(joint.Id));
            return (null, false);
        }

        if (joint.ChosenFamily.Length > 0) return (Designers(ranked, demand, derivation), true);
        var best = ranked[0].Best;
        if (best is null) derivation.Note(FitFindings.NothingFits(joint.Id, ranked));
        return (best, false);
    }

    private static SizeFit? Designers(ImmutableArray<FamilyFit> ranked, JointDemand demand, Derivation derivation)
    {
        var joint = demand.Joint;
        var family = ranked.FirstOrDefault(f => f.Family == joint.ChosenFamily);
        if (family is null)
        {
            derivation.Note(FitFindings.FamilyNotAllowed(joint, ranked));
            return null;
        }

        var size = joint.ChosenSize.Length > 0
            ? family.Sizes.FirstOrDefault(s => s.Size == joint.ChosenSize)
            : family.Best ?? family.Sizes.LastOrDefault();
        if (size is null) derivation.Note(FitFindings.SizeNotOffered(joint, family));
        else if (size.RejectedBy is { } rule) derivation.Note(FitFindings.ChoiceDoesNotFit(joint.Id, size, rule));
        return size;
    }
}
