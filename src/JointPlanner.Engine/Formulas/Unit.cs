namespace JointPlanner.Engine.Formulas;

/// <summary>A unit of measure: its name and the factor (and, for temperature readings, the zero) that leads to SI. All factors stand here, once.</summary>
/// <param name="Name">Symbol as written beside a number.</param>
/// <param name="Dimension">Dimension of what it measures.</param>
/// <param name="Factor">SI value of one unit.</param>
/// <param name="Zero">For a reading: the SI value (°C) of the unit's zero.</param>
/// <param name="IsReading">True for a thermometer scale.</param>
public sealed record Unit(string Name, Dimension Dimension, double Factor, double Zero = 0, bool IsReading = false)
{
    /// <summary>SI value of <paramref name="value"/> units.</summary>
    public double ToSi(double value) => (value * Factor) + Zero;

    /// <summary>How many units the SI value is.</summary>
    public double FromSi(double si) => (si - Zero) / Factor;

    private const double Inch = 0.0254;
    // By definition: 1 lb = 0.45359237 kg, standard gravity 9.80665 m/s².
    private const double PoundForce = 0.45359237 * 9.80665;
    private static readonly Dimension L1 = new(1), L2 = new(2), L4 = new(4), N = new(1, 1, -2), Theta = new(0, 0, 0, 1);

#pragma warning disable CS1591 // the names say it
    public static readonly Unit One = new("", Dimension.None, 1);
    public static readonly Unit Percent = new("%", Dimension.None, 0.01);
    public static readonly Unit PerMille = new("‰", Dimension.None, 1e-3);
    public static readonly Unit Millionth = new("µε", Dimension.None, 1e-6);
    public static readonly Unit Degree = new("°", Dimension.None, Math.PI / 180);
    public static readonly Unit Radian = new("rad", Dimension.None, 1);
    public static readonly Unit Metre = new("m", L1, 1);
    public static readonly Unit Kilometre = new("km", L1, 1000);
    public static readonly Unit Centimetre = new("cm", L1, 0.01);
    public static readonly Unit Millimetre = new("mm", L1, 0.001);
    public static readonly Unit Foot = new("ft", L1, 12 * Inch);
    public static readonly Unit InchUnit = new("in", L1, Inch);
    public static readonly Unit SquareMetre = new("m²", L2, 1);
    public static readonly Unit SquareMillimetre = new("mm²", L2, 1e-6);
    public static readonly Unit SquareCentimetre = new("cm²", L2, 1e-4);
    public static readonly Unit SquareFoot = new("ft²", L2, 144 * Inch * Inch);
    public static readonly Unit SquareInch = new("in²", L2, Inch * Inch);
    public static readonly Unit MetreFourth = new("m⁴", L4, 1);
    public static readonly Unit MillimetreFourth = new("mm⁴", L4, 1e-12);
    public static readonly Unit CentimetreFourth = new("cm⁴", L4, 1e-8);
    public static readonly Unit InchFourth = new("in⁴", L4, Inch * Inch * Inch * Inch);
    public static readonly Unit FootFourth = new("ft⁴", L4, 20736 * Inch * Inch * Inch * Inch);
    public static readonly Unit Celsius = new("°C", Theta, 1, 0, true);
    public static readonly Unit Fahrenheit = new("°F", Theta, 5.0 / 9, -160.0 / 9, true);
    public static readonly Unit Kelvin = new("K", Theta, 1);
    public static readonly Unit CelsiusDifference = new("°C", Theta, 1);
    public static readonly Unit FahrenheitDifference = new("°F", Theta, 5.0 / 9);
    public static readonly Unit PerKelvin = new("/K", Dimension.None / Theta, 1);
    public static readonly Unit PerCelsius = new("/°C", Dimension.None / Theta, 1);
    public static readonly Unit PerFahrenheit = new("/°F", Dimension.None / Theta, 1.8);
    public static readonly Unit MillionthPerKelvin = new("µε/K", Dimension.None / Theta, 1e-6);
    public static readonly Unit MillionthPerFahrenheit = new("µε/°F", Dimension.None / Theta, 1.8e-6);
    public static readonly Unit Newton = new("N", N, 1);
    public static readonly Unit Kilonewton = new("kN", N, 1e3);
    public static readonly Unit Meganewton = new("MN", N, 1e6);
    public static readonly Unit Giganewton = new("GN", N, 1e9);
    public static readonly Unit Kip = new("kip", N, 1000 * PoundForce);
    public static readonly Unit NewtonPerMetre = new("N/m", N / L1, 1);
    public static readonly Unit NewtonPerMillimetre = new("N/mm", N / L1, 1e3);
    public static readonly Unit KilonewtonPerMillimetre = new("kN/mm", N / L1, 1e6);
    public static readonly Unit KilonewtonPerMetre = new("kN/m", N / L1, 1e3);
    public static readonly Unit MeganewtonPerMetre = new("MN/m", N / L1, 1e6);
    public static readonly Unit KipPerInch = new("kip/in", N / L1, 1000 * PoundForce / Inch);
    public static readonly Unit KipPerFoot = new("kip/ft", N / L1, 1000 * PoundForce / (12 * Inch));
    public static readonly Unit MeganewtonMetrePerRadian = new("MN·m/rad", N * L1, 1e6);
    public static readonly Unit KilonewtonMetrePerRadian = new("kN·m/rad", N * L1, 1e3);
    public static readonly Unit KipFootPerRadian = new("kip·ft/rad", N * L1, 1000 * PoundForce * 12 * Inch);
    public static readonly Unit Pascal = new("Pa", N / L2, 1);
    public static readonly Unit Megapascal = new("MPa", N / L2, 1e6);
    public static readonly Unit Gigapascal = new("GPa", N / L2, 1e9);
    public static readonly Unit KipPerSquareInch = new("ksi", N / L2, 1000 * PoundForce / (Inch * Inch));
    public static readonly Unit PoundPerSquareInch = new("psi", N / L2, PoundForce / (Inch * Inch));
    public static readonly Unit MillimetrePerKelvin = new("mm/K", L1 / Theta, 1e-3);
    public static readonly Unit InchPerFahrenheit = new("in/°F", L1 / Theta, Inch * 1.8);
    public static readonly Unit Second = new("s", new(0, 0, 1), 1);
    public static readonly Unit Day = new("d", new(0, 0, 1), 86400);
    public static readonly Unit Year = new("a", new(0, 0, 1), 365.25 * 86400);
    public static readonly Unit MillimetrePerKilonewton = new("mm/kN", L1 / N, 1e-6);
    public static readonly Unit InchPerKip = new("in/kip", L1 / N, Inch / (1000 * PoundForce));
    public static readonly Unit NewtonMetre = new("N·m", N * L1, 1);
    public static readonly Unit KilonewtonMetre = new("kN·m", N * L1, 1e3);
    public static readonly Unit MeganewtonMetre = new("MN·m", N * L1, 1e6);
    public static readonly Unit KipFoot = new("kip·ft", N * L1, 1000 * PoundForce * 12 * Inch);
    public static readonly Unit KilonewtonSquareMetre = new("kN·m²", N * L2, 1e3);
    public static readonly Unit MeganewtonSquareMetre = new("MN·m²", N * L2, 1e6);
    public static readonly Unit KipSquareFoot = new("kip·ft²", N * L2, 1000 * PoundForce * 144 * Inch * Inch);
    public static readonly Unit PerMetre = new("/m", Dimension.None / L1, 1);
    public static readonly Unit PerFoot = new("/ft", Dimension.None / L1, 1 / (12 * Inch));
    public static readonly Unit KelvinPerMetre = new("K/m", Theta / L1, 1);
    public static readonly Unit FahrenheitPerFoot = new("°F/ft", Theta / L1, 5.0 / 9 / (12 * Inch));
    public static readonly Unit KilonewtonPerKelvin = new("kN/K", N / Theta, 1e3);
    public static readonly Unit KipPerFahrenheit = new("kip/°F", N / Theta, 1000 * PoundForce * 1.8);
    public static readonly Unit MeganewtonPerSquareMetre = new("MN/m²", N / L2, 1e6);
    public static readonly Unit MillimetrePerKilonewtonPerMetre = new("mm/(kN/m)", L2 / N, 1e-6);
    public static readonly Unit InchPerKipPerFoot = new("in/(kip/ft)", L2 / N, Inch * 12 * Inch / (1000 * PoundForce));
#pragma warning restore CS1591
}
