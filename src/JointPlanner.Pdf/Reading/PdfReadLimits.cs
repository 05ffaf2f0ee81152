namespace JointPlanner.Pdf.Reading;

/// <summary>How much of a stranger's PDF the reader is willing to look at before it gives up.</summary>
/// <remarks>The file may be built to exhaust the reader, so every count below ends in a <see cref="PdfReadException"/>, never in a hang.</remarks>
public sealed record PdfReadLimits
{
    /// <summary>The limits used wherever a caller names none.</summary>
    public static PdfReadLimits Default { get; } = new();

    /// <summary>Largest file, in bytes.</summary>
    public int FileBytes { get; init; } = 25 * 1024 * 1024;

    /// <summary>Most entries in all cross-reference sections together: every version of an object counts once.</summary>
    public int Objects { get; init; } = 50_000;

    /// <summary>Most revisions: the first state of the file and each update appended to it.</summary>
    public int Revisions { get; init; } = 64;

    /// <summary>Deepest nesting of arrays and dictionaries in one object.</summary>
    public int Nesting { get; init; } = 64;

    /// <summary>Most bytes that one compressed stream may unpack to.</summary>
    public int InflatedStreamBytes { get; init; } = 20 * 1024 * 1024;

    /// <summary>Most bytes that all compressed streams together may unpack to.</summary>
    public int InflatedBytes { get; init; } = 100 * 1024 * 1024;

    /// <summary>Most values (numbers, names, strings, arrays, dictionaries) read in all.</summary>
    public int Values { get; init; } = 2_000_000;

    /// <summary>Most bytes kept of strings and names, in all.</summary>
    public int TextBytes { get; init; } = 40 * 1024 * 1024;

    /// <summary>Longest time spent on one file; elapsed time, not the time of day.</summary>
    public TimeSpan Time { get; init; } = TimeSpan.FromSeconds(5);
}
