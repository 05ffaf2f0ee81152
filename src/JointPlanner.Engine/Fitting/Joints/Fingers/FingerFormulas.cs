using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.Fingers;

/// <summary>Geometry of fingers that reach into each other.</summary>
public static class FingerFormulas
{
    private static readonly Operand Length = new("ℓ", "length of the fingers from root to tip", Quantity.Size);
    private static readonly Operand Overlap = new("v_min", "least overlap of the fingers", Quantity.Size);

    /// <summary>Opening at which the least overlap is left.</summary>
    public static readonly Formula GreatestOpening = new(
        "finger.greatest-opening", "G_max", "opening from tip to opposite root at which the least overlap is left, along the fingers", Quantity.Opening,
        [Length, Overlap], Length - Overlap,
        Provenance.Derived("root to root is opening + ℓ and the two fingers are 2ℓ long, so they overlap by ℓ − opening"),
        new(0.262, 1e-9, "own arithmetic", 0.3, 0.038));
}
