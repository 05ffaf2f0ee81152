using System.Globalization;
using System.Security.Cryptography;

namespace JointPlanner.Pdf.Verifying;

/// <summary>One archived state of a sheet: its first so many bytes and their hash.</summary>
/// <param name="Length">Bytes up to the end of that state.</param>
/// <param name="Sha256">SHA-256 of those bytes, hexadecimal.</param>
public sealed record ArchivedState(int Length, string Sha256);

/// <summary>How a file compares with the archived states of the sheet.</summary>
public enum ArchiveVerdict
{
    /// <summary>Byte for byte the latest archived state.</summary>
    Latest,

    /// <summary>Byte for byte an earlier archived state: the archive holds more signatures.</summary>
    Earlier,

    /// <summary>Begins with an archived state and goes on differently from the archive.</summary>
    GoesOnDifferently,

    /// <summary>Not the archived bytes.</summary>
    Different,
}

/// <summary>How a file compares with the archived states of the sheet.</summary>
/// <param name="Verdict">The answer, for programs.</param>
/// <param name="Text">The answer, for people.</param>
public sealed record ArchiveStatement(ArchiveVerdict Verdict, string Text)
{
    internal static ArchiveStatement Compare(byte[] file, IReadOnlyList<ArchivedState> states)
    {
        var ordered = states.OrderBy(state => state.Length).ToList();
        int matched = ordered.FindLastIndex(state => state.Length <= file.Length
            && string.Equals(Convert.ToHexString(SHA256.HashData(file.AsSpan(0, state.Length))), state.Sha256, StringComparison.OrdinalIgnoreCase));
        if (matched < 0) return new(ArchiveVerdict.Different, "These are not the archived bytes of this sheet.");
        if (ordered[matched].Length < file.Length)
            return new(ArchiveVerdict.GoesOnDifferently, string.Create(CultureInfo.InvariantCulture,
                $"The first {ordered[matched].Length} bytes are archived state {matched + 1} of {ordered.Count}; the {file.Length - ordered[matched].Length} bytes after them are not in the archive."));
        return matched == ordered.Count - 1
            ? new(ArchiveVerdict.Latest, "Byte for byte the latest archived state of this sheet.")
            : new(ArchiveVerdict.Earlier, string.Create(CultureInfo.InvariantCulture, $"Byte for byte archived state {matched + 1} of {ordered.Count}; the archive holds a later one."));
    }
}
