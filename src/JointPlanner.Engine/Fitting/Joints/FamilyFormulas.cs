using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>Formulas that several families share.</summary>
public static class FamilyFormulas
{
    private static readonly Operand Skew = new("β", "skew of the joint, signed", Quantity.Angle);
    private static readonly Operand Share = new("s", "share", Quantity.Ratio);
    private static readonly Operand Lower = new("G_1", "lower limit of the gap, normal to the joint", Quantity.Opening);
    private static readonly Operand Upper = new("G_2", "upper limit of the gap, normal to the joint", Quantity.Opening);
    private static readonly Operand Closes = new("C", "how far the joint still closes, normal to it", Quantity.Movement);
    private static readonly Operand Opens = new("O", "how far the joint still opens, normal to it", Quantity.Movement);

    /// <summary>Skew without sign.</summary>
    public static readonly Formula SkewWithoutSign = new(
        "joint.skew-without-sign", "|β|", "skew of the joint, without sign", Quantity.Angle, [Skew], Larger(Skew, 0 - Skew),
        Provenance.Derived("a joint takes skew to either side alike"), new(0.3, 1e-12, "own arithmetic", -0.3));

    /// <summary>Room between two limits.</summary>
    public static readonly Formula MovementAllowed = new(
        "joint.movement-allowed", "m_all", "movement that has room between the two limits, normal to the joint", Quantity.Movement,
        [Upper, Lower], Upper - Lower, Provenance.Derived("a gap that moves between two limits moves by their difference at most"),
        new(0.0889, 1e-9, "own arithmetic", 0.1016, 0.0127));

    /// <summary>Movement between two limits that both hold in service.</summary>
    public static readonly Formula MovementAsked = new(
        "joint.movement-asked", "m", "movement from setting, closing and opening together, normal to the joint", Quantity.Movement,
        [Closes, Opens], Closes + Opens, Provenance.Derived("set anywhere, the gap ranges over its closing and its opening from there"),
        new(0.03, 1e-12, "own arithmetic", 0.01, 0.02));

    /// <summary>A share of the range between two limits.</summary>
    public static readonly Formula ShareOfRange = new(
        "joint.share-of-range", "R_all", "movement along the joint line allowed, a share of the working range", Quantity.Movement,
        [Share, Upper, Lower], Share * (Upper - Lower), Provenance.Derived("the owner's rule gives racking as a share of the working range"),
        new(0.013335, 1e-9, "own arithmetic", 0.15, 0.1016, 0.0127));
}
