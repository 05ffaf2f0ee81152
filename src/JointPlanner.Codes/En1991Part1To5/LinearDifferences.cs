using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.En1991Part1To5;

/// <summary>Vertical temperature difference by approach 1: the linear difference of table 6.1, times k_sur of table 6.2, straight over the depth and nil at the neutral axis.</summary>
internal static class LinearDifferences
{
    private static readonly Operand Table = new("ΔT_M", "linear temperature difference for 50 mm of surfacing", Quantity.TemperatureDifference);
    private static readonly Operand Factor = new("k_sur", "factor for the surfacing", Quantity.Ratio);
    private static readonly Operand Difference = new("ΔT", "linear temperature difference over the depth, warmer above positive", Quantity.TemperatureDifference);
    private static readonly Operand Neutral = new("ȳ", "depth of the neutral axis", Quantity.Size);
    private static readonly Operand Depth = new("h", "depth of the section", Quantity.Size);

    private static readonly Provenance Approach = new(Mark.Seen, "an open-source finite-element library restating EN 1991-1-5", "", "6.1.4.1, tables 6.1 and 6.2");
    private static readonly Provenance Straight = Provenance.Derived("straight over the depth and nil at the neutral axis, so that it bends the deck without lengthening it");

    /// <summary>Warmer above.</summary>
    public static readonly Formula Warm = new("en-1991-1-5.difference-warm", "ΔT", "linear temperature difference over the depth, warmer above positive",
        Quantity.TemperatureDifference, [Table, Factor], Table * Factor, Approach, new(15, 1e-9, "own arithmetic", 15, 1.0));

    /// <summary>Cooler above.</summary>
    public static readonly Formula Cool = new("en-1991-1-5.difference-cool", "ΔT", "linear temperature difference over the depth, warmer above positive",
        Quantity.TemperatureDifference, [Table, Factor], -1 * (Table * Factor), Approach, new(-18, 1e-9, "own arithmetic", 18, 1.0));

    /// <summary>At the top.</summary>
    public static readonly Formula AtTop = new("en-1991-1-5.difference-at-top", "T_t", "temperature difference at the top of the section", Quantity.TemperatureDifference,
        [Difference, Neutral, Depth], Difference * (Neutral / Depth), Straight, new(6, 1e-9, "own arithmetic", 15, 0.8, 2));

    /// <summary>At the soffit.</summary>
    public static readonly Formula AtSoffit = new("en-1991-1-5.difference-at-soffit", "T_u", "temperature difference at the soffit", Quantity.TemperatureDifference,
        [Difference, Neutral, Depth], Difference * (Neutral / Depth - 1), Straight, new(-9, 1e-9, "own arithmetic", 15, 0.8, 2));

    private static readonly Operand Thinner = new("k_1", "factor of the thinner row", Quantity.Ratio);
    private static readonly Operand Thicker = new("k_2", "factor of the thicker row", Quantity.Ratio);
    private static readonly Operand Surfacing = new("t_s", "height of the road surface above the top of the section", Quantity.Size);
    private static readonly Operand ThinnerDepth = new("t_1", "surfacing of the thinner row", Quantity.Size);
    private static readonly Operand ThickerDepth = new("t_2", "surfacing of the thicker row", Quantity.Size);

    /// <summary>Surfacing between two rows of table 6.2.</summary>
    public static readonly Formula Between = new("en-1991-1-5.surfacing-factor", "k_sur", "factor for the surfacing, linear between rows", Quantity.Ratio,
        [Thinner, Thicker, Surfacing, ThinnerDepth, ThickerDepth], Thinner + (Thicker - Thinner) * (Surfacing - ThinnerDepth) / (ThickerDepth - ThinnerDepth),
        new(Mark.Seen, "an open-source finite-element library restating EN 1991-1-5", "", "table 6.2, linear between rows by that library's choice"),
        new(0.85, 1e-9, "own arithmetic", 1.0, 0.7, 0.075, 0.05, 0.1));

    /// <summary>The two profiles of a deck.</summary>
    public static TemperatureDifferences Of(SectionProperties section, Derivation derivation)
    {
        var (segment, gradient) = (section.Segment, section.Segment.Gradient!);
        var row = DifferenceRow.All.First(r => r.Kind == segment.Kind && (r.Shape is null || r.Shape == gradient.Shape));
        var depth = derivation.Given($"segments/{segment.Id}/section/depth", "h", Depth.Meaning, Quantity.Size, section.Section.Depth);
        var top = derivation.Table("y", "depth of the top of the section", Quantity.Size, 0, Provenance.Derived("depths are measured from the top of the section"), "top");
        return new(Profile("decks warmer above", Warm, row.Warm, isWarm: true), Profile("decks cooler above", Cool, row.Cool, isWarm: false));

        TemperatureProfile Profile(string name, Formula sign, double difference, bool isWarm)
        {
            var table = derivation.Table("ΔT_M", Table.Meaning, Quantity.TemperatureDifference, difference, Source("table 6.1"), $"{row.Name}, {(isWarm ? "heat" : "cool")}");
            var total = derivation.Use(sign, "", table, SurfacingFactor(section, isWarm, derivation));
            return new TemperatureProfile(name,
            [
                new ProfilePoint(top, derivation.Use(AtTop, "", total, section.NeutralAxis, depth)),
                new ProfilePoint(depth, derivation.Use(AtSoffit, "", total, section.NeutralAxis, depth)),
            ]);
        }
    }

    private static Number SurfacingFactor(SectionProperties section, bool isWarm, Derivation derivation)
    {
        var (kind, gradient, thickness) = (section.Segment.Kind, section.Segment.Gradient!, section.Section.Surfacing);
        if (gradient.Surface != DeckSurface.Surfaced)
            return FactorOf(SurfacingRow.Bare(gradient.Surface));
        var rows = SurfacingRow.Surfaced;
        if (thickness >= rows[^1].Thickness) return FactorOf(rows[^1]);
        var next = rows.First(r => r.Thickness > thickness);
        var before = rows[rows.IndexOf(next) - 1];
        if (thickness == before.Thickness) return FactorOf(before);
        return derivation.Use(Between, "", FactorOf(before), FactorOf(next),
            derivation.Given($"segments/{section.Segment.Id}/section/surfacing", "t_s", Surfacing.Meaning, Quantity.Size, thickness), DepthOf(before, ThinnerDepth), DepthOf(next, ThickerDepth));

        Number FactorOf(SurfacingRow row) => derivation.Table("k_sur", Factor.Meaning, Quantity.Ratio, row.Of(kind, isWarm), Source("table 6.2"), $"{row.Name}, {kind}, {(isWarm ? "heat" : "cool")}");

        Number DepthOf(SurfacingRow row, Operand operand) => derivation.Table(operand.Symbol, operand.Meaning, Quantity.Size, row.Thickness, Source("table 6.2"), row.Name);
    }

    private static Provenance Source(string place) => Approach with { Place = place };
}

/// <summary>A row of table 6.1: linear differences for 50 mm of surfacing, K.</summary>
internal sealed record DifferenceRow(string Name, DeckKind Kind, DeckShape? Shape, double Warm, double Cool)
{
    public static readonly ImmutableArray<DifferenceRow> All =
    [
        new("type 1, steel", DeckKind.Steel, null, 18, 13), new("type 2, composite", DeckKind.Composite, null, 15, 18),
        new("type 3, concrete box", DeckKind.Concrete, DeckShape.Box, 10, 5), new("type 3, concrete beams or slab", DeckKind.Concrete, DeckShape.BeamsOrSlab, 15, 8),
    ];
}

/// <summary>A row of table 6.2: factors by type of deck, heat and cool.</summary>
internal sealed record SurfacingRow(string Name, double Thickness, double Heat1, double Cool1, double Heat2, double Cool2, double Heat3, double Cool3)
{
    private static readonly SurfacingRow Unsurfaced = new("unsurfaced", 0, 0.7, 0.9, 0.9, 1.0, 0.8, 1.1);
    private static readonly SurfacingRow Waterproofed = new("waterproofed only, dark", 0, 1.6, 0.6, 1.1, 0.9, 1.5, 1.0);

    /// <summary>Rows of surfaced decks by thickness; the unsurfaced deck begins them.</summary>
    public static readonly ImmutableArray<SurfacingRow> Surfaced =
    [
        Unsurfaced, new("50 mm", 0.05, 1, 1, 1, 1, 1, 1), new("100 mm", 0.1, 0.7, 1.2, 1.0, 1.0, 0.7, 1.0), new("150 mm", 0.15, 0.7, 1.2, 1.0, 1.0, 0.5, 1.0),
    ];

    public static SurfacingRow Bare(DeckSurface surface) => surface == DeckSurface.Waterproofed ? Waterproofed : Unsurfaced;

    public double Of(DeckKind kind, bool isWarm) => (kind, isWarm) switch
    {
        (DeckKind.Steel, true) => Heat1,
        (DeckKind.Steel, false) => Cool1,
        (DeckKind.Composite, true) => Heat2,
        (DeckKind.Composite, false) => Cool2,
        (_, true) => Heat3,
        (_, false) => Cool3,
    };
}
