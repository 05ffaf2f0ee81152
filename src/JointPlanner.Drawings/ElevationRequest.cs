using JointPlanner.Engine.Plans;

namespace JointPlanner.Drawings;

/// <summary>What an elevation is drawn from and for.</summary>
public sealed record ElevationRequest
{
    /// <summary>The deck.</summary>
    public required Plan Plan { get; init; }

    /// <summary>Numbers as text, in the reader's units.</summary>
    public required Func<double, string> Length { get; init; }

    /// <summary>The paper.</summary>
    public required ElevationPaper Paper { get; init; }

    /// <summary>Station at which a segment stands still while the deck warms, m, by segment id; empty before anything is computed.</summary>
    public IReadOnlyDictionary<string, double> ZeroMovementPoints { get; init; } = new Dictionary<string, double>();
}

/// <summary>The paper that an elevation is laid out for, mm.</summary>
/// <param name="WidthMm">Least width; it grows where columns need more.</param>
/// <param name="HeightMm">Room for supports and deck between the lettering, at most.</param>
/// <param name="LetterMm">Size of the letters.</param>
/// <param name="ColumnMm">Width that a column below each support or joint needs; 0 where nothing stands below.</param>
public sealed record ElevationPaper(double WidthMm, double HeightMm, double LetterMm, double ColumnMm)
{
    /// <summary>A wide screen at four pixels a millimetre, with the ledger below.</summary>
    public static ElevationPaper Screen { get; } = new(270, 38, 3.1, 48);

    /// <summary>A phone at four pixels a millimetre: the whole deck in view, columns are swiped.</summary>
    public static ElevationPaper Phone { get; } = new(92, 22, 3.2, 0);

    /// <summary>The text width of a sheet in portrait.</summary>
    public static ElevationPaper Sheet { get; } = new(170, 45, 2.6, 0);
}
