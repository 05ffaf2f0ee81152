using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Combining;

/// <summary>Travel of one bearing line from its own setting state, superstructure relative to what is below, positive up-station, without factors, m.</summary>
/// <param name="Bearing">Id of the bearing line.</param>
/// <param name="HotAtStart">At the highest temperature, nothing shortened yet.</param>
/// <param name="ColdAtStart">At the lowest temperature, nothing shortened yet.</param>
/// <param name="HotAtEnd">At the highest temperature, all shortening over.</param>
/// <param name="ColdAtEnd">At the lowest temperature, all shortening over.</param>
public sealed record BearingTravel(string Bearing, Number HotAtStart, Number ColdAtStart, Number HotAtEnd, Number ColdAtEnd);

/// <summary>Travel of bearings: start and end of life, hot and cold at each.</summary>
public static class BearingTravels
{
    private static readonly Operand PerDegree = new("r", "travel per degree, up-station when warmer", Quantity.Rate);
    private static readonly Operand Extreme = new("T", "extreme effective temperature", Quantity.Temperature);
    private static readonly Operand Set = new("T_set", "temperature when the bearing was tied at zero shear", Quantity.Temperature);
    private static readonly Operand Remaining = new("ε_r", "strain still to come after setting", Quantity.Strain);
    private static readonly Operand Length = new("L", "expansion length of the bearing line for this segment", Quantity.Length);
    private static readonly Operand Part = new("Δ_j", "part of the travel", Quantity.Movement);

    private static readonly Provenance Bar = Provenance.Derived("free change of length of a bar: α·L per degree");

    /// <summary>Travel by temperature from setting to an extreme.</summary>
    public static readonly Formula Thermal = new(
        "bearing.thermal-travel", "Δ_T", "travel up-station by temperature from setting to the extreme", Quantity.Movement, [PerDegree, Extreme, Set],
        PerDegree * (Extreme - Set), Bar, new(-0.0216, 1e-9, "own arithmetic", 0.72e-3, -20, 10));

    /// <summary>Travel by shortening: toward the zero-movement point.</summary>
    public static readonly Formula Shortening = new(
        "bearing.shortening-travel", "Δ_s", "travel up-station by shortening still to come", Quantity.Movement, [Remaining, Length],
        -1 * (Remaining * Length), Bar, new(-0.006, 1e-9, "own arithmetic", 200e-6, 30));

    /// <summary>Parts together.</summary>
    public static readonly Formula Sum = new(
        "bearing.travel", "Δ_b", "travel of the bearing up-station", Quantity.Movement, [Part], Total(Part),
        Provenance.Derived("movements along one axis add"), new(-0.02, 1e-12, "own arithmetic", -0.014, -0.006));

    /// <summary>Travel of a bearing line; null where the deck does not move over it.</summary>
    public static BearingTravel? Of(
        Plan plan, BearingLine bearing, ImmutableArray<(Segment Segment, Number Length)> lengths, Func<string, SegmentTemperature> temperatureOf,
        double settingTemperature, RemainingStrains strains, Derivation derivation)
    {
        if (lengths.IsEmpty) return null;
        var path = $"bearings/{bearing.Id}/setting";
        var set = GivenValues.Of(plan, derivation, $"{path}/temperature", "T_set", Set.Meaning, Quantity.Temperature, settingTemperature);
        var rates = lengths.Select(l => (Rate: derivation.Use(UniformTemperature.Rate, "", temperatureOf(l.Segment.Id).Expansion, l.Length),
            Range: temperatureOf(l.Segment.Id))).ToArray();
        var hot = rates.Select(r => derivation.Use(Thermal, "", r.Rate, r.Range.Max, set)).ToArray();
        var cold = rates.Select(r => derivation.Use(Thermal, "", r.Rate, r.Range.Min, set)).ToArray();
        var shortenings = lengths.SelectMany(l => Shortenings(plan, bearing, l.Segment, l.Length, strains, derivation)).ToArray();
        return new BearingTravel(bearing.Id,
            Total("hot-at-start", hot), Total("cold-at-start", cold),
            Total("hot-at-end", [.. hot, .. shortenings]), Total("cold-at-end", [.. cold, .. shortenings]));

        Number Total(string end, Number[] parts) => derivation.Use(Sum, Keys.TravelTotal(bearing.Id, end), parts);
    }

    private static IEnumerable<Number> Shortenings(
        Plan plan, BearingLine bearing, Segment segment, Number length, RemainingStrains strains, Derivation derivation)
    {
        foreach (var cause in RemainingStrains.Causes.Where(c => RemainingStrains.Has(c, segment)))
        {
            var age = GivenValues.Of(plan, derivation, $"bearings/{bearing.Id}/setting/deck-age", "t",
                $"deck age when bearing line {bearing.Id} was tied at zero shear", Quantity.Age, bearing.SettingAge ?? 0);
            if (strains.Of(cause, segment, age, derivation) is { } remaining) yield return derivation.Use(Shortening, "", remaining, length);
        }
    }
}
