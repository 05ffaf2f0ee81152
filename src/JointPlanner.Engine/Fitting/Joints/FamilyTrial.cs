using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>Tries the sizes of one family at one joint, from small to large.</summary>
internal static class FamilyTrial
{
    public static FamilyFit Of(FamilyRules rules, OwnerRuleSet owner, CodeGapLimits code, CountedMovements movements)
    {
        var path = $"owner-rules/families/{rules.Family}";
        if (JointFamilies.Named(rules.Family) is not { } family)
            return new FamilyFit(rules.Family, [], null, FitFindings.UnknownFamily(path, rules.Family));
        if (rules.Sizes.IsEmpty)
            return new FamilyFit(rules.Family, [], null, FitFindings.NoSizes(path, family.Name));
        foreach (var size in rules.Sizes)
        {
            var missing = RuleSetFigures.Missing(family, rules, size).ToList();
            if (missing.Count > 0) return new FamilyFit(rules.Family, [], null, FitFindings.MissingFigures(path, family.Name, size.Name, missing));
        }

        ImmutableArray<SizeFit> sizes = [.. rules.Sizes.Select(s => Try(family, rules, s, owner, code, movements))];
        var best = sizes.FirstOrDefault(s => s.Fits);
        if (best is not null) Note(family, rules, sizes, best, movements);
        return new FamilyFit(rules.Family, sizes, best, best is null ? FitFindings.NoSizeFits(movements.Demand.Joint.Id, family.Name, sizes[^1]) : null);
    }

    private static SizeFit Try(JointFamily family, FamilyRules rules, FamilySize size, OwnerRuleSet owner, CodeGapLimits code, CountedMovements movements)
    {
        var figures = new RuleSetFigures(rules, size, movements.Derivation);
        var trial = new SizeTrial(figures, rules.ReplacesCodeLimits ? CodeGapLimits.None : code, movements, owner.RackingIsTotalRange);
        ImmutableArray<Limit> limits = [.. family.OwnLimits(trial), .. family.CodeLimits(trial)];
        var reference = family.ReferenceOpening(trial);
        var rule = RuleOpening.For(owner.SettingRule, reference);
        Limit? byRule = RuleOpening.At(rule, limits, reference, movements) is { } opening
            ? new Limit("opening by the owner's rule", opening, Bound.Lower, Measure.Normal, null, owner.Source)
            : null;
        ImmutableArray<RuleCheck> checks = [.. GapRules.Of(limits, byRule, movements), .. family.OtherRules(trial)];
        var columns = limits.Select(l => l.JudgedBy).Concat(checks.Select(c => c.JudgedBy)).OfType<Column>().Distinct();
        return new SizeFit(family.Word, size.Name, checks, limits, reference) { Movements = [.. columns.Select(movements.In)] };
    }

    /// <summary>The choice of size as a step: which were tried, and which rule rejected each.</summary>
    private static void Note(JointFamily family, FamilyRules rules, ImmutableArray<SizeFit> sizes, SizeFit best, CountedMovements movements)
    {
        if (!movements.Derivation.KeepsSteps) return;
        var figure = new RuleSetFigures(rules, rules.Sizes[sizes.IndexOf(best)], movements.Derivation).Required(family.SizeFigure);
        movements.Derivation.Search(Keys.FamilySize(movements.Demand.Joint.Id, family.Word), family.SizeFigure.Symbol,
            $"smallest size of the {family.Name} that fits: {best.Size}", family.SizeFigure.Quantity, figure.Value,
            [.. sizes.TakeWhile(s => s != best).Append(best).Select(s => new Candidate(s.Size, s.RejectedBy?.Name ?? ""))],
            [figure, .. best.Rules.SelectMany(r => new[] { r.Value, r.Limit })]);
    }
}
