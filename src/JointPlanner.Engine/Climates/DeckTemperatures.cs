using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Climates;

/// <summary>Effective temperatures of one segment as the chosen safety format wants them, and the allowance for the doubt about setting.</summary>
/// <param name="Segment">Id of the segment.</param>
/// <param name="Min">Lowest, with safety degrees, °C.</param>
/// <param name="Max">Highest, with safety degrees, °C.</param>
/// <param name="DoubtAllowance">Allowance on both ends when sizing before the day, K.</param>
/// <param name="Expansion">Coefficient of thermal expansion for length, 1/K.</param>
public sealed record SegmentTemperature(string Segment, Number Min, Number Max, Number DoubtAllowance, Number Expansion)
{
    /// <summary>Best estimate of the coefficient of the whole section, from its layers, 1/K; null where they say nothing of it.</summary>
    public Number? BestEstimate { get; init; }
}

/// <summary>Asks the basis for the temperatures of each segment.</summary>
public static class DeckTemperatures
{
    private static readonly Operand Reading = new("T", "effective temperature by the basis", Quantity.Temperature);
    private static readonly Operand Degrees = new("ΔT_γ", "safety degrees", Quantity.TemperatureDifference);

    private static readonly Provenance InDegrees = Provenance.Derived("safety in degrees: the range is widened at both ends, no factor is put on the movement");

    /// <summary>Highest temperature with safety degrees.</summary>
    public static readonly Formula WithSafetyAbove = new(
        "temperature.max-with-safety", "T_max", "highest effective temperature with safety degrees", Quantity.Temperature, [Reading, Degrees],
        Reading + Degrees, InDegrees, new(41, 0.5, "own arithmetic", 36, 5));

    /// <summary>Lowest temperature with safety degrees.</summary>
    public static readonly Formula WithSafetyBelow = new(
        "temperature.min-with-safety", "T_min", "lowest effective temperature with safety degrees", Quantity.Temperature, [Reading, Degrees],
        Reading - Degrees, InDegrees, new(-16, 0.5, "own arithmetic", -11, 5));

    /// <summary>Temperatures of a segment.</summary>
    /// <exception cref="SilentBasisException">The basis does not answer.</exception>
    public static SegmentTemperature Of(Segment segment, Plan plan, CodeBasis basis, Derivation derivation)
    {
        var range = Required(basis.UniformTemperature(segment.Kind, plan, derivation), basis, segment, "the effective temperatures of this deck");
        var (min, max) = (range.Min, range.Max);
        if (SafetyOf(plan, basis) == SafetyFormat.Degrees)
        {
            var degrees = Required(basis.SafetyDegrees(derivation), basis, segment, "safety degrees");
            max = derivation.Use(WithSafetyAbove, Keys.TemperatureMax(segment.Id), max, degrees);
            min = derivation.Use(WithSafetyBelow, Keys.TemperatureMin(segment.Id), min, degrees);
        }
        var doubt = DoubtOf(plan, basis);
        var allowance = doubt == SettingDoubt.None
            ? derivation.Given("basis/setting-doubt", "S", "allowance for the doubt about the temperature at setting: none asked",
                Quantity.TemperatureDifference, 0)
            : Required(basis.DoubtAllowance(doubt, derivation), basis, segment, "an allowance for the doubt about the temperature at setting");
        return new SegmentTemperature(segment.Id, min, max, allowance, ExpansionOf(segment, plan, basis, derivation));
    }

    /// <summary>The safety format in force.</summary>
    public static SafetyFormat SafetyOf(Plan plan, CodeBasis basis) => plan.Basis.Safety ?? basis.SafetyFormats[0];

    /// <summary>The cure for the doubt about setting in force.</summary>
    public static SettingDoubt DoubtOf(Plan plan, CodeBasis basis) => plan.Basis.Doubt ?? basis.Doubts[0];

    private static Number ExpansionOf(Segment segment, Plan plan, CodeBasis basis, Derivation derivation) =>
        segment.Expansion is { } own
            ? GivenValues.Of(plan, derivation, $"segments/{segment.Id}/expansion", "α",
                $"coefficient of thermal expansion of segment {segment.Id}", Quantity.Expansion, own)
            : Required(basis.ExpansionCoefficient(segment.Kind, derivation), basis, segment, "a coefficient of thermal expansion; give one for the segment");

    private static T Required<T>(Answer<T> answer, CodeBasis basis, Segment segment, string what) => answer switch
    {
        Said<T> said => said.Value,
        Silent<T> silent => throw new SilentBasisException(new Finding(
            "basis-silent", Severity.Error, $"segments/{segment.Id}", $"{basis.Title} does not give {what}: {silent.Why}.")),
        _ => throw new InvalidOperationException("An answer is said or silent."),
    };
}

/// <summary>The basis is silent on something without which nothing can be computed.</summary>
public sealed class SilentBasisException(Finding finding) : Exception(finding.Template)
{
    /// <summary>The finding that says so.</summary>
    public Finding Finding { get; } = finding;
}
