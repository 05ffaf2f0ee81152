namespace JointPlanner.Pictures;

/// <summary>One line of text.</summary>
/// <param name="Role">What it stands for.</param>
/// <param name="At">The point to which the text is tied by <see cref="Anchor"/> and <see cref="Level"/>.</param>
/// <param name="Text">The words. Text typed by people belongs only here, in titles and in plan paths.</param>
public sealed record Label(Role Role, PaperPoint At, string Text) : Element(Role)
{
    /// <summary>Height of a capital letter of the typeface as a share of the type size.</summary>
    public const double CapitalHeight = 0.698;

    /// <summary>Type size in millimetres of paper; a capital is some 0.7 of it.</summary>
    public double SizeMm { get; init; } = 2.6;

    /// <summary>Which part of the text stands at the point, along the text.</summary>
    public Anchor Anchor { get; init; } = Anchor.Start;

    /// <summary>Which part of the text stands at the point, across the text.</summary>
    public Level Level { get; init; } = Level.Baseline;

    /// <summary>How strong the letters are.</summary>
    public Weight Weight { get; init; } = Weight.Regular;

    /// <summary>Turn about the point in degrees, clockwise as seen on the paper.</summary>
    public double AngleDegrees { get; init; }

    /// <summary>
    /// A cautious guess of the text's width in millimetres, for finding out whether labels collide; the true width is known only to
    /// whoever holds the typeface.
    /// </summary>
    public double GuessedWidthMm => Text.EnumerateRunes().Sum(GuessedAdvance) * SizeMm * (Weight == Weight.Semibold ? 1.06 : 1);

    /// <summary>How far the baseline lies below <see cref="At"/>, in millimetres across the text.</summary>
    public double BaselineDropMm => Level switch
    {
        Level.Baseline => 0,
        Level.Middle => SizeMm * CapitalHeight / 2,
        Level.Top => SizeMm * CapitalHeight,
        _ => throw new InvalidOperationException($"There is no text level {Level}."),
    };

    private static double GuessedAdvance(System.Text.Rune rune) => rune.Value switch
    {
        'm' or 'w' or 'M' or 'W' or '%' or '@' => 0.95,
        'i' or 'j' or 'l' or 'I' or ' ' or '.' or ',' or ':' or ';' or '\'' or '|' => 0.36,
        >= 'A' and <= 'Z' => 0.70,
        < 0x250 => 0.61,
        _ => 0.85,
    };
}
