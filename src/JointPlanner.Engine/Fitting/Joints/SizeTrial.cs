using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>One size of a family tried at one joint: its figures, what the joint asks, and how a rule is written down.</summary>
/// <param name="Figures">Figures of the size.</param>
/// <param name="Code">The code's bounds on gaps; none where the owner's rules replace them.</param>
/// <param name="Movements">What the joint asks, counted for sizing.</param>
/// <param name="RackingIsTotalRange">How the owner judges racking.</param>
internal sealed record SizeTrial(RuleSetFigures Figures, CodeGapLimits Code, CountedMovements Movements, bool RackingIsTotalRange)
{
    private Derivation Derivation => Movements.Derivation;

    /// <summary>One use of a formula.</summary>
    public Number Use(Formula formula, params Number[] operands) => Derivation.Use(formula, "", operands);

    /// <summary>A bound on the gap that rests on a figure, with the figure's column, direction and source.</summary>
    public Limit Limit(string name, Bound bound, Number value, FamilyFigure figure, Measure? measure = null) =>
        new(name, value, bound, measure ?? Figures.MeasureOf(figure), Figures.JudgedBy(figure), Figures.SourceOf(figure));

    /// <summary>A figure that is itself a bound on the gap; nothing where the rule set does not give it.</summary>
    public IEnumerable<Limit> Given(string name, Bound bound, FamilyFigure figure) =>
        Figures[figure] is { } value ? [Limit(name, bound, value, figure)] : [];

    /// <summary>The bounds at installation that every family with one gap may have.</summary>
    public IEnumerable<Limit> AtInstallation() =>
    [
        .. Given("least installation opening", Bound.Lower, CommonFigures.LeastInstallationOpening),
        .. Given("greatest installation opening", Bound.Upper, CommonFigures.GreatestInstallationOpening),
    ];

    /// <summary>A value that must not exceed a limit.</summary>
    public static RuleCheck AtMost(
        string name, Quantity quantity, Number value, Number limit, Measure? measure, Column? judgedBy, bool isAtInstallation, Provenance source) =>
        new(name, quantity, value, limit, Bound.Upper, measure, judgedBy, isAtInstallation,
            limit.Value > 0 ? value.Value / limit.Value : null, limit.Value - value.Value, source);

    /// <summary>Movement along the joint line against what the size takes.</summary>
    public RuleCheck Racking(string name, Number limit, FamilyFigure figure) =>
        AtMost(name, Quantity.Movement, Movements.Racking(RackingIsTotalRange).Demand, limit, null, Column.Racking, false, Figures.SourceOf(figure));

    /// <summary>The racking rule of a figure that is itself the limit; nothing where the rule set does not give it.</summary>
    public IEnumerable<RuleCheck> Racking(FamilyFigure figure) =>
        Figures[figure] is { } limit ? [Racking("racking", limit, figure)] : [];

    /// <summary>The skew rule; nothing where the rule set gives no limit.</summary>
    public IEnumerable<RuleCheck> Skew()
    {
        if (Figures[CommonFigures.GreatestSkew] is not { } limit) return [];
        var joint = Movements.Demand.Joint;
        var skew = Derivation.Given($"joints/{joint.Id}/skew", "β", $"skew of joint {joint.Id}", Quantity.Angle, joint.Skew);
        return [AtMost("skew", Quantity.Angle, Use(FamilyFormulas.SkewWithoutSign, skew), limit, null, null, false, Figures.SourceOf(CommonFigures.GreatestSkew))];
    }
}
