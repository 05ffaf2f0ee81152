using System.Globalization;
using CsCheck;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Quantities;
using UnitsNet.Units;

namespace JointPlanner.Exchange.Tests.Quantities;

public sealed class QuantityTextTests
{
    private static Quantity Kind(string id) => Quantity.All.Single(q => q.Id == id);

    [Theory]
    [InlineData("42.5 m", "length", 42.5)]
    [InlineData("42,5 m", "length", 42.5)]
    [InlineData("0,234 m", "length", 0.234)]
    [InlineData("1234,567 m", "length", 1234.567)]
    [InlineData("-0.6 m", "length", -0.6)]
    [InlineData("\u22120.6 m", "length", -0.6)]
    [InlineData("+12 m", "length", 12)]
    [InlineData("  300mm ", "movement", 0.3)]
    [InlineData("1\u2009250.5 m", "length", 1250.5)]
    [InlineData("1\u202F250\u202F000\u00A0mm", "length", 1250)]
    [InlineData(".5 in", "movement", 0.0127)]
    [InlineData("6 1/2 in", "size", 0.1651)]
    [InlineData("6-1/2 in", "size", 0.1651)]
    [InlineData("6½ in", "size", 0.1651)]
    [InlineData("½ in", "size", 0.0127)]
    [InlineData("1/16 in", "opening", 0.0015875)]
    [InlineData("12 ft 6 1/2 in", "length", 3.8227)]
    [InlineData("12'-6 1/2\"", "length", 3.8227)]
    [InlineData("12′ 6½″", "length", 3.8227)]
    [InlineData("12' 6.5\"", "length", 3.8227)]
    [InlineData("-12 ft 6 1/2 in", "length", -3.8227)]
    [InlineData("0 ft 0 in", "length", 0)]
    [InlineData("12'", "length", 3.6576)]
    [InlineData("2 km", "length", 2000)]
    [InlineData("0.2025 m2", "plan-area", 0.2025)]
    [InlineData("0.2025 m²", "plan-area", 0.2025)]
    [InlineData("202500 mm^2", "plan-area", 0.2025)]
    [InlineData("18 °C", "temperature", 18)]
    [InlineData("18°C", "temperature", 18)]
    [InlineData("64.4 °F", "temperature", 18)]
    [InlineData("-40 F", "temperature", -40)]
    [InlineData("2 K", "temperature-difference", 2)]
    [InlineData("2 °C", "temperature-difference", 2)]
    [InlineData("9 °F", "temperature-difference", 5)]
    [InlineData("12e-6 /K", "expansion", 12e-6)]
    [InlineData("12×10⁻⁶ /K", "expansion", 12e-6)]
    [InlineData("12 x 10^-6 1/K", "expansion", 12e-6)]
    [InlineData("6 µε/°F", "expansion", 10.8e-6)]
    [InlineData("300 µε", "strain", 300e-6)]
    [InlineData("300 \u03bc\u03b5", "strain", 300e-6)]
    [InlineData("0.3 mm/m", "strain", 300e-6)]
    [InlineData("6e-05", "strain", 60e-6)]
    [InlineData("180°", "angle", Math.PI)]
    [InlineData("900 kN/mm", "stiffness", 900e6)]
    [InlineData("9000 MN·m/rad", "rotational-stiffness", 9e9)]
    [InlineData("31 GPa", "stress", 31e9)]
    [InlineData("365.25 d", "age", 31557600)]
    [InlineData("1 a", "age", 31557600)]
    [InlineData("25 %", "ratio", 0.25)]
    [InlineData("7", "count", 7)]
    public void A_quantity_reads_as_it_is_meant(string text, string kind, double si)
    {
        var read = QuantityText.Parse(text, Kind(kind));

        Assert.Null(read.Fault);
        Assert.Equal(si, read.Value, Math.Abs(si) * 1e-14 + 1e-14);
    }

    [Theory]
    [InlineData("42.5", "length", "quantity.bare-number", "Probably meant “42.5 m”")]
    [InlineData("18", "temperature", "quantity.bare-number", "Probably meant “18 °C”")]
    [InlineData("1,234 m", "length", "quantity.grouping", "“1.234 m” or “1234 m”")]
    [InlineData("12,345", "length", "quantity.grouping", "“12.345 m” or “12345 m”")]
    [InlineData("-1,234 m", "length", "quantity.grouping", "“-1.234 m” or “-1234 m”")]
    [InlineData("1,234.5 m", "length", "quantity.grouping", "“1234.5 m”")]
    [InlineData("1.234,5 m", "length", "quantity.grouping", "“1234.5 m”")]
    [InlineData("1.234.567 m", "length", "quantity.grouping", "“1234567 m”")]
    [InlineData("1 234 m", "length", "quantity.two-numbers", "without spaces")]
    [InlineData("12 mmm", "length", "quantity.unknown-unit", "Did you mean “mm”?")]
    [InlineData("12 mN/m", "stiffness", "quantity.unknown-unit", "Did you mean “MN/m”?")]
    [InlineData("12 furlongs", "length", "quantity.unknown-unit", "Write a length in m, mm, cm, km, ft or in.")]
    [InlineData("12 kN", "length", "quantity.other-kind", "Write a length in")]
    [InlineData("12 K", "temperature", "quantity.kelvin-reading", "Write the reading in °C or °F.")]
    [InlineData("12 m", "ratio", "quantity.unit-not-wanted", "Write “12”.")]
    [InlineData("1.5", "count", "quantity.not-whole", "Write a whole number.")]
    [InlineData("∞ m", "length", "quantity.not-finite", "Write a finite number.")]
    [InlineData("Infinity", "length", "quantity.not-finite", "Write a finite number.")]
    [InlineData("-inf m", "length", "quantity.not-finite", "Write a finite number.")]
    [InlineData("NaN m", "length", "quantity.not-finite", "Write a finite number.")]
    [InlineData("1e999 m", "length", "quantity.not-finite", "Write a finite number.")]
    [InlineData("1/0 in", "length", "quantity.not-finite", "Write a finite number.")]
    [InlineData("1e-999 m", "length", "quantity.not-finite", "Write a finite number.")]
    [InlineData("about 12 m", "length", "quantity.not-a-number", "Write a length as “12 m”.")]
    [InlineData("", "length", "quantity.empty", "Write a length.")]
    [InlineData("12 ft 14 in", "length", "quantity.feet-and-inches", "less than 12 in")]
    [InlineData("12.5 ft 6 in", "length", "quantity.feet-and-inches", "whole")]
    [InlineData("12' 6", "length", "quantity.feet-and-inches", "Write 12 ft 6 in.")]
    [InlineData("12 + 50", "length", "quantity.unknown-unit", "Write a length in")]
    public void A_text_that_is_no_quantity_is_refused_with_what_to_type(string text, string kind, string id, string remedy)
    {
        var read = QuantityText.Parse(text, Kind(kind));

        Assert.True(double.IsNaN(read.Value));
        Assert.Equal(id, read.Fault!.Id);
        Assert.Contains(remedy, read.Fault.Remedy, StringComparison.Ordinal);
        Assert.NotEmpty(read.Fault.Wrong);
        Assert.NotEmpty(read.Fault.Allowed);
    }

    [Fact]
    public void A_bare_number_probably_meant_the_unit_that_is_shown() =>
        Assert.Contains("“42.5 ft”", QuantityText.Parse("42.5", Quantity.Length, Unit.Foot).Fault!.Remedy, StringComparison.Ordinal);

    [Fact]
    public void Every_kind_of_quantity_can_be_typed_and_every_spelling_leads_to_its_unit()
    {
        Assert.Equal(Quantity.All.Select(q => q.Id).Order(), UnitTable.Kinds.Select(k => k.Kind.Id).Order());
        foreach (var kind in UnitTable.Kinds)
            foreach (var unit in kind.Units)
            {
                Assert.Equal(kind.Kind.Dimension, unit.Dimension);
                Assert.Equal(kind.Kind.IsReading, unit.IsReading);
                foreach (var spelling in UnitTable.SpellingsOf(unit))
                {
                    var read = QuantityText.Parse($"3 {spelling}", kind.Kind);
                    Assert.True(read.Fault is null, $"3 {spelling}: {read.Fault?.Wrong}");
                    Assert.Equal(unit.ToSi(3), read.Value);
                }
            }
    }

    [Theory]
    [InlineData("en-US")]
    [InlineData("de-DE")]
    [InlineData("fr-FR")]
    [InlineData("tr-TR")]
    [InlineData("ar-SA")]
    public void Culture_changes_neither_reading_nor_writing(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.Equal(1.5, QuantityText.Parse("1,5 m", Quantity.Length).Value);
            Assert.Equal(-1234.5, QuantityText.Parse("-1234.5 m", Quantity.Length).Value);
            Assert.Equal("quantity.grouping", QuantityText.Parse("1,234 m", Quantity.Length).Fault!.Id);
            Assert.Equal("-1234.5 m", QuantityText.Write(-1234.5, Unit.Metre));
            Assert.Equal("1.2e-5 /K", QuantityText.Write(12e-6, Unit.PerKelvin));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void What_is_written_reads_back_as_the_same_value() =>
        Gen.Select(Gen.OneOf(UnitTable.Kinds.Where(k => k.Kind != Quantity.Count).ToArray()), Gen.Double[-1e7, 1e7], Gen.Int[-9, 2]).SelectMany((kind, number, power) =>
            Gen.OneOf(kind.Units.ToArray()).Select(unit => (kind, unit, si: unit.ToSi(Math.Round(number * Math.Pow(10, power), 6)))))
        .Sample(c =>
        {
            var text = QuantityText.Write(c.si, c.unit);
            var read = QuantityText.Parse(text, c.kind.Kind);
            // A value that no decimal in that unit hits exactly comes within the last bit.
            Assert.True(Math.Abs(read.Value - c.si) <= Math.Abs(c.si) * 3e-16 + (c.kind.Kind.IsReading ? 1e-13 : 0), $"{text} reads as {read.Value:R}, not {c.si:R}; {read.Fault?.Wrong}");
        }, iter: 3000, seed: "0N0XIzNsQ0O2", threads: 1);

    // An outside library of units, whose own factors of force are rounded at the ninth digit: what it makes of a number in a unit is what we make of the same text.
    private static readonly (Quantity Kind, Unit Unit, Func<double, double> ToSi)[] Outside =
    [
        (Quantity.Length, Unit.Foot, v => UnitsNet.Length.From(v, LengthUnit.Foot).Meters),
        (Quantity.Length, Unit.InchUnit, v => UnitsNet.Length.From(v, LengthUnit.Inch).Meters),
        (Quantity.Length, Unit.Millimetre, v => UnitsNet.Length.From(v, LengthUnit.Millimeter).Meters),
        (Quantity.Length, Unit.Centimetre, v => UnitsNet.Length.From(v, LengthUnit.Centimeter).Meters),
        (Quantity.Length, Unit.Kilometre, v => UnitsNet.Length.From(v, LengthUnit.Kilometer).Meters),
        (Quantity.PlanArea, Unit.SquareMillimetre, v => UnitsNet.Area.From(v, AreaUnit.SquareMillimeter).SquareMeters),
        (Quantity.PlanArea, Unit.SquareCentimetre, v => UnitsNet.Area.From(v, AreaUnit.SquareCentimeter).SquareMeters),
        (Quantity.PlanArea, Unit.SquareInch, v => UnitsNet.Area.From(v, AreaUnit.SquareInch).SquareMeters),
        (Quantity.Area, Unit.SquareFoot, v => UnitsNet.Area.From(v, AreaUnit.SquareFoot).SquareMeters),
        (Quantity.Inertia, Unit.MillimetreFourth, v => UnitsNet.AreaMomentOfInertia.From(v, AreaMomentOfInertiaUnit.MillimeterToTheFourth).MetersToTheFourth),
        (Quantity.Inertia, Unit.CentimetreFourth, v => UnitsNet.AreaMomentOfInertia.From(v, AreaMomentOfInertiaUnit.CentimeterToTheFourth).MetersToTheFourth),
        (Quantity.Inertia, Unit.InchFourth, v => UnitsNet.AreaMomentOfInertia.From(v, AreaMomentOfInertiaUnit.InchToTheFourth).MetersToTheFourth),
        (Quantity.Inertia, Unit.FootFourth, v => UnitsNet.AreaMomentOfInertia.From(v, AreaMomentOfInertiaUnit.FootToTheFourth).MetersToTheFourth),
        (Quantity.Temperature, Unit.Fahrenheit, v => UnitsNet.Temperature.From(v, TemperatureUnit.DegreeFahrenheit).DegreesCelsius),
        (Quantity.Temperature, Unit.Celsius, v => UnitsNet.Temperature.From(v, TemperatureUnit.DegreeCelsius).DegreesCelsius),
        (Quantity.TemperatureDifference, Unit.FahrenheitDifference, v => UnitsNet.TemperatureDelta.From(v, TemperatureDeltaUnit.DegreeFahrenheit).Kelvins),
        (Quantity.TemperatureDifference, Unit.CelsiusDifference, v => UnitsNet.TemperatureDelta.From(v, TemperatureDeltaUnit.DegreeCelsius).Kelvins),
        (Quantity.Expansion, Unit.PerFahrenheit, v => UnitsNet.CoefficientOfThermalExpansion.From(v, CoefficientOfThermalExpansionUnit.PerDegreeFahrenheit).PerKelvin),
        (Quantity.Expansion, Unit.MillionthPerKelvin, v => UnitsNet.CoefficientOfThermalExpansion.From(v, CoefficientOfThermalExpansionUnit.PpmPerKelvin).PerKelvin),
        (Quantity.Expansion, Unit.MillionthPerFahrenheit, v => UnitsNet.CoefficientOfThermalExpansion.From(v, CoefficientOfThermalExpansionUnit.PpmPerDegreeFahrenheit).PerKelvin),
        (Quantity.Angle, Unit.Degree, v => UnitsNet.Angle.From(v, AngleUnit.Degree).Radians),
        (Quantity.Force, Unit.Kip, v => UnitsNet.Force.From(v, ForceUnit.KilopoundForce).Newtons),
        (Quantity.Force, Unit.Meganewton, v => UnitsNet.Force.From(v, ForceUnit.Meganewton).Newtons),
        (Quantity.Stiffness, Unit.KilonewtonPerMillimetre, v => UnitsNet.ForcePerLength.From(v, ForcePerLengthUnit.KilonewtonPerMillimeter).NewtonsPerMeter),
        (Quantity.Stiffness, Unit.NewtonPerMillimetre, v => UnitsNet.ForcePerLength.From(v, ForcePerLengthUnit.NewtonPerMillimeter).NewtonsPerMeter),
        (Quantity.Stiffness, Unit.MeganewtonPerMetre, v => UnitsNet.ForcePerLength.From(v, ForcePerLengthUnit.MeganewtonPerMeter).NewtonsPerMeter),
        (Quantity.Stiffness, Unit.KipPerInch, v => UnitsNet.ForcePerLength.From(v, ForcePerLengthUnit.KilopoundForcePerInch).NewtonsPerMeter),
        (Quantity.Stiffness, Unit.KipPerFoot, v => UnitsNet.ForcePerLength.From(v, ForcePerLengthUnit.KilopoundForcePerFoot).NewtonsPerMeter),
        (Quantity.RotationalStiffness, Unit.MeganewtonMetrePerRadian, v => UnitsNet.RotationalStiffness.From(v, RotationalStiffnessUnit.MeganewtonMeterPerRadian).NewtonMetersPerRadian),
        (Quantity.RotationalStiffness, Unit.KilonewtonMetrePerRadian, v => UnitsNet.RotationalStiffness.From(v, RotationalStiffnessUnit.KilonewtonMeterPerRadian).NewtonMetersPerRadian),
        (Quantity.RotationalStiffness, Unit.KipFootPerRadian, v => UnitsNet.Torque.From(v, TorqueUnit.KilopoundForceFoot).NewtonMeters),
        (Quantity.Stress, Unit.Megapascal, v => UnitsNet.Pressure.From(v, PressureUnit.Megapascal).Pascals),
        (Quantity.Stress, Unit.Gigapascal, v => UnitsNet.Pressure.From(v, PressureUnit.Gigapascal).Pascals),
        (Quantity.Stress, Unit.KipPerSquareInch, v => UnitsNet.Pressure.From(v, PressureUnit.KilopoundForcePerSquareInch).Pascals),
        (Quantity.Stress, Unit.PoundPerSquareInch, v => UnitsNet.Pressure.From(v, PressureUnit.PoundForcePerSquareInch).Pascals),
        (Quantity.Age, Unit.Day, v => UnitsNet.Duration.From(v, DurationUnit.Day).Seconds),
        (Quantity.Ratio, Unit.Percent, v => UnitsNet.Ratio.From(v, RatioUnit.Percent).DecimalFractions),
        (Quantity.Strain, Unit.PerMille, v => UnitsNet.Ratio.From(v, RatioUnit.PartPerThousand).DecimalFractions),
        (Quantity.Strain, Unit.Millionth, v => UnitsNet.Ratio.From(v, RatioUnit.PartPerMillion).DecimalFractions),
    ];

    [Fact]
    public void An_outside_library_of_units_reads_the_same_values() =>
        Gen.Select(Gen.OneOf(Outside), Gen.Double[-5000, 5000]).Sample((outside, number) =>
        {
            var rounded = Math.Round(number, 4);
            var text = rounded.ToString(CultureInfo.InvariantCulture) + " " + outside.Unit.Name;
            var (ours, theirs) = (QuantityText.Parse(text, outside.Kind), outside.ToSi(rounded));
            Assert.True(Math.Abs(ours.Value - theirs) <= Math.Abs(theirs) * 1e-8 + 1e-12, $"{text}: {ours.Value:R} and {theirs:R}; {ours.Fault?.Wrong}");
        }, iter: 4000, seed: "0N0XIzNsQ0O3", threads: 1);

    [Fact]
    public void Any_text_at_all_is_read_or_refused_and_never_throws() =>
        Gen.Select(Gen.OneOf(Quantity.All.ToArray()), Gen.Char["0123456789.,+-−/ '\"eEmftin°CFKN½×⁻\u2009\u00A0\0µ∞"].Array[0, 20]).Sample((kind, letters) =>
        {
            var read = QuantityText.Parse(new string(letters), kind);
            Assert.True(read.Fault is null ? double.IsFinite(read.Value) : double.IsNaN(read.Value));
        }, iter: 20000, seed: "0N0XIzNsQ0O4", threads: 1);
}
