using JointPlanner.Engine.Formulas;
using UnitsNet;

namespace JointPlanner.Engine.Tests.Formulas;

/// <summary>Factors against UnitsNet, a general-purpose library of units, which holds some of its own to ten digits.</summary>
public class UnitTests
{
    public static TheoryData<double, double> Factors => new()
    {
        { Unit.Foot.Factor, UnitsNet.Length.FromFeet(1).Meters },
        { Unit.InchUnit.Factor, UnitsNet.Length.FromInches(1).Meters },
        { Unit.SquareInch.Factor, UnitsNet.Area.FromSquareInches(1).SquareMeters },
        { Unit.SquareFoot.Factor, UnitsNet.Area.FromSquareFeet(1).SquareMeters },
        { Unit.FootFourth.Factor, AreaMomentOfInertia.FromFeetToTheFourth(1).MetersToTheFourth },
        { Unit.InchFourth.Factor, AreaMomentOfInertia.FromInchesToTheFourth(1).MetersToTheFourth },
        { Unit.Kip.Factor, UnitsNet.Force.FromKilopoundsForce(1).Newtons },
        { Unit.KipPerInch.Factor, ForcePerLength.FromKilopoundsForcePerInch(1).NewtonsPerMeter },
        { Unit.KipPerFoot.Factor, ForcePerLength.FromKilopoundsForcePerFoot(1).NewtonsPerMeter },
        { Unit.KipPerSquareInch.Factor, Pressure.FromKilopoundsForcePerSquareInch(1).Pascals },
        { Unit.PoundPerSquareInch.Factor, Pressure.FromPoundsForcePerSquareInch(1).Pascals },
        { Unit.Degree.Factor, UnitsNet.Angle.FromDegrees(1).Radians },
        { Unit.Day.Factor, Duration.FromDays(1).Seconds },
        { Unit.PerFahrenheit.Factor, CoefficientOfThermalExpansion.FromPerDegreeFahrenheit(1).PerKelvin },
        { Unit.KipFootPerRadian.Factor, Torque.FromKilopoundForceFeet(1).NewtonMeters },
    };

    [Theory]
    [MemberData(nameof(Factors))]
    public void Factors_agree_with_a_library_of_units(double ours, double theirs) => Assert.Equal(1, ours / theirs, 1e-8);

    [Theory]
    [InlineData(-40, -40)]
    [InlineData(0, 32)]
    [InlineData(100, 212)]
    public void Fahrenheit_readings_have_their_own_zero(double celsius, double fahrenheit)
    {
        Assert.Equal(fahrenheit, Unit.Fahrenheit.FromSi(celsius), 1e-9);
        Assert.Equal(celsius, Unit.Fahrenheit.ToSi(fahrenheit), 1e-9);
        Assert.Equal(Temperature.FromDegreesFahrenheit(fahrenheit).DegreesCelsius, Unit.Fahrenheit.ToSi(fahrenheit), 1e-9);
    }

    [Fact]
    public void A_difference_of_temperatures_has_no_zero_of_its_own() => Assert.Equal(10, Unit.FahrenheitDifference.ToSi(18), 1e-12);
}
