using System.Diagnostics;
using System.Globalization;

namespace JointPlanner.Architecture.Tests.Planted;

/// <summary>Breaches for the search to find: everything that the engine may not touch.</summary>
public static class Impurities
{
    public static string OfAClock() => DateTime.UtcNow.ToString("O", CultureInfo.CurrentCulture) + DateTimeOffset.Now.Offset;

    public static long OfAStopwatch() => Stopwatch.GetTimestamp();

    public static bool OfAFile(string path) => File.Exists(path);

    public static string OfChance() => Guid.NewGuid().ToString() + new Random(1);

    public static string OfACulture(double value) => $"about {value}";
}
