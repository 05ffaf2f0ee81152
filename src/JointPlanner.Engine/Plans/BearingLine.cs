namespace JointPlanner.Engine.Plans;

/// <summary>What a line of bearings does along the deck.</summary>
public enum BearingKind
{
    /// <summary>Holds the deck to what is below.</summary>
    Fixed,
    /// <summary>Slides; friction is not counted yet, and that is a finding.</summary>
    Free,
    /// <summary>Shears: stiffness G·A/T_e per pad.</summary>
    Elastomeric,
    /// <summary>No bearing: a column is built into the deck.</summary>
    Monolithic,
}

/// <summary>The bearings of one segment on one support, acting in parallel, or on a segment that carries it.</summary>
public sealed record BearingLine
{
    /// <summary>Id in the plan.</summary>
    public required string Id { get; init; }
    /// <summary>What the drawing calls it.</summary>
    public string Mark { get; init; } = "";
    /// <summary>The segment it carries.</summary>
    public required string Segment { get; init; }
    /// <summary>Id of the support it stands on, or of the segment that carries this one.</summary>
    public required string On { get; init; }
    /// <summary>Station of the line, m.</summary>
    public required double Station { get; init; }
    /// <summary>What it does along the deck.</summary>
    public required BearingKind Kind { get; init; }
    /// <summary>Depth of the line's own level below the top of the section, m; null for that of the section.</summary>
    public double? Depth { get; init; }
    /// <summary>The pads of an elastomeric line; null for others.</summary>
    public Pads? Pads { get; init; }
    /// <summary>Temperature at which upper and lower parts were tied at zero shear, °C; null: as the joints (steel decks only).</summary>
    public double? SettingTemperature { get; init; }
    /// <summary>Age of the deck then, s; null where the deck does not shorten.</summary>
    public double? SettingAge { get; init; }
}

/// <summary>Elastomeric pads of one bearing line.</summary>
/// <param name="Count">Number of pads.</param>
/// <param name="ShearModulus">G, Pa.</param>
/// <param name="PlanArea">A of one pad, m².</param>
/// <param name="ElastomerThickness">T_e, all elastomer in shear, m.</param>
public sealed record Pads(int Count, double ShearModulus, double PlanArea, double ElastomerThickness);
