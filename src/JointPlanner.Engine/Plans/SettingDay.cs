using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans;

/// <summary>How the temperature of the structure is found on the day of setting.</summary>
public sealed record SettingDay
{
    /// <summary>Methods of measuring that may be used; empty for the owner's, else for what is proposed.</summary>
    public ImmutableArray<MeasuringMethod> Methods { get; init; } = [];
    /// <summary>Points that are measured, each with its weight in the mean; empty for one mean temperature that the person finds.</summary>
    public ImmutableArray<MeasuringPoint> Points { get; init; } = [];
}

/// <summary>A method of measuring the temperature of the structure.</summary>
/// <param name="Id">Short name, permanent once issued.</param>
/// <param name="Name">What people call it.</param>
/// <param name="TemperatureUncertainty">u(T): one standard deviation of the temperature so measured, K.</param>
/// <param name="Source">Where the uncertainty comes from.</param>
public sealed record MeasuringMethod(string Id, string Name, double TemperatureUncertainty, string Source)
{
    /// <summary>From the best to the roughest: what stands in where neither plan nor owner says anything.</summary>
    public static readonly ImmutableArray<MeasuringMethod> Proposed =
    [
        new("embedded", "sensors in the structure", 1, Proposal),
        new("surface", "contact thermometer on shaded surfaces", 2, Proposal),
        new("shade-air", "shade air, averaged over the days before", 4, Proposal),
    ];

    private const string Proposal = "our proposal, not published: let the owner confirm or replace it";
}

/// <summary>A point whose temperature is measured.</summary>
/// <param name="Id">Short name, permanent once issued.</param>
/// <param name="Name">Where it lies, for instance deck slab.</param>
/// <param name="Weight">Its weight in the mean temperature: expansion × stiffness × area of the part that it stands for, on any scale.</param>
public sealed record MeasuringPoint(string Id, string Name, double Weight);
