using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary>The choice of a joint as text: every family, every size, every rule of the size that counts, and why each other was left.</summary>
/// <param name="profile">Units and digits.</param>
internal sealed class FitText(DisplayProfile profile)
{
    /// <summary>Lines of one joint.</summary>
    public IEnumerable<string> Lines(JointResult joint)
    {
        if (joint.Fit is not { } fit) yield break;
        yield return "  Joint choice";
        yield return fit.Chosen is { } chosen
            ? $"    taken: {chosen.Family}, {chosen.Size}{(fit.ChosenByDesigner ? $", by the designer: {joint.Joint.ChoiceReason}" : "")}"
            : "    taken: none";
        foreach (var family in fit.Families)
        {
            var verdict = family.Best is { } best ? $"fits from size {best.Size}" : "does not fit";
            yield return $"    {family.Family}: {verdict}";
            if (family.Rejection is { } rejection) yield return $"      {FindingText.Of(rejection, profile)}";
            foreach (var size in family.Sizes) yield return $"      {size.Size}: {(size.RejectedBy is { } rule ? $"left, {Why(rule)}" : "fits")}";
            if (Shown(family, fit) is { } shown)
                foreach (var line in Rules(shown)) yield return line;
        }
    }

    /// <summary>The size whose rules are printed in full: the one taken, else the smallest that fits, else the largest.</summary>
    private static SizeFit? Shown(FamilyFit family, JointFit fit) =>
        (fit.Chosen is { } chosen && chosen.Family == family.Family ? chosen : null) ?? family.Best ?? family.Sizes.LastOrDefault();

    private IEnumerable<string> Rules(SizeFit size)
    {
        var table = new TextTable($"rule, size {size.Size}", "#asked", "", "#limit", "#share used", "#room left", "judged", "source");
        foreach (var r in size.Rules)
            table.Add(
                r.Name, Say(r.Value.Value, r.Quantity), r.Bound == Bound.Upper ? "≤" : "≥", Say(r.Limit.Value, r.Quantity),
                r.Share is { } share ? Percent(share) : "", Say(r.Room, r.Quantity), Judged(r), ProvenanceText.Of(r.Source));
        return table.Lines("        ");
    }

    private string Why(RuleCheck rule) =>
        $"{rule.Name}: {Say(rule.Value.Value, rule.Quantity)} asked, {Say(rule.Limit.Value, rule.Quantity)} {(rule.Bound == Bound.Upper ? "at most" : "at least")}";

    private static string Judged(RuleCheck rule)
    {
        var when = rule.IsAtInstallation ? "at installation" : rule.JudgedBy is { } column ? Words.Of(column) : "as it stands";
        return rule.Measure is { } measure ? $"{when}, {Words.Of(measure)}" : when;
    }

    private static string Percent(double share) => NumberText.Join(NumberText.Print(share, Share, 0).Text, "%");

    private string Say(double value, Quantity quantity) => NumberText.WithUnit(value, quantity, profile);

    private static readonly DisplayUnit Share = new(Unit.Percent, Digits.Decimals(0));
}
