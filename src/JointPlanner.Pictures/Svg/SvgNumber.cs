using System.Globalization;

namespace JointPlanner.Pictures.Svg;

/// <summary>Numbers as SVG wants them, whatever the culture of the thread.</summary>
internal static class SvgNumber
{
    /// <summary>To a thousandth of a millimetre, without a negative zero.</summary>
    /// <exception cref="InvalidOperationException">The number is not finite.</exception>
    public static string Of(double value)
    {
        if (!double.IsFinite(value))
            throw new InvalidOperationException("A coordinate or size in the picture is not a finite number; it cannot be drawn.");
        var rounded = Math.Round(value, 3, MidpointRounding.AwayFromZero) + 0.0;
        return rounded.ToString("0.###", CultureInfo.InvariantCulture);
    }
}
