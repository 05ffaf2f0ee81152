using System.Buffers.Text;
using System.Security.Cryptography;

namespace JointPlanner.Archive.Values;

/// <summary>The secret part of a link: 128 random bits, as 22 characters that fit an address. Only its hash is kept.</summary>
public static class LinkToken
{
    private const int Bytes = 16;

    public static string New() => Base64Url.EncodeToString(RandomNumberGenerator.GetBytes(Bytes));

    /// <summary>Null for a text that is no token.</summary>
    public static string? HashOf(string token) =>
        Base64Url.IsValid(token, out var length) && length == Bytes ? Fingerprint.Of(Base64Url.DecodeFromChars(token)) : null;
}
