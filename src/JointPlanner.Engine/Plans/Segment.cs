using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans;

/// <summary>What the deck is made of, as the codes group decks for temperature.</summary>
public enum DeckKind
{
    /// <summary>Concrete slab, beams or box.</summary>
    Concrete,
    /// <summary>Steel with a concrete deck acting together.</summary>
    Composite,
    /// <summary>Steel.</summary>
    Steel,
}

/// <summary>A deck segment: continuous from one joint to the next.</summary>
public sealed record Segment
{
    /// <summary>Id in the plan.</summary>
    public required string Id { get; init; }
    /// <summary>What the drawing calls it.</summary>
    public string Mark { get; init; } = "";
    /// <summary>Station of its lower end, m.</summary>
    public required double Start { get; init; }
    /// <summary>Station of its upper end, m.</summary>
    public required double End { get; init; }
    /// <summary>Kind of deck.</summary>
    public required DeckKind Kind { get; init; }
    /// <summary>Depth for the drawing, m.</summary>
    public double Depth { get; init; }
    /// <summary>Axial stiffness EA, N.</summary>
    public required double AxialStiffness { get; init; }
    /// <summary>Cross-section; null where only EA is known, and then the segment does not bend in the model.</summary>
    public CrossSection? Section { get; init; }
    /// <summary>Coefficient of thermal expansion for length, 1/K; null for the basis's value.</summary>
    public double? Expansion { get; init; }
    /// <summary>Creep of the whole deck; null where it does not creep.</summary>
    public Shortening? Creep { get; init; }
    /// <summary>Shrinkage; null where it does not shrink.</summary>
    public Shortening? Shrinkage { get; init; }
    /// <summary>Vertical temperature difference; null where it is not described.</summary>
    public Gradient? Gradient { get; init; }
    /// <summary>Dead load still to come after setting; null where nothing is said of it.</summary>
    public DeadLoadToCome? DeadLoad { get; init; }
    /// <summary>Braking force on the segment; null where none is given.</summary>
    public BrakingForce? Braking { get; init; }
    /// <summary>What the deck's concrete is, for a model of creep and shrinkage; null where the strains are the designer's own, or none.</summary>
    public Concrete? Concrete { get; init; }
    /// <summary>Length, m.</summary>
    public double Length => End - Start;
}

/// <summary>A strain that shortens the deck over time, given by the designer with its development.</summary>
/// <param name="Strain">Strain at the end of life, shortening positive.</param>
/// <param name="Source">Where it comes from.</param>
/// <param name="Development">Share already over at deck ages, both rising; linear in the age between points; empty: all of it still to come.</param>
public sealed record Shortening(double Strain, string Source, ImmutableArray<DevelopmentPoint> Development);

/// <summary>Share of a shortening that is over at an age.</summary>
/// <param name="Age">Deck age, s.</param>
/// <param name="Share">Share over, 0 to 1.</param>
public sealed record DevelopmentPoint(double Age, double Share);
