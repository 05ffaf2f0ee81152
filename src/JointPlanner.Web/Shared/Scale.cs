using System.Globalization;

namespace JointPlanner.Web.Shared;

/// <summary>Paper to pixels: the only place of the site that multiplies.</summary>
internal static class Scale
{
    private const double PixelsPerMillimetre = 4, StubPixels = 152, PaperPixels = 1010;

    /// <summary>A paper length as a style's length.</summary>
    internal static string Pixels(double millimetres) => string.Create(CultureInfo.InvariantCulture, $"{millimetres * PixelsPerMillimetre:0.##}px");

    /// <summary>By how much a drawing of this width, with the names at its left, is made smaller to stand on a landscape sheet.</summary>
    internal static string OnPaper(double millimetres) =>
        string.Create(CultureInfo.InvariantCulture, $"{Math.Min(1, PaperPixels / (StubPixels + (millimetres * PixelsPerMillimetre))):0.###}");

    /// <summary>A share as a style's percentage, at most the whole.</summary>
    internal static string Percent(double share) => string.Create(CultureInfo.InvariantCulture, $"{Math.Clamp(share, 0, 1) * 100:0.#}%");
}
