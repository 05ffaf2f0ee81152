namespace JointPlanner.Pictures;

/// <summary>
/// Carries world points to the paper: one scale along X and the same scale times <see cref="Exaggeration"/> along Z. The exaggeration is
/// a number that whoever draws must print, see <see cref="ScaleSentence"/>.
/// </summary>
public sealed record View
{
    private static readonly double[] NiceExaggerations = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 15, 20, 25, 30, 40, 50, 60, 80, 100];

    /// <summary>The world point that falls on <see cref="PaperOrigin"/>.</summary>
    public required WorldPoint Origin { get; init; }

    /// <summary>Where <see cref="Origin"/> falls on the paper.</summary>
    public required PaperPoint PaperOrigin { get; init; }

    /// <summary>Millimetres of paper for one world unit along X; above zero.</summary>
    public required double XScale { get; init; }

    /// <summary>How many times larger Z is drawn than X; 1 is true to scale. For a diagram it is only the ratio of the two axes' scales.</summary>
    public double Exaggeration { get; init; } = 1;

    /// <summary>Millimetres of paper for one world unit along Z.</summary>
    public double ZScale => XScale * Exaggeration;

    /// <summary>The sentence that states the scales, for printing under an elevation.</summary>
    public string ScaleSentence => Exaggeration == 1
        ? "Heights and lengths to one scale."
        : FormattableString.Invariant($"Heights drawn {Math.Round(Exaggeration, 2):0.##} times as large as lengths.");

    /// <summary>The world in the middle of the room, as large as fits with the given exaggeration.</summary>
    /// <exception cref="ArgumentException">The world or the room has no extent, or the exaggeration is not above zero.</exception>
    public static View Fit(WorldBox world, PaperBox room, double exaggeration = 1)
    {
        Check(world, room);
        if (!(exaggeration > 0) || !double.IsFinite(exaggeration))
            throw new ArgumentException($"The exaggeration must be a number above zero, not {exaggeration}.", nameof(exaggeration));
        return Centred(world, room, Math.Min(Scale(room.Width, world.Width), Scale(room.Height, world.Height * exaggeration)), exaggeration);
    }

    /// <summary>
    /// The world as wide as the room; heights enlarged by the largest round number, up to <paramref name="most"/>, with which they still fit.
    /// For long flat bridges, whose deck would else be a hair.
    /// </summary>
    /// <exception cref="ArgumentException">The world or the room has no extent.</exception>
    public static View FitExaggerated(WorldBox world, PaperBox room, double most = 10)
    {
        Check(world, room);
        if (world.Width <= 0 || world.Height <= 0) return Fit(world, room);
        var largest = room.Height / (world.Height * (room.Width / world.Width));
        var fitting = NiceExaggerations.LastOrDefault(e => e <= largest && e <= most, 1);
        return Fit(world, room, fitting);
    }

    /// <summary>A diagram's view: X fills the room's width and Z its height, each axis with its own scale.</summary>
    /// <exception cref="ArgumentException">The world or the room has no extent in one of the directions.</exception>
    public static View Fill(WorldBox world, PaperBox room)
    {
        Check(world, room);
        if (world.Width <= 0 || world.Height <= 0)
            throw new ArgumentException("A diagram needs some extent along both axes.", nameof(world));
        double x = room.Width / world.Width, z = room.Height / world.Height;
        return Centred(world, room, x, z / x);
    }

    /// <summary>Where a world point falls on the paper.</summary>
    public PaperPoint ToPaper(WorldPoint point) =>
        new(PaperOrigin.X + ((point.X - Origin.X) * XScale), PaperOrigin.Y - ((point.Z - Origin.Z) * ZScale));

    /// <summary>Which world point lies under a place on the paper.</summary>
    public WorldPoint ToWorld(PaperPoint point) =>
        new(Origin.X + ((point.X - PaperOrigin.X) / XScale), Origin.Z - ((point.Y - PaperOrigin.Y) / ZScale));

    private static double Scale(double room, double world) => world > 0 ? room / world : double.PositiveInfinity;

    private static View Centred(WorldBox world, PaperBox room, double scale, double exaggeration) => new()
    {
        Origin = new((world.Left + world.Right) / 2, (world.Bottom + world.Top) / 2),
        PaperOrigin = room.Centre,
        XScale = scale,
        Exaggeration = exaggeration,
    };

    private static void Check(WorldBox world, PaperBox room)
    {
        if (!(world.Width >= 0) || !(world.Height >= 0) || !(world.Width + world.Height > 0) || !double.IsFinite(world.Width + world.Height))
            throw new ArgumentException($"The world to be drawn needs a finite extent, not {world.Width} by {world.Height}.", nameof(world));
        if (!(room.Width > 0) || !(room.Height > 0) || !double.IsFinite(room.Width + room.Height))
            throw new ArgumentException($"The room on the paper must be above zero, not {room.Width} mm by {room.Height} mm.", nameof(room));
    }
}
