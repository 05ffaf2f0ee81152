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
        new("finger-length", Quantity.Size, true, "length of the fingers from root to tip; its direction of measure is that of the fingers") { Measure = Measure.Along };
    internal static readonly FamilyFigure Overlap =
        new("least-overlap", Quantity.Size, true, "least overlap of the fingers, along them, at the coldest") { JudgedBy = Column.GapStrength };
    internal static readonly FamilyFigure Clearance =
        new("least-clearance", Quantity.Opening, true, "least clearance from tip to opposite root, along the fingers, at the hottest") { JudgedBy = Column.GapStrength };
    internal static readonly FamilyFigure Lateral =
        new("lateral-clearance", Quantity.Movement, false, "clear space beside a finger, for movement across the fingers") { JudgedBy = Column.Racking };

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
}
