using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.Fingers;

/// <summary>
/// Plates whose fingers reach into each other. Its opening is from the tip of a finger to the opposite root, along the fingers; the
/// fingers lie along the road unless the rule set measures the finger length normal to the joint.
/// </summary>
public sealed class FingerJoint : JointFamily
{
    internal static readonly FamilyFigure Length =
        new("finger-length", Quantity.Size, true, "length of the fingers from root to tip; its direction of measure is that of the fingers")
        { Symbol = "ℓ", Measure = Measure.Along };
    internal static readonly FamilyFigure Overlap =
        new("least-overlap", Quantity.Size, true, "least overlap of the fingers, along them, at the coldest")
        { Symbol = "v_min", JudgedBy = Column.GapStrength };
    internal static readonly FamilyFigure Clearance =
        new("least-clearance", Quantity.Opening, true, "least clearance from tip to opposite root, along the fingers, at the hottest")
        { Symbol = "e_min", JudgedBy = Column.GapStrength };
    internal static readonly FamilyFigure Lateral =
        new("lateral-clearance", Quantity.Movement, false, "clear space beside a finger, for movement across the fingers")
        { Symbol = "e_side", JudgedBy = Column.Racking };

    /// <inheritdoc/>
    public override string Word => "finger";
    /// <inheritdoc/>
    public override string Name => "finger joint";
    /// <inheritdoc/>
    public override IReadOnlyList<FamilyFigure> Figures { get; } =
    [
        Length, Overlap, Clearance, Lateral, CommonFigures.LeastInstallationOpening, CommonFigures.GreatestInstallationOpening,
        CommonFigures.GreatestSkew, CommonFigures.ReferenceOpening,
    ];

    /// <inheritdoc/>
    public override FamilyFigure SizeFigure => Length;

    internal override IEnumerable<Limit> OwnLimits(SizeTrial trial)
    {
        var along = trial.Figures.MeasureOf(Length);
        return
        [
            trial.Limit("least clearance at the tips", Bound.Lower, trial.Figures.Required(Clearance), Clearance, along),
            trial.Limit("greatest opening with overlap", Bound.Upper,
                trial.Use(FingerFormulas.GreatestOpening, trial.Figures.Required(Length), trial.Figures.Required(Overlap)), Overlap, along),
            .. trial.AtInstallation(),
        ];
    }

    /// <summary>A code's bounds on one open gap do not hold for fingers; their overlap bounds the opening.</summary>
    internal override IEnumerable<Limit> CodeLimits(SizeTrial trial) => [];

    internal override IEnumerable<RuleCheck> OtherRules(SizeTrial trial) =>
    [
        // Fingers that lie along the road slide past each other when the deck moves along the road; only fingers set square to the
        // joint line meet sideways on a skew.
        .. trial.Figures.MeasureOf(Length) == Measure.Normal && trial.Figures[Lateral] is { } space
            ? [trial.Racking("movement across the fingers", space, Lateral)]
            : Array.Empty<RuleCheck>(),
        .. trial.Skew(),
    ];

    internal override Number? ReferenceOpening(SizeTrial trial) => trial.Figures[CommonFigures.ReferenceOpening];
}
