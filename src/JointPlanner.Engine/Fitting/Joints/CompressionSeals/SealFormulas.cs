using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.CompressionSeals;

/// <summary>Limits of a seal as shares of its uncompressed width.</summary>
public static class SealFormulas
{
    private static readonly Operand Share = new("s", "share of the uncompressed width", Quantity.Ratio);
    private static readonly Operand Width = new("W", "uncompressed width of the seal", Quantity.Size);

    private static readonly Provenance OfWidth = Provenance.Derived("the owner's rule gives limits of the seal as shares of its uncompressed width");

    /// <summary>An opening as a share of the width.</summary>
    public static readonly Formula OpeningByShare = new(
        "compression-seal.opening-by-share", "G", "opening at that share of the seal's width, normal to the joint", Quantity.Opening,
        [Share, Width], Share * Width, OfWidth, new(0.04572, 1e-9, "own arithmetic: 0.60 of 3 in", 0.60, 0.0762));

    /// <summary>Racking as a share of the width.</summary>
    public static readonly Formula RackingByShare = new(
        "compression-seal.racking-by-share", "R_all", "movement along the joint line allowed, a share of the seal's width", Quantity.Movement,
        [Share, Width], Share * Width, OfWidth, new(0.016764, 1e-9, "own arithmetic: 0.22 of 3 in", 0.22, 0.0762));
}
