using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.StripSeals;

/// <summary>A folded strip held in two edge rails; its limits are openings between the rails.</summary>
public sealed class StripSeal : JointFamily
{
    internal static readonly FamilyFigure Least =
        new("least-opening", Quantity.Opening, true, "least opening at the hottest") { JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Greatest =
        new("greatest-opening", Quantity.Opening, true, "greatest opening at the coldest") { JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure RackingShare =
        new("greatest-racking-share", Quantity.Ratio, false, "greatest movement along the joint line as a share of greatest less least opening") { JudgedBy = Column.Racking };

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
}
