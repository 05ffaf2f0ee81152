using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.Modulars;

/// <summary>Several sealed cells between beams; its opening is face to face of the edge beams, so the centre-beams count in it.</summary>
public sealed class ModularJoint : JointFamily
{
    internal static readonly FamilyFigure Cells = new("cells", Quantity.Count, true, "number of cells");
    internal static readonly FamilyFigure BeamWidth = new("centre-beam-width", Quantity.Size, true, "top width of one centre-beam, normal to the joint");
    internal static readonly FamilyFigure Least =
        new("least-cell-gap", Quantity.Opening, true, "least gap of one cell at the hottest") { JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Greatest =
        new("greatest-cell-gap", Quantity.Opening, true, "greatest gap of one cell at the coldest") { JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Movement =
        new("greatest-cell-movement", Quantity.Movement, false, "greatest movement of one cell, both ways together") { JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Racking =
        new("racking-per-cell", Quantity.Movement, false, "greatest movement of one cell along the joint line") { JudgedBy = Column.Racking };
    internal static readonly FamilyFigure LeastInstallation =
        new("least-installation-cell-gap", Quantity.Opening, false, "least gap of one cell at which a seal can be put in") { Measure = Measure.Normal };
    internal static readonly FamilyFigure GreatestInstallation =
        new("greatest-installation-cell-gap", Quantity.Opening, false, "greatest gap of one cell at which a seal can be put in") { Measure = Measure.Normal };

    /// <inheritdoc/>
    public override string Word => "modular";
    /// <inheritdoc/>
    public override string Name => "modular joint";
    /// <inheritdoc/>
    public override IReadOnlyList<FamilyFigure> Figures { get; } =
    [
        Cells, BeamWidth, Least, Greatest, Movement, Racking, LeastInstallation, GreatestInstallation, CommonFigures.GreatestSkew,
        CommonFigures.ReferenceOpening,
    ];
}
