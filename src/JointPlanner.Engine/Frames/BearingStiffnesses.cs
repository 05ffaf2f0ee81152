using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Frames;

/// <summary>Shear stiffness of a line of elastomeric bearings.</summary>
public static class BearingStiffnesses
{
    private static readonly Operand Count = new("n", "number of pads in the line", Quantity.Count);
    private static readonly Operand Modulus = new("G", "shear modulus of the elastomer, static", Quantity.Stress);
    private static readonly Operand Area = new("A", "plan area of one pad", Quantity.PlanArea);
    private static readonly Operand Thickness = new("T_e", "thickness of all elastomer in shear", Quantity.Size);

    /// <summary>Pads in parallel.</summary>
    public static readonly Formula PadLine = new(
        "bearing.pad-line-stiffness", "k", "shear stiffness of the line of pads", Quantity.Stiffness, [Count, Modulus, Area, Thickness],
        Count * Modulus * Area / Thickness, Provenance.Derived("simple shear of the elastomer: force = G·A·movement/T_e, pads in parallel"),
        new(7.2e6, 1, "own arithmetic", 4, 0.9e6, 0.12, 0.06));

    /// <summary>Stiffness as a step.</summary>
    /// <exception cref="InvalidOperationException">The line has no pads; the plan was not accepted.</exception>
    public static Number Of(BearingLine bearing, Derivation derivation)
    {
        var pads = bearing.Pads ?? throw new InvalidOperationException($"Bearing line {bearing.Id} has no pads.");
        var path = $"bearings/{bearing.Id}/pads";
        return derivation.Use(PadLine, Keys.BearingStiffness(bearing.Id),
            derivation.Given($"{path}/count", Count.Symbol, Count.Meaning, Count.Quantity, pads.Count),
            derivation.Given($"{path}/shear-modulus", Modulus.Symbol, Modulus.Meaning, Modulus.Quantity, pads.ShearModulus),
            derivation.Given($"{path}/plan-area", Area.Symbol, Area.Meaning, Area.Quantity, pads.PlanArea),
            derivation.Given($"{path}/elastomer-thickness", Thickness.Symbol, Thickness.Meaning, Thickness.Quantity, pads.ElastomerThickness));
    }
}
