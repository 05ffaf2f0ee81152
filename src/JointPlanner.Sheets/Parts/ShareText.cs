using System.Globalization;

namespace JointPlanner.Sheets.Parts;

/// <summary>Writes a share of a limit.</summary>
internal static class ShareText
{
    public static string Of(double share) => Math.Round(share * 100).ToString("F0", CultureInfo.InvariantCulture) + " %";
}
