using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.HandChecks;

/// <summary>End rotation of one simply supported span, and what it does at the joint beside its fixed bearing: θ·h.</summary>
public static class EndRotationByHand
{
    private static readonly Operand Curvature = new("κ", "curvature, positive when the underside lengthens", Quantity.Curvature);
    private static readonly Operand Start = new("x_1", "station of the lower bearing line", Quantity.Length);
    private static readonly Operand End = new("x_2", "station of the upper bearing line", Quantity.Length);
    private static readonly Operand Load = new("g", "load per length", Quantity.LineLoad);
    private static readonly Operand Bending = new("EI", "bending stiffness", Quantity.BendingStiffness);
    private static readonly Operand Rotation = new("θ", "rotation of the end, sagging positive", Quantity.Rotation);
    private static readonly Operand Height = new("h", "height of the road surface above bearing level", Quantity.Size);

    private static readonly Provenance Span = Provenance.Derived("elementary beam theory of one simply supported span");

    /// <summary>By curvature: κL/2.</summary>
    public static readonly Formula ByCurvature = new("hand.end-rotation-by-curvature", "θ", "rotation of the end by curvature, by hand", Quantity.Rotation,
        [Curvature, End, Start], Curvature * (End - Start) / 2, Span, new(1.6667e-3, 0.0005e-3, "own arithmetic: 15 K over 1.8 m at 10 millionths, 40 m", 15e-5 / 1.8, 40, 0));

    /// <summary>By a load over the whole span: wL³/(24EI).</summary>
    public static readonly Formula ByLoad = new("hand.end-rotation-by-load", "θ", "rotation of the end by a load over the whole span, by hand", Quantity.Rotation,
        [Load, End, Start, Bending], Load * Power(End - Start, 3) / (24 * Bending), Span, new(2.540e-3, 0.0005e-3, "own arithmetic", 10e3, 40, 0, 1.05e10));

    /// <summary>θ·h at the fixed bearing: a sagging span opens the joint.</summary>
    public static readonly Formula Opening = new("hand.rotation-opening", "Δ", "opening at road-surface level beside the fixed bearing, by hand", Quantity.Movement,
        [Rotation, Height], Rotation * Height, Provenance.Derived("the end turns about its bearing"), new(4.572e-3, 1e-6, "own arithmetic", 2.540e-3, 1.8));
}
