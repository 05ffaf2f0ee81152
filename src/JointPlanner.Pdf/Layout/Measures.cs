namespace JointPlanner.Pdf.Layout;

/// <summary>The sheet's margins, type sizes and shades in one place. Lengths are in points of 1/72 inch, shades from 0 (black) to 1 (paper).</summary>
internal static class Measures
{
    public const double Mm = 72 / 25.4;

    public const double Left = 22 * Mm;
    public const double Right = 18 * Mm;
    public const double Top = 27 * Mm;
    public const double Bottom = 21 * Mm;

    public const double Body = 9.2;
    public const double BodyLine = 12.6;
    public const double Small = 8;
    public const double SmallLine = 10.6;
    public const double Tiny = 7.2;
    public const double Formula = 9.8;

    public const double Ink = 0.08;
    public const double Quiet = 0.36;
    public const double Rule = 0.62;
    public const double Watermark = 0.94;

    public const double Hairline = 0.3;
    public const double ThinRule = 0.5;
    public const double StrongRule = 0.9;
}
