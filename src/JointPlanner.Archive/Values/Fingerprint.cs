using System.Security.Cryptography;
using System.Text;

namespace JointPlanner.Archive.Values;

/// <summary>SHA-256 as 64 small hexadecimal digits: the one way in which the archive writes a hash.</summary>
public static class Fingerprint
{
    /// <summary>Stands where a first row would name its predecessor.</summary>
    public static readonly string None = new('0', 64);

    // Throws on a lone surrogate: such a text has no UTF-8 bytes that would come back the same.
    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    public static string Of(ReadOnlySpan<byte> bytes) => Convert.ToHexStringLower(SHA256.HashData(bytes));

    /// <summary>Hash of the text's UTF-8 bytes, without a byte order mark.</summary>
    public static string Of(string text) => Of(Strict.GetBytes(text));

    /// <summary>Compares two hashes as people paste them: case and blanks around do not matter.</summary>
    public static bool Same(string one, string other) =>
        string.Equals(one.Trim(), other.Trim(), StringComparison.OrdinalIgnoreCase);
}
