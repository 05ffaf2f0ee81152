using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints.Modulars;

/// <summary>From one cell to the whole joint: n cells have n − 1 centre-beams between them.</summary>
public static class CellFormulas
{
    private static readonly Operand Cells = new("n", "number of cells", Quantity.Count);
    private static readonly Operand Gap = new("g", "gap of one cell, normal to the joint", Quantity.Opening);
    private static readonly Operand Along = new("g_W", "gap of one cell, along the road", Quantity.Opening);
    private static readonly Operand Cos = new("cos β", "cosine of the skew", Quantity.Ratio);
    private static readonly Operand Beam = new("b", "top width of one centre-beam, normal to the joint", Quantity.Size);
    private static readonly Operand Each = new("m_cell", "movement of one cell, normal to the joint", Quantity.Movement);
    private static readonly Operand EachAlong = new("m_W", "movement of one cell, along the road", Quantity.Movement);
    private static readonly Operand Racking1 = new("R_cell", "movement of one cell along the joint line", Quantity.Movement);

    private static readonly Provenance FaceToFace = Provenance.Derived("face to face of the edge beams = all gaps and the centre-beams between them");
    private static readonly Provenance Shared = Provenance.Derived("the cells share the movement evenly");

    /// <summary>Opening of the joint from the normal gap of one cell.</summary>
    public static readonly Formula OpeningFromNormalGap = new(
        "modular.opening-from-normal-gap", "G", "opening face to face of the edge beams, normal to the joint", Quantity.Opening,
        [Cells, Gap, Beam], (Cells * Gap) + ((Cells - 1) * Beam), FaceToFace, new(0.3556, 1e-9, "own arithmetic: 3 · 3 in + 2 · 2.5 in", 3, 0.0762, 0.0635));

    /// <summary>Opening of the joint from the gap of one cell along the road.</summary>
    public static readonly Formula OpeningFromGapAlong = new(
        "modular.opening-from-gap-along", "G", "opening face to face of the edge beams, normal to the joint", Quantity.Opening,
        [Cells, Along, Cos, Beam], (Cells * Along * Cos) + ((Cells - 1) * Beam), FaceToFace,
        new(0.33274, 1e-9, "own arithmetic: 3 · 3 in · 0.9 + 2 · 2.5 in", 3, 0.0762, 0.9, 0.0635));

    /// <summary>Movement of all cells from the normal movement of one.</summary>
    public static readonly Formula MovementFromNormal = new(
        "modular.movement-from-normal", "m_all", "movement of all cells together, normal to the joint", Quantity.Movement,
        [Cells, Each], Cells * Each, Shared, new(0.24, 1e-9, "own arithmetic", 3, 0.08));

    /// <summary>Movement of all cells from the movement of one along the road.</summary>
    public static readonly Formula MovementFromAlong = new(
        "modular.movement-from-along", "m_all", "movement of all cells together, normal to the joint", Quantity.Movement,
        [Cells, EachAlong, Cos], Cells * EachAlong * Cos, Shared, new(0.216, 1e-9, "own arithmetic", 3, 0.08, 0.9));

    /// <summary>Racking of all cells.</summary>
    public static readonly Formula Racking = new(
        "modular.racking", "R_all", "movement along the joint line that all cells take together", Quantity.Movement,
        [Cells, Racking1], Cells * Racking1, Shared, new(0.06, 1e-9, "own arithmetic", 3, 0.02));
}
