using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.CompressionSeals;

/// <summary>A preformed seal held between the joint's edges by its own compression; its limits are shares of its uncompressed width.</summary>
public sealed class CompressionSeal : JointFamily
{
    internal static readonly FamilyFigure Width =
        new("width", Quantity.Size, true, "uncompressed width of the seal") { Symbol = "W" };
    internal static readonly FamilyFigure LeastShare =
        new("least-width-share", Quantity.Ratio, true, "share of its width to which the seal may be compressed")
        { Symbol = "s_min", JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure GreatestShare =
        new("greatest-width-share", Quantity.Ratio, true, "share of its width beyond which the seal no longer presses")
        { Symbol = "s_max", JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure SetShare =
        new("set-width-share", Quantity.Ratio, false, "share of its width at the owner's reference temperature")
        { Symbol = "s_ref", Measure = Measure.Normal };
    internal static readonly FamilyFigure RackingShare =
        new("greatest-racking-share", Quantity.Ratio, false, "greatest movement along the joint line as a share of the width")
        { Symbol = "s_R", JudgedBy = Column.Racking };

    /// <inheritdoc/>
    public override string Word => "compression-seal";
    /// <inheritdoc/>
    public override string Name => "compression seal";
    /// <inheritdoc/>
    public override IReadOnlyList<FamilyFigure> Figures { get; } =
    [
        Width, LeastShare, GreatestShare, SetShare, RackingShare, CommonFigures.GreatestRacking, CommonFigures.GreatestSkew,
        CommonFigures.LeastInstallationOpening, CommonFigures.GreatestInstallationOpening,
    ];

    /// <inheritdoc/>
    public override FamilyFigure SizeFigure => Width;

    internal override IEnumerable<Limit> OwnLimits(SizeTrial trial)
    {
        var width = trial.Figures.Required(Width);
        return
        [
            trial.Limit("least seal width", Bound.Lower, trial.Use(SealFormulas.OpeningByShare, trial.Figures.Required(LeastShare), width), LeastShare),
            trial.Limit("greatest seal width", Bound.Upper, trial.Use(SealFormulas.OpeningByShare, trial.Figures.Required(GreatestShare), width), GreatestShare),
            .. trial.AtInstallation(),
        ];
    }

    internal override IEnumerable<Limit> CodeLimits(SizeTrial trial) => trial.Code.SingleGap;

    internal override IEnumerable<RuleCheck> OtherRules(SizeTrial trial) =>
    [
        .. trial.Figures[RackingShare] is { } share
            ? [trial.Racking("racking as a share of the width", trial.Use(SealFormulas.RackingByShare, share, trial.Figures.Required(Width)), RackingShare)]
            : Array.Empty<RuleCheck>(),
        .. trial.Racking(CommonFigures.GreatestRacking),
        .. trial.Skew(),
    ];

    internal override Number? ReferenceOpening(SizeTrial trial) =>
        trial.Figures[SetShare] is { } share ? trial.Use(SealFormulas.OpeningByShare, share, trial.Figures.Required(Width)) : null;
}
