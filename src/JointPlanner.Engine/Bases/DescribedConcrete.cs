using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Bases;

/// <summary>The concrete of one segment as steps of a derivation: asked twice, listed once.</summary>
public sealed class DescribedConcrete
{
    private static readonly Operand Area = new("A_c", "area of the concrete", Quantity.Area);
    private static readonly Operand Perimeter = new("u", "perimeter in contact with air", Quantity.Length);
    private static readonly Operand Thickness = new("h_0", "notional size", Quantity.Size);
    private static readonly Operand VolumeSurface = new("V/S", "volume over surface", Quantity.Size);
    private static readonly Provenance Prism = Provenance.Derived("volume over surface of a prism is area over perimeter, and the notional size is twice that");

    /// <summary>Notional size from the section.</summary>
    public static readonly Formula NotionalOfSection = new(
        "concrete.notional-size", "h_0", "notional size, twice area over exposed perimeter", Quantity.Size, [Area, Perimeter], 2 * Area / Perimeter, Prism,
        new(0.6724, 5e-5, "own arithmetic", 3.9, 11.6));

    /// <summary>Notional size from volume over surface.</summary>
    public static readonly Formula NotionalOfVolume = new(
        "concrete.notional-of-volume", "h_0", "notional size, twice volume over surface", Quantity.Size, [VolumeSurface], 2 * VolumeSurface, Prism,
        new(0.2, 1e-12, "own arithmetic", 0.1));

    /// <summary>Volume over surface from the section.</summary>
    public static readonly Formula VolumeOfSection = new(
        "concrete.volume-to-surface", "V/S", "volume over surface, area over exposed perimeter", Quantity.Size, [Area, Perimeter], Area / Perimeter, Prism,
        new(0.3362, 5e-5, "own arithmetic", 3.9, 11.6));

    /// <summary>Volume over surface from the notional size.</summary>
    public static readonly Formula VolumeOfNotional = new(
        "concrete.volume-of-notional", "V/S", "volume over surface, half the notional size", Quantity.Size, [Thickness], Thickness / 2, Prism,
        new(0.1, 1e-12, "own arithmetic", 0.2));

    private readonly Plan plan;
    private readonly Segment segment;
    private readonly string path;

    /// <summary>The concrete of a segment that describes it.</summary>
    /// <exception cref="ArgumentException">The segment does not.</exception>
    public DescribedConcrete(Plan plan, Segment segment)
    {
        (this.plan, this.segment) = (plan, segment);
        path = $"segments/{segment.Id}/concrete";
        Concrete = segment.Concrete ?? throw new ArgumentException($"Segment {segment.Id} does not describe its concrete.");
    }

    /// <summary>What the plan says.</summary>
    public Concrete Concrete { get; }

    /// <summary>Strength at 28 days, Pa.</summary>
    public Number Strength(string symbol, string meaning, Derivation derivation) => Concrete.StrengthClass.Length > 0
        ? Given(derivation, "strength-class", symbol, $"{meaning}, class {Concrete.StrengthClass}", Quantity.Stress, Concrete.Strength)
        : Given(derivation, "strength", symbol, meaning, Quantity.Stress, Concrete.Strength);

    /// <summary>Strength when prestress is put on, Pa; null where it is not given.</summary>
    public Number? TransferStrength(string symbol, string meaning, Derivation derivation) => Concrete.TransferStrength is { } strength
        ? Given(derivation, "transfer-strength", symbol, meaning, Quantity.Stress, strength)
        : null;

    /// <summary>Modulus that the plan gives, Pa; null where the model's formula is to be used.</summary>
    public Number? Modulus(string meaning, Derivation derivation) => Concrete.Modulus is { } modulus
        ? Given(derivation, "modulus", "E_c", meaning, Quantity.Stress, modulus)
        : null;

    /// <summary>Relative humidity, 0 to 1.</summary>
    public Number Humidity(Derivation derivation) =>
        Given(derivation, "humidity", "RH", $"relative humidity round segment {segment.Id}", Quantity.Ratio, Concrete.Humidity);

    /// <summary>Age at the end of curing, s.</summary>
    public Number CuringEnd(Derivation derivation) =>
        Given(derivation, "curing-end", "t_s", $"age of segment {segment.Id} at the end of curing", Quantity.Age, Concrete.CuringEnd);

    /// <summary>Age at the end of life, s.</summary>
    public Number EndOfLife(Derivation derivation) =>
        Given(derivation, "end-of-life", "t_end", $"age of segment {segment.Id} at the end of life", Quantity.Age, Concrete.EndOfLife);

    /// <summary>Age at which a stress is put on, s.</summary>
    public Number StageAge(int stage, Derivation derivation) => Given(derivation, Stage(stage, "age"), "t_0",
        FormattableString.Invariant($"age of segment {segment.Id} when stress {stage + 1} is put on"), Quantity.Age, Concrete.Stages[stage].Age);

    /// <summary>A stress put on, compression positive, Pa.</summary>
    public Number StageStress(int stage, Derivation derivation) => Given(derivation, Stage(stage, "stress"), "σ",
        FormattableString.Invariant($"mean axial stress {stage + 1} of segment {segment.Id}, compression positive"), Quantity.Stress, Concrete.Stages[stage].Stress,
        Concrete.Stages[stage].Source);

    /// <summary>Modulus given with a stress, Pa; null where the model's formula is to be used.</summary>
    public Number? StageModulus(int stage, Derivation derivation) => Concrete.Stages[stage].Modulus is { } modulus
        ? Given(derivation, Stage(stage, "modulus"), "E_c", FormattableString.Invariant($"modulus when stress {stage + 1} is put on segment {segment.Id}"), Quantity.Stress,
            modulus, Concrete.Stages[stage].Source)
        : null;

    /// <summary>Notional size, m.</summary>
    public Number NotionalThickness(Derivation derivation) => Concrete.Size switch
    {
        SectionSize section => derivation.Once(NotionalOfSection, AreaOf(section, derivation), PerimeterOf(section, derivation)),
        NotionalSize size => Given(derivation, "notional-size", Thickness.Symbol, Thickness.Meaning, Quantity.Size, size.Value),
        VolumeToSurface ratio => derivation.Once(NotionalOfVolume, Given(derivation, "volume-to-surface", VolumeSurface.Symbol, VolumeSurface.Meaning, Quantity.Size, ratio.Value)),
        _ => throw new InvalidOperationException("A size of concrete is one of three."),
    };

    /// <summary>Volume over surface, m.</summary>
    public Number VolumeOverSurface(Derivation derivation) => Concrete.Size switch
    {
        SectionSize section => derivation.Once(VolumeOfSection, AreaOf(section, derivation), PerimeterOf(section, derivation)),
        NotionalSize size => derivation.Once(VolumeOfNotional, Given(derivation, "notional-size", Thickness.Symbol, Thickness.Meaning, Quantity.Size, size.Value)),
        VolumeToSurface ratio => Given(derivation, "volume-to-surface", VolumeSurface.Symbol, VolumeSurface.Meaning, Quantity.Size, ratio.Value),
        _ => throw new InvalidOperationException("A size of concrete is one of three."),
    };

    private Number AreaOf(SectionSize section, Derivation derivation) => Given(derivation, "area", Area.Symbol, Area.Meaning, Quantity.Area, section.Area);

    private Number PerimeterOf(SectionSize section, Derivation derivation) =>
        Given(derivation, "perimeter", Perimeter.Symbol, Perimeter.Meaning, Quantity.Length, section.Perimeter);

    private static string Stage(int stage, string word) => FormattableString.Invariant($"stages/#{stage + 1}/{word}");

    private Number Given(Derivation derivation, string word, string symbol, string meaning, Quantity quantity, double value, string source = "") =>
        GivenValues.Of(plan, derivation, $"{path}/{word}", symbol, meaning, quantity, value, source.Length > 0 ? source : Concrete.Source);
}
