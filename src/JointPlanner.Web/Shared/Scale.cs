using System.Globalization;

namespace JointPlanner.Web.Shared;

/// <summary>Paper to pixels: the only place of the site that multiplies.</summary>
internal static class Scale
{
    private const double PixelsPerMillimetre = 4;

    /// <summary>A paper length as a style's length.</summary>
    internal static string Pixels(double millimetres) => string.Create(CultureInfo.InvariantCulture, $"{millimetres * PixelsPerMillimetre:0.##}px");

    /// <summary>A share as a style's percentage, at most the whole.</summary>
    internal static string Percent(double share) => string.Create(CultureInfo.InvariantCulture, $"{Math.Clamp(share, 0, 1) * 100:0.#}%");
}
