using Microsoft.EntityFrameworkCore.Storage.ValueConversion;

namespace JointPlanner.Archive.Values;

/// <summary>
/// Instants are kept in UTC and to the microsecond: PostgreSQL keeps no finer step, and a hash made before saving must hold after reading.
/// </summary>
public static class UtcMoments
{
    public static DateTimeOffset ToTheMicrosecond(DateTimeOffset moment)
    {
        var utc = moment.ToUniversalTime();
        return new DateTimeOffset(utc.Ticks - utc.Ticks % TimeSpan.TicksPerMicrosecond, TimeSpan.Zero);
    }

    /// <summary>SQLite cannot order or compare a DateTimeOffset; ticks of UTC it can.</summary>
    public sealed class AsTicks() : ValueConverter<DateTimeOffset, long>(
        moment => ToTheMicrosecond(moment).UtcTicks,
        ticks => new DateTimeOffset(ticks, TimeSpan.Zero));

    /// <summary>PostgreSQL takes an instant only with offset zero.</summary>
    public sealed class AsUniversal() : ValueConverter<DateTimeOffset, DateTimeOffset>(
        moment => ToTheMicrosecond(moment),
        moment => moment);
}
