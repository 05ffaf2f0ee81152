using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Frames;

/// <summary>How much a support yields along the deck at bearing level.</summary>
public static class SupportStiffnesses
{
    private static readonly Operand Height = new("h", "height of the column from foundation to bearing level", Quantity.Length);
    private static readonly Operand Modulus = new("E", "modulus of elasticity of the column", Quantity.Stress);
    private static readonly Operand Inertia = new("I", "second moment of area of the column about the axis across the deck", Quantity.Inertia);
    private static readonly Operand Along = new("K_h", "stiffness of the foundation along the deck", Quantity.Stiffness);
    private static readonly Operand Turning = new("K_θ", "stiffness of the foundation against turning", Quantity.RotationalStiffness);
    private static readonly Operand Part = new("f", "part of the flexibility", Quantity.Flexibility);

    private static readonly Provenance Cantilever = Provenance.Derived("tip of a cantilever on a yielding foundation: 1/k = h³/(3EI) + 1/K_h + h²/K_θ");

    /// <summary>Bending of the column.</summary>
    public static readonly Formula Bending = new(
        "support.column-bending", "f_b", "flexibility of the column by bending", Quantity.Flexibility, [Height, Modulus, Inertia],
        Power(Height, 3) / (3 * Modulus * Inertia), Cantilever, new(1.0 / 90e6, 1e-12, "own arithmetic", 10, 30e9, 1));

    /// <summary>Sliding of the foundation.</summary>
    public static readonly Formula Sliding = new(
        "support.foundation-along", "f_h", "flexibility by displacement of the foundation", Quantity.Flexibility, [Along],
        1 / Along, Cantilever, new(2e-9, 1e-15, "own arithmetic", 5e8));

    /// <summary>Turning of the foundation.</summary>
    public static readonly Formula Tilting = new(
        "support.foundation-turning", "f_θ", "flexibility by turning of the foundation", Quantity.Flexibility, [Height, Turning],
        Power(Height, 2) / Turning, Cantilever, new(1e-8, 1e-14, "own arithmetic", 10, 1e10));

    /// <summary>Stiffness at the top from its parts in series.</summary>
    public static readonly Formula Stiffness = new(
        "support.stiffness", "k", "stiffness of the support along the deck at bearing level", Quantity.Stiffness, [Part],
        1 / Total(Part), Cantilever, new(5e7, 1, "own arithmetic", 1e-8, 1e-8));

    /// <summary>Figures of a column that is built into the deck and so is a member of the frame.</summary>
    public static IEnumerable<Number> ColumnInputs(Support support, ColumnStiffness column, Derivation derivation)
    {
        var path = $"supports/{support.Id}/column";
        yield return derivation.Given($"{path}/height", "h", Height.Meaning, Quantity.Length, column.Height);
        yield return derivation.Given($"{path}/modulus", "E", Modulus.Meaning, Quantity.Stress, column.Modulus);
        yield return derivation.Given($"{path}/inertia", "I", Inertia.Meaning, Quantity.Inertia, column.Inertia);
        if (column.FoundationAlong is { } along)
            yield return derivation.Given($"{path}/foundation-along", "K_h", Along.Meaning, Quantity.Stiffness, along);
        if (column.FoundationTurning is { } turning)
            yield return derivation.Given($"{path}/foundation-turning", "K_θ", Turning.Meaning, Quantity.RotationalStiffness, turning);
    }

    /// <summary>Stiffness as a step; null for an unyielding support.</summary>
    public static Number? Of(Support support, Plan plan, Derivation derivation)
    {
        var path = $"supports/{support.Id}";
        switch (support.Stiffness)
        {
            case null:
                return null;
            case GivenStiffness given:
                return derivation.Given($"{path}/stiffness", "k", $"stiffness of support {support.Id} along the deck", Quantity.Stiffness,
                    given.Value, plan.DefaultReason($"{path}/stiffness"), plan.IsDefault($"{path}/stiffness"));
            case ColumnStiffness c:
                var height = derivation.Given($"{path}/column/height", "h", Height.Meaning, Quantity.Length, c.Height);
                var parts = new List<Number>
                {
                    derivation.Use(Bending, "", height,
                        derivation.Given($"{path}/column/modulus", "E", Modulus.Meaning, Quantity.Stress, c.Modulus),
                        derivation.Given($"{path}/column/inertia", "I", Inertia.Meaning, Quantity.Inertia, c.Inertia)),
                };
                if (c.FoundationAlong is { } along)
                    parts.Add(derivation.Use(Sliding, "",
                        derivation.Given($"{path}/column/foundation-along", "K_h", Along.Meaning, Quantity.Stiffness, along)));
                if (c.FoundationTurning is { } turning)
                    parts.Add(derivation.Use(Tilting, "", height,
                        derivation.Given($"{path}/column/foundation-turning", "K_θ", Turning.Meaning, Quantity.RotationalStiffness, turning)));
                return derivation.Use(Stiffness, Keys.SupportStiffness(support.Id), [.. parts]);
            default:
                throw new InvalidOperationException($"No rule for {support.Stiffness.GetType().Name}.");
        }
    }
}
