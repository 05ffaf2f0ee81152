using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Quantity;

namespace JointPlanner.Exchange.Quantities;

/// <summary>One kind of quantity as people write it.</summary>
/// <param name="Kind">The kind.</param>
/// <param name="Words">What it is called in a sentence, with its article.</param>
/// <param name="Metric">Unit that a bare number most likely meant where the plan is shown in metric units.</param>
/// <param name="Us">The same where it is shown in US units.</param>
/// <param name="Units">Every unit it may be written in, usual ones first.</param>
public sealed record KindOfQuantity(Quantity Kind, string Words, Unit Metric, Unit Us, ImmutableArray<Unit> Units)
{
    /// <summary>The units in a sentence: "m, mm, ft or in".</summary>
    public string UnitNames => Units.Length == 1
        ? NameOf(Units[0])
        : string.Join(", ", Units[..^1].Select(NameOf)) + " or " + NameOf(Units[^1]);

    private static string NameOf(Unit unit) => unit == Unit.One ? "no unit" : unit.Name;
}

/// <summary>Which units each kind of quantity may be written in, and how each unit may be spelled. Factors stand in <see cref="Unit"/> alone.</summary>
public static class UnitTable
{
    private static readonly ImmutableArray<Unit> Lengths = [Unit.Metre, Unit.Millimetre, Unit.Centimetre, Unit.Kilometre, Unit.Foot, Unit.InchUnit];
    private static readonly ImmutableArray<Unit> Areas = [Unit.SquareMetre, Unit.SquareMillimetre, Unit.SquareCentimetre, Unit.SquareFoot, Unit.SquareInch];
    private static readonly ImmutableArray<Unit> Forces = [Unit.Kilonewton, Unit.Meganewton, Unit.Giganewton, Unit.Newton, Unit.Kip];

    /// <summary>Every kind of quantity.</summary>
    public static readonly ImmutableArray<KindOfQuantity> Kinds =
    [
        new(Length, "a length", Unit.Metre, Unit.Foot, Lengths),
        new(Movement, "a movement", Unit.Millimetre, Unit.InchUnit, Lengths),
        new(Opening, "an opening", Unit.Millimetre, Unit.InchUnit, Lengths),
        new(Size, "a dimension", Unit.Millimetre, Unit.InchUnit, Lengths),
        new(Area, "an area", Unit.SquareMetre, Unit.SquareFoot, Areas),
        new(PlanArea, "a plan area", Unit.SquareMillimetre, Unit.SquareInch, Areas),
        new(Inertia, "a second moment of area", Unit.MetreFourth, Unit.FootFourth,
            [Unit.MetreFourth, Unit.CentimetreFourth, Unit.MillimetreFourth, Unit.FootFourth, Unit.InchFourth]),
        new(Temperature, "a temperature", Unit.Celsius, Unit.Fahrenheit, [Unit.Celsius, Unit.Fahrenheit]),
        new(TemperatureDifference, "a temperature difference", Unit.Kelvin, Unit.FahrenheitDifference,
            [Unit.Kelvin, Unit.CelsiusDifference, Unit.FahrenheitDifference]),
        new(Expansion, "a coefficient of expansion", Unit.PerKelvin, Unit.PerFahrenheit,
            [Unit.PerKelvin, Unit.PerCelsius, Unit.PerFahrenheit, Unit.MillionthPerKelvin, Unit.MillionthPerFahrenheit]),
        new(Strain, "a strain", Unit.Millionth, Unit.Millionth, [Unit.Millionth, Unit.PerMille, Unit.Percent, Unit.One]),
        new(Angle, "an angle", Unit.Degree, Unit.Degree, [Unit.Degree, Unit.Radian]),
        new(Force, "a force", Unit.Kilonewton, Unit.Kip, Forces),
        new(Stiffness, "a stiffness", Unit.MeganewtonPerMetre, Unit.KipPerInch,
            [Unit.MeganewtonPerMetre, Unit.KilonewtonPerMetre, Unit.KilonewtonPerMillimetre, Unit.NewtonPerMillimetre, Unit.NewtonPerMetre,
                Unit.KipPerInch, Unit.KipPerFoot]),
        new(RotationalStiffness, "a stiffness against turning", Unit.MeganewtonMetrePerRadian, Unit.KipFootPerRadian,
            [Unit.MeganewtonMetrePerRadian, Unit.KilonewtonMetrePerRadian, Unit.KipFootPerRadian]),
        new(AxialStiffness, "an axial stiffness EA", Unit.Giganewton, Unit.Kip, Forces),
        new(Stress, "a stress or modulus", Unit.Megapascal, Unit.KipPerSquareInch,
            [Unit.Megapascal, Unit.Gigapascal, Unit.Pascal, Unit.KipPerSquareInch, Unit.PoundPerSquareInch]),
        new(Rate, "a movement per degree", Unit.MillimetrePerKelvin, Unit.InchPerFahrenheit, [Unit.MillimetrePerKelvin, Unit.InchPerFahrenheit]),
        new(Age, "an age", Unit.Day, Unit.Day, [Unit.Day, Unit.Year, Unit.Second]),
        new(Ratio, "a plain number", Unit.One, Unit.One, [Unit.One, Unit.Percent]),
        new(Count, "a whole number", Unit.One, Unit.One, [Unit.One]),
        new(LineLoad, "a load per length", Unit.KilonewtonPerMetre, Unit.KipPerFoot,
            [Unit.KilonewtonPerMetre, Unit.MeganewtonPerMetre, Unit.NewtonPerMillimetre, Unit.NewtonPerMetre, Unit.KipPerFoot]),
        new(Moment, "a moment", Unit.KilonewtonMetre, Unit.KipFoot, [Unit.KilonewtonMetre, Unit.MeganewtonMetre, Unit.NewtonMetre, Unit.KipFoot]),
        new(BendingStiffness, "a bending stiffness EI", Unit.MeganewtonSquareMetre, Unit.KipSquareFoot,
            [Unit.MeganewtonSquareMetre, Unit.KilonewtonSquareMetre, Unit.KipSquareFoot]),
        new(Curvature, "a curvature", Unit.PerMetre, Unit.PerFoot, [Unit.PerMetre, Unit.PerFoot]),
        new(Rotation, "a rotation", Unit.Radian, Unit.Radian, [Unit.Radian, Unit.PerMille, Unit.Degree]),
        new(TemperatureGradient, "a change of temperature per depth", Unit.KelvinPerMetre, Unit.FahrenheitPerFoot, [Unit.KelvinPerMetre, Unit.FahrenheitPerFoot]),
        new(StiffnessPerDegree, "a force per degree", Unit.KilonewtonPerKelvin, Unit.KipPerFahrenheit, [Unit.KilonewtonPerKelvin, Unit.KipPerFahrenheit]),
        new(ConnectionStiffness, "a stiffness per length", Unit.MeganewtonPerSquareMetre, Unit.KipPerSquareInch,
            [Unit.MeganewtonPerSquareMetre, Unit.KipPerSquareInch]),
        new(InfluenceArea, "a movement per load per length", Unit.MillimetrePerKilonewtonPerMetre, Unit.InchPerKipPerFoot,
            [Unit.MillimetrePerKilonewtonPerMetre, Unit.InchPerKipPerFoot]),
        new(Flexibility, "a flexibility", Unit.MillimetrePerKilonewton, Unit.InchPerKip, [Unit.MillimetrePerKilonewton, Unit.InchPerKip]),
    ];

    private static readonly Dictionary<Quantity, KindOfQuantity> ByKind = Kinds.ToDictionary(k => k.Kind);

    /// <summary>How a unit may be spelled beside its own name.</summary>
    private static readonly Dictionary<Unit, string[]> Spellings = new()
    {
        [Unit.Millionth] = ["με", "ue", "microstrain", "um/m", "µm/m", "μm/m", "e-6", "ppm"],
        [Unit.PerMille] = ["mm/m"],
        [Unit.Degree] = ["deg", "degrees", "degree", "º"],
        [Unit.Metre] = ["metre", "metres", "meter", "meters"],
        [Unit.Foot] = ["'", "feet", "foot", "ft.", "FT"],
        [Unit.InchUnit] = ["\"", "''", "inch", "inches", "in.", "IN"],
        [Unit.SquareMetre] = ["m2", "m^2", "sq m"],
        [Unit.SquareMillimetre] = ["mm2", "mm^2", "sq mm"],
        [Unit.SquareCentimetre] = ["cm2", "cm^2", "sq cm"],
        [Unit.SquareFoot] = ["ft2", "ft^2", "sq ft"],
        [Unit.SquareInch] = ["in2", "in^2", "sq in"],
        [Unit.MetreFourth] = ["m4", "m^4"],
        [Unit.CentimetreFourth] = ["cm4", "cm^4"],
        [Unit.MillimetreFourth] = ["mm4", "mm^4"],
        [Unit.FootFourth] = ["ft4", "ft^4"],
        [Unit.InchFourth] = ["in4", "in^4"],
        [Unit.Celsius] = ["C", "º C", "ºC", "° C", "℃", "degC", "deg C"],
        [Unit.Fahrenheit] = ["F", "º F", "ºF", "° F", "℉", "degF", "deg F"],
        [Unit.CelsiusDifference] = ["C", "º C", "ºC", "° C", "℃", "degC", "deg C"],
        [Unit.FahrenheitDifference] = ["F", "º F", "ºF", "° F", "℉", "degF", "deg F"],
        [Unit.PerKelvin] = ["1/K", "per K", "K^-1", "K⁻¹"],
        [Unit.PerCelsius] = ["1/°C", "per °C", "/C", "1/C", "°C^-1", "°C⁻¹"],
        [Unit.PerFahrenheit] = ["1/°F", "per °F", "/F", "1/F", "°F^-1", "°F⁻¹"],
        [Unit.MillionthPerKelvin] = ["με/K", "ue/K", "ppm/K", "µε/°C", "με/°C", "ue/C", "ppm/°C"],
        [Unit.MillionthPerFahrenheit] = ["με/°F", "ue/F", "ppm/°F"],
        [Unit.Kip] = ["kips", "KIP", "KIPS"],
        [Unit.KipPerInch] = ["kips/in", "kip/in."],
        [Unit.KipPerFoot] = ["kips/ft", "klf"],
        [Unit.MeganewtonMetrePerRadian] = ["MNm/rad", "MN m/rad", "MN*m/rad"],
        [Unit.KilonewtonMetrePerRadian] = ["kNm/rad", "kN m/rad", "kN*m/rad"],
        [Unit.KipFootPerRadian] = ["kip-ft/rad", "kip ft/rad", "kip*ft/rad", "ft-kip/rad", "k-ft/rad"],
        [Unit.KilonewtonMetre] = ["kNm", "kN m", "kN*m"],
        [Unit.MeganewtonMetre] = ["MNm", "MN m", "MN*m"],
        [Unit.NewtonMetre] = ["Nm", "N m", "N*m"],
        [Unit.KipFoot] = ["kip-ft", "kip ft", "k-ft", "ft-kip"],
        [Unit.MeganewtonSquareMetre] = ["MNm²", "MN m2", "MN*m2", "MNm2", "MN·m2"],
        [Unit.KilonewtonSquareMetre] = ["kNm²", "kN m2", "kN*m2", "kNm2", "kN·m2"],
        [Unit.KipSquareFoot] = ["kip-ft²", "kip-ft2", "kip ft2", "kip*ft2"],
        [Unit.PerMetre] = ["1/m"],
        [Unit.PerFoot] = ["1/ft"],
        [Unit.KelvinPerMetre] = ["°C/m", "C/m"],
        [Unit.FahrenheitPerFoot] = ["F/ft"],
        [Unit.MeganewtonPerSquareMetre] = ["MN/m2", "MN/m^2", "N/mm²", "N/mm2", "N/mm^2"],
        [Unit.Megapascal] = ["N/mm²", "N/mm2", "N/mm^2", "MN/m²", "MN/m2"],
        [Unit.Gigapascal] = ["kN/mm²", "kN/mm2", "kN/mm^2"],
        [Unit.Pascal] = ["N/m²", "N/m2"],
        [Unit.KipPerSquareInch] = ["kip/in²", "kip/in2", "KSI"],
        [Unit.PoundPerSquareInch] = ["lb/in²", "lb/in2", "PSI"],
        [Unit.MillimetrePerKelvin] = ["mm/°C", "mm/C"],
        [Unit.InchPerFahrenheit] = ["in/F"],
        [Unit.Day] = ["day", "days"],
        [Unit.Year] = ["y", "yr", "year", "years"],
        [Unit.Second] = ["sec", "seconds"],
    };

    /// <summary>How people write a kind of quantity.</summary>
    public static KindOfQuantity Of(Quantity kind) => ByKind[kind];

    /// <summary>Every way to spell a unit, its own name first.</summary>
    public static IEnumerable<string> SpellingsOf(Unit unit) => [unit.Name, .. Spellings.GetValueOrDefault(unit, [])];

    /// <summary>The unit spelled so, among those of a kind; null where there is none. Capitals count: mN is not MN.</summary>
    public static Unit? Find(string spelling, KindOfQuantity kind) =>
        kind.Units.FirstOrDefault(u => SpellingsOf(u).Contains(spelling, StringComparer.Ordinal));

    /// <summary>The first kind of quantity that may be written with this unit; null where none may.</summary>
    public static KindOfQuantity? KindMeasuredIn(string spelling) =>
        spelling.Length == 0 ? null : Kinds.FirstOrDefault(k => Find(spelling, k) is not null);
}
