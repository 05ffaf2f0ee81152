using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans;

/// <summary>Surface of the deck, as codes ask for it with temperature differences.</summary>
public enum DeckSurface
{
    /// <summary>Bare deck.</summary>
    Bare,
    /// <summary>Dark waterproofing without surfacing.</summary>
    Waterproofed,
    /// <summary>Surfaced; how thick, the section says.</summary>
    Surfaced,
}

/// <summary>Shape of a concrete deck, as codes ask for it with temperature differences.</summary>
public enum DeckShape
{
    /// <summary>Box.</summary>
    Box,
    /// <summary>Beams or slab.</summary>
    BeamsOrSlab,
}

/// <summary>Vertical temperature difference of a segment: given as profiles, or by the basis.</summary>
public sealed record Gradient
{
    /// <summary>Profile while the deck is warmer above; empty for that of the basis.</summary>
    public ImmutableArray<GradientPoint> Warm { get; init; } = [];
    /// <summary>Profile while it is cooler above; empty for that of the basis.</summary>
    public ImmutableArray<GradientPoint> Cool { get; init; } = [];
    /// <summary>Where given profiles come from.</summary>
    public string Source { get; init; } = "";
    /// <summary>Zone of solar warming in the basis's word; empty where not used.</summary>
    public string Zone { get; init; } = "";
    /// <summary>Surface of the deck.</summary>
    public DeckSurface Surface { get; init; } = DeckSurface.Surfaced;
    /// <summary>Shape of a concrete deck.</summary>
    public DeckShape Shape { get; init; } = DeckShape.BeamsOrSlab;

    /// <summary>True where the profiles are given.</summary>
    public bool IsGiven => !Warm.IsEmpty && !Cool.IsEmpty;
}

/// <summary>A point of a temperature profile.</summary>
/// <param name="Depth">Depth below the top of the section, m.</param>
/// <param name="Difference">Above the uniform part, K.</param>
public sealed record GradientPoint(double Depth, double Difference);

/// <summary>A load per length of deck that is still to be placed after the joint is set: surfacing, barriers.</summary>
/// <param name="Value">N/m, downward positive.</param>
/// <param name="Source">Where it comes from.</param>
public sealed record DeadLoadToCome(double Value, string Source);

/// <summary>A braking force on a segment at road-surface level; it acts either way.</summary>
/// <param name="Force">N.</param>
/// <param name="Source">Where it comes from.</param>
public sealed record BrakingForce(double Force, string Source);

/// <summary>Movement of a support that is still to come after joints and bearings are set.</summary>
/// <param name="Settlement">m, downward positive.</param>
/// <param name="Along">Of bearing level while nothing pushes the support, m, positive up-station: translation, pavement and embankment push.</param>
/// <param name="Tilt">About bearing level, rad, positive when the support leans up-station.</param>
/// <param name="Source">Where it comes from.</param>
public sealed record SubstructureMovement(double Settlement, double Along, double Tilt, string Source);
