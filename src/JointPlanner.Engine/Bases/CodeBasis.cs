using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Bases;

/// <summary>
/// A code edition as answers to questions. Every question may stay unanswered; an edition overrides what it rules.
/// Ids are permanent: one edition, one id, and an integer revision for our own corrections.
/// </summary>
public abstract class CodeBasis
{
    /// <summary>Permanent id of the edition.</summary>
    public abstract string Id { get; }
    /// <summary>Full title with edition.</summary>
    public abstract string Title { get; }
    /// <summary>Number of our own corrections to this folder.</summary>
    public virtual int Revision => 1;
    /// <summary>Named sets of national or regional parameters; the first is the default; empty where there are none.</summary>
    public virtual IReadOnlyList<string> Profiles => [];
    /// <summary>Words of the climate zones that the basis asks for; empty where it asks for none.</summary>
    public virtual IReadOnlyList<string> ClimateZones => [];
    /// <summary>Cures for the doubt about the setting temperature that the basis knows; the first is its default.</summary>
    public virtual IReadOnlyList<SettingDoubt> Doubts => [SettingDoubt.None];
    /// <summary>Safety formats that the basis knows; the first is its default.</summary>
    public virtual IReadOnlyList<SafetyFormat> SafetyFormats => [SafetyFormat.None];

    /// <summary>Lowest and highest effective temperature of a deck, each step noted in the derivation. Without setting doubt and safety degrees.</summary>
    /// <param name="kind">Kind of deck.</param>
    /// <param name="plan">The plan; climate and profile are read from it.</param>
    /// <param name="derivation">Where the steps go.</param>
    public virtual Answer<TemperatureRange> UniformTemperature(DeckKind kind, Plan plan, Derivation derivation) => Silence<TemperatureRange>();

    /// <summary>Coefficient of thermal expansion for length, 1/K.</summary>
    public virtual Answer<Number> ExpansionCoefficient(DeckKind kind, Derivation derivation) => Silence<Number>();

    /// <summary>Allowance on both ends for the doubt about the setting temperature, K.</summary>
    public virtual Answer<Number> DoubtAllowance(SettingDoubt doubt, Derivation derivation) => Silence<Number>();

    /// <summary>Safety degrees on both ends, K, for the format in degrees.</summary>
    public virtual Answer<Number> SafetyDegrees(Derivation derivation) => Silence<Number>();

    /// <summary>Vertical temperature differences of a deck, for movements: profiles over its depth, each step noted in the derivation.</summary>
    /// <param name="section">The deck's section; its segment says which zone, surface and shape.</param>
    /// <param name="derivation">Where the steps go.</param>
    public virtual Answer<TemperatureDifferences> TemperatureDifference(SectionProperties section, Derivation derivation) => Silence<TemperatureDifferences>();

    /// <summary>Traffic loads on what one frame stands for.</summary>
    public virtual Answer<LoadModel> LiveLoad(LiveLoad traffic, Derivation derivation) => Silence<LoadModel>();

    /// <summary>How each cause counts in each judgement under a safety format.</summary>
    public virtual CountingTable Counting(SafetyFormat format) => CountingTable.Empty;

    /// <summary>Bounds on the clear gap that hold for every device with one gap, whoever makes it.</summary>
    public virtual IReadOnlyList<Limit> SingleGapLimits(DeckKind near, DeckKind far, Derivation derivation) => [];

    /// <summary>Bounds on each gap of a joint with several gaps.</summary>
    public virtual IReadOnlyList<Limit> ModularGapLimits(Derivation derivation) => [];

    /// <summary>The model of creep and shrinkage that goes with this edition; a plan may name another, and then the result says so.</summary>
    public virtual Answer<CreepModel> CreepModel => Silence<CreepModel>();

    /// <summary>Values of this basis that are held from memory and that this plan uses: what an owner must confirm by name.</summary>
    public virtual IReadOnlyList<Provenance> MemoryValues => [];

    /// <summary>Published examples that tests reproduce, in words, or the reason why there is none.</summary>
    public virtual string PublishedExamples => "none: no published example of this edition is at hand";

    private static Silent<T> Silence<T>() => new("not asked of this basis");
}

/// <summary>Effective temperatures of a deck, °C.</summary>
/// <param name="Min">Lowest.</param>
/// <param name="Max">Highest.</param>
public sealed record TemperatureRange(Number Min, Number Max);
