using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>What is said about families and sizes.</summary>
internal static class FitFindings
{
    public static Finding UnknownFamily(string path, string word) => new("fit-family-unknown", Severity.Error, path,
        $"There is no joint family {Plain(word)}. Families: {string.Join(", ", JointFamilies.All.Select(f => f.Word))}.");

    public static Finding NoSizes(string path, string family) => new("fit-no-sizes", Severity.Error, path,
        $"The owner's rules give no size of the {family}. Add its sizes to the rule set.");

    public static Finding MissingFigures(string path, string family, string size, IEnumerable<FamilyFigure> missing) =>
        new("fit-figures-missing", Severity.Error, path,
            $"The owner's rules for the {family}, size {Plain(size)}, lack {string.Join(" and ", missing.Select(m => $"{m.Word} ({m.Meaning})"))}. Add them to the rule set.");

    public static Finding NoSizeFits(string joint, string family, SizeFit largest) => Rejected("fit-no-size", Severity.Note, joint,
        $"No size of the {family} fits. The largest, {Plain(largest.Size)}, fails by", largest.RejectedBy!);

    public static Finding NoFamilies(string joint) => new("fit-no-families", Severity.BlocksIssue, $"joints/{joint}",
        "No owner's rules with joint families are chosen, so no joint can be sized. Choose a rule set.");

    public static Finding NothingFits(string joint, ImmutableArray<FamilyFit> ranked) => new("fit-nothing", Severity.BlocksIssue, $"joints/{joint}",
        $"None of the joint families that the owner allows fits here: {string.Join(", ", ranked.Select(f => Plain(f.Family)))}. Each one's reason stands with it.");

    public static Finding FamilyNotAllowed(Joint joint, ImmutableArray<FamilyFit> ranked) => new("fit-family-not-allowed", Severity.BlocksIssue,
        $"joints/{joint.Id}/chosen-family",
        $"The owner's rules do not offer {Plain(joint.ChosenFamily)}. They offer: {string.Join(", ", ranked.Select(f => Plain(f.Family)))}.");

    public static Finding SizeNotOffered(Joint joint, FamilyFit family) => new("fit-size-not-offered", Severity.BlocksIssue,
        $"joints/{joint.Id}/chosen-size",
        family.Sizes.IsEmpty
            ? $"No size of {Plain(family.Family)} could be tried; see the owner's rules for it."
            : $"The owner's rules offer no size {Plain(joint.ChosenSize)} of {Plain(family.Family)}. They offer: {string.Join(", ", family.Sizes.Select(s => Plain(s.Size)))}.");

    public static Finding ChoiceDoesNotFit(string joint, SizeFit size, RuleCheck rule) => Rejected("fit-choice-does-not-fit", Severity.BlocksIssue, joint,
        $"The designer's choice, {Plain(size.Family)} {Plain(size.Size)}, does not fit. It fails by", rule);

    /// <summary>The code's bounds that the owner's rules for the family chosen stand in for; null where there are none.</summary>
    public static Finding? CodeLimitsReplaced(string joint, SizeFit size, OwnerRuleSet rules, CodeGapLimits code)
    {
        if (!rules.Families.Any(f => f.Family == size.Family && f.ReplacesCodeLimits)) return null;
        var names = code.SingleGap.Concat(code.PerCell).Select(l => Plain(l.Name)).ToList();
        return names.Count == 0 ? null : new Finding("fit-code-limits-replaced", Severity.Note, $"joints/{joint}",
            $"The owner's limits of {Plain(size.Family)} stand in for the code's: {string.Join("; ", names)}.");
    }

    private static Finding Rejected(string id, Severity severity, string joint, string start, RuleCheck rule) => new(id, severity, $"joints/{joint}",
        $"{start} {Plain(rule.Name)}: the joint asks {{0}}, {{1}} is allowed, {{2}} too much.",
        [(rule.Quantity, rule.Value.Value), (rule.Quantity, rule.Limit.Value), (rule.Quantity, -rule.Room)]);

    /// <summary>Names come from files; braces in them would read as places for numbers.</summary>
    private static string Plain(string name) => name.Replace('{', '(').Replace('}', ')');
}
