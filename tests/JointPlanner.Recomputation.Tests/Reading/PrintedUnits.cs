namespace JointPlanner.Recomputation.Tests.Reading;

/// <summary>
/// The units that the program prints, written down here a second time: factors from the definitions of inch (25.4 mm), pound
/// (0.45359237 kg) and standard gravity (9.80665 m/s²), NIST SP 811 appendix B. A reading in °C or °F is taken as so many degrees above
/// that scale's zero: only differences of readings are ever used, and one text never mixes the scales.
/// </summary>
public static class PrintedUnits
{
    private const double In = 0.0254, Ft = 0.3048, Lbf = 0.45359237 * 9.80665, Kip = 1000 * Lbf, DegF = 1 / 1.8;
    private static readonly Powers Length = new(1, 0, 0, 0), Force = new(1, 1, -2, 0), Degree = new(0, 0, 0, 1), Second = new(0, 0, 1, 0);

    private static readonly Dictionary<string, (double Factor, Powers Powers)> Known = new()
    {
        ["%"] = (0.01, default),
        ["µε"] = (1e-6, default),
        ["°"] = (Math.PI / 180, default),
        ["rad"] = (1, default),
        ["m"] = (1, Length),
        ["km"] = (1000, Length),
        ["cm"] = (0.01, Length),
        ["mm"] = (0.001, Length),
        ["in"] = (In, Length),
        ["ft"] = (Ft, Length),
        ["m²"] = (1, Length * 2),
        ["mm²"] = (1e-6, Length * 2),
        ["in²"] = (In * In, Length * 2),
        ["ft²"] = (Ft * Ft, Length * 2),
        ["m⁴"] = (1, Length * 4),
        ["mm⁴"] = (1e-12, Length * 4),
        ["in⁴"] = (In * In * In * In, Length * 4),
        ["ft⁴"] = (Ft * Ft * Ft * Ft, Length * 4),
        ["°C"] = (1, Degree),
        ["K"] = (1, Degree),
        ["°F"] = (DegF, Degree),
        ["/K"] = (1, Degree * -1),
        ["/°C"] = (1, Degree * -1),
        ["/°F"] = (1.8, Degree * -1),
        ["N"] = (1, Force),
        ["kN"] = (1e3, Force),
        ["MN"] = (1e6, Force),
        ["GN"] = (1e9, Force),
        ["kip"] = (Kip, Force),
        ["N/m"] = (1, Force - Length),
        ["kN/m"] = (1e3, Force - Length),
        ["kN/mm"] = (1e6, Force - Length),
        ["MN/m"] = (1e6, Force - Length),
        ["kip/in"] = (Kip / In, Force - Length),
        ["kip/ft"] = (Kip / Ft, Force - Length),
        ["kN·m/rad"] = (1e3, Force + Length),
        ["MN·m/rad"] = (1e6, Force + Length),
        ["kip·ft/rad"] = (Kip * Ft, Force + Length),
        ["Pa"] = (1, Force - (Length * 2)),
        ["MPa"] = (1e6, Force - (Length * 2)),
        ["GPa"] = (1e9, Force - (Length * 2)),
        ["ksi"] = (Kip / (In * In), Force - (Length * 2)),
        ["psi"] = (Lbf / (In * In), Force - (Length * 2)),
        ["mm/K"] = (1e-3, Length - Degree),
        ["in/°F"] = (In * 1.8, Length - Degree),
        ["s"] = (1, Second),
        ["d"] = (86400, Second),
        ["a"] = (365.25 * 86400, Second),
        ["mm/kN"] = (1e-6, Length - Force),
        ["in/kip"] = (In / Kip, Length - Force),
        ["kN·m"] = (1e3, Force + Length),
        ["MN·m"] = (1e6, Force + Length),
        ["kip·ft"] = (Kip * Ft, Force + Length),
        ["kN·m²"] = (1e3, Force + (Length * 2)),
        ["MN·m²"] = (1e6, Force + (Length * 2)),
        ["kip·ft²"] = (Kip * Ft * Ft, Force + (Length * 2)),
        ["/m"] = (1, Length * -1),
        ["/ft"] = (1 / Ft, Length * -1),
        ["K/m"] = (1, Degree - Length),
        ["°F/ft"] = (DegF / Ft, Degree - Length),
        ["kN/K"] = (1e3, Force - Degree),
        ["kip/°F"] = (Kip * 1.8, Force - Degree),
        ["MN/m²"] = (1e6, Force - (Length * 2)),
        ["mm/(kN/m)"] = (1e-6, (Length * 2) - Force),
        ["in/(kip/ft)"] = (In * Ft / Kip, (Length * 2) - Force),
    };

    private static readonly KeyValuePair<string, (double Factor, Powers Powers)>[] LongestFirst = [.. Known.OrderByDescending(k => k.Key.Length)];

    /// <summary>The longest unit that stands at this place and ends there; null for none.</summary>
    public static (string Name, double Factor, Powers Powers)? At(string text, int place)
    {
        foreach (var (name, unit) in LongestFirst)
            if (string.CompareOrdinal(text, place, name, 0, name.Length) == 0 && EndsAt(text, place + name.Length))
                return (name, unit.Factor, unit.Powers);
        return null;
    }

    private static bool EndsAt(string text, int place) => place >= text.Length || text[place] is ' ' or ')' or ',' or ':';
}
