namespace JointPlanner.Engine.Plans;

/// <summary>Kind of support line.</summary>
public enum SupportKind
{
    /// <summary>End of the bridge, with a backwall.</summary>
    Abutment,
    /// <summary>Pier.</summary>
    Pier,
    /// <summary>Tower.</summary>
    Tower,
}

/// <summary>A support line across the deck.</summary>
public sealed record Support
{
    /// <summary>Id in the plan.</summary>
    public required string Id { get; init; }
    /// <summary>What the drawing calls it.</summary>
    public string Mark { get; init; } = "";
    /// <summary>Station, m.</summary>
    public required double Station { get; init; }
    /// <summary>Kind.</summary>
    public required SupportKind Kind { get; init; }
    /// <summary>How it yields along the deck; null for unyielding.</summary>
    public SupportStiffness? Stiffness { get; init; }
    /// <summary>Movement still to come after setting; null where nothing is said of it.</summary>
    public SubstructureMovement? Movement { get; init; }
    /// <summary>Height for the drawing, m; null where not given.</summary>
    public double? Height { get; init; }
}

/// <summary>How a support yields along the deck at bearing level.</summary>
public abstract record SupportStiffness;

/// <summary>A stiffness given directly.</summary>
/// <param name="Value">N/m.</param>
public sealed record GivenStiffness(double Value) : SupportStiffness;

/// <summary>A column free to turn at its top: 1/k = h³/(3EI) + 1/K_h + h²/K_θ.</summary>
/// <param name="Height">h, m.</param>
/// <param name="Modulus">E, Pa.</param>
/// <param name="Inertia">I about the axis across the deck, m⁴.</param>
/// <param name="FoundationAlong">K_h, N/m; null for unyielding.</param>
/// <param name="FoundationTurning">K_θ, N·m/rad; null for unyielding.</param>
public sealed record ColumnStiffness(double Height, double Modulus, double Inertia, double? FoundationAlong, double? FoundationTurning)
    : SupportStiffness;
