using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.CompressionSeals;

/// <summary>A preformed seal held between the joint's edges by its own compression; its limits are shares of its uncompressed width.</summary>
public sealed class CompressionSeal : JointFamily
{
    internal static readonly FamilyFigure Width = new("width", Quantity.Size, true, "uncompressed width of the seal");
    internal static readonly FamilyFigure LeastShare =
        new("least-width-share", Quantity.Ratio, true, "share of its width to which the seal may be compressed") { JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure GreatestShare =
        new("greatest-width-share", Quantity.Ratio, true, "share of its width beyond which the seal no longer presses") { JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure SetShare =
        new("set-width-share", Quantity.Ratio, false, "share of its width at the owner's reference temperature") { Measure = Measure.Normal };
    internal static readonly FamilyFigure RackingShare =
        new("greatest-racking-share", Quantity.Ratio, false, "greatest movement along the joint line as a share of the width") { JudgedBy = Column.Racking };

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
}
