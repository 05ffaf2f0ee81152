using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.AashtoLrfd7Us;

/// <summary>Vertical temperature gradient of 3.12.3, held from memory: T1 at the top, T2 four inches down, nil at four inches and A.</summary>
internal static class TemperatureGradients
{
    private static readonly Operand Positive = new("T", "temperature of the positive gradient", Quantity.TemperatureDifference);
    private static readonly Operand Share = new("r", "share of the positive gradient that is the negative one", Quantity.Ratio);
    private static readonly Operand First = new("y_2", "depth of the first break", Quantity.Size);
    private static readonly Operand Reach = new("A", "depth over which the rest fades", Quantity.Size);
    private static readonly Operand Whole = new("h", "depth of the section", Quantity.Size);

    /// <summary>Negative gradient.</summary>
    public static readonly Formula Negative = new("aashto-lrfd.negative-gradient", "T_n", "temperature of the negative gradient", Quantity.TemperatureDifference, [Positive, Share],
        Share * Positive, Source("negative gradient", "aashto-lrfd-7-us/gradient-negative"), new(-9, 1e-9, "own arithmetic", 30, -0.3));

    /// <summary>Where it has faded.</summary>
    public static readonly Formula End = new("aashto-lrfd.gradient-end", "y_3", "depth at which the gradient has faded", Quantity.Size, [First, Reach], First + Reach,
        Source("figure 3.12.3-2", "aashto-lrfd-7-us/gradient-shape"), new(0.4064, 1e-9, "own arithmetic: 4 in and 12 in", 0.1016, 0.3048));

    /// <summary>A of a shallow concrete deck.</summary>
    public static readonly Formula ShallowReach = new("aashto-lrfd.shallow-gradient", "A", "depth over which the rest fades, shallow concrete deck", Quantity.Size, [Whole, First], Whole - First,
        Source("figure 3.12.3-2, concrete shallower than 16 in", "aashto-lrfd-7-us/gradient-shape"), new(0.2, 1e-9, "own arithmetic", 0.3016, 0.1016));

    private static readonly ImmutableDictionary<string, (double T1, double T2)> Zones = new Dictionary<string, (double, double)>
    {
        ["1"] = (54, 14),
        ["2"] = (46, 12),
        ["3"] = (41, 11),
        ["4"] = (38, 9),
    }.ToImmutableDictionary();

    /// <summary>The two profiles of a deck.</summary>
    public static Answer<TemperatureDifferences> Of(SectionProperties section, Derivation derivation)
    {
        var (segment, gradient) = (section.Segment, section.Segment.Gradient!);
        if (!Zones.TryGetValue(gradient.Zone, out var zone)) return new Silent<TemperatureDifferences>("3.12.3 wants a zone of solar warming, 1 to 4");
        var (t1, t2) = (Degrees("T_1", "at the top", zone.T1), Degrees("T_2", "four inches down", zone.T2));
        var shape = Source("figure 3.12.3-2", "aashto-lrfd-7-us/gradient-shape");
        var top = derivation.Table("y", "depth of the top of the section", Quantity.Size, 0, Provenance.Derived("depths are measured from the top of the section"), "top");
        var first = derivation.Table("y_2", First.Meaning, Quantity.Size, Unit.InchUnit.ToSi(4), shape, "4 in");
        var isShallow = segment.Kind == DeckKind.Concrete && section.Section.Depth < Unit.InchUnit.ToSi(16);
        var reach = isShallow
            ? derivation.Use(ShallowReach, "", derivation.Given($"segments/{segment.Id}/section/depth", "h", Whole.Meaning, Quantity.Size, section.Section.Depth), first)
            : derivation.Table("A", Reach.Meaning, Quantity.Size, Unit.InchUnit.ToSi(12), shape, "12 in");
        var end = derivation.Use(End, "", first, reach);
        var nil = derivation.Table("T_3", "no difference below", Quantity.TemperatureDifference, 0, Source("3.12.3: T_3 without a site study", "aashto-lrfd-7-us/gradient-bottom"), "T_3");
        var share = derivation.Table("r", Share.Meaning, Quantity.Ratio, gradient.Surface == DeckSurface.Surfaced ? -0.20 : -0.30,
            Source("negative gradient", "aashto-lrfd-7-us/gradient-negative"), gradient.Surface == DeckSurface.Surfaced ? "asphalt overlay" : "bare deck");
        return new TemperatureDifferences(
            new("decks warmer above", [new(top, t1), new(first, t2), new(end, nil)]),
            new("decks cooler above", [new(top, derivation.Use(Negative, "", t1, share)), new(first, derivation.Use(Negative, "", t2, share)), new(end, nil)]));

        Number Degrees(string symbol, string where, double fahrenheit) => derivation.Table(symbol, $"temperature of the positive gradient {where}", Quantity.TemperatureDifference,
            Unit.FahrenheitDifference.ToSi(fahrenheit), Source("table 3.12.3-1", "aashto-lrfd-7-us/gradient"), $"zone {gradient.Zone}");
    }

    private static Provenance Source(string place, string valueId) => new(Mark.Memory, "AASHTO LRFD Bridge Design Specifications", "7th edition, 2014, US units", place, valueId);
}
