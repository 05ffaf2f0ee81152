using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Bases;

/// <summary>Vertical temperature differences of a deck.</summary>
/// <param name="Warm">While it is warmer above.</param>
/// <param name="Cool">While it is cooler above.</param>
public sealed record TemperatureDifferences(TemperatureProfile Warm, TemperatureProfile Cool);
