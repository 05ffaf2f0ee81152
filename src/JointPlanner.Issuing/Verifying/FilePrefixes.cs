using System.Security.Cryptography;

namespace JointPlanner.Issuing.Verifying;

/// <summary>Where a state of a PDF may end, and the hash of everything up to there: what an archived sheet is found by.</summary>
public static class FilePrefixes
{
    // As many as a file may have states; a file with more marks is found by those of its first ones and by its whole.
    private const int Most = 64;

    /// <summary>SHA-256 of the file up to and with each end-of-file mark (with and without the line end after it), and of the whole.</summary>
    public static IReadOnlyList<string> Hashes(ReadOnlySpan<byte> pdf)
    {
        var hashes = new HashSet<string>();
        using var running = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        var done = 0;
        foreach (var end in Ends(pdf))
        {
            running.AppendData(pdf[done..end]);
            done = end;
            hashes.Add(Convert.ToHexStringLower(running.GetCurrentHash()));
        }

        return [.. hashes];
    }

    private static SortedSet<int> Ends(ReadOnlySpan<byte> pdf)
    {
        var mark = "%%EOF"u8;
        var ends = new SortedSet<int> { pdf.Length };
        for (var (at, seen) = (0, 0); seen < Most && pdf[at..].IndexOf(mark) is >= 0 and var next; seen++)
        {
            at += next + mark.Length;
            ends.Add(at);
            for (var line = at; line < pdf.Length && line < at + 2 && pdf[line] is (byte)'\r' or (byte)'\n'; line++) ends.Add(line + 1);
        }

        return ends;
    }
}
