using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans;

/// <summary>How quickly the cement hardens.</summary>
public enum CementClass
{
    /// <summary>Slowly.</summary>
    Slow,
    /// <summary>Normally.</summary>
    Normal,
    /// <summary>Rapidly.</summary>
    Rapid,
}

/// <summary>How the concrete was cured.</summary>
public enum Curing
{
    /// <summary>Kept moist.</summary>
    Moist,
    /// <summary>By steam.</summary>
    Steam,
}

/// <summary>The concrete of a deck as models of creep and shrinkage ask for it. Ages count from concreting.</summary>
public sealed record Concrete
{
    /// <summary>Id of the model; empty for the basis's own.</summary>
    public string Model { get; init; } = "";
    /// <summary>Where the description comes from.</summary>
    public required string Source { get; init; }
    /// <summary>Strength at 28 days as the model defines it (characteristic or specified cylinder strength), Pa.</summary>
    public required double Strength { get; init; }
    /// <summary>Strength class that the strength was read from; empty where the strength itself is given.</summary>
    public string StrengthClass { get; init; } = "";
    /// <summary>Strength when prestress is put on, Pa; null where the model's share of the strength is taken.</summary>
    public double? TransferStrength { get; init; }
    /// <summary>Modulus as the model defines it, Pa; null where the model's own formula gives it.</summary>
    public double? Modulus { get; init; }
    /// <summary>Cement.</summary>
    public CementClass Cement { get; init; } = CementClass.Normal;
    /// <summary>Curing.</summary>
    public Curing Curing { get; init; } = Curing.Moist;
    /// <summary>Age at which curing ends and drying begins, s.</summary>
    public required double CuringEnd { get; init; }
    /// <summary>Relative humidity of the air round the deck, 0 to 1.</summary>
    public required double Humidity { get; init; }
    /// <summary>Thickness from which the concrete dries, as it was given.</summary>
    public required ConcreteSize Size { get; init; }
    /// <summary>Age at which the movement still to come is over, s.</summary>
    public required double EndOfLife { get; init; }
    /// <summary>Mean axial stresses put on the deck; empty where the description serves shrinkage alone.</summary>
    public ImmutableArray<StressStage> Stages { get; init; } = [];
}

/// <summary>How thick a concrete is for drying.</summary>
public abstract record ConcreteSize;

/// <summary>From the section.</summary>
/// <param name="Area">Area of the concrete, m².</param>
/// <param name="Perimeter">Perimeter in contact with air, m.</param>
public sealed record SectionSize(double Area, double Perimeter) : ConcreteSize;

/// <summary>As twice area over exposed perimeter.</summary>
/// <param name="Value">m.</param>
public sealed record NotionalSize(double Value) : ConcreteSize;

/// <summary>As area over exposed perimeter, which is volume over surface.</summary>
/// <param name="Value">m.</param>
public sealed record VolumeToSurface(double Value) : ConcreteSize;

/// <summary>A stress put on the deck at an age and staying on it.</summary>
/// <param name="Age">Age at which it is put on, s.</param>
/// <param name="Stress">Mean axial stress over the length, compression positive, Pa; a loss is negative.</param>
/// <param name="Modulus">Modulus for its elastic strain, Pa; null where the model's formula gives it.</param>
/// <param name="Source">What it is and where it comes from.</param>
public sealed record StressStage(double Age, double Stress, double? Modulus, string Source);
