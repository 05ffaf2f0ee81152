using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Bases;

/// <summary>An owner's own rules, as data: laid over the code, entry by entry. Each value keeps its source. SI.</summary>
public sealed record OwnerRuleSet
{
    /// <summary>Permanent id.</summary>
    public required string Id { get; init; }
    /// <summary>Name for people.</summary>
    public required string Name { get; init; }
    /// <summary>Version as the owner numbers it.</summary>
    public required string Version { get; init; }
    /// <summary>Where the rules come from.</summary>
    public required Provenance Source { get; init; }
    /// <summary>What the owner counts, laid over the code's table.</summary>
    public CountingTable Counting { get; init; } = CountingTable.Empty;
    /// <summary>True when racking is judged by its total range, false for the larger one-way value from setting.</summary>
    public bool RackingIsTotalRange { get; init; }
    /// <summary>Standard deviations in the reserve U.</summary>
    public double UncertaintyFactor { get; init; } = 2;
    /// <summary>Step to which set values are rounded, m; null for the display profile's step.</summary>
    public double? RoundingStep { get; init; }
    /// <summary>How the set value is chosen within its window.</summary>
    public SettingRule SettingRule { get; init; } = new MidWindow();
    /// <summary>Methods of measuring the temperature on the day; empty where the owner says nothing.</summary>
    public ImmutableArray<MeasuringMethod> MeasuringMethods { get; init; } = [];
    /// <summary>How long after its issue a calculation may be used to set joints, s.</summary>
    public double UseWithin { get; init; } = 90 * Unit.Day.Factor;
    /// <summary>Joint families that the owner allows, in order of preference, with their sizes and limits.</summary>
    public ImmutableArray<FamilyRules> Families { get; init; } = [];
}

/// <summary>How the recommended set value is chosen.</summary>
public abstract record SettingRule;

/// <summary>The middle of the window.</summary>
public sealed record MidWindow : SettingRule;

/// <summary>A reference opening at a reference temperature, carried by the thermal slope without factor.</summary>
/// <param name="Temperature">Reference temperature, °C.</param>
/// <param name="Opening">Normal opening at that temperature, m; null where it is a share of the seal's width (see the family).</param>
public sealed record FixedReference(double Temperature, double? Opening) : SettingRule;

/// <summary>The middle of the family's service limits at mid temperature, carried by the thermal slope and half the irreversible movement.</summary>
public sealed record MidRange : SettingRule;

/// <summary>
/// Linear between the size's greatest opening at the lowest temperature and its least at the highest, so that the whole working range
/// is spread over the range of temperature.
/// </summary>
public sealed record RangeShare : SettingRule;

/// <summary>Sizes and limits of one joint family, as data.</summary>
public sealed record FamilyRules
{
    /// <summary>Family word, for instance strip-seal.</summary>
    public required string Family { get; init; }
    /// <summary>Where the figures come from.</summary>
    public required Provenance Source { get; init; }
    /// <summary>Figures that hold for all sizes: word → value in SI. The family says which words it asks for.</summary>
    public ImmutableSortedDictionary<string, double> Figures { get; init; } = ImmutableSortedDictionary<string, double>.Empty;
    /// <summary>What is said about single figures beyond their value: word → note.</summary>
    public ImmutableSortedDictionary<string, FigureNote> Notes { get; init; } = ImmutableSortedDictionary<string, FigureNote>.Empty;
    /// <summary>True where these limits stand in for the code's general bounds on the gap, false where both hold.</summary>
    public bool ReplacesCodeLimits { get; init; }
    /// <summary>Sizes from small to large.</summary>
    public ImmutableArray<FamilySize> Sizes { get; init; } = [];
}

/// <summary>One nominal size of a family.</summary>
/// <param name="Name">Name as it is ordered by, in generic terms.</param>
/// <param name="Figures">Figures of this size: word → value in SI; they cover those of the family.</param>
public sealed record FamilySize(string Name, ImmutableSortedDictionary<string, double> Figures);

/// <summary>What a rule set says about one figure beyond its value; what it leaves open the family decides.</summary>
/// <param name="JudgedBy">Column of the counting table whose movements are set against the figure; null for the family's own.</param>
/// <param name="Measure">Direction in which the figure is measured; null for the family's own.</param>
/// <param name="Source">Where the figure comes from; null for the source of the family's rules.</param>
public sealed record FigureNote(Column? JudgedBy = null, Measure? Measure = null, Provenance? Source = null);
