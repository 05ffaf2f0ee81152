using System.Collections.Frozen;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Exchange.Printing.Digits;

namespace JointPlanner.Exchange.Printing;

/// <summary>
/// The units and digits in which one reader sees every kind of quantity. A profile belongs to the display alone: it never changes a
/// result, and units of two profiles never stand in one table.
/// </summary>
public sealed class DisplayProfile
{
    private readonly FrozenDictionary<Quantity, DisplayUnit> units;

    private DisplayProfile(string id, string name, double settingStep, double dayStep, Dictionary<Quantity, DisplayUnit> units) =>
        (Id, Name, SettingStep, DayStep, this.units) = (id, name, settingStep, dayStep, units.ToFrozenDictionary());

    /// <summary>Word for the profile in files and on the command line.</summary>
    public string Id { get; }

    /// <summary>Name for people.</summary>
    public string Name { get; }

    /// <summary>Step to which set values are rounded where the owner's rules state none, m.</summary>
    public double SettingStep { get; }

    /// <summary>Step of temperature between rows of the tables that people on site set by, K.</summary>
    public double DayStep { get; }

    /// <summary>How a kind of quantity is shown.</summary>
    /// <exception cref="ArgumentException">The profile has no unit for it.</exception>
    public DisplayUnit this[Quantity quantity] =>
        units.TryGetValue(quantity, out var unit) ? unit : throw new ArgumentException($"The {Id} profile has no unit for {quantity.Id}.");

    /// <summary>Metres, millimetres, kilonewtons, degrees Celsius.</summary>
    public static readonly DisplayProfile Metric = new("metric", "metric units", 0.001, 1, new()
    {
        [Quantity.Length] = new(Unit.Metre, Decimals(3)),
        [Quantity.Movement] = new(Unit.Millimetre, Decimals(1)),
        [Quantity.Opening] = new(Unit.Millimetre, Decimals(1)),
        [Quantity.Size] = new(Unit.Millimetre, Decimals(1)),
        [Quantity.Area] = new(Unit.SquareMetre, Significant(4)),
        [Quantity.PlanArea] = new(Unit.SquareMillimetre, Significant(4)),
        [Quantity.Inertia] = new(Unit.MetreFourth, Significant(4)),
        [Quantity.Temperature] = new(Unit.Celsius, Decimals(1)),
        [Quantity.TemperatureDifference] = new(Unit.Kelvin, Decimals(1)),
        [Quantity.Expansion] = new(Unit.PerKelvin, Decimals(1), -6),
        [Quantity.Strain] = new(Unit.One, Decimals(1), -6),
        [Quantity.Angle] = new(Unit.Degree, Decimals(2)),
        [Quantity.Force] = new(Unit.Kilonewton, Decimals(1)),
        [Quantity.Stiffness] = new(Unit.KilonewtonPerMillimetre, Significant(4)),
        [Quantity.RotationalStiffness] = new(Unit.MeganewtonMetrePerRadian, Significant(4)),
        [Quantity.AxialStiffness] = new(Unit.Meganewton, Significant(4)),
        [Quantity.Stress] = new(Unit.Megapascal, Significant(4)),
        [Quantity.Rate] = new(Unit.MillimetrePerKelvin, Decimals(3)),
        [Quantity.Age] = new(Unit.Day, Decimals(0)),
        [Quantity.Ratio] = new(Unit.One, Decimals(3)),
        [Quantity.Count] = new(Unit.One, Decimals(0)),
        [Quantity.Flexibility] = new(Unit.MillimetrePerKilonewton, Significant(4)),
        [Quantity.LineLoad] = new(Unit.KilonewtonPerMetre, Significant(4)),
        [Quantity.Moment] = new(Unit.KilonewtonMetre, Significant(4)),
        [Quantity.BendingStiffness] = new(Unit.MeganewtonSquareMetre, Significant(4)),
        [Quantity.Curvature] = new(Unit.PerMetre, Decimals(2), -6),
        [Quantity.Rotation] = new(Unit.Radian, Decimals(3), -3),
        [Quantity.TemperatureGradient] = new(Unit.KelvinPerMetre, Decimals(2)),
        [Quantity.StiffnessPerDegree] = new(Unit.KilonewtonPerKelvin, Significant(4)),
        [Quantity.ConnectionStiffness] = new(Unit.MeganewtonPerSquareMetre, Significant(4)),
        [Quantity.InfluenceArea] = new(Unit.MillimetrePerKilonewtonPerMetre, Significant(4)),
    });

    /// <summary>Feet in decimals for the deck, inches for gaps and movements, kips, degrees Fahrenheit.</summary>
    public static readonly DisplayProfile Us = new("us", "US customary units", 0.0254 / 16, 2 * Unit.FahrenheitDifference.Factor, new()
    {
        [Quantity.Length] = new(Unit.Foot, Decimals(3)),
        [Quantity.Movement] = new(Unit.InchUnit, Decimals(3)),
        [Quantity.Opening] = new(Unit.InchUnit, Decimals(3)),
        [Quantity.Size] = new(Unit.InchUnit, Decimals(3)),
        [Quantity.Area] = new(Unit.SquareInch, Significant(4)),
        [Quantity.PlanArea] = new(Unit.SquareInch, Significant(4)),
        [Quantity.Inertia] = new(Unit.FootFourth, Significant(4)),
        [Quantity.Temperature] = new(Unit.Fahrenheit, Decimals(1)),
        [Quantity.TemperatureDifference] = new(Unit.FahrenheitDifference, Decimals(1)),
        [Quantity.Expansion] = new(Unit.PerFahrenheit, Decimals(2), -6),
        [Quantity.Strain] = new(Unit.One, Decimals(1), -6),
        [Quantity.Angle] = new(Unit.Degree, Decimals(2)),
        [Quantity.Force] = new(Unit.Kip, Decimals(1)),
        [Quantity.Stiffness] = new(Unit.KipPerInch, Significant(4)),
        [Quantity.RotationalStiffness] = new(Unit.KipFootPerRadian, Significant(4)),
        [Quantity.AxialStiffness] = new(Unit.Kip, Significant(4)),
        [Quantity.Stress] = new(Unit.KipPerSquareInch, Significant(4)),
        [Quantity.Rate] = new(Unit.InchPerFahrenheit, Decimals(5)),
        [Quantity.Age] = new(Unit.Day, Decimals(0)),
        [Quantity.Ratio] = new(Unit.One, Decimals(3)),
        [Quantity.Count] = new(Unit.One, Decimals(0)),
        [Quantity.Flexibility] = new(Unit.InchPerKip, Significant(4)),
        [Quantity.LineLoad] = new(Unit.KipPerFoot, Significant(4)),
        [Quantity.Moment] = new(Unit.KipFoot, Significant(4)),
        [Quantity.BendingStiffness] = new(Unit.KipSquareFoot, Significant(4)),
        [Quantity.Curvature] = new(Unit.PerFoot, Decimals(2), -6),
        [Quantity.Rotation] = new(Unit.Radian, Decimals(3), -3),
        [Quantity.TemperatureGradient] = new(Unit.FahrenheitPerFoot, Decimals(2)),
        [Quantity.StiffnessPerDegree] = new(Unit.KipPerFahrenheit, Significant(4)),
        [Quantity.ConnectionStiffness] = new(Unit.KipPerSquareInch, Significant(4)),
        [Quantity.InfluenceArea] = new(Unit.InchPerKipPerFoot, Significant(4)),
    });

    /// <summary>Every profile there is.</summary>
    public static IReadOnlyList<DisplayProfile> All { get; } = [Metric, Us];

    /// <summary>The profile with this id.</summary>
    /// <exception cref="ArgumentException">There is none.</exception>
    public static DisplayProfile Of(string id) => All.FirstOrDefault(p => p.Id == id)
        ?? throw new ArgumentException($"There is no display profile '{id}'; there are {string.Join(" and ", All.Select(p => p.Id))}.");

    /// <inheritdoc/>
    public override string ToString() => Id;
}
