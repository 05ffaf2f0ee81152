using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.Modulars;

/// <summary>Several sealed cells between beams; its opening is face to face of the edge beams, so the centre-beams count in it.</summary>
public sealed class ModularJoint : JointFamily
{
    internal static readonly FamilyFigure Cells =
        new("cells", Quantity.Count, true, "number of cells") { Symbol = "n" };
    internal static readonly FamilyFigure BeamWidth =
        new("centre-beam-width", Quantity.Size, true, "top width of one centre-beam, normal to the joint") { Symbol = "b" };
    internal static readonly FamilyFigure Least =
        new("least-cell-gap", Quantity.Opening, true, "least gap of one cell at the hottest")
        { Symbol = "g_min", JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Greatest =
        new("greatest-cell-gap", Quantity.Opening, true, "greatest gap of one cell at the coldest")
        { Symbol = "g_max", JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Movement =
        new("greatest-cell-movement", Quantity.Movement, false, "greatest movement of one cell, both ways together")
        { Symbol = "m_max", JudgedBy = Column.SealRange, Measure = Measure.Normal };
    internal static readonly FamilyFigure Racking =
        new("racking-per-cell", Quantity.Movement, false, "greatest movement of one cell along the joint line")
        { Symbol = "R_cell", JudgedBy = Column.Racking };
    internal static readonly FamilyFigure LeastInstallation =
        new("least-installation-cell-gap", Quantity.Opening, false, "least gap of one cell at which a seal can be put in")
        { Symbol = "g_i,min", Measure = Measure.Normal };
    internal static readonly FamilyFigure GreatestInstallation =
        new("greatest-installation-cell-gap", Quantity.Opening, false, "greatest gap of one cell at which a seal can be put in")
        { Symbol = "g_i,max", Measure = Measure.Normal };

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

    /// <inheritdoc/>
    public override FamilyFigure SizeFigure => Cells;

    internal override IEnumerable<Limit> OwnLimits(SizeTrial trial) =>
    [
        .. Opening(trial, "least cell gap", Bound.Lower, Least),
        .. Opening(trial, "greatest cell gap", Bound.Upper, Greatest),
        .. Opening(trial, "least installation cell gap", Bound.Lower, LeastInstallation),
        .. Opening(trial, "greatest installation cell gap", Bound.Upper, GreatestInstallation),
    ];

    internal override IEnumerable<Limit> CodeLimits(SizeTrial trial) =>
        trial.Code.PerCell.Select(l => l with { Value = Opening(trial, l.Value, l.Measure), Measure = Measure.Normal });

    internal override IEnumerable<RuleCheck> OtherRules(SizeTrial trial) =>
    [
        .. CellMovement(trial),
        .. trial.Figures[Racking] is { } each
            ? [trial.Racking("racking of all cells", trial.Use(CellFormulas.Racking, trial.Figures.Required(Cells), each), Racking)]
            : Array.Empty<RuleCheck>(),
        .. trial.Skew(),
    ];

    internal override Number? ReferenceOpening(SizeTrial trial) => trial.Figures[CommonFigures.ReferenceOpening];

    private static IEnumerable<Limit> Opening(SizeTrial trial, string name, Bound bound, FamilyFigure figure) => trial.Figures[figure] is { } gap
        ? [trial.Limit(name, bound, Opening(trial, gap, trial.Figures.MeasureOf(figure)), figure, Measure.Normal)]
        : [];

    private static Number Opening(SizeTrial trial, Number gap, Measure measure)
    {
        var cells = trial.Figures.Required(Cells);
        var beam = trial.Figures.Required(BeamWidth);
        return measure == Measure.Normal
            ? trial.Use(CellFormulas.OpeningFromNormalGap, cells, gap, beam)
            : trial.Use(CellFormulas.OpeningFromGapAlong, cells, gap, trial.Movements.Demand.CosSkew, beam);
    }

    private static RuleCheck[] CellMovement(SizeTrial trial)
    {
        if (trial.Figures[Movement] is not { } each || trial.Figures.JudgedBy(Movement) is not { } column) return [];
        var asked = trial.Movements.In(column);
        var cells = trial.Figures.Required(Cells);
        var allowed = trial.Figures.MeasureOf(Movement) == Measure.Normal
            ? trial.Use(CellFormulas.MovementFromNormal, cells, each)
            : trial.Use(CellFormulas.MovementFromAlong, cells, each, trial.Movements.Demand.CosSkew);
        return
        [
            SizeTrial.AtMost("movement of all cells", Quantity.Movement, trial.Use(FamilyFormulas.MovementAsked, asked.ClosesBy, asked.OpensBy), allowed,
                Measure.Normal, column, false, trial.Figures.SourceOf(Movement)),
        ];
    }
}
