using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.StripSeals;

/// <summary>A folded strip held in two edge rails; its limits are openings between the rails.</summary>
public sealed class StripSeal : JointFamily
{
    internal static readonly FamilyFigure Least =
        new("least-opening", Quantity.Opening, true, "least opening at the hottest")
        { Symbol = "G_min", JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Greatest =
        new("greatest-opening", Quantity.Opening, true, "greatest opening at the coldest")
        { Symbol = "G_max", JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure RackingShare =
        new("greatest-racking-share", Quantity.Ratio, false, "greatest movement along the joint line as a share of greatest less least opening")
        { Symbol = "s_R", JudgedBy = Column.Racking };

    /// <inheritdoc/>
    public override string Word => "strip-seal";
    /// <inheritdoc/>
    public override string Name => "strip seal";
    /// <inheritdoc/>
    public override IReadOnlyList<FamilyFigure> Figures { get; } =
    [
        Least, Greatest, CommonFigures.LeastInstallationOpening, CommonFigures.GreatestInstallationOpening,
        CommonFigures.GreatestRacking, RackingShare, CommonFigures.GreatestSkew, CommonFigures.ReferenceOpening,
    ];

    /// <inheritdoc/>
    public override FamilyFigure SizeFigure => Greatest;

    internal override IEnumerable<Limit> OwnLimits(SizeTrial trial) =>
    [
        trial.Limit("least opening", Bound.Lower, trial.Figures.Required(Least), Least),
        trial.Limit("greatest opening", Bound.Upper, trial.Figures.Required(Greatest), Greatest),
        .. trial.AtInstallation(),
    ];

    internal override IEnumerable<Limit> CodeLimits(SizeTrial trial) => trial.Code.SingleGap;

    internal override IEnumerable<RuleCheck> OtherRules(SizeTrial trial) =>
    [
        .. trial.Racking(CommonFigures.GreatestRacking),
        .. trial.Figures[RackingShare] is { } share
            ? [trial.Racking("racking as a share of the range",
                trial.Use(FamilyFormulas.ShareOfRange, share, trial.Figures.Required(Greatest), trial.Figures.Required(Least)), RackingShare)]
            : Array.Empty<RuleCheck>(),
        .. trial.Skew(),
    ];

    internal override Number? ReferenceOpening(SizeTrial trial) => trial.Figures[CommonFigures.ReferenceOpening];
}
