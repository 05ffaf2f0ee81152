using System.Security.Cryptography;

namespace JointPlanner.Exchange.Packages;

/// <summary>The hash by which stored content is known: SHA-256 of its bytes as they stand, in small hexadecimal letters.</summary>
public static class ContentHash
{
    /// <summary>The hash of some bytes.</summary>
    public static string Of(ReadOnlySpan<byte> bytes) => Convert.ToHexStringLower(SHA256.HashData(bytes));

    /// <summary>True where a text has the shape of such a hash.</summary>
    public static bool IsHash(string text) => text.Length == 64 && text.All(char.IsAsciiHexDigitLower);
}
