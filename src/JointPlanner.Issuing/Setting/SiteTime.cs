using System.Globalization;

namespace JointPlanner.Issuing.Setting;

/// <summary>Instants as people at the structure read and write them.</summary>
/// <param name="zone">IANA zone of the structure.</param>
public sealed class SiteTime(string zone)
{
    private readonly TimeZoneInfo found = TimeZoneInfo.TryFindSystemTimeZoneById(zone, out var known) ? known : TimeZoneInfo.Utc;

    /// <summary>Day, hour and zone.</summary>
    public string Moment(DateTimeOffset instant) => string.Create(CultureInfo.InvariantCulture, $"{Local(instant):yyyy-MM-dd HH:mm} {zone}");

    /// <summary>The day.</summary>
    public string Day(DateTimeOffset instant) => string.Create(CultureInfo.InvariantCulture, $"{Local(instant):yyyy-MM-dd}");

    /// <summary>The local clock, as a field for day and hour holds it.</summary>
    public string Clock(DateTimeOffset instant) => string.Create(CultureInfo.InvariantCulture, $"{Local(instant):yyyy-MM-ddTHH:mm}");

    /// <summary>The instant of a local clock's reading; null where there is none. In the hour that comes twice in autumn the earlier one is meant.</summary>
    public DateTimeOffset? Instant(string? clock)
    {
        if (!DateTime.TryParseExact(clock, ["yyyy-MM-ddTHH:mm", "yyyy-MM-ddTHH:mm:ss"], CultureInfo.InvariantCulture, DateTimeStyles.None, out var local)
            || found.IsInvalidTime(local)) return null;
        var offset = found.IsAmbiguousTime(local) ? found.GetAmbiguousTimeOffsets(local).Max() : found.GetUtcOffset(local);
        return new DateTimeOffset(local, offset).ToUniversalTime();
    }

    private DateTimeOffset Local(DateTimeOffset instant) => TimeZoneInfo.ConvertTime(instant, found);
}
